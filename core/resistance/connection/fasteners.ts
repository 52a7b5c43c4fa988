/** Bolts by grade and size. From memory, sure: ISO 898-1, ISO 724, ASTM F3125. */
import type { ResistingEnd } from '../model.ts';

/** Tensile strength, N/mm². */
const STRENGTH: Readonly<Record<string, number>> = {
  '4.6': 400,
  '8.8': 800,
  '10.9': 1000,
  A325: 825,
  A490: 1035,
};

export const boltStrength = (grade: string): number => STRENGTH[grade] ?? 400;

/** ISO metric coarse pitches, mm. */
const PITCH: readonly (readonly [number, number])[] = [
  [6, 1],
  [8, 1.25],
  [10, 1.5],
  [12, 1.75],
  [16, 2],
  [22, 2.5],
  [27, 3],
  [33, 3.5],
  [39, 4],
  [64, 5],
];

/** Stress area of a threaded bolt or rod, π/4 (d − 0.9382 p)², mm². */
export function stressArea(diameter: number): number {
  const pitch = PITCH.find(([upTo]) => diameter <= upTo)?.[1] ?? 6;
  return (Math.PI / 4) * (diameter - 0.9382 * pitch) ** 2;
}

export const shankArea = (diameter: number): number => (Math.PI / 4) * diameter ** 2;

/** Clear distances in front of the bolts along the force: of the last to the end, of the others to the next hole. mm. */
export function clearDistances({ endDistance, pitch, hole, bolts, rows }: ResistingEnd): {
  readonly end: number;
  readonly inner: number;
  readonly atEnd: number;
  readonly within: number;
} {
  const atEnd = Math.min(rows, bolts);
  return { end: endDistance - hole / 2, inner: pitch - hole, atEnd, within: bolts - atEnd };
}
