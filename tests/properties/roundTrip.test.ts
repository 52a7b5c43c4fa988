/** What is written is read back the same, whatever the project. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readProject } from '../../core/project/readProject.ts';
import { writeProject } from '../../core/project/writeProject.ts';
import { anyProject } from './given/projects.ts';
import { runs } from './given/runs.ts';

describe('a project written and read', () => {
  it('is the same project, for bays of every kind', () => {
    fc.assert(
      fc.property(anyProject, (project) => {
        const read = readProject(writeProject(project));
        expect(read).toEqual({ ok: true, project, migratedFrom: null });
      }),
      runs(300),
    );
  });

  it('gives the same text every time from the first reading on', () => {
    fc.assert(
      fc.property(anyProject, (project) => {
        const once = rewritten(writeProject(project));
        expect(rewritten(once)).toBe(once);
      }),
      runs(100),
    );
  });

  it('never throws at a file that was cut short or has a value changed, and says where it is wrong', () => {
    const nonsense = fc.constantFrom<unknown>(null, -1, 1e300, 'x', [], {}, true);
    fc.assert(
      fc.property(
        anyProject,
        fc.double({ min: 0, max: 1, noNaN: true }),
        nonsense,
        (project, share, value) => {
          const text = writeProject(project);
          const cut = readProject(text.slice(0, Math.floor((text.length - 3) * share)));
          expect(cut.ok).toBe(false);

          const data: unknown = JSON.parse(text);
          const places = leaves(data);
          const place = places[Math.floor(share * (places.length - 1))];
          if (!place) return;
          place.owner[place.key] = value;
          const read = readProject(JSON.stringify(data));
          if (!read.ok)
            for (const problem of read.problems) {
              expect(problem.what.length).toBeGreaterThan(5);
              expect(problem.todo.length).toBeGreaterThan(5);
            }
        },
      ),
      runs(200),
    );
  });
});

function rewritten(text: string): string {
  const read = readProject(text);
  if (!read.ok) throw new Error(JSON.stringify(read.problems));
  return writeProject(read.project);
}

interface Leaf {
  readonly owner: Record<string, unknown>;
  readonly key: string;
}

function leaves(data: unknown): readonly Leaf[] {
  if (typeof data !== 'object' || data === null) return [];
  const owner = data as Record<string, unknown>;
  return Object.keys(owner).flatMap((key): readonly Leaf[] => [{ owner, key }, ...leaves(owner[key])]);
}
