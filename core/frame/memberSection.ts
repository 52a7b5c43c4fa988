import type { Member } from '../project/model.ts';
import { memberPlates } from './memberPlates.ts';

/** Of a member given by its outside size only: second moments in mm⁴, area in mm². */
export interface MemberSection {
  readonly area: number;
  /** Against motion along its depth. */
  readonly Imajor: number;
  /** Against motion along its width. */
  readonly Iminor: number;
  readonly J: number;
}

/** Stiffness of a member. */
export function memberSection(member: Member): MemberSection {
  const { depth: h, width: b } = member;
  const { flange, web } = memberPlates(member);
  switch (member.shape) {
    case 'I':
    case 'channel':
    case 'zed':
      return flanged(h, b, flange, web);
    case 'tube': {
      const t = web;
      const box = (x: number, y: number) => (x * y ** 3 - (x - 2 * t) * (y - 2 * t) ** 3) / 12;
      const around = 2 * (h + b - 2 * t);
      const enclosed = (h - t) * (b - t);
      return { area: around * t, Imajor: box(b, h), Iminor: box(h, b), J: (4 * enclosed ** 2 * t) / around };
    }
    default:
      return member.shape satisfies never;
  }
}

function flanged(h: number, b: number, tf: number, tw: number): MemberSection {
  const web = h - 2 * tf;
  return {
    area: 2 * b * tf + web * tw,
    Imajor: (b * h ** 3 - (b - tw) * web ** 3) / 12,
    Iminor: (2 * tf * b ** 3 + web * tw ** 3) / 12,
    J: (2 * b * tf ** 3 + web * tw ** 3) / 3,
  };
}
