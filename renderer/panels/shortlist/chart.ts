/** The sheet of the shortlist's picture: mass to the right, slenderness upwards, as px. */
import type { UnitSystem } from '../../../core/project/model.ts';
import type { Candidate, Shortlist } from '../../../core/shortlist/model.ts';
import { massPerMetreIn } from '../../../core/units/quantity.ts';

export interface Chart {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly massTicks: readonly number[];
  readonly slendernessTicks: readonly number[];
  /** Mass as shown, kg/m or lb/ft. */
  x(mass: number): number;
  y(slenderness: number): number;
  at(candidate: Candidate): readonly [number, number];
}

const MARGIN = { left: 44, right: 14, top: 12, bottom: 32 };

export function chartOf(list: Shortlist, width: number, height: number, units: UnitSystem): Chart {
  const massOf = (candidate: Candidate): number => massPerMetreIn(candidate.massPerMetre, units);
  const present = list.candidates.find(({ isPresent }) => isPresent);
  const first = list.first ?? list.candidates[0];
  const anchor = Math.max(
    present === undefined ? 0 : massOf(present),
    first === undefined ? 1 : massOf(first),
  );
  // The heavy end of the stock list would press what matters into a corner.
  const heaviest = Math.max(...list.candidates.map(massOf), 1);
  const massTop = Math.min(heaviest, anchor * 2.5);
  const massLow = Math.min(...list.candidates.map(massOf), anchor * 0.6) * 0.95;
  const massStep = niceStep((massTop - massLow) / 9);
  const x0 = Math.floor(massLow / massStep) * massStep;
  const x1 = Math.ceil(massTop / massStep) * massStep;

  const shown = list.candidates
    .filter((candidate) => massOf(candidate) <= x1)
    .map(({ slenderness }) => slenderness);
  const low = Math.min(...shown, list.limit * 0.8);
  const high = Math.min(Math.max(...shown, list.limit * 1.2), list.limit * 1.75);
  const slendernessStep = niceStep((high - low) / 5);
  const y0 = Math.max(0, Math.floor(low / slendernessStep) * slendernessStep);
  const y1 = Math.ceil(high / slendernessStep) * slendernessStep;

  const left = MARGIN.left;
  const right = width - MARGIN.right;
  const top = MARGIN.top;
  const bottom = height - MARGIN.bottom;
  const x = (mass: number): number => left + ((mass - x0) / (x1 - x0)) * (right - left);
  const y = (slenderness: number): number => bottom - ((slenderness - y0) / (y1 - y0)) * (bottom - top);
  return {
    left,
    right,
    top,
    bottom,
    massTicks: ticks(x0, x1, massStep),
    slendernessTicks: ticks(y0, y1, slendernessStep),
    x,
    y,
    at: (candidate) => [x(massOf(candidate)), y(candidate.slenderness)],
  };
}

/** Whether the candidate falls on the sheet. */
export function isOnChart(chart: Chart, candidate: Candidate): boolean {
  const [x, y] = chart.at(candidate);
  return x >= chart.left - 1 && x <= chart.right + 1 && y >= chart.top - 1;
}

export function niceStep(rough: number): number {
  const power = 10 ** Math.floor(Math.log10(Math.max(rough, 1e-9)));
  const ratio = rough / power;
  return power * (ratio <= 1 ? 1 : ratio <= 2 ? 2 : ratio <= 5 ? 5 : 10);
}

function ticks(from: number, to: number, step: number): readonly number[] {
  return Array.from({ length: Math.round((to - from) / step) + 1 }, (_, index) => from + index * step);
}
