import type { DockTab } from '../store/windowState.ts';
import type { DockSizes } from './firstSizes.ts';

const KEPT = 'tautline.docks';

/**
 * The docks' sizes as they were left, each within what this window has room for; those to begin with where nothing is kept, or what is
 * kept makes no sense.
 *
 * @param width @param height of the window, px
 */
export function keptSizes(storage: Storage, first: DockSizes, width: number, height: number): DockSizes {
  const kept = read(storage);
  const within = (value: unknown, least: number, most: number, otherwise: number): number =>
    typeof value === 'number' && Number.isFinite(value)
      ? Math.max(least, Math.min(most, Math.round(value)))
      : otherwise;
  const tables = record(kept['tables']);
  const tall = height * MOST_TALL;
  const table = (tab: DockTab): number => within(tables[tab], LEAST.tables, tall, first.tables[tab]);
  return {
    left: within(kept['left'], LEAST.left, width * MOST_WIDE, first.left),
    card: within(kept['card'], LEAST.card, width * MOST_WIDE, first.card),
    tables: {
      schedule: table('schedule'),
      shortlist: table('shortlist'),
      findings: table('findings'),
      bowing: table('bowing'),
      forces: table('forces'),
    },
  };
}

/** px; what the docks can be dragged down to. */
const LEAST = { left: 200, card: 356, tables: 104 } as const;
/** Shares of the window that a dock takes at most when it is opened again, perhaps on a smaller screen. */
const MOST_WIDE = 0.3;
const MOST_TALL = 0.6;

export function keepSizes(storage: Storage, sizes: DockSizes): void {
  try {
    storage.setItem(KEPT, JSON.stringify(sizes));
  } catch {
    // Storage may be refused, as in a private window: the sizes then last as long as the window.
  }
}

function read(storage: Storage): Record<string, unknown> {
  try {
    return record(JSON.parse(storage.getItem(KEPT) ?? 'null'));
  } catch {
    return {}; // Refused, or written by something else.
  }
}

const record = (value: unknown): Record<string, unknown> =>
  typeof value === 'object' && value !== null ? { ...value } : {};
