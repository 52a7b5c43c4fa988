import { describe, expect, it } from 'vitest';
import { firstSizes } from '../../../renderer/shell/firstSizes.ts';
import { keepSizes, keptSizes } from '../../../renderer/shell/keptSizes.ts';

/** Storage as a browser gives it, over a Map. */
function storage(kept: string | null = null): Storage {
  const values = new Map<string, string>(kept === null ? [] : [['tautline.docks', kept]]);
  return {
    get length() {
      return values.size;
    },
    clear: () => values.clear(),
    getItem: (key) => values.get(key) ?? null,
    key: (index) => [...values.keys()][index] ?? null,
    removeItem: (key) => void values.delete(key),
    setItem: (key, value) => void values.set(key, value),
  };
}
const FIRST = firstSizes(1440, 900);
const read = (from: Storage, width = 1440, height = 900) =>
  keptSizes(from, firstSizes(width, height), width, height);

describe('the sizes of the docks', () => {
  it('are those to begin with where nothing is kept, or what is kept makes no sense', () => {
    for (const kept of [null, 'no json', '7', '{"left":"wide","tables":3}', '[]'])
      expect(read(storage(kept))).toEqual(FIRST);
  });

  it('come back as they were left', () => {
    const from = storage();
    const left = { left: 300, card: 400, tables: { ...FIRST.tables, bowing: 410 } };
    keepSizes(from, left);
    expect(read(from)).toEqual(left);
  });

  it('leave room for the view in a smaller window', () => {
    const from = storage();
    keepSizes(from, { left: 390, card: 560, tables: { ...FIRST.tables, schedule: 700 } });
    const { left, card, tables } = read(from, 1280, 800);
    // A view of 320 px at least.
    expect(left + card).toBeLessThanOrEqual(1280 - 320);
    expect(tables.schedule).toBeLessThanOrEqual(0.6 * 800);
  });

  it('are kept by the window only as long as it lives where storage is refused', () => {
    const refused = {
      ...storage(),
      getItem: () => {
        throw new Error('refused');
      },
      setItem: () => {
        throw new Error('refused');
      },
    };
    keepSizes(refused, FIRST);
    expect(read(refused)).toEqual(FIRST);
  });
});
