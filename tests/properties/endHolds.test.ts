/** Ends that are marked as holding less than both ways: letting go never shortens, holding more never lengthens, and the bound is safe. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { assess } from '../../core/assess.ts';
import { applyEdit } from '../../core/project/applyEdit.ts';
import { END_HOLDS, type EndHolds } from '../../core/project/model.ts';
import type { Held } from '../../core/restraint/model.ts';
import { piecesOf } from '../../core/restraint/pieces.ts';
import { freeDirectionRule, type RuleStation } from '../../core/restraint/rule.ts';
import { AXES } from '../../core/section/model.ts';
import { criticalLoad } from '../../core/stability/criticalLoad.ts';
import { PINNED } from '../../core/stability/model.ts';
import { CATALOGUES, propertiesOf } from '../unit/assess/given/catalogues.ts';
import { direction, E } from './given/barProblems.ts';
import { anyProject } from './given/projects.ts';
import { runs } from './given/runs.ts';

/** Sums in another order over a handful of stations. */
const ARITHMETIC = 1e-9;
const L = 6000;

type Way = 0 | 90 | 'both' | 'none';
const WAYS: readonly Way[] = [0, 90, 'both', 'none'];
const section = fc.constantFrom(...['70x70x6', '125x75x8', '200x100x10', '50x50x5'].map(propertiesOf));
const way = fc.constantFrom<Way>(...WAYS);

const held = (hold: Way): Held =>
  hold === 'none' ? { ways: 0 } : hold === 'both' ? { ways: 2 } : { ways: 1, direction: direction(hold) };

interface Marked {
  readonly i: Way;
  readonly j: Way;
  readonly inner: readonly { readonly at: number; readonly hold: Way }[];
}

const marked: fc.Arbitrary<Marked> = fc.record({
  i: way,
  j: way,
  inner: fc
    .uniqueArray(fc.integer({ min: 1, max: 29 }), { maxLength: 5 })
    .chain((places) =>
      fc.tuple(
        ...places.sort((a, b) => a - b).map((place) => way.map((hold) => ({ at: (place * L) / 30, hold }))),
      ),
    ),
});

const stationsOf = ({ i, j, inner }: Marked): readonly RuleStation[] => [
  { at: 0, held: held(i) },
  ...inner.map(({ at, hold }) => ({ at, held: held(hold) })),
  { at: L, held: held(j) },
];
const slendernessOf = (angle: ReturnType<typeof propertiesOf>, bar: Marked): number =>
  freeDirectionRule(angle, stationsOf(bar)).slenderness;

/** All that a hold can be made of one that holds less. */
const more = (hold: Way): readonly Way[] =>
  hold === 'none' ? WAYS : hold === 'both' ? ['both'] : [hold, 'both'];

describe('the rule with ends that do not hold', () => {
  it('never gives more for an end or a station that holds more', () => {
    fc.assert(
      fc.property(section, marked, fc.nat(), fc.nat(), (angle, bar, place, pick) => {
        const better = (hold: Way): Way => more(hold)[pick % more(hold).length] ?? hold;
        const k = place % (bar.inner.length + 2);
        const after: Marked =
          k === 0
            ? { ...bar, i: better(bar.i) }
            : k === 1
              ? { ...bar, j: better(bar.j) }
              : {
                  ...bar,
                  inner: bar.inner.map((mark, n) =>
                    n === k - 2 ? { ...mark, hold: better(mark.hold) } : mark,
                  ),
                };
        expect(slendernessOf(angle, after)).toBeLessThanOrEqual(slendernessOf(angle, bar) * (1 + ARITHMETIC));
      }),
      runs(4000),
    );
  });

  it('gives the same from either end of the bar', () => {
    fc.assert(
      fc.property(section, marked, (angle, bar) => {
        const back: Marked = {
          i: bar.j,
          j: bar.i,
          inner: [...bar.inner].reverse().map(({ at, hold }) => ({ at: L - at, hold })),
        };
        const [there, again] = [slendernessOf(angle, bar), slendernessOf(angle, back)];
        if (Number.isFinite(there)) expect(again / there).toBeCloseTo(1, 9);
        else expect(again).toBe(there);
      }),
      runs(500),
    );
  });

  it('is infinite where the exact load is none, and beside an end that lets go never below the exact slenderness', () => {
    fc.assert(
      fc.property(section, marked, (angle, bar) => {
        const ways = (hold: Way) =>
          hold === 'none' ? [] : hold === 'both' ? [direction(0), direction(90)] : [direction(hold)];
        const { N } = criticalLoad(
          {
            E,
            length: L,
            section: angle,
            holds: bar.inner.flatMap(({ at, hold }) =>
              ways(hold).map((each) => ({ at, direction: each, stiffness: 'rigid' as const })),
            ),
            axial: [{ from: 0, to: L, share: 1 }],
            endI: PINNED,
            endJ: PINNED,
            endsStay: { i: ways(bar.i), j: ways(bar.j) },
            twist: null,
          },
          { second: false },
        );
        const rule = slendernessOf(angle, bar);
        if (!N) {
          expect(rule).toBe(Number.POSITIVE_INFINITY);
          return;
        }
        if (bar.i === 'both' && bar.j === 'both') return;
        // The search for the exact load ends within 1e-11 of it.
        expect(Math.PI * Math.sqrt((E * angle.area) / N)).toBeLessThanOrEqual(rule * (1 + ARITHMETIC));
      }),
      runs(3000),
    );
  });
});

describe('the pieces of a motion', () => {
  it('count as the span and twice the part beyond a last stop', () => {
    // By hand: 0 free, stops at 1, 3 and 4, free at 6 (m): 2 + 2·1, then 1 + 2·2.
    expect(piecesOf(0, 6, [1, 3, 4])).toEqual([
      { from: 0, to: 3, counts: 4 },
      { from: 3, to: 6, counts: 5 },
    ]);
    // Two stops and free at both ends: the longer part alone, twice.
    expect(piecesOf(0, 6, [1, 4])).toEqual([{ from: 0, to: 6, counts: 7 }]);
    expect(piecesOf(0, 6, [0, 2, 6])).toEqual([
      { from: 0, to: 2, counts: 2 },
      { from: 2, to: 6, counts: 4 },
    ]);
  });
});

describe('an end let go', () => {
  it('shortens no lane and lowers no slenderness, in bays from recipes', () => {
    fc.assert(
      fc.property(
        anyProject,
        fc.nat(),
        fc.constantFrom<EndHolds>(...END_HOLDS),
        fc.constantFrom('endI', 'endJ'),
        (made, pick, holds, end) => {
          const bare = {
            ...made,
            bays: made.bays.map((bay) => ({ ...bay, bars: {} })),
          };
          const before = assess(bare, CATALOGUES, 'by the marks');
          const ids = [...before.diagonals.keys()];
          const id = ids[pick % Math.max(1, ids.length)];
          if (id === undefined) return;
          const after = assess(
            applyEdit(bare, { kind: 'bars', bars: [id], change: { [end]: { holds } } }),
            CATALOGUES,
            'by the marks',
          );
          const [was, now] = [before.diagonals.get(id), after.diagonals.get(id)];
          if (!was?.restraint) return;
          if (!now?.restraint) {
            expect(now?.turns, id).not.toBeNull();
            expect(
              after.findings.some(({ kind, bars }) => kind === 'bar can move' && bars.includes(id)),
            ).toBe(true);
            expect(after.breaksLimit).toBe(true);
            return;
          }
          for (const axis of AXES)
            expect(now.restraint.lanes[axis].found, `${id} about ${axis}`).toBeGreaterThanOrEqual(
              was.restraint.lanes[axis].found * (1 - ARITHMETIC),
            );
          expect(now.restraint.governing.slenderness).toBeGreaterThanOrEqual(
            was.restraint.governing.slenderness * (1 - ARITHMETIC),
          );
        },
      ),
      runs(250),
    );
  });
});
