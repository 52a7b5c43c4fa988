import type { DockTab } from '../store/windowState.ts';

export interface DockSizes {
  readonly left: number;
  readonly card: number;
  /** Height of the tables by what they show: the picture of the shortlist wants more than the schedule. */
  readonly tables: Readonly<Record<DockTab, number>>;
}

/** The docks' sizes to begin with, px, by the window's. */
export function firstSizes(width: number, height: number): DockSizes {
  const narrow = width < 1400;
  const share = (part: number, most: number): number => Math.round(Math.min(most, height * part));
  return {
    left: narrow ? 240 : 252,
    card: narrow ? 380 : 424,
    tables: {
      schedule: share(0.255, 300),
      shortlist: share(0.36, 380),
      findings: share(0.34, 380),
      bowing: share(0.36, 380),
      forces: share(0.3, 320),
    },
  };
}
