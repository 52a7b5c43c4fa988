import { mostBetween } from '../layout/crossings.ts';
import type { Crossing } from '../layout/model.ts';
import { showLength } from '../units/quantity.ts';
import type { Finding } from './model.ts';
import { bayPath, type FindingSubject } from './subject.ts';

/** A gap or a difference smaller than this closes by itself, mm (common practice, no source). */
const CLOSES = 2;

/** Crossings that are unmarked, bars that cannot pass each other, packers that do not fit. */
export function crossingFindings(subject: FindingSubject): readonly Finding[] {
  return subject.layout.bays.flatMap((bay) => {
    const crossings = bay.crossings.flatMap((id) => subject.layout.crossings.get(id) ?? []);
    const each = crossings.flatMap((crossing) => findingsAt(subject, crossing));
    const unmarkedLines = crossings.filter(
      (crossing) => crossing.kind !== 'diagonals' && crossing.join === null,
    );
    return unmarkedLines.length > 0 ? [...each, unmarkedLinesFinding(subject, bay.id, unmarkedLines)] : each;
  });
}

function findingsAt(subject: FindingSubject, crossing: Crossing): readonly Finding[] {
  const found: Finding[] = [];
  const name = nameOf(subject, crossing);
  const units = subject.project.settings.units;
  const base = {
    bay: crossing.bay,
    bars: [crossing.a, crossing.b],
    crossing: crossing.id,
    breaksLimit: false,
    path: `${bayPath(subject, crossing.bay)}.joins.${crossing.key}`,
  } as const;
  if (crossing.tooFarApart && isJoinMarked(crossing)) {
    const most = mostBetween(crossing.kind);
    found.push({
      ...base,
      id: `apart:${crossing.id}`,
      kind: 'too far apart to join',
      severity: 'look into',
      title: `${name} lie too far apart to be joined`,
      detail: `There are ${showLength(crossing.gap, units, 'small')} between them, and no ${crossing.kind === 'diagonals' ? 'join of two diagonals' : 'cleat'} is taken to span more than ${showLength(most, units, 'small')} (common practice), so nothing is taken from the mark. Bring the bars nearer, or say that there is no join.`,
      value: crossing.gap,
      limit: most,
      quantity: 'length',
    });
  }
  if (crossing.kind !== 'diagonals') return found;
  if (crossing.join === null)
    found.push({
      ...base,
      id: `unmarked:${crossing.id}`,
      kind: 'crossing unmarked',
      severity: 'look into',
      title: `${name} is unmarked`,
      detail:
        'Nothing says how the two diagonals meet, so they are taken as not joined. Mark the join, or say that there is none.',
      value: null,
      limit: null,
      quantity: 'none',
    });
  if (crossing.clash)
    found.push({
      ...base,
      id: `clash:${crossing.id}`,
      kind: 'clash',
      severity: 'must fix',
      title: `${name} clash`,
      detail: `${whereTheyLie(subject, crossing)} and run through each other by ${showLength(-crossing.gap, units, 'small')}. Put one on the other side of the gusset or farther away, or cut one and plate it.`,
      value: -crossing.gap,
      limit: 0,
      quantity: 'length',
    });
  const fit = packerFit(subject, crossing);
  if (fit)
    found.push({ ...base, id: `packer:${crossing.id}`, kind: 'packer differs', severity: 'note', ...fit });
  return found;
}

function whereTheyLie({ layout }: FindingSubject, { a, b }: Crossing): string {
  const side = (id: string) => layout.bars.get(id)?.angle?.side;
  return side(a) === side(b) ? 'Both lie on one side of the gusset' : 'They lie too near each other';
}

const isJoinMarked = ({ join }: Crossing): boolean =>
  join !== null && join.kind !== 'none' && join.kind !== 'hung';

function packerFit(
  subject: FindingSubject,
  crossing: Crossing,
): Pick<Finding, 'title' | 'detail' | 'value' | 'limit' | 'quantity'> | null {
  const { join, gap } = crossing;
  if (crossing.clash || crossing.tooFarApart || gap < 0) return null;
  const units = subject.project.settings.units;
  const name = nameOf(subject, crossing);
  if (join?.kind === 'bolted' && gap > CLOSES)
    return {
      title: `${name} lie ${showLength(gap, units, 'small')} apart where they are bolted`,
      detail: `The gusset leaves ${showLength(gap, units, 'small')} between the legs here. Bolting through closes it by bending them; a packer of that thickness does not.`,
      value: gap,
      limit: 0,
      quantity: 'length',
    };
  if (join?.kind === 'packed' && join.packer !== null && Math.abs(join.packer - gap) > CLOSES)
    return {
      title: `The packer at ${name} does not fill the gap`,
      detail: `The packer is ${showLength(join.packer, units, 'small')}; the legs lie ${showLength(gap, units, 'small')} apart.`,
      value: join.packer,
      limit: gap,
      quantity: 'length',
    };
  return null;
}

function unmarkedLinesFinding(subject: FindingSubject, bay: string, crossings: readonly Crossing[]): Finding {
  const many = crossings.length > 1;
  const lines = crossings.filter(({ kind }) => kind === 'line').length;
  const passed =
    lines === crossings.length
      ? { title: 'purlins or rails', one: 'one purlin or rail', more: 'purlins or rails' }
      : lines === 0
        ? { title: 'struts or other members', one: 'one member', more: 'struts or other members' }
        : { title: 'purlins, rails and members', one: '', more: 'purlins, rails and members' };
  return {
    id: `unmarked-lines:${bay}`,
    kind: 'crossing unmarked',
    severity: 'note',
    breaksLimit: false,
    bay,
    bars: [...new Set(crossings.map((crossing) => crossing.a))],
    crossing: crossings[0]?.id ?? null,
    title: `${crossings.length} ${many ? 'crossings' : 'crossing'} with ${passed.title} ${many ? 'are' : 'is'} unmarked`,
    detail: `In ${bay} the diagonals pass ${many ? passed.more : passed.one} without a mark; nothing is taken from them.`,
    value: crossings.length,
    limit: null,
    quantity: 'none',
    path: `${bayPath(subject, bay)}.joins`,
  };
}

function nameOf(subject: FindingSubject, crossing: Crossing): string {
  const mark = (id: string) => subject.layout.bars.get(id)?.mark ?? id;
  return `${mark(crossing.a)} × ${mark(crossing.b)}`;
}
