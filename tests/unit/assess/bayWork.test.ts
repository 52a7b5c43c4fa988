/** An assessment whose costly part is shared out: the same as one made in one go. */
import { describe, expect, it } from 'vitest';
import { bowingsOfBays, unremembered } from '../../../core/assess/bayWork.ts';
import { prepared } from '../../../core/assess/prepared.ts';
import { assess, assessmentOf } from '../../../core/assess.ts';
import { BowingMemory } from '../../../core/bowing/memory.ts';
import type { Bay } from '../../../core/project/model.ts';
import { bay, line, project, roof, vouched, wall } from './given/bays.ts';
import { CATALOGUES } from './given/catalogues.ts';

const BAYS: readonly Bay[] = [
  bay(wall(6000, [[4000, 'crossed']]), { id: 'W1', joins: { 't1.fall+t1.rise': { kind: 'bolted' } } }),
  bay(roof(6000, 8, [[4000, 'rising']], [line('P1', 2000, vouched)]), {
    id: 'R1',
    joins: { 'P1+a.p1.rise': { kind: 'purlin', boltsAcross: 1 } },
    place: { origin: [0, 9000, 0], turn: 0 },
  }),
  bay(wall(5000, [[3000, 'peaked']]), { id: 'W2', place: { origin: [20_000, 0, 0], turn: 90 } }),
];
const made = project(BAYS);

describe('an assessment shared out by bays', () => {
  it('is the same as one made in one go, whoever worked which bay out', () => {
    const memory = new BowingMemory();
    // Two that know nothing of each other, as two workers do; what they find crosses as plain data.
    for (const bays of [[2, 0], [1]])
      for (const { key, bowings } of structuredClone(bowingsOfBays(prepared(made, CATALOGUES), bays)))
        memory.remember(key, bowings);
    const ready = prepared(made, CATALOGUES);
    expect(unremembered(ready, memory)).toEqual([]);
    expect(assessmentOf(ready, 'all levels', memory)).toEqual(assess(made, CATALOGUES));
  });

  it('knows which bays are still to be worked out, and after an edit works out those it touches alone', () => {
    const memory = new BowingMemory();
    expect(unremembered(prepared(made, CATALOGUES), memory)).toEqual([0, 1, 2]);
    assess(made, CATALOGUES, 'all levels', memory);
    expect(unremembered(prepared(made, CATALOGUES), memory)).toEqual([]);
    const changed = project(BAYS.map((each) => (each.id === 'R1' ? { ...each, joins: {} } : each)));
    expect(unremembered(prepared(changed, CATALOGUES), memory)).toEqual([1]);
  });

  it('passes over places at which there is no bay', () => {
    expect(bowingsOfBays(prepared(made, CATALOGUES), [7])).toEqual([]);
  });
});
