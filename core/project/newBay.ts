import type { CatalogueId } from '../catalogue/model.ts';
import type { Vec3 } from '../geometry/vector.ts';
import type { Bay, DiagonalSpec, EndConnection, Member, Recipe, Role } from './model.ts';

/** Sizes to begin with; every one is there to be changed. */
export const COLUMN: Member = {
  name: 'column 254 × 146',
  shape: 'I',
  depth: 254,
  width: 146,
  web: 6,
  flange: 8.6,
};
export const BEAM: Member = {
  name: 'beam 203 × 133',
  shape: 'I',
  depth: 203,
  width: 133,
  web: 5.7,
  flange: 7.8,
};
export const RAFTER: Member = {
  name: 'rafter 305 × 165',
  shape: 'I',
  depth: 305,
  width: 165,
  web: 6,
  flange: 10.2,
};
export const STRUT: Member = { name: 'strut, tube 114', shape: 'tube', depth: 114, width: 114, web: 5 };
export const PURLIN: Member = { name: 'purlin, channel 150 × 65', shape: 'channel', depth: 150, width: 65 };
export const RAIL: Member = { name: 'rail, channel 125 × 50', shape: 'channel', depth: 125, width: 50 };
export const CHORD: Member = {
  name: 'chord 203 × 133',
  shape: 'I',
  depth: 203,
  width: 133,
  web: 5.7,
  flange: 7.8,
};

/** What a bar of a freely drawn bay is to begin with, by what it is; null for bars of angle. */
export function firstMember(role: Role): Member | null {
  switch (role) {
    case 'column':
      return COLUMN;
    case 'beam':
      return BEAM;
    case 'strut':
      return STRUT;
    case 'rafter':
      return RAFTER;
    case 'purlin':
      return PURLIN;
    case 'rail':
      return RAIL;
    case 'chord':
      return CHORD;
    case 'diagonal':
    case 'knee':
    case 'tie':
      return null;
    default:
      return role satisfies never;
  }
}

export const TWO_M16: EndConnection = {
  kind: 'bolted',
  bolts: 2,
  boltDiameter: 16,
  pitch: 60,
  endDistance: 40,
  gauge: null,
  legs: 'one',
  setBack: 350,
  weldLength: 0,
};

/** A common light angle of each stock list. */
const FIRST_SECTION: Readonly<Record<CatalogueId, { section: string; grade: string }>> = {
  en: { section: '70x70x6', grade: 'S355JR' },
  us: { section: 'L3X3X1/4', grade: 'A36' },
  au: { section: '75x75x6EA', grade: '300' },
};

export function firstDiagonals(catalogue: CatalogueId = 'en'): DiagonalSpec {
  return {
    ...FIRST_SECTION[catalogue],
    countedOn: 'tension',
    legInPlane: 'longer',
    heel: 'up',
    arrangement: 'opposite',
    gusset: 10,
    ends: TWO_M16,
  };
}

function bay(id: string, name: string, recipe: Recipe, catalogue: CatalogueId): Bay {
  return {
    id,
    name,
    place: { origin: [0, 0, 0], turn: 0 },
    numberOff: 1,
    recipe,
    diagonals: firstDiagonals(catalogue),
    bars: {},
    joins: {},
  };
}

/** One crossed tier, 6 m by 4 m. */
export function newWallBay(id: string, name: string, catalogue: CatalogueId = 'en'): Bay {
  return bay(
    id,
    name,
    {
      kind: 'wall',
      width: 6000,
      tiers: [{ id: 't1', height: 4000, pattern: 'crossed' }],
      columns: COLUMN,
      beams: BEAM,
      lines: [],
      lineMember: RAIL,
    },
    catalogue,
  );
}

/** One slope of two crossed panels under three purlins. */
export function newRoofBay(id: string, name: string, catalogue: CatalogueId = 'en'): Bay {
  return bay(
    id,
    name,
    {
      kind: 'roof',
      width: 6000,
      slopes: [
        {
          id: 'a',
          pitch: 8,
          panels: [
            { id: 'p1', height: 4500, pattern: 'crossed' },
            { id: 'p2', height: 4500, pattern: 'crossed' },
          ],
          lines: [
            { id: 'P1', at: 1500, heldBy: { kind: 'nothing' } },
            { id: 'P2', at: 3000, heldBy: { kind: 'nothing' } },
            { id: 'P3', at: 4500, heldBy: { kind: 'nothing' } },
            { id: 'P4', at: 6000, heldBy: { kind: 'nothing' } },
            { id: 'P5', at: 7500, heldBy: { kind: 'nothing' } },
          ],
        },
      ],
      rafters: RAFTER,
      struts: STRUT,
      purlin: PURLIN,
      eavesStrut: true,
      ridgeStrut: true,
    },
    catalogue,
  );
}

/** Knees at 45° from a lower chord up to three purlins, on both sides. */
export function newKneeBay(id: string, name: string, catalogue: CatalogueId = 'en'): Bay {
  const made = bay(
    id,
    name,
    {
      kind: 'knee',
      count: 3,
      spacing: 1500,
      drop: 1200,
      angle: 45,
      sides: 'both',
      chord: CHORD,
      purlin: PURLIN,
    },
    catalogue,
  );
  // A knee steadies a flange both ways, and is short enough to be pressed.
  return {
    ...made,
    diagonals: { ...made.diagonals, countedOn: 'both', ends: { ...TWO_M16, bolts: 1, setBack: 120 } },
  };
}

/** A crossed square between four held nodes, to be drawn on. */
export function newFreeBay(id: string, name: string, catalogue: CatalogueId = 'en'): Bay {
  const corner = (name: string, at: Vec3) => ({ id: name, at, support: true });
  return bay(
    id,
    name,
    {
      kind: 'free',
      nodes: [
        corner('n1', [0, 0, 0]),
        corner('n2', [4000, 0, 0]),
        corner('n3', [4000, 0, 4000]),
        corner('n4', [0, 0, 4000]),
      ],
      bars: [
        { id: 'b1', from: 'n1', to: 'n3', role: 'diagonal', member: null },
        { id: 'b2', from: 'n2', to: 'n4', role: 'diagonal', member: null },
      ],
      normal: null,
    },
    catalogue,
  );
}
