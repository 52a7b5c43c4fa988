/**
 * The slenderness limits of each design standard, as data. Every clause says how sure we are of it: none of these standards' running text was
 * before us, so all are from memory and are to be checked against the standard in hand.
 *
 * All of them ask for the in-service verdict: their L/r is that of the member as it can buckle or sag between the points that hold it.
 * The handling verdict, the whole length over the least radius, is common practice for transport and erection and stands beside it.
 */
import type { PracticeId } from '../project/model.ts';
import type { Confidence, MemberClass, Practice } from './model.ts';

const SURE: Confidence = 'from memory, sure';
const VERIFY: Confidence = 'from memory, verify';

const WAIVER =
  'The limit for tension members may be waived where flexibility, sag, vibration and slack are dealt with in another way; set an own limit for that.';

const sans10162: Practice = {
  id: 'sans10162',
  steel: { E: 200_000, G: 77_000 },
  name: 'SANS 10162-1',
  edition: '2011 (2005 the same)',
  standing: 'shall',
  asks: 'inService',
  exempt: [],
  tension: [memberClass('tension', 'Tension member', 300, '10.4.2.2', SURE)],
  compression: [memberClass('compression', 'Compression member', 200, '10.4.2.1', SURE)],
  axisLetters: { x: 'x', y: 'y', u: 'u', v: 'v' },
  note: `L/r with L the unbraced length about each axis. ${WAIVER} Axis letters as in the handbook of the trade, from memory.`,
};

const csaS16: Practice = {
  id: 'csaS16',
  steel: { E: 200_000, G: 77_000 },
  name: 'CSA S16',
  edition: '2019 (2001 to 2014 the same)',
  standing: 'shall',
  asks: 'inService',
  exempt: [],
  tension: [memberClass('tension', 'Tension member', 300, '10.4.2.2', SURE)],
  compression: [memberClass('compression', 'Compression member', 200, '10.4.2.1', SURE)],
  axisLetters: { x: 'x', y: 'y', u: 'x′', v: 'y′' },
  note: `L/r with L the unbraced length about each axis. ${WAIVER} The standard counts x along the connected leg; here x is parallel to the shorter leg. The primes for the principal axes are from memory.`,
};

const aisc360: Practice = {
  id: 'aisc360',
  steel: { E: 200_000, G: 77_200 },
  name: 'AISC 360',
  edition: '2022 (2005 to 2016 the same)',
  standing: 'advice',
  asks: 'inService',
  exempt: ['rod'],
  tension: [memberClass('tension', 'Tension member', 300, 'D1, user note', SURE)],
  compression: [memberClass('compression', 'Compression member', 200, 'E2, user note', SURE)],
  axisLetters: { x: 'x', y: 'y', u: 'w', v: 'z' },
  note: 'Both limits are advice ("preferably"), not requirements; rods and hangers are outside the one for tension. z is the minor principal axis.',
};

const en1993: Practice = {
  id: 'en1993',
  steel: { E: 210_000, G: 81_000 },
  name: 'EN 1993-1-1',
  edition: '2005 and 2022',
  standing: 'none',
  asks: 'inService',
  exempt: [],
  tension: [memberClass('tension', 'Tension member', null, 'no clause gives a limit', SURE)],
  compression: [memberClass('compression', 'Compression member', null, 'no clause gives a limit', SURE)],
  axisLetters: { x: 'y', y: 'z', u: 'u', v: 'v' },
  note: 'No limit on slenderness in buildings, so an own limit applies, 300 unless set. A national annex or the specification may give one. y is parallel to the shorter leg, z to the longer.',
};

const as4100: Practice = {
  id: 'as4100',
  steel: { E: 200_000, G: 80_000 },
  name: 'AS 4100',
  edition: '2020 (1998 the same)',
  standing: 'none',
  asks: 'inService',
  exempt: [],
  tension: [memberClass('tension', 'Tension member', null, 'no clause gives a limit', VERIFY)],
  compression: [memberClass('compression', 'Compression member', null, 'no clause gives a limit', VERIFY)],
  axisLetters: { x: 'n', y: 'p', u: 'x', v: 'y' },
  note: 'No general limit on slenderness known to us, so an own limit applies, 300 unless set. Mind the letters: x and y are the major and minor principal axes, n and p are parallel to the legs (which of the two is which, from memory, verify).',
};

const IS_TABLE = 'Table 3, 3.8';

const is800: Practice = {
  id: 'is800',
  steel: { E: 200_000, G: 76_900 },
  name: 'IS 800',
  edition: '2007',
  standing: 'shall',
  asks: 'inService',
  exempt: [],
  tension: [
    memberClass('wind', 'Tie or bracing, reversed by wind or earthquake', 350, IS_TABLE, SURE),
    memberClass(
      'other loads',
      'Tension member, reversed by loads other than wind or earthquake',
      180,
      IS_TABLE,
      SURE,
    ),
    memberClass('always in tension', 'Always in tension, not pretensioned', 400, IS_TABLE, SURE),
  ],
  compression: [
    memberClass('other loads', 'Compression from dead and imposed loads', 180, IS_TABLE, SURE),
    memberClass(
      'wind',
      'Compression from wind or earthquake only, its bowing harming nothing else',
      250,
      IS_TABLE,
      SURE,
    ),
  ],
  axisLetters: { x: 'x', y: 'y', u: 'u', v: 'v' },
  note: 'The class is chosen by the loads. Unless one is chosen, ties are taken as reversed by wind (350) and bars counted on in compression as carrying dead and imposed loads (180), the careful one. Axis letters as in the older tables of sections, from memory, verify.',
};

export const PRACTICES: readonly Practice[] = [sans10162, csaS16, aisc360, en1993, as4100, is800];

const BY_ID: Readonly<Record<PracticeId, Practice>> = { sans10162, csaS16, aisc360, en1993, as4100, is800 };

export function practiceFor(id: PracticeId): Practice {
  return BY_ID[id];
}

function memberClass(
  id: string,
  name: string,
  limit: number | null,
  clause: string,
  confidence: Confidence,
): MemberClass {
  return { id, name, limit, clause, confidence };
}
