import type { Member } from '../project/model.ts';

/** Thicknesses of what a member is made of, mm; of a tube or zed both are its wall. */
export interface MemberPlates {
  readonly flange: number;
  readonly web: number;
  /** One of them is not given, and taken. */
  readonly assumed: boolean;
}

/**
 * Thicknesses as given; what is not given is taken: flange depth/25, web depth/40, wall of a tube depth/25, none of these below 3, 3 and 2 mm; of a zed 2 mm.
 * Common practice, no source: ordinary light sections lie near these. Shown as an assumption wherever a figure rests on it.
 */
export function memberPlates(member: Member): MemberPlates {
  const { depth, shape, web, flange } = member;
  switch (shape) {
    case 'I':
    case 'channel':
      return {
        flange: flange ?? Math.max(3, depth / 25),
        web: web ?? Math.max(3, depth / 40),
        assumed: flange === undefined || web === undefined,
      };
    case 'zed': {
      const wall = web ?? 2;
      return { flange: wall, web: wall, assumed: web === undefined };
    }
    case 'tube': {
      const wall = web ?? Math.max(2, depth / 25);
      return { flange: wall, web: wall, assumed: web === undefined };
    }
    default:
      return shape satisfies never;
  }
}
