/** What is shipped beside the program must agree with it. */
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import { readProject } from '../../../core/project/readProject.ts';
import { projectJsonSchema } from '../../../core/project/schema.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';

const asset = (name: string): string =>
  readFileSync(new URL(`../../../assets/${name}`, import.meta.url), 'utf8');

describe('the JSON Schema of project files', () => {
  it('is the one that the program checks by; `npm run make:schema` writes it', () => {
    expect(JSON.parse(asset('schema/tautline-project.schema.json'))).toEqual(projectJsonSchema());
  });
});

describe('the example project', () => {
  const read = readProject(asset('examples/marrow-lane.json'));
  if (!read.ok) throw new Error(JSON.stringify(read.problems));
  const assessment = assess(read.project, CATALOGUES);

  it('opens, and is two wall bays and a roof bay with purlins', () => {
    expect(read.project.bays.map((bay) => bay.recipe.kind)).toEqual(['wall', 'wall', 'roof']);
  });

  it('shows findings of many kinds, of every severity, and breaks a limit', () => {
    const kinds = new Set(assessment.findings.map((finding) => finding.kind));
    expect(kinds.size).toBeGreaterThanOrEqual(6);
    expect([...kinds]).toEqual(
      expect.arrayContaining([
        'too slender in service',
        'crossing unmarked',
        'clash',
        'hold without a holder',
      ]),
    );
    for (const count of Object.values(assessment.counts)) expect(count).toBeGreaterThan(0);
    expect(assessment.breaksLimit).toBe(true);
  });

  it('names only sections that are in stock', () => {
    expect(assessment.findings.filter((finding) => finding.kind === 'section unknown')).toEqual([]);
  });
});
