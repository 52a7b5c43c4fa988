/** Every kind of edit: on what is there and on what is not, with values that can be saved and with some that cannot. */
import fc from 'fast-check';
import type { Edit } from '../../../core/project/edit.ts';
import type { Bay, Settings } from '../../../core/project/model.ts';
import {
  BAR_KEYS,
  BAY_IDS,
  barMark,
  bayCalled,
  CROSSING_KEYS,
  diagonalSpec,
  join,
  lineHolder,
  recipe,
  settings,
} from './projects.ts';

const bayId = fc.constantFrom<string>(...BAY_IDS, 'nowhere', '', 'W1/', '__proto__', 'a b');
const idOf = (keys: readonly string[]) =>
  fc.oneof(
    {
      weight: 8,
      arbitrary: fc.tuple(fc.constantFrom(...BAY_IDS), fc.constantFrom(...keys)).map((p) => p.join('/')),
    },
    {
      weight: 1,
      arbitrary: fc.constantFrom('', '/', 'W1', 'W1x', 'W1/', '/t1.rise', 'no/such/thing', 'W1/__proto__'),
    },
  );
const barIds = fc.array(idOf(BAR_KEYS), { maxLength: 3 });
const crossingIds = fc.array(idOf(CROSSING_KEYS), { maxLength: 3 });

/** A number that no file may hold. */
const absurd = fc.constantFrom(Number.NaN, Number.POSITIVE_INFINITY, -5, 1e12, 0);
/** The value, or in one of eight cases an absurd number in one of its places. */
const spoilt = <T extends object>(value: fc.Arbitrary<T>, names: readonly (keyof T)[]): fc.Arbitrary<T> =>
  fc
    .tuple(value, fc.nat({ max: 7 }), fc.constantFrom(...names), absurd)
    .map(([made, dice, name, number]) => (dice === 0 ? { ...made, [name]: number } : made));

/** Some of the entries of a value. */
const part = <T extends object>(value: fc.Arbitrary<T>): fc.Arbitrary<Partial<T>> =>
  fc
    .tuple(value, fc.infiniteStream(fc.boolean()))
    .map(
      ([made, keep]) =>
        Object.fromEntries(Object.entries(made).filter(() => keep.next().value)) as Partial<T>,
    );

const bay: fc.Arbitrary<Bay> = fc.constantFrom(...BAY_IDS, 'N7', 'a b').chain(bayCalled);

export const anyEdit: fc.Arbitrary<Edit> = fc.oneof(
  fc.record({ kind: fc.constant('name project'), name: fc.string({ maxLength: 300 }) }),
  fc.record({
    kind: fc.constant('settings'),
    change: part<Settings>(spoilt(settings, ['ownLimit', 'sagRatio'])),
  }),
  fc.record({
    kind: fc.constant('own stock'),
    rows: fc.array(
      spoilt(
        fc.record({
          designation: fc.constantFrom('own 60', 'own 80', ''),
          longLeg: fc.constantFrom(60, 80),
          shortLeg: fc.constantFrom(40, 60, 90),
          thickness: fc.constantFrom(4, 6, 70),
          rootRadius: fc.constantFrom(0, 8, 40),
          toeRadius: fc.constantFrom(0, 4, 40),
        }),
        ['thickness', 'rootRadius'],
      ),
      { maxLength: 3 },
    ),
  }),
  fc.record({ kind: fc.constant('add bay'), bay, after: fc.option(bayId) }),
  fc.record({ kind: fc.constant('remove bay'), bay: bayId }),
  fc.record({
    kind: fc.constant('bay'),
    bay: bayId,
    change: part(
      fc.record({
        name: fc.string({ maxLength: 30 }),
        place: fc.record({
          origin: fc.tuple(absurd, fc.constant(0), fc.constant(3000)),
          turn: fc.constantFrom(0, 90, 400),
        }),
        numberOff: fc.constantFrom(1, 3, 0, 2.5),
      }),
    ),
  }),
  fc.record({ kind: fc.constant('rename bay'), bay: bayId, to: bayId }),
  fc.record({ kind: fc.constant('recipe'), bay: bayId, recipe, what: fc.constant('the size') }),
  fc.record({
    kind: fc.constant('diagonals'),
    bay: bayId,
    change: part(spoilt(diagonalSpec, ['gusset'])),
  }),
  fc.record({
    kind: fc.constant('bars'),
    bars: barIds,
    change: spoilt(barMark, ['roll']),
    clear: fc.subarray(['mark', 'section', 'roll', 'overrides', 'endI'] as const),
  }),
  fc.record({ kind: fc.constant('join'), crossings: crossingIds, join: fc.option(join) }),
  fc.record({
    kind: fc.constant('tension share'),
    bay: bayId,
    crossing: fc.constantFrom(...CROSSING_KEYS, 'no such crossing', 'constructor', ''),
    share: fc.option(fc.oneof(fc.constantFrom(-1, 0, 0.5, 1), absurd)),
  }),
  fc.record({
    kind: fc.constant('line holder'),
    bay: bayId,
    line: fc.constantFrom('P1', 'P2', 'nothing', 'constructor'),
    heldBy: lineHolder,
  }),
) as fc.Arbitrary<Edit>;
