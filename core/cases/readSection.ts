import { angleProperties } from '../section/angleProperties.ts';
import type { AngleOutline } from '../section/model.ts';
import { outlineProblem, outlineProblemText } from '../section/outlineProblem.ts';
import { centreLineConstants, principal } from '../section/principal.ts';
import type { CaseReader } from './caseReader.ts';
import type { CaseSection } from './model.ts';

const FIGURES = ['A', 'Ixx', 'Iyy', 'Ixy'] as const;
const TORSION = ['J', 'Iw', 'shear_centre_rel_centroid'] as const;

/** Stands in for a section that could not be read. */
const UNREAD: Figures = { area: 1, Ixx: 1, Iyy: 1, Ixy: 0 };

interface Figures {
  readonly area: number;
  readonly Ixx: number;
  readonly Iyy: number;
  readonly Ixy: number;
}

interface Torsion {
  readonly shearCentre: readonly [number, number];
  readonly J: number;
  readonly Iw: number;
}

/**
 * A, Ixx, Iyy, Ixy as given, or from the geometry when none of them is; principal values follow from these whatever else the case states.
 * Axes are the case's: x along the leg b, y along the leg h.
 */
export function readSection(reader: CaseReader, twist: boolean): CaseSection {
  reader.object('a section with A, Ixx, Iyy and Ixy, or with its geometry');
  const given = FIGURES.filter((name) => reader.at(name).isGiven);
  const wanted = given.length === 0 || (twist && TORSION.some((name) => !reader.at(name).isGiven));
  const outline = wanted ? readGeometry(reader.at('geometry')) : null;
  const computed = outline && inCaseAxes(outline);
  const figures = given.length === 0 && computed ? computed : readFigures(reader);
  const torsion = readTorsion(reader, computed, twist);
  const { area, Ixx, Iyy, Ixy } = figures;
  const { major: Iu, minor: Iv, alpha } = principal(Ixx, Iyy, Ixy);
  return {
    area,
    Ixx,
    Iyy,
    Ixy,
    Iu,
    Iv,
    alpha,
    rx: Math.sqrt(Ixx / area),
    ry: Math.sqrt(Iyy / area),
    ru: Math.sqrt(Iu / area),
    rv: Math.sqrt(Iv / area),
    ...torsion,
  };
}

function readFigures(reader: CaseReader): Figures {
  const area = reader.at('A').number('above zero');
  const Ixx = reader.at('Ixx').number('above zero');
  const Iyy = reader.at('Iyy').number('above zero');
  const Ixy = reader.at('Ixy').number();
  if (Ixx * Iyy > Ixy * Ixy) return { area, Ixx, Iyy, Ixy };
  // Without all of them there is nothing to compare, and what is missing was noted.
  if (FIGURES.some((name) => typeof reader.at(name).value !== 'number')) return UNREAD;
  reader.problem(
    'Its Ixx, Iyy and Ixy give a second moment about v that is not above zero.',
    'Check them: Ixx·Iyy must exceed Ixy².',
  );
  return UNREAD;
}

/** The outline with its legs as h and b, whichever is the longer; null when no geometry is given, or a wrong one. */
function readGeometry(reader: CaseReader): { h: number; b: number; outline: AngleOutline } | null {
  if (!reader.isGiven) return null;
  reader.object('a geometry with h, b, t, root_radius and toe_radius');
  const [h, b] = [reader.at('h').number('above zero'), reader.at('b').number('above zero')];
  const outline = {
    longLeg: Math.max(h, b),
    shortLeg: Math.min(h, b),
    thickness: reader.at('t').number('above zero'),
    rootRadius: reader.at('root_radius').number('zero or more'),
    toeRadius: reader.at('toe_radius').number('zero or more'),
  };
  const problem = outlineProblem(outline);
  if (!problem) return { h, b, outline };
  reader.problem(
    `No angle has these dimensions: ${outlineProblemText(problem)}`,
    'Check h, b, t and the radii.',
  );
  return null;
}

/** Properties with x along b and y along h. Where b is the longer leg the section is seen from its other side. */
function inCaseAxes({ h, b, outline }: { h: number; b: number; outline: AngleOutline }): Figures & Torsion {
  const { area, Ixx, Iyy, Ixy, shearCentre } = angleProperties(outline);
  const constants = centreLineConstants(outline);
  if (h >= b) return { area, Ixx, Iyy, Ixy, shearCentre, ...constants };
  return { area, Ixx: Iyy, Iyy: Ixx, Ixy, shearCentre: [shearCentre[1], shearCentre[0]], ...constants };
}

function readTorsion(reader: CaseReader, computed: Torsion | null, twist: boolean): Torsion {
  if (!twist) return { shearCentre: [0, 0], J: 0, Iw: 0 };
  const number = (name: 'J' | 'Iw', known: number | undefined): number => {
    const given = reader.at(name);
    return given.isGiven || known === undefined
      ? given.number(name === 'J' ? 'above zero' : 'zero or more')
      : known;
  };
  const J = number('J', computed?.J);
  // Without any warping stiffness the equations are of another order; a trace of it gives their answer.
  const Iw = Math.max(number('Iw', computed?.Iw), J * 1e-6);
  return { shearCentre: readPoint(reader.at('shear_centre_rel_centroid'), computed?.shearCentre), J, Iw };
}

/** [x, y], mm; `otherwise` when it is not given. */
export function readPoint(
  reader: CaseReader,
  otherwise: readonly [number, number] | undefined,
): readonly [number, number] {
  if (!reader.isGiven && otherwise) return otherwise;
  const [x, y, more] = reader.list();
  if (x && y && !more) return [x.number(), y.number()];
  reader.problem('It is not a point.', 'Give [x, y] from the centroid, mm.');
  return [0, 0];
}
