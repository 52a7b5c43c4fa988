/** What the figures of a report stand on, stated so that a checker can agree or not. */
import type { Assessment } from '../../assessment.ts';
import type { LimitInForce, Practice } from '../../practice/model.ts';
import { endFixityOf } from '../../project/endFixity.ts';
import { endsHoldOf, endsMarkedFree } from '../../restraint/endWords.ts';
import { showSlenderness } from '../../units/quantity.ts';
import { CATALOGUE_NAMES } from '../words.ts';

/** Of the whole project: limits with their clauses, the rules that are taken everywhere, and every holder that the user vouches for. */
export function projectAssumptions(assessment: Assessment): readonly string[] {
  const { project, practice } = assessment;
  const { settings } = project;
  const limits = new Map([...assessment.diagonals.values()].map(({ limit }) => [limitKey(limit), limit]));
  return [
    ...[...limits.values()].map((limit) => limitWords(limit, practice)),
    askedWords(practice),
    settings.lengthBasis === 'set-out'
      ? 'Unbraced lengths run between set-out points.'
      : 'Unbraced lengths run between the centres of the end connections.',
    endsWords(assessment),
    'No load but their own weight acts on the bars between their stations.',
    ...(assessment.forces === null ? [] : FORCES),
    'Every mark on the drawing is built as it stands there, bolts in place and tight, before the bar is relied on.',
    `Sections are of ${CATALOGUE_NAMES[settings.catalogue]}${project.ownStock.length > 0 ? `, and of the project's own list (${project.ownStock.length} sizes)` : ''}.`,
    ...vouchedLines(assessment),
    ...vouchedPoints(assessment),
  ];
}

/** What forces rest on. */
const FORCES: readonly string[] = [
  'Bars are straight lines between set-out points; members that run through a node bend there in the plane of their bay, and feet are hinged.',
  'Bays that share nodes carry together. The rest of the building holds, square to its bays, what they do not; frames keep the eaves of a roof from spreading, and keep the roof from turning in plan only where it stands on one braced line alone.',
];

function limitKey({ limit, source, clause, className }: LimitInForce): string {
  return [limit, source, clause, className].join('|');
}

export function limitWords(limit: LimitInForce, practice: Practice): string {
  const figure = showSlenderness(limit.limit);
  switch (limit.source) {
    case 'practice': {
      const standing = limit.standing === 'advice' ? 'advises' : 'asks';
      return `${practice.name} ${practice.edition} ${standing} L/r ≤ ${figure} (${lowered(limit.className)}), ${limit.clause} (${limit.confidence}).`;
    }
    case 'own limit':
      return `L/r ≤ ${figure}, a limit of the project's own in place of that of ${practice.name}.`;
    case 'own limit, practice gives none':
      return `L/r ≤ ${figure}, a limit of the project's own: ${practice.name} gives none (${limit.confidence}).`;
    default:
      return limit.source satisfies never;
  }
}

function endsWords({ project, layout }: Assessment): string {
  const marked = [...layout.bars.values()].some(
    ({ angle }) => angle !== null && endsMarkedFree({ endsHold: endsHoldOf(angle) }).length > 0,
  );
  const hold = `The end connections hold every way${marked ? ', but where they are marked otherwise' : ''}`;
  return endFixityOf(project.settings).outOfPlane === 'stiff'
    ? `${hold}; unbraced lengths count on no fixity of them, critical loads take them as stiff out of the plane, as the project says.`
    : `${hold}; no fixity of them is counted on.`;
}

function lowered(text: string): string {
  return text.charAt(0).toLowerCase() + text.slice(1);
}

function askedWords(practice: Practice): string {
  return practice.asks === 'inService'
    ? `${practice.name} is read as asking for the slenderness in service; that of handling is for note.`
    : `${practice.name} is read as asking for the slenderness in handling, over the whole length and the least radius; that in service is for note.`;
}

function vouchedLines({ layout }: Assessment): readonly string[] {
  return [...layout.bars.values()].flatMap((bar) =>
    bar.line?.heldBy.kind === 'vouched'
      ? [`${bar.bay}: ${bar.mark} is held along itself, as vouched for: “${bar.line.heldBy.reason}”.`]
      : [],
  );
}

/** One statement for each bay, with its vouched points by name. */
function vouchedPoints({ layout }: Assessment): readonly string[] {
  return layout.bays.flatMap((bay) => {
    const labels = bay.nodes.flatMap((id) => {
      const node = layout.nodes.get(id);
      return node?.supports[bay.id]?.kind === 'vouched' ? [node.label] : [];
    });
    return labels.length > 0 ? [`${bay.id}: held in place by what is not drawn: ${labels.join('; ')}.`] : [];
  });
}
