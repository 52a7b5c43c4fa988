import { dot } from '../geometry/vector.ts';
import type { BayLayout } from '../layout/model.ts';
import type { Bay, Tier } from '../project/model.ts';
import type { Finding } from './model.ts';
import {
  bayPath,
  type FindingSubject,
  grouped,
  isAre,
  type Judged,
  judgedIn,
  marksInWords,
} from './subject.ts';

/** Usual range of a diagonal's slope, degrees (common practice, no source). */
const FLATTEST = 30;
const STEEPEST = 60;

/** Whether the pattern of a bay lets "tension only" be true, and whether the slopes are usual. */
export function patternFindings(subject: FindingSubject): readonly Finding[] {
  return subject.layout.bays.flatMap((layout) => {
    const bay = subject.project.bays[subject.places.get(layout.id) ?? -1];
    if (!bay) return [];
    const all = judgedIn(subject, layout);
    return [
      ...tensionFindings(subject, bay, layout, all),
      ...slopeFindings(layout, all),
      ...outOfPlane(subject, layout, all),
    ];
  });
}

function tensionFindings(
  subject: FindingSubject,
  bay: Bay,
  layout: BayLayout,
  all: readonly Judged[],
): readonly Finding[] {
  const diagonals = all.filter(({ bar }) => bar.role === 'diagonal' || bar.role === 'knee');
  const ties = diagonals.filter(({ angle }) => angle.spec.countedOn === 'tension');
  const peaked = new Set(
    tiersOf(bay)
      .filter(({ tier }) => tier.pattern === 'peaked' || tier.pattern === 'vee')
      .map(({ key }) => key),
  );
  return grouped(ties, ({ bar }) => panelOf(bar.key)).flatMap((group): readonly Finding[] => {
    const [first] = group;
    if (!first) return [];
    const panel = panelOf(first.bar.key);
    const base = {
      bay: layout.id,
      bars: group.map(({ bar }) => bar.id),
      crossing: null,
      breaksLimit: false,
      value: null,
      limit: null,
      quantity: 'none',
      path: `${bayPath(subject, bay.id)}.recipe`,
    } as const;
    if (peaked.has(panel))
      return [
        {
          ...base,
          id: `beam-pull:${first.bar.id}`,
          kind: 'beam takes the pull',
          severity: 'must fix',
          title: `${marksInWords(group)} pull on the beam between them`,
          detail:
            'With one slack, the other pulls the beam sideways at its middle: tension only does not work in a peaked or vee tier unless the beam is checked for it.',
        } as const,
      ];
    const alone = group.filter((judged) => !hasPartner(judged, diagonals, layout));
    if (alone.length === 0) return [];
    return [
      {
        ...base,
        id: `alone:${first.bar.id}`,
        kind: 'no partner',
        severity: 'look into',
        bars: alone.map(({ bar }) => bar.id),
        title: `${marksInWords(alone)} ${isAre(alone)} tension only with no partner`,
        detail: alone.every(({ bar }) => bar.role === 'knee')
          ? 'The reversed load finds no knee that it can pull. Put one on the other side, or count the knee on in compression too.'
          : 'The reversed load finds no diagonal that it can pull. Cross the panel, count the bar on in compression too, or make sure that another bay of the line takes the reversed load.',
      } as const,
    ];
  });
}

/** Tiers and panels with the key that their bars begin with. */
function tiersOf(bay: Bay): readonly { readonly key: string; readonly tier: Tier }[] {
  const { recipe } = bay;
  switch (recipe.kind) {
    case 'wall':
      return recipe.tiers.map((tier) => ({ key: tier.id, tier }));
    case 'roof':
      return recipe.slopes.flatMap((slope) =>
        slope.panels.map((panel) => ({ key: `${slope.id}.${panel.id}`, tier: panel })),
      );
    case 'knee':
    case 'free':
      return [];
    default:
      return recipe satisfies never;
  }
}

/** "a.p1" of "a.p1.rise"; of a bar drawn freely, nothing: all are one panel. */
function panelOf(key: string): string {
  const dot = key.lastIndexOf('.');
  return dot < 0 ? '' : key.slice(0, dot);
}

/** A diagonal of the same panel that leans the other way. */
function hasPartner(judged: Judged, diagonals: readonly Judged[], layout: BayLayout): boolean {
  const side = leanOf(judged, layout);
  return diagonals.some(
    (other) =>
      other !== judged &&
      panelOf(other.bar.key) === panelOf(judged.bar.key) &&
      leanOf(other, layout) * side < 0,
  );
}

/** 1 for a bar that rises to the right of its plane, −1 for one that falls, 0 for one that is level or upright. */
function leanOf({ bar }: Judged, layout: BayLayout): number {
  const plane = layout.planes.find(({ id }) => id === bar.plane);
  return plane ? Math.sign(dot(bar.direction, plane.right) * dot(bar.direction, plane.up)) : 0;
}

function slopeFindings(layout: BayLayout, all: readonly Judged[]): readonly Finding[] {
  const unusual = all.filter(
    ({ angle, bar }) =>
      bar.role === 'diagonal' && (angle.inclination < FLATTEST || angle.inclination > STEEPEST),
  );
  const [first] = unusual;
  if (!first) return [];
  const worst = unusual.reduce((most, each) =>
    Math.abs(each.angle.inclination - 45) > Math.abs(most.angle.inclination - 45) ? each : most,
  );
  return [
    {
      id: `slope:${layout.id}`,
      kind: 'steep or flat',
      severity: 'note',
      breaksLimit: false,
      bay: layout.id,
      bars: unusual.map(({ bar }) => bar.id),
      crossing: null,
      title: `${marksInWords(unusual)} ${isAre(unusual)} ${worst.angle.inclination < 45 ? 'flat' : 'steep'}: ${worst.angle.inclination.toFixed(0)}°`,
      detail:
        'Diagonals between 30° and 60° are usual (common practice): flatter or steeper ones carry more force for the same load and give more drift.',
      value: worst.angle.inclination,
      limit: worst.angle.inclination < 45 ? FLATTEST : STEEPEST,
      quantity: 'angle',
      path: null,
    },
  ];
}

/** A diagonal this far out of the plane of its bay is not one of it: sin 10°, as directions count as one. */
const OUT_OF_PLANE = Math.sin((10 * Math.PI) / 180);

/** A bay drawn freely has one plane: crossings, legs and ways are read in it. Knees and ties may leave it. */
function outOfPlane(subject: FindingSubject, bay: BayLayout, all: readonly Judged[]): readonly Finding[] {
  const [plane] = bay.planes;
  if (bay.kind !== 'free' || !plane) return [];
  const out = all.filter(
    ({ bar }) => bar.role === 'diagonal' && Math.abs(dot(bar.direction, plane.normal)) > OUT_OF_PLANE,
  );
  if (out.length === 0) return [];
  return [
    {
      id: `out-of-plane:${bay.id}`,
      kind: 'out of the plane',
      severity: 'look into',
      breaksLimit: false,
      bay: bay.id,
      bars: out.map(({ bar }) => bar.id),
      crossing: null,
      title: `${marksInWords(out)} ${isAre(out)} out of the plane of ${bay.id}`,
      detail: `A bay drawn freely has one plane, in which crossings are found and “in plane” and “out of plane” are read; ${marksInWords(out)} ${out.length > 1 ? 'leave' : 'leaves'} it. Draw what lies in another plane as another bay: nodes at one place are one.`,
      value: null,
      limit: null,
      quantity: 'none',
      path: `${bayPath(subject, bay.id)}.recipe.bars`,
    },
  ];
}
