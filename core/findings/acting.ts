/** What the forces of the combinations show: of the assumption "tension only", of what carries, and of how far it moves. */
import { MOST_IN_EVERY_CHOICE, turnedInPart } from '../forces/combinationStates.ts';
import type { ForceState, Forces } from '../forces/model.ts';
import { motionInWords } from '../forces/motionWords.ts';
import type { Bar, BarId } from '../layout/model.ts';
import { showForce, showMoment, showMovement } from '../units/loads.ts';
import type { Finding } from './model.ts';
import { type FindingSubject, grouped, type Judged, judgedIn, marksInWords } from './subject.ts';

/** Movement along a bay, slack taken up, beyond height over this is worth a look. Common practice, no source. */
const DRIFT = 200;
/** λ̄ below which EN 1998-1, 6.7.3(1), will not let a crossed pair be counted on in tension only. From memory, sure. */
const STOCKY = 1.3;

export function actingFindings(subject: FindingSubject): readonly Finding[] {
  const { forces } = subject;
  if (!forces) return [];
  return [
    ...problemFindings(subject, forces),
    ...turningsLeftOut(subject),
    ...noWayFindings(subject, forces),
    ...subject.layout.bays.flatMap((bay) => {
      const all = judgedIn(subject, bay);
      return [
        ...bentBeams(subject, forces, all),
        ...squeezedByGravity(subject, forces, all),
        ...aloneAndSqueezed(subject, forces, all),
        ...stocky(subject, forces, all),
        ...partnerSlackWhenWanted(subject, forces, all),
        ...pretensionLost(subject, forces, all),
      ];
    }),
    ...driftFindings(subject, forces),
  ];
}

const blank = {
  crossing: null,
  breaksLimit: false,
  value: null,
  limit: null,
  quantity: 'none',
  path: null,
} as const;

function problemFindings(subject: FindingSubject, forces: Forces): readonly Finding[] {
  return forces.problems.map(({ path, what, todo }) => ({
    ...blank,
    id: `action:${path}`,
    kind: 'load on nothing' as const,
    severity: 'must fix' as const,
    breaksLimit: true,
    bay: subject.layout.bays[0]?.id ?? '',
    bars: [],
    title: 'A load acts on nothing',
    detail: `${what} ${todo} Until then it is left out.`,
    path,
  }));
}

function turningsLeftOut({ project, layout }: FindingSubject): readonly Finding[] {
  const inPart = project.actions ? turnedInPart(project.actions) : [];
  if (inPart.length === 0) return [];
  const names = inPart.map(({ id, name }) => name.trim() || id);
  return [
    {
      ...blank,
      id: 'turnings-left-out',
      kind: 'turnings left out',
      severity: 'look into',
      bay: layout.bays[0]?.id ?? '',
      bars: [],
      title: `Not every way of turning loads round is looked at in ${names.join(', ')}`,
      detail: `More than ${MOST_IN_EVERY_CHOICE} cases act either way there. All together, each by itself and all but each are turned round, and no other choice of them. Part the combination if others can be worse.`,
      path: 'actions.combinations',
    },
  ];
}

/** One for each motion: the same bays, with all states that find no way. */
function noWayFindings(subject: FindingSubject, forces: Forces): readonly Finding[] {
  const found = forces.states.flatMap((state) => state.noWay.map((noWay) => ({ state, noWay })));
  return grouped(found, ({ noWay }) => noWay.bays.join(' ')).flatMap((group): readonly Finding[] => {
    const [first] = group;
    if (!first) return [];
    const { state, noWay } = first;
    const reversed = group.every((each) => each.state.turned.length > 0) && carriesUnturned(forces, state);
    const bars = [...new Set(group.flatMap((each) => each.noWay.slackened))];
    const marks = bars.map((id) => subject.layout.bars.get(id)?.mark ?? id);
    return [
      {
        ...blank,
        id: `no-way:${noWay.bays.join('+')}`,
        kind: reversed ? 'reversed load not carried' : 'no way to carry a load',
        severity: 'must fix',
        breaksLimit: true,
        bay: noWay.bays[0] ?? '',
        bars,
        title: reversed
          ? `${noWay.bays.join(', ')} cannot carry the load turned round`
          : `${noWay.bays.join(', ')} cannot carry ${group.length > 1 ? `${group.length} combinations` : state.name}`,
        detail: `In ${state.name}: ${motionInWords(noWay, subject.layout)}.${
          marks.length > 0
            ? ` ${marks.join(' and ')} would have to push, and ${marks.length > 1 ? 'are' : 'is'} counted on in tension only.`
            : ''
        }`,
        value: group.length,
        limit: 0,
      },
    ];
  });
}

const carriesUnturned = (forces: Forces, state: ForceState): boolean =>
  forces.states.some(
    (other) =>
      other.combination === state.combination && other.turned.length === 0 && other.noWay.length === 0,
  );

/** Peaked and vee tiers in tension only: the beam between the diagonals bends. */
function bentBeams(subject: FindingSubject, forces: Forces, all: readonly Judged[]): readonly Finding[] {
  const units = subject.project.settings.units;
  const ties = all.filter(({ angle }) => angle.spec.countedOn === 'tension');
  return grouped(ties, ({ bar }) => panelOf(bar.key)).flatMap((group): readonly Finding[] => {
    const [first] = group;
    if (!first) return [];
    const panel = panelOf(first.bar.key);
    const beams = beamsPulledAt(subject, group);
    const worst = most(forces, (state) =>
      beams.reduce((greatest, { id }) => Math.max(greatest, state.moments.get(id) ?? 0), 0),
    );
    if (!worst || worst.value < 1e6) return [];
    return [
      {
        ...blank,
        id: `beam-bends:${first.bar.bay}/${panel}`,
        kind: 'beam bends under the pull',
        severity: 'must fix',
        bay: first.bar.bay,
        bars: group.map(({ bar }) => bar.id),
        title: `The beam between ${marksInWords(group)} bends by ${showMoment(worst.value, units)}`,
        detail: `In ${worst.state.name} one diagonal pulls and the other is slack, so the beam takes their pull in bending. Cross the tier, count the diagonals on in compression too, or have the beam checked for this moment.`,
        value: worst.value,
        limit: 0,
        quantity: 'none',
      },
    ];
  });
}

/** Beams and struts that run through a node at which one of the ties ends. */
function beamsPulledAt(subject: FindingSubject, ties: readonly Judged[]): readonly Bar[] {
  const bay = subject.layout.bays[subject.places.get(ties[0]?.bar.bay ?? '') ?? -1];
  const beams = (bay?.bars ?? [])
    .flatMap((id) => subject.layout.bars.get(id) ?? [])
    .filter(({ role }) => role === 'beam' || role === 'strut');
  const ends = new Set(ties.flatMap(({ bar }) => [bar.i, bar.j]));
  const through = [...ends].filter(
    (node) => beams.filter((beam) => beam.i === node || beam.j === node).length > 1,
  );
  return beams.filter((beam) => through.includes(beam.i) || through.includes(beam.j));
}

/** Both of a crossed pair slack, and both squeezed: the columns shorten under the load above. */
function squeezedByGravity(
  subject: FindingSubject,
  forces: Forces,
  all: readonly Judged[],
): readonly Finding[] {
  const units = subject.project.settings.units;
  return pairsOf(subject, all).flatMap(({ a, b, crossing }): readonly Finding[] => {
    const worst = most(forces, (state) =>
      Math.min(state.attracted.get(a.bar.id) ?? 0, state.attracted.get(b.bar.id) ?? 0),
    );
    if (!worst || worst.value < 1) return [];
    return [
      {
        ...blank,
        id: `gravity:${crossing}`,
        kind: 'both diagonals squeezed',
        severity: 'look into',
        bay: a.bar.bay,
        bars: [a.bar.id, b.bar.id],
        crossing,
        title: `${a.bar.mark} and ${b.bar.mark} are both squeezed as the columns shorten`,
        detail: `In ${worst.state.name} neither is pulled. Working both ways they would take ${showForce(worst.state.attracted.get(a.bar.id) ?? 0, units)} and ${showForce(worst.state.attracted.get(b.bar.id) ?? 0, units)}: fasten them after the columns have taken their load, or draw them tight.`,
        value: worst.value,
        limit: 0,
      },
    ];
  });
}

function aloneAndSqueezed(
  subject: FindingSubject,
  forces: Forces,
  all: readonly Judged[],
): readonly Finding[] {
  const units = subject.project.settings.units;
  const paired = new Set(pairsOf(subject, all).flatMap(({ a, b }) => [a.bar.id, b.bar.id]));
  const alone = all.filter(
    ({ bar, angle }) => angle.spec.countedOn === 'tension' && bar.role === 'diagonal' && !paired.has(bar.id),
  );
  return alone.flatMap((judged): readonly Finding[] => {
    const { bar } = judged;
    const worst = most(forces, (state) => state.attracted.get(bar.id) ?? 0);
    if (!worst || worst.value < 1) return [];
    return [
      {
        ...blank,
        id: `alone-squeezed:${bar.id}`,
        kind: 'squeezed with no partner',
        severity: 'look into',
        bay: bar.bay,
        bars: [bar.id],
        title: `${bar.mark} would be squeezed, and has no partner to pull instead`,
        detail: `In ${worst.state.name} it would take ${showForce(worst.value, units)} of compression. Counted on in tension only it hangs slack, and other bars and the bending of members carry the load.`,
        value: worst.value,
        limit: 0,
      },
    ];
  });
}

/** Bars so stocky that they carry what they attract: they do not go slack, whatever is assumed. Alike bars of a panel in one. */
function stocky(subject: FindingSubject, forces: Forces, all: readonly Judged[]): readonly Finding[] {
  const units = subject.project.settings.units;
  const found = all.flatMap((judged) => {
    const load = judged.bowing?.real.N ?? 0;
    const worst = most(forces, (state) => state.attracted.get(judged.bar.id) ?? 0);
    const tie = judged.angle.spec.countedOn === 'tension';
    return tie && worst && worst.value >= 1 && worst.value <= load ? [{ judged, load, worst }] : [];
  });
  return grouped(found, ({ judged }) => `${panelOf(judged.bar.key)} ${judged.angle.spec.section}`).flatMap(
    (group): readonly Finding[] => {
      const top = group.reduce((a, b) => (b.worst.value / b.load > a.worst.value / a.load ? b : a));
      const { judged, load, worst } = top;
      const relative = relativeSlenderness(judged, load);
      const marks = group.map((each) => each.judged);
      const plural = marks.length > 1;
      return [
        {
          ...blank,
          id: `stocky:${group[0]?.judged.bar.id ?? ''}`,
          kind: 'too stocky to go slack',
          severity: relative !== null && relative < STOCKY ? 'must fix' : 'note',
          bay: judged.bar.bay,
          bars: marks.map(({ bar }) => bar.id),
          title: `${marksInWords(marks)} will not go slack: ${plural ? 'they attract' : 'it attracts'} ${showForce(worst.value, units)} and ${plural ? 'bow' : 'bows'} only at ${showForce(load, units)}`,
          detail: `${judged.bar.mark} in ${worst.state.name}, working both ways, takes ${((100 * worst.value) / load).toFixed(0)} % of its critical load, so it stays straight and carries compression. Its ends and the columns must take that force, and its partner is pulled by as much less.${informationOn(subject, judged, relative)}`,
          value: worst.value / load,
          limit: 1,
          quantity: 'ratio',
        },
      ];
    },
  );
}

const panelOf = (key: string): string => key.slice(0, key.lastIndexOf('.'));

/** λ̄ = √(A f_y/N_cr); null where the steel is unknown. */
function relativeSlenderness({ checks, angle }: Judged, load: number): number | null {
  const squash = (checks?.steel?.fy ?? 0) * (angle.stock?.properties.area ?? 0);
  return squash > 0 ? Math.sqrt(squash / load) : null;
}

/** What two standards set as thresholds, beside the bar's own figures. */
function informationOn(subject: FindingSubject, { checks, bowing }: Judged, relative: number | null): string {
  if (relative === null || !checks?.steel) return '';
  const inelastic = 4.71 * Math.sqrt(subject.practice.steel.E / checks.steel.fy);
  const slenderness = bowing?.real.slenderness ?? 0;
  return ` For information (from memory, sure): λ̄ = ${relative.toFixed(2)}, ${relative < STOCKY ? 'below' : 'above'} the 1.3 of EN 1998-1, 6.7.3; π√(EA/N_cr) = ${slenderness.toFixed(0)} against 4.71√(E/F_y) = ${inelastic.toFixed(0)} of AISC 360, E3.`;
}

/** A bar squeezed in a combination in which the partner it leans on hangs slack. */
function partnerSlackWhenWanted(
  subject: FindingSubject,
  forces: Forces,
  all: readonly Judged[],
): readonly Finding[] {
  return all.flatMap(({ bar, bowing }): readonly Finding[] => {
    const partner = bowing?.partner;
    if (!bowing || !partner || partner.shareFrom.kind !== 'combination') return [];
    const { state: id } = partner.shareFrom;
    const state = forces.states.find((each) => each.id === id);
    if (!state?.slack.has(partner.bar) || bowing.real.N >= 0.9 * bowing.rigid.N) return [];
    const other = subject.layout.bars.get(partner.bar)?.mark ?? partner.bar;
    return [
      {
        ...blank,
        id: `partner-slack:${bar.id}`,
        kind: 'loses support when the partner goes slack',
        severity: 'look into',
        bay: bar.bay,
        bars: [bar.id],
        crossing: partner.crossing,
        title: `${bar.mark} is squeezed while ${other}, which holds it, is slack`,
        detail: `In ${state.name} ${other} hangs slack: ${bar.mark} keeps ${((100 * bowing.real.N) / bowing.rigid.N).toFixed(0)} % of the critical load that a rigid crossing would give it.`,
        value: bowing.real.N / bowing.rigid.N,
        limit: 0.9,
        quantity: 'ratio',
      },
    ];
  });
}

function pretensionLost(subject: FindingSubject, forces: Forces, all: readonly Judged[]): readonly Finding[] {
  const drawn = new Set(
    (subject.project.actions?.cases ?? []).flatMap(({ loads }) =>
      loads.flatMap((load) => (load.kind === 'shortened' && load.by > 0 ? [load.bar] : [])),
    ),
  );
  const lost = all.filter(({ bar }) => drawn.has(bar.id));
  return lost.flatMap(({ bar }): readonly Finding[] => {
    const states = forces.states.filter((state) => state.use === 'service' && state.slack.has(bar.id));
    const [first] = states;
    if (!first) return [];
    return [
      {
        ...blank,
        id: `pretension:${bar.id}`,
        kind: 'pretension lost',
        severity: 'look into',
        bay: bar.bay,
        bars: [bar.id],
        title: `${bar.mark} is drawn tight and goes slack in service`,
        detail: `In ${first.name}${states.length > 1 ? ` and ${states.length - 1} more` : ''} its pretension is used up. Draw it tighter, or count on its slack.`,
        value: states.length,
        limit: 0,
      },
    ];
  });
}

function driftFindings(subject: FindingSubject, forces: Forces): readonly Finding[] {
  const units = subject.project.settings.units;
  const found = forces.states.flatMap((state) =>
    state.drifts
      .filter((drift) => drift.withTakeUp !== null)
      .map((drift) => ({ state, drift, ratio: Math.abs(drift.withTakeUp ?? 0) / drift.height })),
  );
  return grouped(found, ({ drift }) => drift.bay).flatMap((all): readonly Finding[] => {
    const bay = all[0]?.drift.bay ?? '';
    const worst = all.reduce<(typeof all)[number] | null>(
      (top, each) => (top === null || each.ratio > top.ratio ? each : top),
      null,
    );
    if (!worst || worst.ratio <= 1 / DRIFT) return [];
    const { state, drift } = worst;
    return [
      {
        ...blank,
        id: `drift:${bay}`,
        kind: 'moves far before it works',
        severity: 'look into',
        bay,
        bars: [],
        title: `${bay} moves ${showMovement(Math.abs(drift.withTakeUp ?? 0), units)} at ${drift.level}, height/${Math.round(1 / worst.ratio)}`,
        detail: `In ${state.name}: ${showMovement(Math.abs(drift.elastic), units)} elastic, the rest until bolts bear and sagging bars are straight. Over height/${DRIFT} (common practice, no source). Draw the bars tight, or use fitted or preloaded bolts.`,
        value: worst.ratio,
        limit: 1 / DRIFT,
      },
    ];
  });
}

interface Pair {
  readonly a: Judged;
  readonly b: Judged;
  readonly crossing: string;
}

function pairsOf(subject: FindingSubject, all: readonly Judged[]): readonly Pair[] {
  const byId = new Map<BarId, Judged>(all.map((judged) => [judged.bar.id, judged]));
  const bay = subject.layout.bays[subject.places.get(all[0]?.bar.bay ?? '') ?? -1];
  return (bay?.crossings ?? []).flatMap((id) => {
    const crossing = subject.layout.crossings.get(id);
    if (!crossing) return [];
    const [a, b] = [byId.get(crossing.a), byId.get(crossing.b)];
    return crossing.kind === 'diagonals' && a && b ? [{ a, b, crossing: crossing.id }] : [];
  });
}

/** The strength state in which something is greatest. */
function most(
  forces: Forces,
  of: (state: ForceState) => number,
): { readonly state: ForceState; readonly value: number } | null {
  let found: { state: ForceState; value: number } | null = null;
  for (const state of forces.states) {
    if (state.use !== 'strength') continue;
    const value = of(state);
    if (found === null || value > found.value) found = { state, value };
  }
  return found;
}
