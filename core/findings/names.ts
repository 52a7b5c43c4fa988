import type { BayLayout } from '../layout/model.ts';
import type { Bay, Line } from '../project/model.ts';
import type { Finding } from './model.ts';
import { bayPath, type FindingSubject } from './subject.ts';

/** An entry of the file that says nothing: where it is, what it names, and what it is taken for. */
interface Idle {
  readonly path: string;
  readonly what: string;
  /** Whether another figure is taken in its place, so that it is more than a note. */
  readonly changesFigures?: boolean;
}

/**
 * Entries that name what is not there: marks of bars and crossings left from another pattern, lines held by a bay that is gone or by their
 * own, a bar to be cut that does not cross, a class of member that the practice does not have. One finding a bay: a note, but for the class,
 * which decides the limits of all.
 */
export function nameFindings(subject: FindingSubject): readonly Finding[] {
  return subject.layout.bays.flatMap((layout, index) => {
    const bay = subject.project.bays[subject.places.get(layout.id) ?? -1];
    if (!bay) return [];
    const path = bayPath(subject, bay.id);
    const idle = [
      ...(index === 0 ? unknownClass(subject) : []),
      ...idleMarks(subject, bay, layout, path),
      ...idleHolders(subject, bay, path),
    ];
    return idle.length === 0 ? [] : [finding(bay.id, idle)];
  });
}

function finding(bay: string, idle: readonly Idle[]): Finding {
  const [first] = idle;
  return {
    id: `idle-names:${bay}`,
    kind: 'names what is not there',
    severity: idle.some(({ changesFigures = false }) => changesFigures) ? 'look into' : 'note',
    breaksLimit: false,
    bay,
    bars: [],
    crossing: null,
    title:
      idle.length === 1
        ? `An entry of ${bay} names what is not there`
        : `${idle.length} entries of ${bay} name what is not there`,
    detail: `${idle.map(({ path, what }) => `${path}: ${what}`).join('; ')}. Nothing is taken from ${idle.length === 1 ? 'it' : 'them'}: take ${idle.length === 1 ? 'it' : 'them'} out, or correct the name.`,
    value: null,
    limit: null,
    quantity: 'none',
    path: first?.path ?? null,
  };
}

function unknownClass({ project, practice }: FindingSubject): readonly Idle[] {
  const { memberClass } = project.settings;
  const known = [...practice.tension, ...practice.compression].some(({ id }) => id === memberClass);
  return memberClass === null || known
    ? []
    : [
        {
          path: 'settings.memberClass',
          what: `${practice.name} has no class of member “${memberClass}”, and its first is taken`,
          changesFigures: true,
        },
      ];
}

function idleMarks(
  { layout: all }: FindingSubject,
  bay: Bay,
  layout: BayLayout,
  path: string,
): readonly Idle[] {
  const diagonals = new Set<string>(layout.diagonals);
  const crossing = (key: string) => all.crossings.get(`${bay.id}/${key}`);
  const bars = Object.keys(bay.bars)
    .filter((key) => !diagonals.has(`${bay.id}/${key}`))
    .map((key) => ({ path: `${path}.bars.${key}`, what: 'there is no such diagonal' }));
  const joins = Object.entries(bay.joins).flatMap(([key, join]): readonly Idle[] => {
    const at = `${path}.joins.${key}`;
    const found = crossing(key);
    if (!found) return [{ path: at, what: 'there is no such crossing' }];
    if (found.join !== null) return [];
    return join.kind === 'cut' && found.choices.includes('cut')
      ? [{ path: `${at}.cutBar`, what: `“${join.cutBar}” does not cross there` }]
      : [{ path: at, what: `what crosses there cannot be joined as “${join.kind}”` }];
  });
  const shares = Object.keys(bay.tensionShares ?? {})
    .filter((key) => !crossing(key))
    .map((key) => ({ path: `${path}.tensionShares.${key}`, what: 'there is no such crossing' }));
  return [...bars, ...joins, ...shares];
}

function idleHolders({ project }: FindingSubject, bay: Bay, path: string): readonly Idle[] {
  return linesOf(bay).flatMap(({ line, at }): readonly Idle[] => {
    if (line.heldBy.kind !== 'bay') return [];
    const holder = line.heldBy.bay;
    const where = `${path}.recipe.${at}.heldBy.bay`;
    if (holder === bay.id)
      return [{ path: where, what: `${line.id} is said to be held by the bay that it is to hold` }];
    return project.bays.some(({ id }) => id === holder)
      ? []
      : [{ path: where, what: `${line.id} is said to be held by ${holder}, and there is no such bay` }];
  });
}

function linesOf({ recipe }: Bay): readonly { readonly line: Line; readonly at: string }[] {
  switch (recipe.kind) {
    case 'wall':
      return recipe.lines.map((line, index) => ({ line, at: `lines[${index}]` }));
    case 'roof':
      return recipe.slopes.flatMap(({ lines }, slope) =>
        lines.map((line, index) => ({ line, at: `slopes[${slope}].lines[${index}]` })),
      );
    case 'knee':
    case 'free':
      return [];
    default:
      return recipe satisfies never;
  }
}
