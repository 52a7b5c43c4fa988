import type { DiagonalSpec, Settings } from '../project/model.ts';
import type { LimitInForce, MemberClass, Practice } from './model.ts';

/** L/r taken where a practice gives no limit and the user set none (common practice for ties). */
export const DEFAULT_LIMIT = 300;

/**
 * The limit on L/r for a bar: the user's own when set, else the practice's for the class of member, else 300.
 * An own limit counts for bars in tension and in compression alike. A class that does not exist for how the bar is counted on
 * (IS 800 "always in tension" for a bar in compression) gives way to the first one that does.
 */
export function limitInForce(
  practice: Practice,
  settings: Pick<Settings, 'memberClass' | 'ownLimit'>,
  countedOn: DiagonalSpec['countedOn'],
): LimitInForce {
  const member = classInForce(practice, settings.memberClass, countedOn);
  const said = { clause: member.clause, confidence: member.confidence, className: member.name };
  if (member.limit === null || practice.standing === 'none')
    return {
      ...said,
      limit: settings.ownLimit ?? DEFAULT_LIMIT,
      source: 'own limit, practice gives none',
      standing: 'own',
    };
  if (settings.ownLimit !== null)
    return { ...said, limit: settings.ownLimit, source: 'own limit', standing: 'own' };
  return { ...said, limit: member.limit, source: 'practice', standing: practice.standing };
}

/** The class of member that applies: the chosen one where it exists, else the practice's first. */
export function classInForce(
  practice: Practice,
  chosen: string | null,
  countedOn: DiagonalSpec['countedOn'],
): MemberClass {
  const classes = countedOn === 'tension' ? practice.tension : practice.compression;
  const member = classes.find(({ id }) => id === chosen) ?? classes[0];
  if (!member)
    throw new Error(`practice ${practice.id} has no class of member for bars counted on in ${countedOn}`);
  return member;
}
