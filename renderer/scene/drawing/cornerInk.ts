import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import type { SheetView } from '../view/sheetView.ts';
import { from, heading, type Ink, line, polyline } from './ink.ts';

const AXES: readonly (readonly [string, Vec3])[] = [
  ['X', [1, 0, 0]],
  ['Y', [0, 1, 0]],
  ['Z', [0, 0, 1]],
];

/** Length of a triad arm seen square on, px. */
const ARM = 26;

/** From the edges of the sheet to the end of an arm with its name, px. */
const TRIAD_EDGE = 20;
/** Names of arms keep this far from one another, px. */
const NAMES_APART = 12;
/** Where the name of an arm may stand from its usual place beyond the tip: there, farther out, above, below. */
const NAME_PLACES: readonly { readonly out: number; readonly down: number }[] = [
  { out: 0, down: 0 },
  { out: NAMES_APART, down: 0 },
  { out: 0, down: -NAMES_APART },
  { out: 0, down: NAMES_APART },
];

/** The directions X, Y and Z of the project, in the lower left corner. */
export function triadInk(view: SheetView): readonly Ink[] {
  // Directions alone: the scale of the view has no say in the triad.
  const arms = AXES.map(([name, axis]) => ({
    name,
    run: [
      axis[0] * view.right[0] + axis[1] * view.right[1] + axis[2] * view.right[2],
      -(axis[0] * view.up[0] + axis[1] * view.up[1] + axis[2] * view.up[2]),
    ] as Vec2,
  }));
  const reach = (axis: 0 | 1, sign: 1 | -1): number =>
    ARM * Math.max(0, ...arms.map(({ run }) => sign * run[axis])) + 8 + TRIAD_EDGE;
  const foot: Vec2 = [Math.max(36, reach(0, -1)), view.height - Math.max(34, reach(1, 1))];
  const ink: Ink[] = [{ kind: 'ring', key: 'triad foot', look: 'scene-solid', at: foot, radius: 2.2 }];
  const named: Vec2[] = [];
  for (const { name, run } of arms) {
    const way = heading(run, 0.08);
    if (way === null) continue;
    const tip = from(foot, run, ARM);
    const label = namePlace(tip, way, named);
    named.push(label);
    ink.push({ kind: 'path', key: `triad ${name}`, look: 'scene-triad', d: line(foot, tip) });
    ink.push({
      kind: 'words',
      key: `triad ${name} name`,
      look: 'scene-words',
      at: [label[0], label[1] + 4],
      anchor: 'middle',
      text: name,
    });
  }
  return ink;
}

/** Two arms that nearly meet on the sheet would have their names on one another: the later one gives way. */
function namePlace(tip: Vec2, way: Vec2, named: readonly Vec2[]): Vec2 {
  const places = NAME_PLACES.map(({ out, down }): Vec2 => {
    const [x, y] = from(tip, way, 8 + out);
    return [x, y + down];
  });
  const isFree = (at: Vec2): boolean =>
    named.every((other) => Math.hypot(other[0] - at[0], other[1] - at[1]) >= NAMES_APART);
  return places.find(isFree) ?? from(tip, way, 8);
}

const MM_PER_FOOT = 304.8;
/** Lengths that a scale may show, in metres or feet. */
const STEPS = [0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 50, 100, 200, 500, 1000];

/** Width that the last figure with its unit may take, px. */
const LAST_FIGURE = 62;

/**
 * A scale of two parts in the lower left corner, beside the triad, or above it where the legend leaves no room there. It measures what lies square to the view; where uprights are foreshortened it measures
 * those instead and says so, as they are what one reads off an axonometric.
 */
export function scaleInk(
  view: SheetView,
  units: UnitSystem,
  legend: { readonly width: number; readonly height: number },
): readonly Ink[] {
  const upright = view.up[2];
  const foreshortened = upright > 0.3 && upright < 0.9998;
  const pxPerUnit = view.pxPerMm * (foreshortened ? upright : 1) * (units === 'us' ? MM_PER_FOOT : 1000);
  const step = STEPS.find((one) => one * pxPerUnit >= 36);
  if (step === undefined) return [];
  const part = step * pxPerUnit;
  const free = view.width - legend.width - 14 - 2 * part - LAST_FIGURE;
  const place = [
    { left: 96, y: view.height - 24 },
    { left: 20, y: view.height - 100 },
  ].find(({ left }) => left <= free);
  if (place === undefined) return [];
  const { left, y } = place;
  const unit = `${units === 'us' ? 'ft' : 'm'}${foreshortened ? ' upright' : ''}`;
  const figure = (parts: number, text: string, key: string): Ink => ({
    kind: 'words',
    key,
    look: 'scene-words quiet',
    at: [left + parts * part, y + 16],
    anchor: parts === 2 ? 'start' : 'middle',
    text,
  });
  const box = (start: number): string =>
    polyline(
      [
        [left + start * part, y - 4],
        [left + (start + 1) * part, y - 4],
        [left + (start + 1) * part, y],
        [left + start * part, y],
      ],
      true,
    );
  return [
    { kind: 'path', key: 'scale filled', look: 'scene-scale filled', d: box(0) },
    { kind: 'path', key: 'scale open', look: 'scene-scale', d: box(1) },
    figure(0, '0', 'scale 0'),
    figure(1, shown(step), 'scale 1'),
    figure(2, `${shown(2 * step)} ${unit}`, 'scale 2'),
  ];
}

function shown(value: number): string {
  return String(Math.round(value * 10) / 10);
}
