/** Any change, sensible or not, leaves a project that can be assessed, or is refused. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { assess } from '../../core/assess.ts';
import { applyEdit, editLabel, tryEdit } from '../../core/project/applyEdit.ts';
import type { Edit } from '../../core/project/edit.ts';
import type { Project } from '../../core/project/model.ts';
import { readProject } from '../../core/project/readProject.ts';
import { writeProject } from '../../core/project/writeProject.ts';
import { CATALOGUES } from '../unit/assess/given/catalogues.ts';
import { anyEdit } from './given/edits.ts';
import { notFinite, oddWords } from './given/numbers.ts';
import { anyProject } from './given/projects.ts';
import { runs } from './given/runs.ts';

describe('an assessment', () => {
  it('holds no number that is not finite and no word of one, for bays of every kind', () => {
    fc.assert(
      fc.property(anyProject, (project) => {
        const assessment = assess(project, CATALOGUES);
        expect(notFinite(assessment)).toEqual([]);
        expect(oddWords(assessment)).toEqual([]);
      }),
      runs(300),
    );
  });

  it('is the same when made again, and can be sent to a worker', () => {
    fc.assert(
      fc.property(anyProject, (project) => {
        const assessment = assess(project, CATALOGUES);
        expect(assess(project, CATALOGUES)).toEqual(assessment);
        expect(structuredClone(assessment)).toEqual(assessment);
      }),
      runs(60),
    );
  });
});

describe('random edits', () => {
  it('never throw, and those that are taken leave a project that can be assessed', () => {
    fc.assert(
      fc.property(anyProject, fc.array(anyEdit, { minLength: 1, maxLength: 6 }), (start, edits) => {
        let project: Project = start;
        for (const edit of edits) {
          expect(editLabel(edit).length).toBeGreaterThan(0);
          const outcome = tryEdit(project, edit);
          if (outcome.ok) project = outcome.project;
        }
        const assessment = assess(project, CATALOGUES);
        expect(notFinite(assessment)).toEqual([]);
        expect(oddWords(assessment)).toEqual([]);
      }),
      runs(300),
    );
  });

  it('are taken exactly when the project can then be saved and read back the same', () => {
    fc.assert(
      fc.property(anyProject, anyEdit, (project, edit) => {
        const changed = applyEdit(project, edit);
        const outcome = tryEdit(project, edit);
        const back = readProject(writeProject(changed));
        const same = back.ok && canonical(back.project) === canonical(changed);
        // A number that is not finite is written as null, which may be readable where null may stand: it is refused all the same.
        expect(outcome.ok).toBe(same && notFinite(changed).length === 0);
        if (outcome.ok) expect(outcome.project).toEqual(changed);
        else expect(outcome.problems.length).toBeGreaterThan(0);
      }),
      runs(1000),
    );
  });

  it('on what is not there change nothing', () => {
    const nowhere = ['nowhere', '', 'W1/', 'a b'];
    fc.assert(
      fc.property(anyProject, anyEdit, (project, edit) => {
        const names = 'bay' in edit && typeof edit.bay === 'string' ? edit.bay : null;
        fc.pre(names !== null && nowhere.includes(names));
        expect(applyEdit(project, edit)).toEqual(project);
      }),
      runs(200),
    );
  });

  it('leave the bays that they do not touch as they are, so that nothing is assessed twice for them', () => {
    fc.assert(
      fc.property(anyProject, anyEdit, (project, edit) => {
        const changed = applyEdit(project, edit);
        for (const bay of changed.bays) {
          const before = project.bays.find((each) => JSON.stringify(each) === JSON.stringify(bay));
          if (before && !touched(edit).includes(before.id)) expect(project.bays).toContain(bay);
        }
      }),
      runs(500),
    );
  });
});

function touched(edit: Edit): readonly string[] {
  const baysOf = (ids: readonly string[]) => ids.map((id) => id.split('/')[0] ?? '');
  switch (edit.kind) {
    case 'add bay':
      return [edit.bay.id];
    case 'remove bay':
    case 'bay':
    case 'rename bay':
    case 'recipe':
    case 'diagonals':
    case 'line holder':
      return [edit.bay];
    case 'bars':
      return baysOf(edit.bars);
    case 'join':
      return baysOf(edit.crossings);
    default:
      return [];
  }
}

/** Text that does not depend on the order of entries, which carries no meaning. */
const canonical = (data: unknown): string =>
  JSON.stringify(data, (_, value: unknown) =>
    typeof value === 'object' && value !== null && !Array.isArray(value)
      ? Object.fromEntries(Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1)))
      : value,
  );
