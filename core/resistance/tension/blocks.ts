/** Blocks that may tear out of an end. Practice-facts C; the blocks of two rows as a published example has them. */
import { deductedWidth } from '../holes.ts';
import type { ResistingEnd, TensionQuestion } from '../model.ts';
import type { Working } from '../working.ts';
import { type BoltRow, pliesOf, rowsOf } from './boltRows.ts';

/** Areas along which a block parts from the bar: across the force in tension, along it in shear. mm². */
export interface Block {
  readonly name: string;
  readonly netTension: number;
  readonly grossTension: number;
  readonly netShear: number;
  readonly grossShear: number;
  /** Pulled through its middle, so that tension is even over it. */
  readonly even: boolean;
}

/** A line along which it parts: length and the holes in it. mm. */
interface Cut {
  readonly length: number;
  readonly holes: number;
  /** s²/(4g) of slanting stretches. */
  readonly slant: number;
}

/**
 * Every block that the bolts could tear out with them, or a sentence that says why none is worked out.
 * Of one row in a leg: along it and out to the toe. Of two: along the first and out to the toe, or along both and across between them.
 */
export function blocksOf(question: TensionQuestion, end: ResistingEnd): readonly Block[] | string {
  const { section, practice, options } = question;
  const { shape } = section;
  if (shape !== 'angle' && shape !== 'angles back to back' && shape !== 'starred angles' && shape !== 'flat')
    return `no block is worked out for a ${shape}`;
  const d = deductedWidth(practice, end, options.punchedHoles).width;
  const t = section.thickness * pliesOf(section);
  const rows = rowsOf(end, section);
  const [first, second] = rows;
  if (!first) return 'no bolts';
  if (Math.min(end.edgeDistance, end.gauge) <= end.hole / 2) return 'a hole breaks its edge';

  const along = ({ start, bolts }: BoltRow): Cut => ({
    length: start + (bolts - 1) * end.pitch,
    holes: bolts - 0.5,
    slant: 0,
  });
  const outward = (length: number, holes: number, slant = 0): Cut => ({ length, holes, slant });
  const block = (name: string, tension: readonly Cut[], shear: readonly Cut[], even: boolean): Block => ({
    name,
    netTension: t * total(tension, ({ length, holes, slant }) => length - holes * d + slant),
    grossTension: t * total(tension, ({ length }) => length),
    netShear: t * total(shear, ({ length, holes }) => length - holes * d),
    grossShear: t * total(shear, ({ length }) => length),
    even,
  });

  if (end.legs === 'both' && shape !== 'flat') {
    if (end.rows === 2 || !second) return 'two rows in each of two legs, or a leg without bolts';
    const toToe = outward(end.edgeDistance, 0.5);
    const toOtherToe = outward(section.outstandingLeg - end.gauge, 0.5);
    return [
      block('along both rows and out to both toes', [toToe, toOtherToe], [along(first), along(second)], true),
      block(
        'along both rows and around the heel',
        [outward(first.across - second.across, 1)],
        [along(first), along(second)],
        true,
      ),
    ];
  }

  const farEdge = end.edgeDistance + (second ? second.across - first.across : 0);
  const oneSided =
    shape === 'flat'
      ? [
          ...(second
            ? []
            : [
                block(
                  'along the row and out to the first edge',
                  [outward(end.gauge, 0.5)],
                  [along(first)],
                  false,
                ),
              ]),
        ]
      : [];
  if (!second) {
    const toe = shape === 'flat' ? 'the far edge' : 'the toe';
    return [
      ...oneSided,
      block(`along the row and out to ${toe}`, [outward(farEdge, 0.5)], [along(first)], false),
    ];
  }
  const g = second.across - first.across;
  // The last bolts of the two rows stand half a pitch apart where they are staggered, whichever row is the longer.
  const s = lastOf(first, end.pitch) - lastOf(second, end.pitch);
  const slant = g > 0 ? (s * s) / (4 * g) : 0;
  return [
    block(
      shape === 'flat'
        ? 'along the first row and out to the far edge'
        : 'along the first row and out to the toe',
      [outward(farEdge, 1.5, slant)],
      [along(first)],
      false,
    ),
    ...(shape === 'flat'
      ? [
          block(
            'along the second row and out to the first edge',
            [outward(end.gauge + g, 1.5, slant)],
            [along(second)],
            false,
          ),
        ]
      : []),
    block(
      'along both rows and across between them',
      [outward(g, 1, slant)],
      [along(first), along(second)],
      shape === 'flat',
    ),
  ];
}

const lastOf = ({ start, bolts }: BoltRow, pitch: number): number => start + (bolts - 1) * pitch;

const total = (cuts: readonly Cut[], of: (cut: Cut) => number): number =>
  cuts.reduce((sum, cut) => sum + Math.max(0, of(cut)), 0);

/**
 * The block that resists least, with its areas told; null where none is worked out, which is told as a condition.
 *
 * @param strength design resistance of a block, N
 */
export function weakestBlock(
  blocks: readonly Block[] | string,
  strength: (block: Block) => number,
  working: Working,
): Block | null {
  if (typeof blocks === 'string') {
    working.requires('a block that is worked out here: bolts inside one leg, both, or a flat', false, blocks);
    return null;
  }
  const [first, ...rest] = blocks;
  if (!first) return null;
  const weakest = rest.reduce((least, each) => (strength(each) < strength(least) ? each : least), first);
  const where = `${weakest.name}${rest.length > 0 ? `: the least of ${blocks.length}` : ''}`;
  working.step('net area in tension', 'A_nt', `${where}; holes out`, weakest.netTension, 'area');
  working.step('gross area in tension', 'A_gt', where, weakest.grossTension, 'area');
  working.step('net area in shear', 'A_nv', `${where}; holes out`, weakest.netShear, 'area');
  working.step('gross area in shear', 'A_gv', where, weakest.grossShear, 'area');
  return weakest;
}
