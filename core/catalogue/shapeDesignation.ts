import { type BarShape, extentOf, thicknessOf } from '../section/barShape.ts';
import { shapeProperties } from '../section/shapeProperties.ts';
import type { StockAngle } from './model.ts';

/** kg/m for each mm² of steel: 7850 kg/m³. */
const STEEL_PER_METRE = 7.85e-3;

/**
 * A shape other than a single angle, by its name and its sizes in mm: "FL 80x8" (flat), "ROD 20", "CHS 60.3x4", "SHS 60x4", "T 100x100x10x8" (width, depth, flange, web),
 * "C 100x50x6x8.5" (depth, width, web, flange), "2L 70x70x6/10" (two angles, gap), "2L 70x70x6*10" or "2L 70x70x6/10 STAR" (heel to heel).
 * Null when the text names none, or its sizes make none. Sizes are the user's own: no list stands behind them.
 *
 * @param angleOf the angle that a pair is made of
 */
export function shapeCalled(
  typed: string,
  angleOf: (designation: string) => StockAngle | null,
): StockAngle | null {
  const text = typed.toUpperCase().replaceAll(/[×*]/g, 'X').replaceAll(',', '.').trim();
  const pair = /^2\s*L\s*(.+?)\s*\/\s*([\d.]+)\s*(STAR)?$/.exec(text);
  if (pair) {
    const angle = angleOf(pair[1] ?? '');
    const gap = Number(pair[2]);
    if (!angle || angle.outline.shape || !(gap > 0 && gap <= 60)) return null;
    return made(
      `2L ${angle.designation}/${gap}${pair[3] ? ' STAR' : ''}`,
      { kind: pair[3] ? 'starred angles' : 'angles back to back', angle: angle.outline, gap },
      2 * angle.massPerMetre,
    );
  }
  const named = /^(FLAT|FL|PL|ROD|CHS|SHS|TEE|T|CHANNEL|C)\s*([\dX.\s]+)$/.exec(text);
  if (!named) return null;
  const sizes = (named[2] ?? '').split('X').map((size) => Number(size.trim()));
  if (sizes.some((size) => !(size > 0 && size <= 1000))) return null;
  const shape = shapeFrom(named[1] ?? '', sizes);
  return shape === null ? null : made(nameOf(shape), shape, null);
}

function shapeFrom(name: string, sizes: readonly number[]): BarShape | null {
  const [a = 0, b = 0, c = 0, d = 0] = sizes;
  switch (name) {
    case 'FLAT':
    case 'FL':
    case 'PL':
      return sizes.length === 2 && a > b ? { kind: 'flat', width: a, thickness: b } : null;
    case 'ROD':
      return sizes.length === 1 && a >= 6 && a <= 100 ? { kind: 'rod', diameter: a } : null;
    case 'CHS':
      return sizes.length === 2 && a > 2 * b ? { kind: 'round tube', diameter: a, wall: b } : null;
    case 'SHS': {
      const wall = sizes.length === 3 ? c : b;
      const square = sizes.length === 2 || (sizes.length === 3 && a === b);
      return square && a > 2 * wall ? { kind: 'square tube', side: a, wall } : null;
    }
    case 'TEE':
    case 'T':
      return sizes.length === 4 && c < b && d < a
        ? { kind: 'tee', width: a, depth: b, flange: c, web: d }
        : null;
    case 'CHANNEL':
    case 'C':
      return sizes.length === 4 && c < b && 2 * d < a
        ? { kind: 'channel', depth: a, width: b, web: c, flange: d }
        : null;
    default:
      return null;
  }
}

function nameOf(shape: BarShape): string {
  switch (shape.kind) {
    case 'flat':
      return `FL ${shape.width}x${shape.thickness}`;
    case 'rod':
      return `ROD ${shape.diameter}`;
    case 'round tube':
      return `CHS ${shape.diameter}x${shape.wall}`;
    case 'square tube':
      return `SHS ${shape.side}x${shape.wall}`;
    case 'tee':
      return `T ${shape.width}x${shape.depth}x${shape.flange}x${shape.web}`;
    case 'channel':
      return `C ${shape.depth}x${shape.width}x${shape.web}x${shape.flange}`;
    case 'angles back to back':
    case 'starred angles':
      return '2L';
    default:
      return shape satisfies never;
  }
}

function made(designation: string, shape: BarShape, massPerMetre: number | null): StockAngle {
  const [x, y] = extentOf(shape);
  const properties = shapeProperties(shape);
  return {
    designation,
    catalogue: 'own',
    kind: 'unequal',
    outline: {
      longLeg: y,
      shortLeg: x,
      thickness: thicknessOf(shape),
      rootRadius: 0,
      toeRadius: 0,
      shape,
    },
    properties,
    basis: 'computed',
    massPerMetre: massPerMetre ?? properties.area * STEEL_PER_METRE,
  };
}
