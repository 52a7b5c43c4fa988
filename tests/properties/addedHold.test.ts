/** A hold more never makes a bar longer: no lane grows, and the rule's slenderness does not rise. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { assess } from '../../core/assess.ts';
import type { Assessment } from '../../core/assessment.ts';
import { applyEdit } from '../../core/project/applyEdit.ts';
import type { Edit } from '../../core/project/edit.ts';
import type { Bay, Project } from '../../core/project/model.ts';
import { AXES } from '../../core/section/model.ts';
import { project } from '../unit/assess/given/bays.ts';
import { CATALOGUES } from '../unit/assess/given/catalogues.ts';
import { inSpace, planarBay, UPRIGHT } from './given/planarBay.ts';
import { anyProject } from './given/projects.ts';
import { runs } from './given/runs.ts';

/** Sums in another order over a handful of stations. */
const ARITHMETIC = 1e-9;

/** Lengths set by hand stand in for what the marks give, so a hold more or less does not come into it. */
const withoutOverrides = (made: Project): Project => ({
  ...made,
  bays: made.bays.map(
    (bay): Bay => ({
      ...bay,
      bars: Object.fromEntries(
        Object.entries(bay.bars).map(([key, { overrides: _gone, ...mark }]) => [key, mark]),
      ),
    }),
  ),
});

function expectNoneLonger(before: Assessment, after: Assessment): void {
  for (const [id, { restraint }] of before.diagonals) {
    const now = after.diagonals.get(id)?.restraint;
    if (!restraint || !now) continue;
    for (const axis of AXES)
      expect(now.lanes[axis].found, `${id} about ${axis}`).toBeLessThanOrEqual(
        restraint.lanes[axis].found * (1 + ARITHMETIC),
      );
    expect(now.governing.slenderness, id).toBeLessThanOrEqual(
      restraint.governing.slenderness * (1 + ARITHMETIC),
    );
  }
}

/** Every crossing that holds nothing as it is marked, and the strongest mark it may have. */
function holdsToAdd(assessment: Assessment): readonly Edit[] {
  return [...assessment.layout.crossings.values()]
    .filter(({ join }) => join === null || join.kind === 'none' || join.kind === 'hung')
    .map(
      (crossing): Edit => ({
        kind: 'join',
        crossings: [crossing.id],
        join: crossing.kind === 'diagonals' ? { kind: 'bolted' } : { kind: 'purlin', boltsAcross: 1 },
      }),
    );
}

describe('a hold added', () => {
  it('at a crossing lengthens no lane and raises no slenderness, in bays from recipes', () => {
    fc.assert(
      fc.property(anyProject.map(withoutOverrides), fc.nat(), (made, pick) => {
        const before = assess(made, CATALOGUES, 'by the marks');
        const edits = holdsToAdd(before);
        const edit = edits[pick % Math.max(1, edits.length)];
        if (!edit) return;
        expectNoneLonger(before, assess(applyEdit(made, edit), CATALOGUES, 'by the marks'));
      }),
      runs(250),
    );
  });

  it('at every crossing at once lengthens no lane either, in bays drawn freely', () => {
    fc.assert(
      fc.property(planarBay, (planar) => {
        const made = project([inSpace(planar, UPRIGHT)]);
        const before = assess(made, CATALOGUES, 'by the marks');
        const after = assess(holdsToAdd(before).reduce(applyEdit, made), CATALOGUES, 'by the marks');
        expectNoneLonger(before, after);
      }),
      runs(250),
    );
  });

  it('by vouching for a purlin or rail lengthens no lane', () => {
    fc.assert(
      fc.property(anyProject.map(withoutOverrides), (made) => {
        const before = assess(made, CATALOGUES, 'by the marks');
        const edits = [...before.layout.bars.values()]
          .filter(({ line }) => line !== null)
          .map(
            ({ bay, line }): Edit => ({
              kind: 'line holder',
              bay,
              line: line?.id ?? '',
              heldBy: { kind: 'vouched', reason: 'tied' },
            }),
          );
        expectNoneLonger(before, assess(edits.reduce(applyEdit, made), CATALOGUES, 'by the marks'));
      }),
      runs(150),
    );
  });

  it('by a support under a node lengthens no lane', () => {
    fc.assert(
      fc.property(planarBay, fc.nat({ max: 7 }), (planar, node) => {
        const before = assess(project([inSpace(planar, UPRIGHT)]), CATALOGUES, 'by the marks');
        const supports = planar.supports.map((held, k) => held || k === node);
        expectNoneLonger(
          before,
          assess(project([inSpace({ ...planar, supports }, UPRIGHT)]), CATALOGUES, 'by the marks'),
        );
      }),
      runs(200),
    );
  });
});

describe('the rule and the lanes', () => {
  it('agree: the slenderness that governs is no less than any lane, for legs that lie along the plane', () => {
    // METHODS.md §3: "With legs aligned to the plane it equals the largest of the four lanes"; with mixed holds the bound may be above.
    fc.assert(
      fc.property(planarBay, (planar) => {
        const { diagonals } = assess(project([inSpace(planar, UPRIGHT)]), CATALOGUES, 'by the marks');
        for (const [id, { restraint }] of diagonals) {
          if (!restraint) continue;
          const largest = Math.max(...AXES.map((axis) => restraint.lanes[axis].slenderness));
          const { basis, slenderness } = restraint.governing;
          if (basis === 'span') expect(slenderness / largest, id).toBeCloseTo(1, 9);
          else expect(slenderness, id).toBeGreaterThanOrEqual(largest * (1 - ARITHMETIC));
        }
      }),
      runs(300),
    );
  });

  it('agree where a length is set by hand: no lane whose length was left alone is passed over', () => {
    fc.assert(
      fc.property(
        planarBay,
        fc.constantFrom('x', 'y', 'u', 'v'),
        fc.constantFrom(500, 2000, 9000),
        (planar, axis, length) => {
          const overrides = [{ axis, length, factor: 1, reason: 'a test' }] as const;
          const marks = Object.fromEntries(planar.bars.map(({ id }) => [id, { overrides }]));
          const { diagonals } = assess(
            project([inSpace({ ...planar, marks }, UPRIGHT)]),
            CATALOGUES,
            'by the marks',
          );
          for (const [id, { restraint }] of diagonals) {
            if (!restraint) continue;
            const largest = Math.max(...AXES.map((each) => restraint.lanes[each].slenderness));
            expect(restraint.governing.slenderness, id).toBeGreaterThanOrEqual(largest * (1 - ARITHMETIC));
          }
        },
      ),
      runs(200),
    );
  });
});
