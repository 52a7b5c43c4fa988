import type { Assessment, DiagonalAssessment } from '../../assessment.ts';
import type { BayLayout, Plane } from '../../layout/model.ts';
import { grouped } from '../../units/figures.ts';
import { showMass, showSlenderness } from '../../units/quantity.ts';
import { crossingSection } from '../elevation/crossingSection.ts';
import { type Elevation, elevation } from '../elevation/elevation.ts';
import { legend } from '../elevation/legend.ts';
import { scaleBar } from '../elevation/scaleBar.ts';
import type { Room } from '../elevation/view.ts';
import { type Markup, markup } from '../markup.ts';
import type { ReportOptions } from '../reportOptions.ts';
import { groupedAlike } from './alike.ts';
import { diagonalSheet } from './diagonalSheet.ts';
import { memberSheet } from './memberSheet.ts';
import { scheduleSheet } from './scheduleSheet.ts';

const BESIDE_LEGEND: Room = {
  width: 456,
  height: 590,
  margins: { left: 104, right: 34, top: 16, bottom: 66 },
};
/** Two to a row, over the legend. */
const HALF_WIDTH: Room = {
  width: 342,
  height: 420,
  margins: { left: 84, right: 34, top: 16, bottom: 60 },
};

/** A bay: its planes drawn, its crossings in section, its schedule, and a sheet for each diagonal. */
export function baySheet(
  assessment: Assessment,
  bay: BayLayout,
  options: ReportOptions,
  page: string,
): Markup {
  const summary = assessment.bays.get(bay.id);
  const drawings = drawnPlanes(assessment, bay, options);
  const sections = unlikeSections(assessment, bay, options);
  const off = bay.numberOff === 1 ? '' : `, ${bay.numberOff} off`;
  const mass = summary ? ` · ${showMass(summary.mass, options.units)} of diagonals in all` : '';
  const diagonals = groupedAlike(assessment, bay).flatMap(([first, ...others]) =>
    first
      ? [
          diagonalSheet(
            assessment,
            first.bar,
            first.angle,
            first.diagonal,
            others.map(({ bar }) => bar.mark),
            options,
          ),
        ]
      : [],
  );
  return markup`<section class="bay ${page}"><h1>${bay.id}: ${bay.name}<small>${summary?.says ?? ''}${off}${mass}</small></h1>
<h2>As it will be built<small>${seenFrom(bay)}${options.units === 'metric' ? ', mm unless marked' : ''}</small></h2>
<div class="drawings ${drawings.length > 1 ? 'stacked' : ''}"><div class="planes">${drawings.map(({ title, drawing }) => markup`<figure>${title === '' ? null : markup`<figcaption>${title}</figcaption>`}${drawing.svg}${scaleBar(drawing, options.units)}</figure>`)}</div><div class="side">${sections.map(({ svg, caption, title }) => markup`<div class="keep"><h3>${title}</h3>${svg}<p>${caption}</p></div>`)}<div class="keep"><h3>Legend</h3>${legend(drawings.map(({ drawing }) => drawing))}</div></div></div>
${scheduleSheet(assessment, bay, options)}${memberSheet(assessment, bay, options)}</section><div class="${page}">${diagonals}</div>`;
}

function seenFrom({ kind }: BayLayout): string {
  switch (kind) {
    case 'wall':
      return 'seen from outside';
    case 'roof':
      return 'each slope laid flat, seen from above';
    case 'knee':
      return 'each pair seen along the chord';
    case 'free':
      return 'seen square to its plane';
    default:
      return kind satisfies never;
  }
}

interface DrawnPlane {
  readonly title: string;
  readonly drawing: Elevation;
}

/** One drawing a plane that has diagonals in it; planes that would look the same share one, which names the marks of the others. */
function drawnPlanes(
  assessment: Assessment,
  bay: BayLayout,
  { units }: ReportOptions,
): readonly DrawnPlane[] {
  const { layout } = assessment;
  const marksIn = (plane: Plane): readonly string[] =>
    bay.diagonals.flatMap((id) => {
      const bar = layout.bars.get(id);
      return bar?.plane === plane.id ? [bar.mark] : [];
    });
  const withDiagonals = bay.planes.filter((plane) => marksIn(plane).length > 0);
  const planes = withDiagonals.length > 0 ? withDiagonals : bay.planes;
  const unlike = new Map<string, Plane[]>();
  for (const plane of planes) {
    const look = lookOf(assessment, bay, plane);
    unlike.set(look, [...(unlike.get(look) ?? []), plane]);
  }
  const room = unlike.size > 1 ? HALF_WIDTH : BESIDE_LEGEND;
  return [...unlike.values()].flatMap(([plane, ...alike]) => {
    if (!plane) return [];
    const drawing = elevation(
      { layout, bay, plane, units, standing: (id) => standingOf(assessment.diagonals.get(id)) },
      room,
    );
    const others = alike.map((other) => marksIn(other).join(', '));
    const title = [
      planes.length > 1 ? `Plane ${plane.id}` : '',
      others.length > 0 ? `the same for ${others.join('; ')}` : '',
    ]
      .filter((part) => part !== '')
      .join(', ');
    return [{ title, drawing }];
  });
}

/** All that shows on a drawing but the marks: sizes within the plane, sections, sides, joins, figures. */
function lookOf({ layout, diagonals }: Assessment, bay: BayLayout, plane: Plane): string {
  const bars = bay.bars.flatMap((id) => layout.bars.get(id) ?? []).filter((bar) => bar.plane === plane.id);
  const round = (at: readonly number[], origin: readonly number[], along: readonly number[]): number =>
    Math.round(along.reduce((sum, value, k) => sum + value * ((at[k] ?? 0) - (origin[k] ?? 0)), 0));
  const place = (at: readonly number[]): string =>
    `${round(at, plane.origin, plane.right)},${round(at, plane.origin, plane.up)}`;
  const ids = new Set(bars.map(({ id }) => id));
  const joins = bay.crossings
    .flatMap((id) => layout.crossings.get(id) ?? [])
    .filter(({ a, b }) => ids.has(a) && ids.has(b))
    .map(({ at, join }) => `${place(at)} ${join?.kind ?? ''}`);
  const looks = bars.map((bar) => {
    const diagonal = diagonals.get(bar.id);
    const figure = diagonal ? standingOf(diagonal) : null;
    return [
      bar.role,
      place(bar.from),
      place(bar.to),
      bar.angle?.stock?.designation ?? '',
      bar.angle?.side ?? '',
      bar.angle?.spec.heel ?? '',
      figure?.status ?? '',
      figure?.figure ?? '',
    ].join(' ');
  });
  return [...looks, ...joins].join('|');
}

function standingOf(diagonal: DiagonalAssessment | undefined): {
  readonly status: DiagonalAssessment['status'];
  readonly figure: string;
} {
  const verdict =
    [diagonal?.inService, diagonal?.handling].find((candidate) => candidate?.asked) ?? diagonal?.inService;
  return {
    status: diagonal?.status ?? 'unknown',
    figure: verdict ? showSlenderness(verdict.slenderness, verdict.limit) : '–',
  };
}

/** How many unlike crossings of a bay are shown in section. */
const SECTIONS = 2;

function unlikeSections(
  { layout }: Assessment,
  bay: BayLayout,
  { units }: ReportOptions,
): readonly { readonly svg: Markup; readonly caption: string; readonly title: string }[] {
  const seen = new Set<string>();
  const crossings = bay.crossings.flatMap((id) => layout.crossings.get(id) ?? []);
  return crossings
    .filter(({ kind }) => kind === 'diagonals')
    .flatMap((crossing) => {
      const bars = [crossing.a, crossing.b].flatMap((id) => layout.bars.get(id) ?? []);
      const plane = bay.planes.find(({ id }) => id === bars[0]?.plane);
      const look = [
        crossing.join?.kind ?? '',
        grouped(crossing.gap, 1),
        ...bars.map(
          ({ angle }) =>
            `${angle?.stock?.designation} ${angle?.side} ${angle?.spec.heel} ${angle?.spec.legInPlane}`,
        ),
      ].join('|');
      if (!plane || seen.has(look) || seen.size >= SECTIONS) return [];
      seen.add(look);
      const section = crossingSection(crossing, layout, plane, units);
      const title = `Section at ${bars.map(({ mark }) => mark).join(' and ')}`;
      return section ? [{ ...section, title }] : [];
    });
}
