/**
 * The exact critical loads against a Hermite finite-element model whose eigenproblem another library solves: random bars with holds in any
 * direction, rigid or springs, springs at the ends, forces in steps of either sign, loads that nearly coincide; and bars that twist.
 */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { LoadedSystem } from '../../core/stability/assembly.ts';
import { criticalLoad } from '../../core/stability/criticalLoad.ts';
import { meshOf } from '../../core/stability/mesh.ts';
import type { BarProblem } from '../../core/stability/model.ts';
import { unknownsOf } from '../../core/stability/unknowns.ts';
import { anySection, bowingBar, E, sectionOf, twistingBar } from './given/barProblems.ts';
import { hermiteLoads } from './given/hermiteBar.ts';
import { runs } from './given/runs.ts';

/** Asked for. A conforming model is too stiff, never too soft: below the exact load there is only rounding (of a matrix with elements of unlike size). */
const BOWING = 0.0005;
const TWIST = 0.002;
const ROUNDING = 1e-6;

function expectAgreement(problem: BarProblem, above: number): void {
  const { factor, second } = criticalLoad(problem);
  const [first, next] = hermiteLoads(problem);
  if (factor === null || second === null || first === undefined || next === undefined)
    throw new Error('a pressed bar has loads');
  for (const [exact, model] of [
    [factor, first],
    [second, next],
  ] as const) {
    expect(model / exact - 1, `${model} against ${exact}`).toBeLessThan(above);
    expect(model / exact - 1, `${model} against ${exact}`).toBeGreaterThan(-ROUNDING);
  }
}

describe('exact loads against finite elements', () => {
  it('agree within 0.05 % on random bars, first and second load', () => {
    fc.assert(
      fc.property(bowingBar(), (problem) => expectAgreement(problem, BOWING)),
      runs(300),
    );
  });

  it('agree where the first two loads are one, or apart by a millionth', () => {
    // As stiff both ways; or four times, with a middle hold along the weak motion: one half-wave about u against two about v.
    const near = fc
      .tuple(fc.constantFrom(0, 1e-12, 1e-9, 1e-6, 1e-3), fc.integer({ min: -90, max: 90 }), fc.boolean())
      .map(([apart, degrees, held]): BarProblem => {
        const section = sectionOf(2e5, (held ? 4 : 1) * (1 + apart), degrees);
        return {
          E,
          length: 4000,
          section,
          holds: held
            ? [
                {
                  at: 2000,
                  direction: [Math.cos(section.alpha), Math.sin(section.alpha)],
                  stiffness: 'rigid',
                },
              ]
            : [],
          axial: [{ from: 0, to: 4000, share: 1 }],
          endI: { alongX: 0, alongY: 0 },
          endJ: { alongX: 0, alongY: 0 },
          twist: null,
        };
      });
    fc.assert(
      fc.property(near, (problem) => {
        expectAgreement(problem, BOWING);
        const { factor, second } = criticalLoad(problem);
        expect(second ?? 0).toBeGreaterThanOrEqual((factor ?? 0) * (1 - 1e-9));
      }),
      runs(40),
    );
  });

  it('agree within 0.2 % with twist', () => {
    fc.assert(
      fc.property(twistingBar, (problem) => expectAgreement(problem, TWIST)),
      runs(40),
    );
  });
});

describe('the count of critical loads', () => {
  const countBelow = (problem: BarProblem): ((factor: number) => number) => {
    const mesh = meshOf(problem);
    const system = new LoadedSystem([{ problem, mesh, unknowns: unknownsOf(mesh) }]);
    return (factor) => system.tried(factor).below;
  };

  it('is that of the model’s eigenvalues, halfway between any two of the first four', () => {
    fc.assert(
      fc.property(bowingBar(anySection), (problem) => {
        const loads = hermiteLoads(problem).slice(0, 5);
        const below = countBelow(problem);
        expect(below((loads[0] ?? 0) / 2)).toBe(0);
        // The model's own error grows with the load; loads nearer than two per cent are left alone.
        for (let k = 0; k + 1 < loads.length; k++) {
          const [here = 0, next = 0] = [loads[k], loads[k + 1]];
          if (next < here * 1.02) continue;
          expect(below((here + next) / 2), `after load ${k + 1}`).toBe(k + 1);
        }
      }),
      runs(60),
    );
  });

  it('never falls as the load rises', () => {
    fc.assert(
      fc.property(fc.oneof(bowingBar(), twistingBar), fc.integer({ min: 2, max: 40 }), (problem, times) => {
        const below = countBelow(problem);
        const factor = criticalLoad(problem).factor ?? 0;
        let before = 0;
        for (let step = 0; step <= 60; step++) {
          const now = below((factor * times * step) / 60);
          expect(now).toBeGreaterThanOrEqual(before);
          before = now;
        }
      }),
      runs(60),
    );
  });
});
