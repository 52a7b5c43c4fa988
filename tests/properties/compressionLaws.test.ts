/** Laws of the checks of compression, over random angles and bars (seeded, shrinking). */
import fc from 'fast-check';
import { EigenvalueDecomposition, Matrix } from 'ml-matrix';
import { describe, expect, it } from 'vitest';
import { compressionResistances } from '../../core/resistance/compression/compressionResistances.ts';
import { coupledStress } from '../../core/resistance/compression/coupledStress.ts';
import {
  doublePower,
  exponential,
  memberReduction,
  perry,
} from '../../core/resistance/compression/curves.ts';
import { governingCompression } from '../../core/resistance/compression/governingCompression.ts';
import type {
  CompressionQuestion,
  Resistance,
  ResistanceKind,
  ResistingSection,
} from '../../core/resistance/model.ts';
import { angleProperties } from '../../core/section/angleProperties.ts';
import { criticalLoad } from '../../core/stability/criticalLoad.ts';
import { PINNED } from '../../core/stability/model.ts';
import {
  angleWith,
  CRITICAL,
  compressed,
  compressionOf,
  LENGTHS,
  ONE_LEG,
} from '../published/compressionGiven.ts';
import { PRACTICES, stepOf } from '../published/tensionGiven.ts';
import { runs } from './given/runs.ts';

/** Relative; sums of a few products and one halving search to the last bit. */
const ROUNDING = 1e-9;

interface Given {
  readonly practice: (typeof PRACTICES)[number];
  readonly long: number;
  readonly ratio: number;
  readonly slimness: number;
  readonly by: 'longer' | 'shorter';
  /** Length over the least radius. */
  readonly slender: number;
  readonly fy: number;
  readonly system: 'planar' | 'space';
  readonly joinedBetween: boolean;
  readonly bolts: number;
  /** Critical load over Euler's about the minor axis. */
  readonly share: number;
}

const givens: fc.Arbitrary<Given> = fc.record({
  practice: fc.constantFrom(...PRACTICES),
  long: fc.double({ min: 40, max: 200, noNaN: true }),
  ratio: fc.oneof(fc.constant(1), fc.double({ min: 0.5, max: 1, noNaN: true })),
  slimness: fc.double({ min: 0.05, max: 0.16, noNaN: true }),
  by: fc.constantFrom('longer', 'shorter'),
  slender: fc.double({ min: 5, max: 350, noNaN: true }),
  fy: fc.constantFrom(235, 250, 300, 355, 450),
  system: fc.constantFrom('planar', 'space'),
  joinedBetween: fc.boolean(),
  bolts: fc.integer({ min: 1, max: 3 }),
  share: fc.double({ min: 0.05, max: 4, noNaN: true }),
});

type Shape = Pick<Given, 'long' | 'ratio' | 'slimness' | 'by'>;

function sectionOf({ long, ratio, slimness, by }: Shape, scale = 1): ResistingSection {
  const outline = {
    longLeg: long * scale,
    shortLeg: long * ratio * scale,
    thickness: long * slimness * scale,
    rootRadius: long * 0.1 * scale,
    toeRadius: long * 0.02 * scale,
  };
  return angleWith(angleProperties(outline), outline.longLeg, outline.shortLeg, outline.thickness, by);
}

function questionOf(given: Given, scale = 1, longer = 1): CompressionQuestion {
  const section = sectionOf(given, scale);
  const { area, rv } = section.properties;
  return compressed(given.practice, section, given.slender * rv * longer, {
    fy: given.fy,
    ends: [{ bolts: given.bolts }, { bolts: 2 }],
    more: {
      system: given.system,
      joinedBetween: given.joinedBetween,
      criticalLoad: (given.share * Math.PI ** 2 * 200_000 * area) / (given.slender * longer) ** 2,
    },
  });
}

/** N; null where the rule gives none. */
const resistanceOf = (question: CompressionQuestion, kind: ResistanceKind): number | null =>
  compressionOf(question, kind).resistance;

const KINDS: readonly ResistanceKind[] = [CRITICAL, LENGTHS, ONE_LEG];

/** φ or 1/γ that the practice puts before yield. */
const PART: Readonly<Record<(typeof PRACTICES)[number], number>> = {
  sans10162: 0.9,
  csaS16: 0.9,
  aisc360: 0.9,
  en1993: 1,
  as4100: 0.9,
  is800: 1 / 1.1,
};

describe('a resistance in compression', () => {
  it('is never above φ A f_y', () => {
    fc.assert(
      fc.property(givens, (given) => {
        const question = questionOf(given);
        const most = PART[given.practice] * question.section.properties.area * given.fy;
        for (const { resistance } of compressionResistances(question))
          if (resistance !== null) {
            expect(resistance).toBeGreaterThan(0);
            expect(resistance).toBeLessThanOrEqual(most * (1 + ROUNDING));
          }
      }),
      runs(300),
    );
  });

  it('is never above the elastic critical load that it comes from', () => {
    fc.assert(
      fc.property(givens, (given) => {
        const question = questionOf(given);
        expect(resistanceOf(question, CRITICAL)).toBeLessThan(question.criticalLoad ?? 0);
        const byLengths = compressionOf(question, LENGTHS);
        expect(byLengths.resistance).toBeLessThan(stepOf(byLengths, 'N_cr'));
      }),
      runs(300),
    );
  });

  it('comes near Euler’s load, less φ and what the curve holds back, for a very slender bar', () => {
    // At λ̄ = 30: SANS, CSA (1 + λ^−2.68)^−0.746 → 1; AISC 0.877; EN 1 − α/λ̄, IS 1 − 0.49/λ̄. AS reckons Euler as 8100 × 250/(l_e/r)², 1.026 of π²E/(l_e/r)².
    const held = {
      sans10162: 0.9,
      csaS16: 0.9,
      aisc360: 0.9 * 0.877,
      en1993: 1,
      as4100: 0.9 * 1.026,
      is800: 1 / 1.1,
    };
    for (const practice of PRACTICES) {
      const section = sectionOf({ long: 100, ratio: 1, slimness: 0.12, by: 'longer' });
      const N = (section.properties.area * 250) / 900;
      const found = resistanceOf(
        compressed(practice, section, 3000, { fy: 250, more: { criticalLoad: N } }),
        CRITICAL,
      );
      expect(Math.abs((found ?? 0) / N / held[practice] - 1)).toBeLessThan(0.025);
    }
  });

  it('is never more for a longer bar', () => {
    fc.assert(
      fc.property(givens, fc.double({ min: 1, max: 1.5, noNaN: true }), (given, longer) => {
        const [short, long] = [questionOf(given), questionOf(given, 1, longer)];
        for (const kind of KINDS) {
          const [a, b] = [resistanceOf(short, kind), resistanceOf(long, kind)];
          // A rule that ends at a slenderness gives none beyond it.
          if (b === null) continue;
          expect(a, kind).not.toBeNull();
          // At the joint of its two formulas AISC rises by 0.05 %, as its printed constants do.
          const rise = given.practice === 'aisc360' ? 6e-4 : ROUNDING;
          expect(b, kind).toBeLessThanOrEqual((a ?? 0) * (1 + rise));
        }
      }),
      runs(300),
    );
  });

  it('rises with the critical load', () => {
    fc.assert(
      fc.property(givens, fc.double({ min: 1, max: 2, noNaN: true }), (given, more) => {
        const question = questionOf(given);
        const stiffer = { ...question, criticalLoad: (question.criticalLoad ?? 0) * more };
        const rise = given.practice === 'aisc360' ? 6e-4 : ROUNDING;
        expect((resistanceOf(stiffer, CRITICAL) ?? 0) * (1 + rise)).toBeGreaterThanOrEqual(
          resistanceOf(question, CRITICAL) ?? 0,
        );
      }),
      runs(300),
    );
  });

  it('grows with the square of the scale, all lengths and the section growing alike', () => {
    fc.assert(
      fc.property(givens, fc.double({ min: 0.2, max: 5, noNaN: true }), (given, scale) => {
        const [one, other] = [questionOf(given), questionOf(given, scale)];
        const scaled = { ...other, criticalLoad: (one.criticalLoad ?? 0) * scale ** 2 };
        for (const kind of KINDS) {
          const [a, b] = [resistanceOf(one, kind), resistanceOf(scaled, kind)];
          if (a === null || b === null) expect(a).toBe(b);
          else expect(Math.abs(b / (a * scale ** 2) - 1), kind).toBeLessThan(1e-7);
        }
      }),
      runs(200),
    );
  });

  it('is the same for the mirrored section', () => {
    fc.assert(
      fc.property(givens, (given) => {
        const question = questionOf(given);
        const { properties } = question.section;
        const [x, y] = properties.shearCentre;
        const mirrored = {
          ...properties,
          alpha: -properties.alpha,
          Ixy: -properties.Ixy,
          shearCentre: [-x, y],
        } as const;
        const other = { ...question, section: { ...question.section, properties: mirrored } };
        for (const kind of KINDS) {
          const [a, b] = [resistanceOf(question, kind), resistanceOf(other, kind)];
          if (a === null) expect(b).toBeNull();
          else expect(Math.abs((b ?? 0) / a - 1), kind).toBeLessThan(ROUNDING);
        }
      }),
      runs(200),
    );
  });

  it('by ASD is 1/(0.9 × 1.67) of that by LRFD, and by EN goes with 1/γ_M1', () => {
    fc.assert(
      fc.property(givens, fc.double({ min: 1, max: 1.3, noNaN: true }), (given, gammaM1) => {
        const ratio = (
          practice: 'aisc360' | 'en1993',
          options: Partial<CompressionQuestion['options']>,
          kind: ResistanceKind,
        ) => {
          const question = questionOf({ ...given, practice, bolts: 2 });
          const [a, b] = [question, { ...question, options: { ...question.options, ...options } }].map(
            (each) => resistanceOf(each, kind),
          );
          return a == null || b == null ? null : b / a;
        };
        for (const kind of KINDS) {
          const asd = ratio('aisc360', { method: 'ASD' }, kind);
          if (asd !== null) expect(asd).toBeCloseTo(1 / (0.9 * 1.67), 9);
          expect(
            ratio('en1993', { partialFactors: { gammaM0: null, gammaM1, gammaM2: null } }, kind),
          ).toBeCloseTo(1 / gammaM1, 9);
        }
      }),
      runs(60),
    );
  });

  it('ends its steps with itself, and every step is a number with a name', () => {
    fc.assert(
      fc.property(givens, (given) => {
        for (const { steps, resistance } of compressionResistances(questionOf(given))) {
          if (resistance !== null) expect(steps.at(-1)?.value).toBe(resistance);
          for (const { name, symbol, value } of steps) {
            expect(name).not.toBe('');
            expect(symbol).not.toBe('');
            expect(Number.isFinite(value), symbol).toBe(true);
          }
        }
      }),
      runs(200),
    );
  });
});

describe('curves and lines are continuous where their formulas meet', () => {
  const STEP = 1e-9;

  it('L_c/r at L/r_a = 80 planar and 75 in space, by either leg', () => {
    for (const [system, knee] of [
      ['planar', 80],
      ['space', 75],
    ] as const)
      for (const by of ['longer', 'shorter'] as const) {
        const section = sectionOf({ long: 100, ratio: 0.75, slimness: 0.12, by });
        const r = by === 'longer' ? section.properties.ry : section.properties.rx;
        const at = (ratio: number): number =>
          stepOf(
            compressionOf(compressed('csaS16', section, ratio * r, { fy: 300, more: { system } }), ONE_LEG),
            'L_c/r',
          );
        expect(at(knee + STEP)).toBeCloseTo(at(knee - STEP), 6);
      }
  });

  it('AISC at F_y/F_e = 2.25 but for 0.05 % of its rounded constants', () => {
    expect(Math.abs(exponential(2.25 + STEP) / exponential(2.25) - 1)).toBeLessThan(6e-4);
  });

  it('EN and IS at 0.2, AS at λ = 13.5', () => {
    for (const alpha of [0.34, 0.49]) expect(perry(0.2 + STEP, alpha).chi).toBeCloseTo(1, 6);
    expect(memberReduction(13.5 + STEP, 0.5).alphaC).toBeCloseTo(1, 6);
    expect(memberReduction(13.5 - STEP, 0.5).alphaC).toBe(1);
  });

  it('over the yield stress where a leg begins to lose width, AS apart, whose curve changes there', () => {
    // b/t 12: CSA 200/√f_y at f_y 277.8; EN ρ at λ̄_p 0.748; IS 15.7 ε and 25 ε. Half a N/mm² changes a curve by 0.3 % at most.
    const section = sectionOf({ long: 120, ratio: 1, slimness: 1 / 12, by: 'longer' });
    for (const practice of PRACTICES) {
      if (practice === 'as4100') continue;
      const at = (fy: number): number =>
        resistanceOf(compressed(practice, section, 1500, { fy, more: { criticalLoad: 1e6 } }), CRITICAL) ?? 0;
      for (let fy = 150; fy < 500; fy += 0.5) {
        const change = Math.abs(at(fy + 0.5) / at(fy) - 1);
        expect(change, `${practice} at ${fy}`).toBeLessThan(0.004);
      }
    }
  });
});

describe('column curves', () => {
  it('fall, and stay below yield and below the elastic stress', () => {
    const slender = fc.double({ min: 0.01, max: 10, noNaN: true });
    fc.assert(
      fc.property(slender, fc.double({ min: 1.0001, max: 1.5, noNaN: true }), (lambda, more) => {
        for (const curve of [
          (l: number) => doublePower(l, 1.34),
          (l: number) => perry(l, 0.34).chi,
          (l: number) => perry(l, 0.49).chi,
          (l: number) => exponential(l * l),
          // λ̄ = λ_n/90 √(8100 × 250/(π²E)), AS's own Euler.
          (l: number) => memberReduction(90 * l, 0.5).alphaC,
          (l: number) => memberReduction(90 * l, 1).alphaC,
        ]) {
          expect(curve(lambda)).toBeLessThanOrEqual(1);
          expect(curve(lambda) * lambda * lambda).toBeLessThanOrEqual(1 + ROUNDING);
          expect(curve(lambda * more)).toBeLessThanOrEqual(curve(lambda) * (1 + 6e-4));
        }
      }),
      runs(500),
    );
  });
});

describe('bowing with twist', () => {
  const stress = fc.double({ min: -2, max: 3, noNaN: true }).map((power) => 100 * 10 ** power);
  /** Shares of the squared polar radius: together below 1. */
  const shares = fc
    .tuple(fc.double({ min: 0, max: 0.98, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true }))
    .map(([sum, part]) => [sum * part, sum * (1 - part)] as const);

  it('is never above bowing alone or twist alone', () => {
    fc.assert(
      fc.property(stress, stress, stress, shares, (Fu, Fv, Fz, [p, q]) => {
        const F = coupledStress(Fu, Fv, Fz, p, q);
        expect(F).toBeGreaterThan(0);
        expect(F).toBeLessThanOrEqual(Math.min(Fu, Fv, Fz));
      }),
      runs(1000),
    );
  });

  it('is the smallest of the three roots, found as eigenvalues', () => {
    fc.assert(
      fc.property(stress, stress, stress, shares, (Fu, Fv, Fz, [p, q]) => {
        const [a, b] = [Math.sqrt(p / (Fu * Fz)), Math.sqrt(q / (Fv * Fz))];
        const flexibility = new Matrix([
          [1 / Fu, 0, a],
          [0, 1 / Fv, b],
          [a, b, 1 / Fz],
        ]);
        const most = Math.max(
          ...new EigenvalueDecomposition(flexibility, { assumeSymmetric: true }).realEigenvalues,
        );
        // The eigenvalues are good to the last bits of the greatest.
        expect(Math.abs(coupledStress(Fu, Fv, Fz, p, q) * most - 1)).toBeLessThan(1e-11);
      }),
      runs(1000),
    );
  });

  it('with an axis of symmetry is the lower of bowing about v and Bernoulli’s closed form', () => {
    fc.assert(
      fc.property(
        stress,
        stress,
        stress,
        fc.double({ min: 0.001, max: 0.98, noNaN: true }),
        (Fu, Fv, Fz, p) => {
          const H = 1 - p;
          // Rationalised, for the difference of near equals loses digits: (S − √(S² − 4PH))/(2H) = 2P/(S + √(S² − 4PH)).
          const closed = (2 * Fu * Fz) / (Fu + Fz + Math.sqrt((Fu + Fz) ** 2 - 4 * Fu * Fz * H));
          expect(Math.abs(coupledStress(Fu, Fv, Fz, p, 0) / Math.min(Fv, closed) - 1)).toBeLessThan(1e-11);
          // The other axis the axis of symmetry.
          expect(coupledStress(Fv, Fu, Fz, 0, p)).toBeCloseTo(coupledStress(Fu, Fv, Fz, p, 0), 9);
        },
      ),
      runs(1000),
    );
  });

  it('without an offset is the lowest of the three alone, and a bar that cannot twist only bows', () => {
    fc.assert(
      fc.property(stress, stress, stress, shares, (Fu, Fv, Fz, [p, q]) => {
        expect(coupledStress(Fu, Fv, Fz, 0, 0)).toBeCloseTo(Math.min(Fu, Fv, Fz), 9);
        expect(coupledStress(Fu, Fv, Number.POSITIVE_INFINITY, p, q)).toBeCloseTo(Math.min(Fu, Fv), 9);
      }),
      runs(300),
    );
  });

  it('is what the exact stability functions give for a pinned angle free to twist, which share no code with it', () => {
    fc.assert(
      fc.property(givens, (given) => {
        const question = questionOf({ ...given, practice: 'csaS16' });
        const { section, steel, length } = question;
        const exact = criticalLoad({
          E: steel.E,
          length,
          section: section.properties,
          holds: [],
          axial: [{ from: 0, to: length, share: 1 }],
          endI: PINNED,
          endJ: PINNED,
          twist: { G: steel.G, heldAt: [] },
        }).N;
        const found = stepOf(compressionOf(question, LENGTHS), 'N_cr');
        // The search of the other ends within 3e-8 where root and pole fall together.
        expect(Math.abs(found / (exact ?? 0) - 1)).toBeLessThan(1e-7);
      }),
      runs(100),
    );
  });
});

describe('bowing about the leg that a crossing does not hold, with twist', () => {
  it('is above the exact stability functions by 2 % at most, held at mid-length on the heel line, L/r 60 and more', () => {
    fc.assert(
      fc.property(
        givens,
        fc.constantFrom('x', 'y'),
        fc.double({ min: 60, max: 250, noNaN: true }),
        (given, axis, slender) => {
          const section = sectionOf(given);
          const { rx, ry, centroidX, centroidY } = section.properties;
          const length = slender * (axis === 'x' ? rx : ry);
          const half = { x: length / 2, y: length / 2, u: length / 2, v: length / 2 };
          const question = compressed('csaS16', section, length, {
            fy: 300,
            more: { unbraced: { ...half, [axis]: length }, joinedBetween: true },
          });
          const exact = criticalLoad({
            E: question.steel.E,
            length,
            section: section.properties,
            // Held along the axis that it bows about.
            holds: [
              {
                at: length / 2,
                direction: axis === 'x' ? [1, 0] : [0, 1],
                stiffness: 'rigid',
                grip: [-centroidX, -centroidY],
              },
            ],
            axial: [{ from: 0, to: length, share: 1 }],
            endI: PINNED,
            endJ: PINNED,
            twist: { G: question.steel.G, heldAt: [] },
          }).N;
          const found = stepOf(compressionOf(question, LENGTHS), 'N_cr');
          // Bowing alone is 0.987 to 1 of the rule of lengths for such a bar (METHODS.md, the free-direction rule): 1.3 %. The rest is for ways to bow that the
          // two-way coupling keeps apart: over 6000 such bars the most was 1.4 % (3.8 % from L/r 40 on), where bowing alone and the cubic were up to 42 % above.
          expect(found / (exact ?? 0)).toBeLessThan(1.02);
        },
      ),
      runs(200),
    );
  });
});

describe('what a bar is judged by', () => {
  it('is never above any check that applies, and one of them', () => {
    fc.assert(
      fc.property(givens, (given) => {
        const all = compressionResistances(questionOf(given));
        const judged = governingCompression(all);
        expect(judged).not.toBeNull();
        for (const { applies, resistance } of all)
          if (applies && resistance !== null) expect(judged?.resistance).toBeLessThanOrEqual(resistance);
        const same: Resistance | undefined = all.find(({ kind }) => kind === judged?.kind);
        expect(judged?.resistance).toBe(same?.resistance);
      }),
      runs(300),
    );
  });
});
