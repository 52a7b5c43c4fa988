/** What a bar is judged by in compression. */
import { describe, expect, it } from 'vitest';
import { compressionResistances } from '../../../core/resistance/compression/compressionResistances.ts';
import { governingCompression } from '../../../core/resistance/compression/governingCompression.ts';
import type { CompressionQuestion } from '../../../core/resistance/model.ts';
import {
  CRITICAL,
  compressed,
  LENGTHS,
  loadOf,
  ONE_LEG,
  stockAngle,
} from '../../published/compressionGiven.ts';

const section = stockAngle('100x100x10');
const judged = (question: CompressionQuestion) => governingCompression(compressionResistances(question));

describe('what an angle by one leg is judged by', () => {
  it('is the rule for one leg where all of it is met', () => {
    // CSA over 2500 mm: 162.4 kN against 176.8 through the centroid.
    const question = compressed('csaS16', section, 2500, { fy: 350 });
    expect(judged(question)?.kind).toBe(ONE_LEG);
  });

  it('is the borrowed rule too, which says that it is borrowed', () => {
    const found = judged(compressed('sans10162', section, 2500, { fy: 350 }));
    expect(found?.kind).toBe(ONE_LEG);
    expect(found?.note).toContain('borrowed');
  });

  it('is never above what it carries through its centroid, and says why', () => {
    // EN over 2500 mm: 227.0 kN by BB.1.2 against 193.7 through the centroid.
    const question = compressed('en1993', section, 2500, { fy: 355, E: 210_000 });
    const found = judged(question);
    expect(found?.kind).toBe(LENGTHS);
    expect(found?.resistance).toBe(loadOf(question, LENGTHS));
    expect(found?.note).toContain('The rule for one leg is met and allows more');
    expect(found?.note).not.toContain('beam-column');
  });

  it('is the lower check through the centroid where the rule is not met, with the caution', () => {
    const ends = [{}, { bolts: 1 }] as const;
    const question = compressed('csaS16', section, 2500, { fy: 350, ends });
    expect(judged(question)?.kind).toBe(LENGTHS);
    expect(judged(question)?.note).toContain('a beam-column check is still due');
    // A critical load below Euler's over the length: the framing holds it less than the marks say.
    expect(judged({ ...question, criticalLoad: 150_000 })?.kind).toBe(CRITICAL);
    // And above it: the lengths still count.
    expect(judged({ ...question, criticalLoad: 600_000 })?.kind).toBe(LENGTHS);
  });

  it('is the check through the centroid in AS, whose rule is not reproduced', () => {
    expect(judged(compressed('as4100', section, 2500, { fy: 320 }))?.kind).toBe(LENGTHS);
  });

  it('leaves out a figure whose conditions are not all met', () => {
    const all = compressionResistances(compressed('csaS16', section, 2500, { fy: 350 }));
    const broken = all.map((each) => (each.kind === ONE_LEG ? { ...each, applies: false } : each));
    expect(governingCompression(broken)?.kind).toBe(LENGTHS);
  });

  it('is nothing where nothing gives a figure', () => {
    const tee = { ...section, shape: 'tee', properties: { ...section.properties, J: 0 } } as const;
    expect(judged(compressed('csaS16', tee, 2500, { fy: 350 }))).toBeNull();
    expect(governingCompression([])).toBeNull();
  });
});
