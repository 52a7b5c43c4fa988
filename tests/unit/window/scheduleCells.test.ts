import { describe, expect, it } from 'vitest';
import { cellText } from '../../../renderer/panels/schedule/cellText.ts';
import {
  BRACING_COLUMNS,
  type ColumnId,
  MAKING_COLUMNS,
} from '../../../renderer/panels/schedule/scheduleColumns.ts';
import { crossedTier } from '../documents/given.ts';

const seen = (given: Parameters<typeof crossedTier>[0]) => {
  const [row] = crossedTier(given).schedule;
  if (!row) throw new Error('the schedule has no row');
  return { row, status: 'within', ratio: null, bowing: null } as const;
};
const bolted = seen({ join: { kind: 'bolted' } });
const column = (columns: typeof MAKING_COLUMNS, id: ColumnId) => {
  const found = columns.find((each) => each.id === id);
  if (!found) throw new Error(`no column ${id}`);
  return found;
};

describe('a length in the schedule', () => {
  // 5000/25.4 = 196.850 in = 16'-4 13.6/16"; 4380/25.4 = 172.441 in = 14'-4 7.06/16".
  it('is told to the sixteenth of an inch in US units, to judge by and to make by', () => {
    for (const columns of [BRACING_COLUMNS, MAKING_COLUMNS]) {
      expect(cellText(column(columns, 'setOut'), bolted, 'us')).toBe('16\'-4 7/8"');
      expect(cellText(column(columns, 'cut'), bolted, 'us')).toBe('14\'-4 7/16"');
    }
  });

  // A set-back of 350 mm is 13.780 in, 1'-1 12.5/16".
  it('stands as a fraction beside fractions', () => {
    expect(cellText(column(MAKING_COLUMNS, 'setBackI'), bolted, 'us')).toBe('1\'-1 3/4"');
    expect(cellText(column(MAKING_COLUMNS, 'setBackI'), bolted, 'metric')).toBe('350');
  });

  it('of a cut bar is told piece by piece where it is to be made', () => {
    const cut = seen({ join: { kind: 'cut', cutBar: 't1.rise' } });
    const pieces = cut.row.pieces.map((mm) => Math.round(mm).toLocaleString('en').replace(',', '\u202f'));
    expect(pieces).toHaveLength(2);
    expect(cellText(column(MAKING_COLUMNS, 'cut'), cut, 'metric')).toBe(pieces.join(' + '));
    expect(cellText(column(BRACING_COLUMNS, 'cut'), cut, 'metric')).toBe(
      (cut.row.cutLength / 1000).toFixed(2),
    );
  });
});
