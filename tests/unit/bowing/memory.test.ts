import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import { BowingMemory } from '../../../core/bowing/memory.ts';
import { applyEdit } from '../../../core/project/applyEdit.ts';
import type { Edit } from '../../../core/project/edit.ts';
import { readProject } from '../../../core/project/readProject.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';

const read = readProject(readFileSync('assets/examples/marrow-lane.json', 'utf8'));
if (!read.ok) throw new Error('the example does not open');

/** Edits that reach a bay's bowing by different ways: its own marks, another bay under it, the practice, the stock. */
const EDITS: readonly Edit[] = [
  { kind: 'join', crossings: ['W1/t1.fall+t1.rise'], join: { kind: 'welded' } },
  { kind: 'bars', bars: ['R1/a.p1.rise'], change: { section: '100x100x8' } },
  { kind: 'line holder', bay: 'R1', line: 'P2', heldBy: { kind: 'vouched', reason: 'tied to the gable' } },
  { kind: 'remove bay', bay: 'W2' },
  { kind: 'settings', change: { practice: 'en1993' } },
  { kind: 'bay', bay: 'W1', change: { place: { origin: [0, 0, 500], turn: 0 } } },
];

describe('an assessment that remembers', () => {
  it('gives the same as one that does not, edit after edit', () => {
    const memory = new BowingMemory();
    let project = read.project;
    expect(assess(project, CATALOGUES, 'all levels', memory)).toEqual(assess(project, CATALOGUES));
    for (const edit of EDITS) {
      project = applyEdit(project, edit);
      expect(assess(project, CATALOGUES, 'all levels', memory)).toEqual(assess(project, CATALOGUES));
    }
  });

  it('does not work a bay out again that no edit has touched', () => {
    const memory = new BowingMemory();
    const before = assess(read.project, CATALOGUES, 'all levels', memory);
    const [first] = EDITS;
    if (!first) throw new Error('no edit');
    const after = assess(applyEdit(read.project, first), CATALOGUES, 'all levels', memory);
    expect(after.diagonals.get('R1/a.p1.rise')?.bowing).toBe(before.diagonals.get('R1/a.p1.rise')?.bowing);
    expect(after.diagonals.get('W1/t1.rise')?.bowing).not.toBe(before.diagonals.get('W1/t1.rise')?.bowing);
  });
});
