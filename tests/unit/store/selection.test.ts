import { describe, expect, it } from 'vitest';
import au from '../../../assets/catalogues/au.json' with { type: 'json' };
import en from '../../../assets/catalogues/en.json' with { type: 'json' };
import us from '../../../assets/catalogues/us.json' with { type: 'json' };
import { assess } from '../../../core/assess.ts';
import type { Assessment } from '../../../core/assessment.ts';
import type { Catalogues } from '../../../core/catalogue/model.ts';
import { readCatalogue } from '../../../core/catalogue/readCatalogue.ts';
import { newWallBay } from '../../../core/project/newBay.ts';
import { newProject } from '../../../core/project/newProject.ts';
import {
  bayOf,
  NOTHING_SELECTED,
  settled,
  steppedBack,
  withBar,
  withBay,
  withCrossing,
  withEnd,
  withRenamedBay,
} from '../../../renderer/store/selection.ts';

const catalogues: Catalogues = { en: readCatalogue(en), us: readCatalogue(us), au: readCatalogue(au) };
const CROSSING = 'W1/t1.fall+t1.rise';

function shed(...ids: readonly string[]): Assessment {
  const bays = ids.map((id, index) => {
    const bay = newWallBay(id, id);
    return { ...bay, place: { ...bay.place, origin: [0, index * 6000, 0] as const } };
  });
  return assess({ ...newProject('shed'), bays }, catalogues);
}

const two = shed('W1', 'W2');

describe('the selection', () => {
  it('begins with the worst diagonal of the worst bay', () => {
    const selection = settled(NOTHING_SELECTED, two);
    expect(selection.bay).toBe('W1');
    expect(selection.bar).toBe(two.bays.get('W1')?.worst?.bar);
  });

  it('takes a bar with its bay, and closes what was docked for another bar', () => {
    const docked = withCrossing(withBar(NOTHING_SELECTED, 'W1/t1.rise'), CROSSING, two);
    expect(docked.crossing).toBe(CROSSING);
    expect(withBar(docked, 'W1/t1.rise').crossing).toBe(CROSSING);
    expect(withBar(docked, 'W2/t1.rise')).toMatchObject({ bay: 'W2', crossing: null });
  });

  it('reads a crossing for the chosen bar when it passes there, else for the first of the crossing', () => {
    expect(withCrossing(withBar(NOTHING_SELECTED, 'W1/t1.fall'), CROSSING, two).bar).toBe('W1/t1.fall');
    expect(withCrossing(withBar(NOTHING_SELECTED, 'W2/t1.fall'), CROSSING, two).bar).toBe(
      two.layout.crossings.get(CROSSING)?.a,
    );
  });

  it('keeps the chosen bar of a bay that is chosen again', () => {
    const chosen = withBar(NOTHING_SELECTED, 'W1/t1.fall');
    expect(withBay(chosen, 'W1', two)).toBe(chosen);
    expect(withBay(chosen, 'W2', two).bay).toBe('W2');
  });

  it('steps back from what is docked and then stays', () => {
    const docked = withEnd({ bar: 'W1/t1.rise', end: 'j' });
    const back = steppedBack(docked);
    expect([back.end, back.bar]).toEqual([null, 'W1/t1.rise']);
    expect(steppedBack(back)).toBe(back);
  });

  it('lets go of what the project no longer has', () => {
    const docked = withCrossing(withBar(NOTHING_SELECTED, 'W2/t1.rise'), 'W2/t1.fall+t1.rise', two);
    const selection = settled(docked, shed('W1'));
    expect(selection).toMatchObject({ bay: 'W1', crossing: null });
    expect(settled(docked, assess(newProject('empty'), catalogues))).toEqual(NOTHING_SELECTED);
  });

  it('keeps its identity when nothing in it changes', () => {
    const selection = withBar(NOTHING_SELECTED, 'W2/t1.rise');
    expect(settled(selection, two)).toBe(selection);
  });

  it('follows a bay to its new name, and only that bay', () => {
    const docked = withCrossing(withBar(NOTHING_SELECTED, 'W1/t1.rise'), CROSSING, two);
    expect(withRenamedBay(docked, 'W1', 'A')).toEqual({
      bay: 'A',
      bar: 'A/t1.rise',
      crossing: 'A/t1.fall+t1.rise',
      end: null,
    });
    expect(withRenamedBay(docked, 'W2', 'B')).toEqual(docked);
  });

  it('reads the bay off an id', () => {
    expect(bayOf('W1/t1.rise')).toBe('W1');
  });
});
