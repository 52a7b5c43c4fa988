import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lengthProblemText, parseLength, showLength } from '../../../core/units/quantity.ts';

/** One foot is 304.8 mm and one inch 25.4 mm, by definition. */
const FOOT = 304.8;
const INCH = 25.4;

describe('reading a length', () => {
  it.each([
    ['7320', 7320],
    ['7 320', 7320],
    ['7\u202f320', 7320],
    ['6\u00a0000 mm', 6000],
    ['7.32 m', 7320],
    ['7,32 m', 7320],
    ['7.32m', 7320],
    ['732cm', 7320],
    ['4.5', 4.5],
    ['.5 m', 500],
    [' 12 MM ', 12],
    ['-250', -250],
    ['−250', -250],
    ['24\'-0 1/8"', 24 * FOOT + INCH / 8],
    ['24 ft 1/8 in', 24 * FOOT + INCH / 8],
    ["6'", 6 * FOOT],
    ['6′ 3″', 6 * FOOT + 3 * INCH],
    ["5'6", 5 * FOOT + 6 * INCH],
    ['3/8"', (3 * INCH) / 8],
    ['24 ft. 0 1/8 in.', 24 * FOOT + INCH / 8],
  ])('takes “%s” in a metric project', (typed, mm) => {
    const read = parseLength(typed, 'metric');
    // Read lengths are kept to a millionth of a mm.
    expect(read.ok && read.mm).toBeCloseTo(mm, 6);
  });

  it.each([
    ['24', 24 * INCH],
    ['3 1/2', 3.5 * INCH],
    ['3-1/2', 3.5 * INCH],
    ['1/4', INCH / 4],
    ['24-0 1/8', 24 * FOOT + INCH / 8],
    ['24-6', 24 * FOOT + 6 * INCH],
    ["24'-0 1/8", 24 * FOOT + INCH / 8],
    ["24.5'", 24.5 * FOOT],
    ['7.32 m', 7320],
    ['7320 mm', 7320],
  ])('takes “%s” in a US project', (typed, mm) => {
    const read = parseLength(typed, 'us');
    expect(read.ok && read.mm).toBeCloseTo(mm, 6);
  });

  it.each([
    ['', 'empty'],
    ['   ', 'empty'],
    ['6,000', 'ambiguous comma'],
    ['six', 'not a length'],
    ['1/0 in', 'not a length'],
    ['5 furlong', 'unknown unit'],
    ['12 kg', 'unknown unit'],
    ['3 1/2', 'not a length'],
    ['7.3.2', 'not a length'],
    ['NaN', 'not a length'],
    ['Infinity', 'not a length'],
  ])('refuses “%s” in a metric project, with a reason in words', (typed, kind) => {
    const read = parseLength(typed, 'metric');
    expect(!read.ok && read.problem.kind).toBe(kind);
    if (!read.ok) expect(lengthProblemText(read.problem, 'metric')).toMatch(/[Tt]ype|write|use/);
  });

  // Shown in whole mm, or on a tape to the sixteenth of an inch: half of that may be lost.
  it('reads back what is shown, to the rounding shown', () => {
    fc.assert(
      fc.property(fc.double({ min: -50_000, max: 50_000, noNaN: true }), (mm) => {
        for (const units of ['metric', 'us'] as const)
          for (const style of ['full', 'bare'] as const) {
            const read = parseLength(showLength(mm, units, style), units);
            expect(read.ok).toBe(true);
            const half = units === 'us' ? INCH / 32 : 0.5;
            if (read.ok) expect(Math.abs(read.mm - mm)).toBeLessThanOrEqual(half + 1e-6);
          }
      }),
      { seed: 7, numRuns: 500 },
    );
  });

  it('never throws, whatever is typed', () => {
    fc.assert(
      fc.property(fc.string(), (typed) => {
        const read = parseLength(typed, 'us');
        if (read.ok) expect(Number.isFinite(read.mm)).toBe(true);
      }),
      { seed: 8, numRuns: 500 },
    );
  });
});
