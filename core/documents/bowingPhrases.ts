/** Half sentences of what a push against a bar meets: "meets D1 end-on", "meets only D1's bending and swings". */
import type { Claim, HoldReason } from '../restraint/model.ts';
import { listed } from './listed.ts';

export type NameOf = (holder: string) => string;

/** "meets D1 end-on": what stops the push, each kind of reason once with all its names. */
export function whyItStays(claims: readonly Claim[], nameOf: NameOf): string {
  return phrases(claims, nameOf, (reason, names) => {
    switch (reason.kind) {
      case 'partner end-on':
        return `meets ${names} end-on`;
      case 'line held along itself':
        return `meets ${names}, which cannot move along itself,`;
      case 'line stiff across':
        return `meets ${names}, stiff across,`;
      case 'bar ends here':
        return `meets ${names}, which ends on it,`;
      default:
        return `is held at ${names}`;
    }
  });
}

/** "meets only D1's bending and swings": why the push is not stopped. What crosses it comes first, what it hangs from last. */
export function whyItSwings(claims: readonly Claim[], nameOf: NameOf): string {
  const partnersFirst = [...claims].sort((one, other) => Number(!isPartner(one)) - Number(!isPartner(other)));
  const said = phrases(partnersFirst, nameOf, (reason, names) => {
    switch (reason.kind) {
      case 'partner only bends':
        return `meets only ${possessive(names)} bending`;
      case 'partner half free':
        return `meets ${names}, half of which reaches nothing held`;
      case 'single plate hinges':
        return `finds at ${names} only a plate, which is a hinge`;
      case 'not joined':
        return reason.marked
          ? `is not joined to ${names}`
          : `has ${unmarkedCrossings(names)}, taken as not joined`;
      case 'too far apart':
        return `lies too far from ${names} to be joined`;
      case 'hung':
        return `only hangs from ${names}`;
      case 'line free along itself':
        return `only moves ${names} along with it`;
      case 'line end free':
        return `meets ${names}, an end of which is free`;
      case 'bar ends here, itself free':
        return `meets ${names}, itself free`;
      case 'nearly along the bar':
        return `finds ${names} within 10° of its own line`;
      default:
        return `is not held at ${names}`;
    }
  });
  return claims.every(({ reason }) => reason.kind === 'partner only bends') ? `${said} and swings` : said;
}

function isPartner({ reason }: Claim): boolean {
  return reason.kind.startsWith('partner') || reason.kind === 'single plate hinges';
}

function unmarkedCrossings(names: string): string {
  return names.includes(' and ') ? `unmarked crossings with ${names}` : `an unmarked crossing with ${names}`;
}

/** "D1's", and "D1 and D3's" for several: they are told apart by the marks. */
function possessive(names: string): string {
  return `${names}'s`;
}

function phrases(
  claims: readonly Claim[],
  nameOf: NameOf,
  say: (reason: HoldReason, names: string) => string,
): string {
  const byPhrase = new Map<string, { readonly reason: HoldReason; readonly names: string[] }>();
  for (const { reason } of claims) {
    const key = reason.kind === 'not joined' ? `${reason.kind} ${reason.marked}` : reason.kind;
    const group = byPhrase.get(key) ?? { reason, names: [] };
    group.names.push(nameOf(holderNamed(reason)));
    byPhrase.set(key, group);
  }
  return listed([...byPhrase.values()].map(({ reason, names }) => say(reason, listed(names))));
}

function holderNamed(reason: HoldReason): string {
  switch (reason.kind) {
    case 'end':
    case 'end marked free':
      return 'the end';
    case 'partner end-on':
    case 'partner half free':
    case 'partner only bends':
    case 'single plate hinges':
    case 'not joined':
    case 'too far apart':
      return reason.partner;
    case 'hung':
    case 'line held along itself':
    case 'line free along itself':
    case 'line stiff across':
    case 'line end free':
    case 'twist held':
      return reason.line;
    case 'bar ends here':
    case 'bar ends here, itself free':
      return reason.bar;
    case 'nearly along the bar':
      return reason.holder;
    default:
      return reason satisfies never;
  }
}
