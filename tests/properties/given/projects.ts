/** Projects of every kind of bay, as a user might draw them and as nobody would; all of them pass the gate of the file format. */
import fc from 'fast-check';
import type { OwnAngle } from '../../../core/catalogue/model.ts';
import { cross, length, subtract, type Vec3 } from '../../../core/geometry/vector.ts';
import { layOut } from '../../../core/layout/layOut.ts';
import type {
  BarMark,
  Bay,
  DiagonalSpec,
  EndConnection,
  FreeRecipe,
  Join,
  KneeRecipe,
  Line,
  LineHolder,
  Member,
  Project,
  Recipe,
  RoofRecipe,
  Settings,
  Tier,
  WallRecipe,
} from '../../../core/project/model.ts';
import { PATTERNS } from '../../../core/project/model.ts';
import { stock } from '../../unit/assess/given/catalogues.ts';

export const BAY_IDS = ['W1', 'R2', 'K-3', '9', 'B_9', 'b1'] as const;
const LINE_IDS = ['P1', 'P2', 'G1', '7', 'x-9'] as const;
const TIER_IDS = ['t1', 't2', 't3', 'x'] as const;
const SECTIONS = ['70x70x6', '125x75x8', 'L3X3X1/4', '90x90x8EA', '65×50×5', 'own 60', '71x71x6', 'rod 20'];

/** Lengths in steps that make marks fall on one place now and then. */
const span = (least: number, most: number) => {
  const step = most >= 1000 ? 500 : 10;
  return fc.oneof(
    fc.integer({ min: Math.ceil(least / step), max: Math.floor(most / step) }).map((k) => k * step),
    fc.double({ min: least, max: most, noNaN: true }),
  );
};

const member: fc.Arbitrary<Member> = fc.record({
  name: fc.string({ maxLength: 20 }),
  shape: fc.constantFrom('I', 'channel', 'tube', 'zed'),
  depth: span(10, 600),
  width: span(10, 400),
});

const text = fc.oneof(
  fc.constantFrom('tied by the sheeting', ' as agreed ', '“x” < y & z'),
  fc.string({ minLength: 1, maxLength: 30 }).filter((each) => each.trim().length > 0),
);

export const lineHolder: fc.Arbitrary<LineHolder> = fc.oneof(
  fc.constant<LineHolder>({ kind: 'nothing' }),
  fc.record({ kind: fc.constant('bay'), bay: fc.constantFrom(...BAY_IDS, 'nowhere') }),
  fc.record({ kind: fc.constant('vouched'), reason: text }),
);

const tiers: fc.Arbitrary<readonly Tier[]> = fc
  .subarray([...TIER_IDS], { minLength: 1 })
  .chain((ids) =>
    fc.tuple(
      ...ids.map((id) =>
        fc.record({ id: fc.constant(id), height: span(500, 6000), pattern: fc.constantFrom(...PATTERNS) }),
      ),
    ),
  );

const total = (all: readonly Tier[]): number => all.reduce((sum, tier) => sum + tier.height, 0);

/** Lines under the ids given, at shares of a length; at 0 and at the end too. */
const linesOn = (ids: readonly string[], length: number): fc.Arbitrary<readonly Line[]> =>
  fc
    .tuple(
      ...ids.map((id) =>
        fc.record({
          id: fc.constant(id),
          at: fc.integer({ min: 0, max: 12 }).map((k) => (length * k) / 12),
          heldBy: lineHolder,
        }),
      ),
    )
    .map((all) => all);

const wall: fc.Arbitrary<WallRecipe> = fc.tuple(tiers, fc.subarray([...LINE_IDS])).chain(([all, ids]) =>
  fc.record<WallRecipe>({
    kind: fc.constant('wall'),
    width: span(500, 12_000),
    tiers: fc.constant(all),
    columns: member,
    beams: member,
    lines: linesOn(ids, total(all)),
    lineMember: member,
  }),
);

const roof: fc.Arbitrary<RoofRecipe> = fc
  .tuple(tiers, tiers, fc.shuffledSubarray([...LINE_IDS]), fc.nat({ max: 5 }), fc.boolean())
  .chain(([first, second, ids, cut, two]) => {
    const slope = (id: string, panels: readonly Tier[], lineIds: readonly string[]) =>
      fc.record({
        id: fc.constant(id),
        pitch: fc.constantFrom(0, 3, 8.5, 45, 75),
        panels: fc.constant(panels),
        lines: linesOn(lineIds, total(panels)),
      });
    return fc.record<RoofRecipe>({
      kind: fc.constant('roof'),
      width: span(500, 12_000),
      slopes: two
        ? fc.tuple(slope('a', first, ids.slice(0, cut)), slope('b', second, ids.slice(cut)))
        : fc.tuple(slope('a', first, ids)),
      rafters: member,
      struts: member,
      purlin: member,
      eavesStrut: fc.boolean(),
      ridgeStrut: fc.boolean(),
    });
  });

const knee: fc.Arbitrary<KneeRecipe> = fc.record({
  kind: fc.constant('knee'),
  count: fc.integer({ min: 1, max: 4 }),
  spacing: span(500, 3000),
  drop: span(100, 3000),
  angle: fc.constantFrom(5, 30, 45, 60, 85),
  sides: fc.constantFrom('one', 'both'),
  chord: member,
  purlin: member,
});

const NODE_IDS = ['n1', 'n2', 'n3', 'n4', 'n5', 'n6', '7'] as const;
const BAR_IDS = ['b1', 'b2', 'b3', 'b4', 'b5', 'b6', '7', 'b8'] as const;
const grid = fc.integer({ min: -6, max: 6 }).map((k) => k * 500);
const ROLES = [
  'diagonal',
  'diagonal',
  'diagonal',
  'knee',
  'tie',
  'column',
  'beam',
  'purlin',
  'chord',
] as const;

const free: fc.Arbitrary<FreeRecipe> = fc
  .record({
    places: fc.array(fc.tuple(grid, fc.constantFrom(0, 0, 0, 1, 250), grid), {
      minLength: NODE_IDS.length,
      maxLength: NODE_IDS.length,
    }),
    supports: fc.array(fc.boolean(), { minLength: NODE_IDS.length, maxLength: NODE_IDS.length }),
    ends: fc.array(
      fc.tuple(fc.constantFrom(...NODE_IDS), fc.constantFrom(...NODE_IDS), fc.constantFrom(...ROLES)),
      { maxLength: BAR_IDS.length },
    ),
    member: fc.option(member),
    normal: fc.constantFrom<Vec3 | null>(null, [0, -1, 0], [0, 0, 3], [1, 2, -2]),
  })
  .map(({ places, supports, ends, member: shape, normal }): FreeRecipe => {
    const at = (id: string): Vec3 => places[NODE_IDS.indexOf(id as (typeof NODE_IDS)[number])] ?? [0, 0, 0];
    const apart = (a: Vec3, b: Vec3) => Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);
    const bars = ends
      .filter(([from, to]) => apart(at(from), at(to)) >= 10)
      .map(([from, to, role], k) => ({ id: BAR_IDS[k] ?? 'b9', from, to, role, member: shape }));
    return {
      kind: 'free',
      nodes: NODE_IDS.map((id, k) => ({ id, at: at(id), support: supports[k] ?? false })),
      bars,
      // A file whose diagonals all lie along their normal is refused.
      normal: bars.some(
        ({ from, to, role }) =>
          normal &&
          (role === 'diagonal' || role === 'knee' || role === 'tie') &&
          length(cross(normal, subtract(at(to), at(from)))) > 100,
      )
        ? normal
        : null,
    };
  });

export const recipe: fc.Arbitrary<Recipe> = fc.oneof(wall, roof, knee, free);

const ends: fc.Arbitrary<EndConnection> = fc.record({
  kind: fc.constantFrom('bolted', 'welded'),
  bolts: fc.integer({ min: 1, max: 4 }),
  boltDiameter: fc.constantFrom(12, 16, 20, 24),
  pitch: span(40, 120),
  endDistance: span(20, 60),
  gauge: fc.constantFrom(null, 35, 40),
  legs: fc.constantFrom('one', 'both'),
  setBack: fc.oneof({ weight: 6, arbitrary: span(0, 500) }, { weight: 1, arbitrary: span(0, 20_000) }),
  weldLength: span(0, 300),
});

export const diagonalSpec: fc.Arbitrary<DiagonalSpec> = fc.record({
  section: fc.constantFrom(...SECTIONS),
  grade: fc.constantFrom('S355JR', '', 'A36'),
  countedOn: fc.constantFrom('tension', 'both'),
  legInPlane: fc.constantFrom('longer', 'shorter'),
  heel: fc.constantFrom('up', 'down'),
  arrangement: fc.constantFrom('opposite', 'same side'),
  gusset: fc.constantFrom(0, 8, 10, 200),
  ends,
});

/** At most one override an axis. */
const overrides = fc.subarray(['x', 'y', 'u', 'v'] as const, { minLength: 1 }).chain((axes) =>
  fc.tuple(
    ...axes.map((axis) =>
      fc.record({
        axis: fc.constant(axis),
        length: fc.constantFrom(null, 1, 2500, 12_000),
        factor: fc.constantFrom(1, 0.5, 2, 20),
        reason: text,
      }),
    ),
  ),
);

export const barMark: fc.Arbitrary<BarMark> = fc.record(
  {
    mark: fc.constantFrom('D1', 'BR-7', 'D2'),
    section: fc.constantFrom(...SECTIONS),
    grade: fc.constantFrom('S275', ''),
    countedOn: fc.constantFrom('tension', 'both'),
    legInPlane: fc.constantFrom('longer', 'shorter'),
    heel: fc.constantFrom('up', 'down'),
    side: fc.constantFrom('near', 'far'),
    roll: fc.constantFrom(0, 30, -45, 90, 12.5, 360),
    endI: fc.record(
      {
        setBack: span(0, 600),
        bolts: fc.constantFrom(1, 3),
        holds: fc.constantFrom('both', 'in plane only', 'out of plane only', 'nothing'),
      },
      { requiredKeys: [] },
    ),
    endJ: fc.record({ setBack: span(0, 600), kind: fc.constantFrom('welded') }, { requiredKeys: [] }),
    overrides,
  },
  { requiredKeys: [] },
) as fc.Arbitrary<BarMark>;

/** Keys of bars and crossings that some recipe above yields, and some that none does. */
export const BAR_KEYS = [
  't1.rise',
  't1.fall',
  't2.left',
  'a.t1.rise',
  'a.t1.fall',
  'b.t2.rise',
  'k1.knee-a',
  'b1',
  '7',
  'ghost',
] as const;
export const CROSSING_KEYS = [
  't1.fall+t1.rise',
  't2.fall+t2.rise',
  'a.t1.fall+a.t1.rise',
  'P1+t1.rise',
  'P1+a.t1.rise',
  'P2+a.t1.fall',
  'G1+t2.fall',
  'b1+b2',
  'b2+b3',
  '7+b1',
  'ghost+ghoul',
] as const;

export const join: fc.Arbitrary<Join> = fc.oneof(
  fc.constantFrom<Join>({ kind: 'none' }, { kind: 'bolted' }, { kind: 'welded' }, { kind: 'hung' }),
  fc.record({ kind: fc.constant('packed'), packer: fc.constantFrom(null, 0, 10) }),
  fc.record({ kind: fc.constant('cut'), cutBar: fc.constantFrom(...BAR_KEYS) }),
  fc.record({ kind: fc.constant('purlin'), boltsAcross: fc.constantFrom(1, 2) }),
) as fc.Arbitrary<Join>;

/** Joins that fit a crossing of two diagonals, and a crossing with a purlin, a rail or another member. */
const betweenDiagonals = fc.constantFrom<Join['kind']>('none', 'bolted', 'packed', 'cut', 'welded');
const toALine = fc.constantFrom<Join['kind']>('none', 'purlin', 'purlin', 'hung');

/** Both kinds of joins wherever they may stand: a mark that does not fit its crossing is part of life. */
export const bayCalled = (id: string): fc.Arbitrary<Bay> =>
  fc.record({
    id: fc.constant(id),
    name: fc.string({ maxLength: 30 }),
    place: fc.record({
      origin: fc.tuple(grid, grid, grid),
      turn: fc.constantFrom(0, 90, -90, 180, 33, 360),
    }),
    numberOff: fc.integer({ min: 1, max: 9 }),
    recipe,
    diagonals: diagonalSpec,
    bars: fc.dictionary(fc.constantFrom(...BAR_KEYS), barMark, { maxKeys: 4, noNullPrototype: true }),
    joins: fc.dictionary(fc.constantFrom(...CROSSING_KEYS), join, { maxKeys: 6, noNullPrototype: true }),
  });

const ownAngle: OwnAngle = {
  designation: 'own 60',
  longLeg: 60,
  shortLeg: 60,
  thickness: 4,
  rootRadius: 8,
  toeRadius: 4,
};

const plainSettings: fc.Arbitrary<Settings> = fc.record({
  practice: fc.constantFrom('sans10162', 'csaS16', 'aisc360', 'en1993', 'as4100', 'is800'),
  memberClass: fc.constantFrom(null, 'wind', 'no such class'),
  ownLimit: fc.constantFrom(null, 20, 250),
  catalogue: fc.constantFrom('en', 'us', 'au'),
  units: fc.constantFrom('metric', 'us'),
  sagRatio: fc.constantFrom(null, 200, 5000),
  lengthBasis: fc.constantFrom('set-out', 'connections'),
});
const turning = fc.constantFrom('stiff', 'hinged');
const endFixity = fc.record({ inPlane: turning, outOfPlane: turning });

export const settings: fc.Arbitrary<Settings> = fc
  .tuple(plainSettings, fc.option(endFixity, { nil: null }))
  .map(([plain, ends]) => (ends === null ? plain : { ...plain, endFixity: ends }));

const unmarkedProject: fc.Arbitrary<Project> = fc.subarray([...BAY_IDS], { maxLength: 3 }).chain((ids) =>
  fc.record({
    format: fc.constant('tautline-project'),
    version: fc.constant(1),
    name: fc.string({ maxLength: 40 }),
    settings,
    ownStock: fc.constantFrom<readonly OwnAngle[]>([], [ownAngle]),
    bays: fc.tuple(...ids.map(bayCalled)),
  }),
) as fc.Arbitrary<Project>;

/** What to mark at the n-th crossing and bar that a project turns out to have. */
const marks = fc.record({
  crossings: fc.array(fc.tuple(betweenDiagonals, toALine, fc.boolean(), fc.boolean()), { maxLength: 30 }),
  bars: fc.array(fc.option(barMark), { maxLength: 12 }),
});

/** As drawn, and then marked on the crossings and bars that are really there, or else hardly a mark would meet one. */
export const anyProject: fc.Arbitrary<Project> = fc.tuple(unmarkedProject, marks).map(([project, given]) => {
  const layout = layOut(project, stock());
  const crossings = [...layout.crossings.values()];
  const diagonals = layout.bays.flatMap((bay) => bay.diagonals);
  return {
    ...project,
    bays: project.bays.map((bay): Bay => {
      const joins: Record<string, Join> = { ...bay.joins };
      const bars: Record<string, BarMark> = { ...bay.bars };
      crossings.forEach((crossing, k) => {
        const mark = given.crossings[k];
        if (!mark || crossing.bay !== bay.id) return;
        const [diagonals, toLine, second, given2] = mark;
        const kind = crossing.kind === 'diagonals' ? diagonals : toLine;
        const cutBar = (second ? crossing.a : crossing.b).slice(bay.id.length + 1);
        joins[crossing.key] = joinOf(kind, cutBar, given2);
      });
      diagonals.forEach((id, k) => {
        const mark = given.bars[k];
        if (mark && id.startsWith(`${bay.id}/`)) bars[id.slice(bay.id.length + 1)] = mark;
      });
      return { ...bay, joins, bars };
    }),
  };
});

function joinOf(kind: Join['kind'], cutBar: string, option: boolean): Join {
  switch (kind) {
    case 'packed':
      return { kind, packer: option ? null : 8 };
    case 'cut':
      return { kind, cutBar };
    case 'purlin':
      return { kind, boltsAcross: option ? 1 : 2 };
    default:
      return { kind };
  }
}
