import { type Command, Option } from 'commander';
import type { CatalogueId, StockAngle } from '../../core/catalogue/model.ts';
import { stockOf } from '../../core/catalogue/stock.ts';
import { textTable } from '../../core/documents/textTable.ts';
import { grouped } from '../../core/units/figures.ts';
import { builtInCatalogues, CATALOGUE_IDS } from './catalogues.ts';
import type { Ending } from './ending.ts';
import { jsonText } from './json.ts';

interface SectionOptions {
  readonly catalogue?: CatalogueId;
  readonly format: 'table' | 'json';
}

export function addSectionCommand(program: Command, ending: Ending): void {
  program
    .command('section')
    .description(
      'the properties of a stock angle, about x (parallel to the shorter leg), y (the longer), u and v',
    )
    .argument('<name>', 'designation as people type it: 70x70x6, L3x3x1/4, 90x90x8EA')
    .addOption(
      new Option('-c, --catalogue <list>', 'only this stock list; without it en, then us, then au').choices(
        CATALOGUE_IDS,
      ),
    )
    .addOption(
      new Option('-f, --format <format>', 'how to write it').choices(['table', 'json']).default('table'),
    )
    .action((name: string, { catalogue, format }: SectionOptions) => {
      const found = stockOf(catalogue ?? 'en', [], builtInCatalogues()).find(name);
      if (!found.ok)
        return ending.trouble({ kind: 'no such section', typed: found.typed, nearest: found.nearest });
      const { angle } = found;
      if (catalogue !== undefined && angle.catalogue !== catalogue)
        return ending.trouble({
          kind: 'section in another list',
          typed: name,
          list: catalogue,
          other: angle.catalogue,
        });
      ending.terminal.out(format === 'json' ? jsonText(sectionJson(angle)) : sectionTable(angle));
    });
}

/** mm, mm², mm⁴, mm⁶, rad, kg/m. */
function sectionJson(angle: StockAngle) {
  const { designation, catalogue, kind, basis, massPerMetre, outline, properties } = angle;
  const { area, Ixx, Iyy, Ixy, Iv, rx, ry, ru, rv, centroidX, centroidY, shearCentre, J, Iw } = properties;
  const { Iu, alpha } = angle.printed ?? properties;
  return {
    designation,
    catalogue,
    kind,
    basis,
    mass: massPerMetre,
    area,
    Ixx,
    Iyy,
    Ixy,
    Iu,
    Iv,
    alpha,
    rx,
    ry,
    ru,
    rv,
    centroidX,
    centroidY,
    shearCentre,
    J,
    Iw,
    outline,
  };
}

function sectionTable({
  designation,
  catalogue,
  basis,
  massPerMetre,
  outline,
  properties,
  printed = properties,
}: StockAngle): string {
  const p = { ...properties, Iu: printed.Iu, alpha: printed.alpha };
  const { name, standard } = builtInCatalogues()[catalogue === 'own' ? 'en' : catalogue];
  const degrees = (p.alpha * 180) / Math.PI;
  const size = (mm: number): string => String(Number(mm.toFixed(2)));
  const head = [
    outline.shape
      ? `${designation}, ${outline.shape.kind}, of no list`
      : `${designation}, ${name} (${standard})`,
    outline.shape
      ? `${size(outline.longLeg)} in the plane of the bay (y), ${size(outline.shortLeg)} out of it (x), mm`
      : `legs ${size(outline.longLeg)} and ${size(outline.shortLeg)}, thickness ${size(outline.thickness)}, root radius ${size(outline.rootRadius)}, toe radius ${size(outline.toeRadius)} mm`,
    `area ${grouped(p.area, 1)} mm², ${size(massPerMetre)} kg/m, properties ${basis === 'computed' ? 'from the outline' : 'as published'}`,
    `centroid ${grouped(p.centroidX, 1)} mm from the ${outline.shape ? 'face along x' : 'heel along the shorter leg'}, ${grouped(p.centroidY, 1)} mm along ${outline.shape ? 'y' : 'the longer'}`,
    `u lies ${grouped(degrees, 1)}° from x; Ixy ${grouped(p.Ixy, 0)} mm⁴; J ${grouped(p.J, 0)} mm⁴`,
  ].join('\n');
  const rows = (
    [
      ['x', p.Ixx, p.rx, outline.shape ? 'along y' : 'along the longer leg'],
      ['y', p.Iyy, p.ry, outline.shape ? 'along x' : 'along the shorter leg'],
      ['u', p.Iu, p.ru, 'along v'],
      ['v', p.Iv, p.rv, 'along u'],
    ] as const
  ).map(([axis, inertia, radius, moves]) => [axis, grouped(inertia, 0), grouped(radius, 2), moves]);
  const table = textTable(
    [
      { head: 'axis', align: 'left' },
      { head: 'I mm⁴', align: 'right' },
      { head: 'r mm', align: 'right' },
      { head: 'bending about it moves the bar', align: 'left' },
    ],
    rows,
  );
  return `${head}\n\n${table}`;
}
