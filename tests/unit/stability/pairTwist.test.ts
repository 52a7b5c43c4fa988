/** Two crossed angles bolted together, both bowing both ways and twisting, each gripped on its gauge line at the face of the leg in the plane. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { criticalLoad } from '../../../core/stability/criticalLoad.ts';
import { PINNED } from '../../../core/stability/model.ts';
import { type PairBar, pairCriticalLoad } from '../../../core/stability/pair.ts';
import { CATALOGUES, propertiesOf } from '../assess/given/catalogues.ts';

const E = 200_000;
const G = 77_000;

interface Given {
  readonly section: string;
  readonly length: number;
  /** Heel to the line of bolts along the longer leg, which lies in the plane, mm. */
  readonly gauge: number;
}

/** Held rigidly in the plane at the middle; `pulled` is its tension, below zero compression, per unit of the load factor. */
function bar({ section: name, length, gauge }: Given, pulled: number, twist: boolean): PairBar {
  const section = propertiesOf(name);
  const grip = [-section.centroidX, gauge - section.centroidY] as const;
  return {
    problem: {
      E,
      length,
      section,
      holds: [{ at: length / 2, direction: [0, 1], stiffness: 'rigid', grip }],
      axial: [{ from: 0, to: length, share: -pulled }],
      endI: PINNED,
      endJ: PINNED,
      twist: twist ? { G, heldAt: [] } : null,
    },
    crossingAt: length / 2,
    outOfPlane: [1, 0],
    grip,
    cut: false,
  };
}

const load = (given: Given, taut: number, twist = true): number =>
  pairCriticalLoad({ bar: bar(given, -1, twist), partner: bar(given, taut, twist) }).N ?? Number.NaN;

describe('a crossed pair that twists', () => {
  // A second derivation: finite elements, 24 cubic ones a bar for both displacements and the twist of the shear centre, both bars in one matrix. N.
  const TAUT = [-1, -0.5, 0, 0.3, 0.6] as const;
  it.each<[string, number, number, readonly number[]]>([
    ['90x90x8', 3201.562, 50, [192_183, 252_864, 332_257, 332_257, 332_257]],
    ['100x100x8', 3201.562, 55, [259_692, 340_650, 455_748, 461_133, 461_133]],
    ['120x120x10', 3201.562, 65, [544_998, 714_024, 939_966, 992_942, 992_942]],
    ['150x150x10', 3905.125, 80, [652_776, 848_689, 1_001_242, 1_020_236, 1_020_236]],
    ['150x150x10', 2828.427, 80, [894_337, 1_076_390, 1_076_390, 1_076_390, 1_076_390]],
    ['125x75x8', 4000, 70, [79_696, 105_263, 147_421, 182_168, 184_554]],
    ['150x90x10', 4000, 85, [169_938, 224_032, 309_941, 375_864, 383_806]],
  ])(
    'of %s, %d mm long, agrees with finite elements at every state of the partner',
    (section, length, gauge, found) => {
      TAUT.forEach((taut, k) => {
        const ratio = load({ section, length, gauge }, taut) / (found[k] ?? 0);
        // The elements lie a trace above what is exact.
        expect(ratio, `T/C ${taut}`).toBeLessThan(1 + 1e-5);
        expect(ratio, `T/C ${taut}`).toBeGreaterThan(1 - 4e-4);
      });
    },
  );

  const given = fc.record({
    section: fc.constantFrom(
      ...CATALOGUES.en.angles
        .filter(({ outline }) => outline.longLeg >= 60)
        .map(({ designation }) => designation),
    ),
    length: fc.integer({ min: 2000, max: 6000 }),
    gauge: fc.integer({ min: 30, max: 55 }),
  });

  it('is worth no more than one bar held in its plane alone when both are squeezed alike', () => {
    fc.assert(
      fc.property(given, (each) => {
        const { problem } = bar(each, -1, true);
        const alone = criticalLoad(problem, { second: false }).N ?? Number.NaN;
        expect(Math.abs(load(each, -1) / alone - 1)).toBeLessThan(1e-8);
      }),
      { numRuns: 60, seed: 7 },
    );
  });

  it('loses by twist and gains by a tauter partner, in every state', () => {
    fc.assert(
      fc.property(given, fc.integer({ min: -10, max: 9 }), (each, tenth) => {
        const here = load(each, tenth / 10);
        expect(here).toBeLessThanOrEqual(load(each, tenth / 10, false) * (1 + 1e-9));
        expect(load(each, (tenth + 1) / 10)).toBeGreaterThanOrEqual(here * (1 - 1e-9));
      }),
      { numRuns: 80, seed: 7 },
    );
  });

  it('is the pair that only bows when its section cannot twist', () => {
    const stiff = (each: PairBar): PairBar => ({
      ...each,
      problem: { ...each.problem, section: { ...each.problem.section, J: 1e12 } },
    });
    const one: Given = { section: '100x75x8', length: 4000, gauge: 55 };
    for (const taut of TAUT) {
      const rigid =
        pairCriticalLoad({ bar: stiff(bar(one, -1, true)), partner: stiff(bar(one, taut, true)) }).N ?? 0;
      expect(Math.abs(rigid / load(one, taut, false) - 1), `T/C ${taut}`).toBeLessThan(1e-5);
    }
  });
});
