/** Bolts by grade and size. From memory, sure: ISO 898-1, ISO 724, ASTM F3125, AS 1252. */
import type { PracticeId } from '../../project/model.ts';
import type { ResistingEnd, ResistingSection } from '../model.ts';
import { pliesOf, rowsOf } from '../tension/boltRows.ts';

/** Tensile strength, N/mm². */
const STRENGTH: Readonly<Record<string, number>> = {
  '4.6': 400,
  '8.8': 800,
  '10.9': 1000,
  A325: 825,
  A490: 1035,
};

/** Bolts of unknown grade count as 4.6. Australian bolts to AS 1252 have 830 where ISO has 800. */
export function boltStrength(practice: PracticeId, grade: string): number {
  if (practice === 'as4100' && grade === '8.8') return 830;
  return STRENGTH[grade] ?? 400;
}

/** ISO metric coarse pitches, mm, by the largest diameter they go with. */
const PITCH: readonly (readonly [upTo: number, pitch: number])[] = [
  [6, 1],
  [8, 1.25],
  [10, 1.5],
  [12, 1.75],
  [16, 2],
  [22, 2.5],
  [27, 3],
  [33, 3.5],
  [39, 4],
  [45, 4.5],
  [52, 5],
  [60, 5.5],
];

const pitchOf = (diameter: number): number => PITCH.find(([upTo]) => diameter <= upTo + 0.01)?.[1] ?? 6;

/** Stress area of a threaded bolt or rod, π/4 (d − 0.9382 p)², mm². ISO 898-1. Inch threads are taken as metric ones of their diameter. */
export const stressArea = (diameter: number): number =>
  (Math.PI / 4) * (diameter - 0.9382 * pitchOf(diameter)) ** 2;

/** Area at the root of the thread, π/4 (d − 1.2269 p)², mm². ISO 724. */
export const rootArea = (diameter: number): number =>
  (Math.PI / 4) * (diameter - 1.2269 * pitchOf(diameter)) ** 2;

export const shankArea = (diameter: number): number => (Math.PI / 4) * diameter ** 2;

/** Planes in which each bolt is sheared: two where a pair of angles clasps the gusset. */
export const shearPlanes = ({ shape }: ResistingSection): 1 | 2 => (shape === 'angles back to back' ? 2 : 1);

/** Thickness of the bar that one bolt bears on, mm. Each bolt of a starred pair goes through one leg only. */
export const bearingThickness = (section: ResistingSection): number =>
  section.shape === 'starred angles' ? section.thickness : section.thickness * pliesOf(section);

/** Bolts at the end of their row, and those behind them. */
export function bolted(
  end: ResistingEnd,
  section: ResistingSection,
): { readonly first: number; readonly behind: number } {
  const rows = rowsOf(end, section);
  return { first: rows.length, behind: rows.reduce((sum, { bolts }) => sum + bolts - 1, 0) };
}
