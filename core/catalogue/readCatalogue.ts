import type { AngleOutline } from '../section/model.ts';
import { outlineProblem, outlineProblemText } from '../section/outlineProblem.ts';
import { publishedProperties } from '../section/publishedProperties.ts';
import { KG_PER_METRE_PER_POUND_FOOT, MM_PER_INCH } from '../units/unitSystem.ts';
import { CatalogueFileError, type Fields, fieldsOf, numberOf, textOf } from './catalogueFile.ts';
import { designationKey } from './designation.ts';
import type { Catalogue, CatalogueId, StockAngle } from './model.ts';
import { computedAngle } from './ownAngle.ts';

export const CATALOGUE_FORMAT = 'tautline-catalogue';
export const CATALOGUE_VERSION = 1;

/**
 * A stock catalogue from its file in `assets/catalogues`. Rows stay in the order of the source.
 *
 * A file says its `basis`: 'computed' (lengths in mm; properties from the dimensions) or 'published' (inches, as the US table
 * prints them; area, second moments and radii carried as printed, because no radius rule reproduces that table and every rule errs on the unsafe side).
 *
 * @throws CatalogueFileError naming the place in the file
 */
export function readCatalogue(json: unknown): Catalogue {
  const file = fieldsOf(json, 'the top');
  if (file.format !== CATALOGUE_FORMAT)
    throw new CatalogueFileError('format', `expected "${CATALOGUE_FORMAT}"`);
  if (file.version !== CATALOGUE_VERSION)
    throw new CatalogueFileError(
      'version',
      `version ${String(file.version)} is not ${CATALOGUE_VERSION}, the one known here`,
    );
  const id = catalogueId(file);
  const read = rowReader(file);
  if (!Array.isArray(file.rows) || file.rows.length === 0)
    throw new CatalogueFileError('rows', 'expected a list of angles');
  const angles = file.rows.map((row: unknown, i) => read(fieldsOf(row, `rows[${i}]`), id, `rows[${i}].`));
  refuseDoubles(angles);
  return {
    id,
    name: textOf(file, 'name', ''),
    standard: textOf(file, 'standard', ''),
    source: textOf(file, 'source', ''),
    angles,
  };
}

type RowReader = (row: Fields, id: CatalogueId, where: string) => StockAngle;

function catalogueId(file: Fields): CatalogueId {
  const { id } = file;
  if (id === 'en' || id === 'us' || id === 'au') return id;
  throw new CatalogueFileError('id', 'expected "en", "us" or "au"');
}

function rowReader(file: Fields): RowReader {
  if (file.basis === 'computed' && file.units === 'mm') return computedRow;
  if (file.basis === 'published' && file.units === 'in') return publishedRow;
  throw new CatalogueFileError(
    'basis',
    'expected "computed" with units "mm", or "published" with units "in"',
  );
}

function computedRow(row: Fields, id: CatalogueId, where: string): StockAngle {
  const outline = sound(
    {
      longLeg: numberOf(row, 'longLeg', where),
      shortLeg: numberOf(row, 'shortLeg', where),
      thickness: numberOf(row, 'thickness', where),
      rootRadius: numberOf(row, 'rootRadius', where),
      toeRadius: numberOf(row, 'toeRadius', where),
    },
    where,
  );
  const mass = row.massPerMetre === undefined ? null : numberOf(row, 'massPerMetre', where);
  return computedAngle(textOf(row, 'designation', where), id, outline, mass);
}

function publishedRow(row: Fields, id: CatalogueId, where: string): StockAngle {
  const inches = (name: string, power = 1): number => numberOf(row, name, where) * MM_PER_INCH ** power;
  const outline = sound(
    drawnOutline(inches('longLeg'), inches('shortLeg'), inches('thickness'), inches('k')),
    where,
  );
  const properties = publishedProperties(outline, {
    area: inches('area', 2),
    centroidX: inches('x'),
    centroidY: inches('y'),
    Ixx: inches('Ix', 4),
    Iyy: inches('Iy', 4),
    Iv: inches('Iz', 4),
    rx: inches('rx'),
    ry: inches('ry'),
    rv: inches('rz'),
    J: inches('J', 4),
    Iw: inches('Cw', 6),
  });
  return {
    designation: textOf(row, 'designation', where),
    catalogue: id,
    kind: outline.longLeg === outline.shortLeg ? 'equal' : 'unequal',
    outline,
    properties,
    basis: 'published',
    massPerMetre: numberOf(row, 'weight', where) * KG_PER_METRE_PER_POUND_FOOT,
    printed: {
      Iu: inches('Iw', 4),
      alpha: Math.sign(properties.alpha) * Math.atan(numberOf(row, 'tanAlpha', where)),
    },
  };
}

/** An outline to draw a US angle by: root radius k − t, toes half of that (an assumption, the table gives none). Nothing is computed from it. */
function drawnOutline(longLeg: number, shortLeg: number, thickness: number, k: number): AngleOutline {
  const rootRadius = Math.max(0, k - thickness);
  return { longLeg, shortLeg, thickness, rootRadius, toeRadius: Math.min(rootRadius / 2, thickness) };
}

function sound(outline: AngleOutline, where: string): AngleOutline {
  const problem = outlineProblem(outline);
  if (problem) throw new CatalogueFileError(where.replace(/\.$/, ''), outlineProblemText(problem));
  return outline;
}

function refuseDoubles(angles: readonly StockAngle[]): void {
  const seen = new Set<string>();
  angles.forEach(({ designation }, i) => {
    const key = designationKey(designation);
    if (seen.has(key))
      throw new CatalogueFileError(`rows[${i}].designation`, `${designation} is listed twice`);
    seen.add(key);
  });
}
