/** A bay drawn freely in a plane of its own, so that it can be put anywhere in space: places are [along, up] in the plane, mm. */
import fc from 'fast-check';
import type { Vec3 } from '../../../core/geometry/vector.ts';
import type { BarMark, Bay, FreeBar, Join } from '../../../core/project/model.ts';
import { bay } from '../../unit/assess/given/bays.ts';

export interface PlanarBay {
  readonly places: readonly (readonly [number, number])[];
  readonly supports: readonly boolean[];
  readonly bars: readonly FreeBar[];
  readonly joins: Readonly<Record<string, Join>>;
  readonly marks: Readonly<Record<string, BarMark>>;
  readonly legInPlane: 'longer' | 'shorter';
  readonly section: string;
}

/** Where the plane stands: unit vectors along, up, and towards the near side. */
export interface Frame {
  readonly origin: Vec3;
  readonly right: Vec3;
  readonly up: Vec3;
  readonly normal: Vec3;
}

export const UPRIGHT: Frame = { origin: [0, 0, 0], right: [1, 0, 0], up: [0, 0, 1], normal: [0, -1, 0] };

const NODES = 8;
const step = fc.integer({ min: -7, max: 7 }).map((k) => k * 700);

export const planarBay: fc.Arbitrary<PlanarBay> = fc
  .record({
    places: fc.uniqueArray(fc.tuple(step, step), {
      minLength: NODES,
      maxLength: NODES,
      selector: ([a, b]) => `${a},${b}`,
    }),
    supports: fc.array(fc.boolean(), { minLength: NODES, maxLength: NODES }),
    ends: fc.uniqueArray(
      fc
        .tuple(fc.nat({ max: NODES - 1 }), fc.nat({ max: NODES - 1 }))
        .filter(([from, to]) => from !== to)
        .map(([from, to]): readonly [number, number] => [from, to]),
      { minLength: 2, maxLength: 7, selector: ([from, to]) => `${Math.min(from, to)},${Math.max(from, to)}` },
    ),
    roles: fc.array(fc.constantFrom<FreeBar['role']>('diagonal', 'diagonal', 'diagonal', 'tie', 'beam'), {
      minLength: 7,
      maxLength: 7,
    }),
    joins: fc.array(fc.constantFrom<Join['kind'] | null>('bolted', 'bolted', 'cut', 'purlin', 'none', null), {
      minLength: 21,
      maxLength: 21,
    }),
    setBacks: fc.array(fc.constantFrom(null, 60, 200), { minLength: 7, maxLength: 7 }),
    legInPlane: fc.constantFrom('longer', 'shorter'),
    section: fc.constantFrom('70x70x6', '125x75x8', '80x60x7'),
  })
  .map(({ places, supports, ends, roles, joins, setBacks, legInPlane, section }): PlanarBay => {
    const bars = ends.map(
      ([from, to], k): FreeBar => ({
        id: `b${k}`,
        from: `n${from}`,
        to: `n${to}`,
        role: roles[k] ?? 'diagonal',
        member: null,
      }),
    );
    const pairs = bars.flatMap((one, k) => bars.slice(k + 1).map((other) => [one.id, other.id] as const));
    const marked = pairs.flatMap(([one, other], k): readonly (readonly [string, Join])[] => {
      const kind = joins[k];
      if (!kind) return [];
      const key = [one, other].sort().join('+');
      return [
        [
          key,
          kind === 'cut'
            ? { kind, cutBar: other }
            : kind === 'purlin'
              ? { kind, boltsAcross: 1 }
              : ({ kind } as Join),
        ],
      ];
    });
    const marks = bars.flatMap((each, k): readonly (readonly [string, BarMark])[] => {
      const setBack = setBacks[k];
      return setBack ? [[each.id, { endI: { setBack } }]] : [];
    });
    return {
      places,
      supports,
      bars,
      joins: Object.fromEntries(marked),
      marks: Object.fromEntries(marks),
      legInPlane,
      section,
    };
  });

const at = ({ origin, right, up }: Frame, [a, b]: readonly [number, number]): Vec3 => [
  origin[0] + a * right[0] + b * up[0],
  origin[1] + a * right[1] + b * up[1],
  origin[2] + a * right[2] + b * up[2],
];

/** The bay in space. */
export function inSpace(planar: PlanarBay, frame: Frame): Bay {
  return bay(
    {
      kind: 'free',
      nodes: planar.places.map((place, k) => ({
        id: `n${k}`,
        at: at(frame, place),
        support: planar.supports[k] ?? false,
      })),
      bars: planar.bars,
      normal: frame.normal,
    },
    {
      joins: planar.joins,
      bars: planar.marks,
      diagonals: { legInPlane: planar.legInPlane, section: planar.section },
    },
  );
}
