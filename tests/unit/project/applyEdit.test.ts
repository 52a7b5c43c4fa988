/** Each kind of edit does what it says, and nothing else. */
import { describe, expect, it } from 'vitest';
import { applyEdit, editLabel, placeOf, tryEdit } from '../../../core/project/applyEdit.ts';
import type { Edit } from '../../../core/project/edit.ts';
import type { Project } from '../../../core/project/model.ts';
import { bay, line, project, roof, wall } from '../assess/given/bays.ts';

const made: Project = project([
  bay(wall(6000, [[4000, 'crossed']], [line('G1', 1500)]), {
    id: 'W1',
    joins: { 't1.fall+t1.rise': { kind: 'bolted' } },
  }),
  bay(roof(6000, 8, [[4000, 'crossed']], [line('P1', 900, { kind: 'bay', bay: 'W1' })]), {
    id: 'R1',
    bars: { 'a.p1.rise': { section: '80x80x8', heel: 'down' } },
  }),
]);
const bayOf = (changed: Project, id: string) => changed.bays.find((each) => each.id === id);

/** What holds the first rail of a wall bay, or the first purlin of a roof bay. */
function holderIn(changed: Project, id: string) {
  const recipe = bayOf(changed, id)?.recipe;
  if (recipe?.kind === 'wall') return recipe.lines[0]?.heldBy;
  return recipe?.kind === 'roof' ? recipe.slopes[0]?.lines[0]?.heldBy : undefined;
}

describe('an edit', () => {
  it('names the project', () => {
    expect(applyEdit(made, { kind: 'name project', name: 'north shed' })).toEqual({
      ...made,
      name: 'north shed',
    });
  });

  it('changes one setting and leaves the others', () => {
    expect(applyEdit(made, { kind: 'settings', change: { ownLimit: 250 } }).settings).toEqual({
      ...made.settings,
      ownLimit: 250,
    });
  });

  it('adds a bay after another, or at the end', () => {
    const added = bay(wall(3000, [[3000, 'rising']]), { id: 'W2' });
    const ids = (after: string | null) =>
      applyEdit(made, { kind: 'add bay', bay: added, after }).bays.map((each) => each.id);
    expect(ids('W1')).toEqual(['W1', 'W2', 'R1']);
    expect(ids(null)).toEqual(['W1', 'R1', 'W2']);
    expect(ids('nowhere')).toEqual(['W1', 'R1', 'W2']);
  });

  it('removes a bay', () => {
    expect(applyEdit(made, { kind: 'remove bay', bay: 'W1' }).bays.map((each) => each.id)).toEqual(['R1']);
  });

  it('renames a bay, and the purlins that are held by it follow', () => {
    const changed = applyEdit(made, { kind: 'rename bay', bay: 'W1', to: 'North' });
    expect(changed.bays.map((each) => each.id)).toEqual(['North', 'R1']);
    expect(holderIn(changed, 'R1')).toEqual({
      kind: 'bay',
      bay: 'North',
    });
  });

  it('renames nothing to a name that is taken, and nothing that is not there', () => {
    expect(applyEdit(made, { kind: 'rename bay', bay: 'W1', to: 'R1' })).toBe(made);
    expect(applyEdit(made, { kind: 'rename bay', bay: 'W9', to: 'W8' })).toBe(made);
  });

  it('does not take over a line that is held by a bay which is not there', () => {
    const dangling = applyEdit(made, { kind: 'remove bay', bay: 'W1' });
    expect(applyEdit(dangling, { kind: 'rename bay', bay: 'W1', to: 'W5' })).toBe(dangling);
  });

  it('changes the diagonals of a bay and keeps the rest', () => {
    const changed = applyEdit(made, { kind: 'diagonals', bay: 'W1', change: { section: '90x90x8' } });
    expect(bayOf(changed, 'W1')?.diagonals).toEqual({ ...bayOf(made, 'W1')?.diagonals, section: '90x90x8' });
    expect(bayOf(changed, 'R1')).toBe(bayOf(made, 'R1'));
  });

  it('marks bars, clears marks, and forgets a bar with none left', () => {
    const marked = applyEdit(made, {
      kind: 'bars',
      bars: ['R1/a.p1.rise', 'W1/t1.fall'],
      change: { grade: 'S275' },
    });
    expect(bayOf(marked, 'R1')?.bars['a.p1.rise']).toEqual({
      section: '80x80x8',
      heel: 'down',
      grade: 'S275',
    });
    expect(bayOf(marked, 'W1')?.bars['t1.fall']).toEqual({ grade: 'S275' });
    const cleared = applyEdit(marked, { kind: 'bars', bars: ['W1/t1.fall'], change: {}, clear: ['grade'] });
    expect(bayOf(cleared, 'W1')?.bars).toEqual({});
  });

  it('sets a join and takes it away', () => {
    const crossings = ['W1/t1.fall+t1.rise'];
    const welded = applyEdit(made, { kind: 'join', crossings, join: { kind: 'welded' } });
    expect(bayOf(welded, 'W1')?.joins).toEqual({ 't1.fall+t1.rise': { kind: 'welded' } });
    expect(bayOf(applyEdit(welded, { kind: 'join', crossings, join: null }), 'W1')?.joins).toEqual({});
  });

  it('says how taut the partner is at a crossing, and forgets the last of such words without a trace', () => {
    const at = { kind: 'tension share', bay: 'W1', crossing: 't1.fall+t1.rise' } as const;
    const taut = applyEdit(made, { ...at, share: 0.6 });
    expect(bayOf(taut, 'W1')?.tensionShares).toEqual({ 't1.fall+t1.rise': 0.6 });
    const squeezed = applyEdit(taut, { ...at, crossing: 't2.fall+t2.rise', share: -1 });
    expect(bayOf(squeezed, 'W1')?.tensionShares).toEqual({ 't1.fall+t1.rise': 0.6, 't2.fall+t2.rise': -1 });
    expect(applyEdit(taut, { ...at, share: null })).toEqual(made);
    expect(applyEdit(made, { ...at, bay: 'nowhere', share: 1 })).toBe(made);
  });

  it('says what holds a rail or a purlin', () => {
    const heldBy = { kind: 'vouched', reason: 'sheeting' } as const;
    const rail = applyEdit(made, { kind: 'line holder', bay: 'W1', line: 'G1', heldBy });
    expect(holderIn(rail, 'W1')).toEqual(heldBy);
    const purlin = applyEdit(made, { kind: 'line holder', bay: 'R1', line: 'P1', heldBy });
    expect(holderIn(purlin, 'R1')).toEqual(heldBy);
  });

  it('never changes the project that it was given', () => {
    const text = JSON.stringify(made);
    applyEdit(made, { kind: 'bars', bars: ['R1/a.p1.rise'], change: { roll: 30 }, clear: ['section'] });
    applyEdit(made, { kind: 'rename bay', bay: 'W1', to: 'X' });
    expect(JSON.stringify(made)).toBe(text);
  });

  it('on an id without a slash, or of another bay, touches no bay', () => {
    // "W1x" once lost its last letter and came out as a bar of W1.
    for (const id of ['W1x', 'W1', '', '/t1.rise', 'X/t1.rise'])
      expect(applyEdit(made, { kind: 'bars', bars: [id], change: { roll: 5 } }), id).toEqual(made);
  });

  it('has a label that begins with a capital, for undo', () => {
    const edits: readonly Edit[] = [
      { kind: 'name project', name: 'x' },
      { kind: 'rename bay', bay: 'W1', to: 'W2' },
      { kind: 'join', crossings: [], join: null },
      { kind: 'bars', bars: ['W1/t1.rise', 'W1/t1.fall'], change: {} },
      { kind: 'tension share', bay: 'W1', crossing: 't1.fall+t1.rise', share: 0.5 },
    ];
    for (const edit of edits) expect(editLabel(edit)).toMatch(/^[A-Z]/);
    expect(editLabel(edits[1] as Edit)).toContain('W2');
    expect(editLabel(edits[3] as Edit)).toContain('2 bars');
  });
});

describe('an id of a bar', () => {
  it('is taken apart at its first slash', () => {
    expect(placeOf('W1/t1.rise')).toEqual({ bay: 'W1', key: 't1.rise' });
  });
});

describe('an edit on trial', () => {
  it('is refused with the place, when the project could not be opened again', () => {
    const outcome = tryEdit(made, {
      kind: 'recipe',
      bay: 'W1',
      recipe: wall(6000, [[Number.NaN, 'crossed']]),
      what: 'the height',
    });
    expect(outcome.ok).toBe(false);
    if (!outcome.ok) expect(outcome.problems[0]?.path).toBe('bays[0].recipe.tiers[0].height');
  });

  it('is refused for a rail that a lower bay leaves in the air', () => {
    const recipe = { ...wall(6000, [[1000, 'crossed']]), lines: [line('G1', 1500)] };
    expect(tryEdit(made, { kind: 'recipe', bay: 'W1', recipe, what: 'the height' }).ok).toBe(false);
  });

  it('is refused for a partner squeezed harder than the bar itself', () => {
    const squeezed = { kind: 'tension share', bay: 'W1', crossing: 't1.fall+t1.rise', share: -1.2 } as const;
    const outcome = tryEdit(made, squeezed);
    expect(outcome.ok || outcome.problems[0]?.path).toBe('bays[0].tensionShares.t1.fall+t1.rise');
  });

  it('keeps what was typed, spaces and all', () => {
    const outcome = tryEdit(made, { kind: 'bars', bars: ['W1/t1.rise'], change: { mark: ' BR 1 ' } });
    expect(outcome.ok && bayOf(outcome.project, 'W1')?.bars['t1.rise']?.mark).toBe(' BR 1 ');
  });
});
