/** What a project file may hold. Types stand in `model.ts`; this is the gate that files pass through. */
import { z } from 'zod';
import { BOLT_GRADES, END_HOLDS, PROJECT_FORMAT, PROJECT_VERSION, type Project } from './model.ts';

const millimetres = (least: number, most: number) => z.number().min(least).max(most);
/** Members of a braced bay are between a hand's breadth and a stadium long. */
const span = millimetres(100, 200_000);
const coordinate = millimetres(-1_000_000, 1_000_000);
const point = z.tuple([coordinate, coordinate, coordinate]);
const text = z.string().max(200);
/** Something said, kept as it was typed: reading a file changes nothing in it. */
const said = (most: number) =>
  z
    .string()
    .min(1)
    .max(most)
    .refine((typed) => typed.trim() !== '', { error: 'There is nothing here but spaces.' });
const reason = said(400);
/** Names are looked up in plain objects, where a few, such as "constructor", are always there. */
const name = (pattern: RegExp) =>
  z
    .string()
    .regex(pattern)
    .refine((typed) => !(typed in {}), { error: 'This word has a meaning of its own and cannot be a name.' });
const key = name(/^[A-Za-z0-9][A-Za-z0-9_.+-]{0,119}$/);
const shortId = name(/^[A-Za-z0-9][A-Za-z0-9_-]{0,23}$/);

const member = z.strictObject({
  name: text,
  shape: z.enum(['I', 'channel', 'tube', 'zed']),
  depth: millimetres(10, 3_000),
  width: millimetres(10, 3_000),
  web: millimetres(0.5, 200).optional(),
  flange: millimetres(0.5, 200).optional(),
  grade: z.string().max(60).optional(),
});

const pattern = z.enum(['crossed', 'rising', 'falling', 'peaked', 'vee', 'open']);
const tier = z.strictObject({ id: shortId, height: span, pattern });

const lineHolder = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('nothing') }),
  z.strictObject({ kind: z.literal('bay'), bay: shortId }),
  z.strictObject({ kind: z.literal('vouched'), reason }),
]);
const line = z.strictObject({ id: shortId, at: millimetres(0, 200_000), heldBy: lineHolder });

const wall = z.strictObject({
  kind: z.literal('wall'),
  width: span,
  tiers: z.array(tier).min(1).max(60),
  columns: member,
  beams: member,
  lines: z.array(line).max(200),
  lineMember: member,
});

const slope = z.strictObject({
  id: shortId,
  pitch: z.number().min(0).max(75),
  panels: z.array(tier).min(1).max(60),
  lines: z.array(line).max(200),
});
const roof = z.strictObject({
  kind: z.literal('roof'),
  width: span,
  slopes: z.array(slope).min(1).max(2),
  rafters: member,
  struts: member,
  purlin: member,
  eavesStrut: z.boolean(),
  ridgeStrut: z.boolean(),
});

const knee = z.strictObject({
  kind: z.literal('knee'),
  count: z.int().min(1).max(500),
  spacing: span,
  drop: span,
  angle: z.number().min(5).max(85),
  sides: z.enum(['one', 'both']),
  chord: member,
  purlin: member,
});

const role = z.enum([
  'column',
  'beam',
  'strut',
  'rafter',
  'purlin',
  'rail',
  'chord',
  'diagonal',
  'knee',
  'tie',
]);
const free = z.strictObject({
  kind: z.literal('free'),
  nodes: z.array(z.strictObject({ id: shortId, at: point, support: z.boolean() })).max(50_000),
  bars: z
    .array(z.strictObject({ id: shortId, from: shortId, to: shortId, role, member: member.nullable() }))
    .max(50_000),
  normal: point.nullable(),
});

const ends = z.strictObject({
  kind: z.enum(['bolted', 'welded']),
  bolts: z.int().min(1).max(20),
  boltDiameter: millimetres(5, 64),
  pitch: millimetres(10, 500),
  endDistance: millimetres(5, 500),
  gauge: millimetres(5, 300).nullable(),
  legs: z.enum(['one', 'both']),
  setBack: millimetres(0, 20_000),
  weldLength: millimetres(0, 5_000),
  rows: z.union([z.literal(1), z.literal(2)]).optional(),
  rowSpacing: millimetres(10, 300).optional(),
  staggered: z.boolean().optional(),
  boltGrade: z.enum(BOLT_GRADES).optional(),
  threadsInShear: z.boolean().optional(),
  weldSize: millimetres(2, 30).optional(),
  holds: z.enum(END_HOLDS).optional(),
});

const diagonals = z.strictObject({
  section: z.string().min(1).max(60),
  grade: z.string().max(60),
  countedOn: z.enum(['tension', 'both']),
  legInPlane: z.enum(['longer', 'shorter']),
  heel: z.enum(['up', 'down']),
  arrangement: z.enum(['opposite', 'same side']),
  gusset: millimetres(0, 200),
  ends,
  battens: z.int().min(0).max(100).optional(),
});

const override = z.strictObject({
  axis: z.enum(['x', 'y', 'u', 'v']),
  length: millimetres(1, 200_000).nullable(),
  factor: z.number().min(0.05).max(20),
  reason,
});

const barMark = z.strictObject({
  mark: said(24).optional(),
  section: z.string().min(1).max(60).optional(),
  grade: z.string().max(60).optional(),
  countedOn: z.enum(['tension', 'both']).optional(),
  legInPlane: z.enum(['longer', 'shorter']).optional(),
  heel: z.enum(['up', 'down']).optional(),
  side: z.enum(['near', 'far']).optional(),
  roll: z.number().min(-360).max(360).optional(),
  endI: ends.partial().optional(),
  endJ: ends.partial().optional(),
  overrides: z.array(override).max(4).optional(),
});

const join = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('none') }),
  z.strictObject({ kind: z.literal('bolted') }),
  z.strictObject({ kind: z.literal('packed'), packer: millimetres(0, 500).nullable() }),
  z.strictObject({ kind: z.literal('cut'), cutBar: key }),
  z.strictObject({ kind: z.literal('welded') }),
  z.strictObject({ kind: z.literal('purlin'), boltsAcross: z.union([z.literal(1), z.literal(2)]) }),
  z.strictObject({ kind: z.literal('hung') }),
]);

const bay = z.strictObject({
  id: shortId,
  name: text,
  place: z.strictObject({ origin: point, turn: z.number().min(-360).max(360) }),
  numberOff: z.int().min(1).max(10_000),
  recipe: z.discriminatedUnion('kind', [wall, roof, knee, free]),
  diagonals,
  bars: z.record(key, barMark),
  joins: z.record(key, join),
  tensionShares: z.record(key, z.number().min(-1).max(10)).optional(),
});

const ownAngle = z.strictObject({
  designation: said(60),
  longLeg: millimetres(5, 1_000),
  shortLeg: millimetres(5, 1_000),
  thickness: millimetres(0.5, 200),
  rootRadius: millimetres(0, 200),
  toeRadius: millimetres(0, 200),
});

const partialFactor = z.number().min(0.5).max(3);
const settings = z.strictObject({
  practice: z.enum(['sans10162', 'csaS16', 'aisc360', 'en1993', 'as4100', 'is800']),
  memberClass: z.string().max(60).nullable(),
  ownLimit: z.number().min(20).max(2_000).nullable(),
  catalogue: z.enum(['en', 'us', 'au']),
  units: z.enum(['metric', 'us']),
  sagRatio: z.number().min(20).max(5_000).nullable(),
  lengthBasis: z.enum(['set-out', 'connections']),
  endFixity: z
    .strictObject({ inPlane: z.enum(['stiff', 'hinged']), outOfPlane: z.enum(['stiff', 'hinged']) })
    .optional(),
  resistance: z
    .strictObject({
      method: z.enum(['LRFD', 'ASD']).optional(),
      gammaM0: partialFactor.optional(),
      gammaM1: partialFactor.optional(),
      gammaM2: partialFactor.optional(),
      blockTearing: z.enum(['off the middle', 'through the middle']).optional(),
      punchedHoles: z.boolean().optional(),
      gussetFixity: z.enum(['fixed', 'hinged']).optional(),
    })
    .optional(),
  ownGrades: z
    .array(
      z.strictObject({
        grade: said(60),
        fy: z.number().min(50).max(2_000),
        fu: z.number().min(50).max(3_000),
      }),
    )
    .max(100)
    .optional(),
});

/** "W1/t1.rise", "R1/a.L2". */
const place = z.string().regex(/^[A-Za-z0-9][A-Za-z0-9_-]{0,23}\/[A-Za-z0-9][A-Za-z0-9_.+-]{0,119}$/);
/** kN or kN/m: nothing that is braced with angles carries a hundred meganewtons. */
const strength = z.number().min(-100_000).max(100_000);
const forces = z.tuple([strength, strength, strength]);
const pressure = z.number().min(-50).max(50);

const load = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('node'), id: shortId, node: place, force: forces }),
  z.strictObject({ kind: z.literal('line'), id: shortId, bar: place, perMetre: forces }),
  z.strictObject({
    kind: z.literal('shortened'),
    id: shortId,
    bar: place,
    by: z.number().min(-200).max(200),
  }),
  z.strictObject({
    kind: z.literal('gable'),
    id: shortId,
    bay: shortId,
    pressure,
    rafter: z.union([z.literal(1), z.literal(2)]),
    ground: coordinate,
  }),
  z.strictObject({
    kind: z.literal('side'),
    id: shortId,
    bay: shortId,
    pressure,
    width: millimetres(0, 1_000_000),
  }),
  z.strictObject({
    kind: z.literal('bowed'),
    id: shortId,
    bay: shortId,
    squeeze: z.number().min(0).max(100_000),
    rafters: z.int().min(1).max(1000),
    gives: z.number().min(50).max(100_000),
  }),
]);

const actions = z.strictObject({
  cases: z
    .array(
      z.strictObject({
        id: shortId,
        name: text,
        kind: z.enum(['permanent', 'imposed', 'wind', 'other']),
        selfWeight: z.boolean(),
        reverses: z.boolean(),
        loads: z.array(load).max(20_000),
      }),
    )
    .max(50),
  combinations: z
    .array(
      z.strictObject({
        id: shortId,
        name: text,
        use: z.enum(['strength', 'service']),
        factors: z.record(shortId, z.number().min(-20).max(20)),
        leaning: z.boolean(),
      }),
    )
    .max(200),
  carries: z
    .array(z.strictObject({ from: shortId, to: shortId, eaves: z.union([z.literal(1), z.literal(2)]) }))
    .max(20_000),
});

export const projectSchema = z.strictObject({
  format: z.literal(PROJECT_FORMAT),
  version: z.literal(PROJECT_VERSION),
  name: text,
  settings,
  ownStock: z.array(ownAngle).max(2_000),
  bays: z.array(bay).max(20_000),
  actions: actions.optional(),
});

type Parsed = z.infer<typeof projectSchema>;
/** Breaks the build when schema and model part ways. */
const modelOf = (parsed: Parsed): Project => parsed as DropUndefined<Parsed>;
export const asProject = modelOf;

/** zod's optional keys admit `undefined`; files cannot hold it, so the model's keys do not. */
type DropUndefined<T> = T extends readonly (infer _)[]
  ? { [K in keyof T]: DropUndefined<T[K]> }
  : T extends object
    ? { [K in keyof T]: DropUndefined<Exclude<T[K], undefined>> }
    : T;

/** The JSON Schema of project files, as kept in assets/schema. */
export function projectJsonSchema(): object {
  return z.toJSONSchema(projectSchema, { target: 'draft-2020-12', io: 'input' });
}
