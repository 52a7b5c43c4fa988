import { textTable } from '../../core/documents/textTable.ts';
import type { UnitSystem } from '../../core/project/model.ts';
import { grouped } from '../../core/units/figures.ts';
import { showStiffness } from '../../core/units/loads.ts';
import { showLength } from '../../core/units/quantity.ts';
import { unitNames } from '../../core/units/unitSystem.ts';
import type { Pushed, PushedStiffness } from './pushed.ts';

/** A push test as a table, in the units of the project: N/mm or kip/in, which stands over it. */
export function pushTable(test: Pushed, units: UnitSystem): string {
  const { mark, bay, section, length, at, inPlace, offered } = test;
  const head = `${mark} of ${bay}, ${section}, ${showLength(length, units)}; pushed ${showLength(at, units)} from end A`;
  const rows = [
    ...(inPlace ? [rowOf('bar in place', inPlace, units)] : []),
    ...(offered ? [rowOf('offered by the rest', offered, units)] : []),
  ];
  const table = textTable(
    [
      { head: unitNames(units).stiffness, align: 'left' },
      { head: 'in plane, across', align: 'right' },
      { head: 'out of plane', align: 'right' },
      { head: 'stiffest', align: 'right' },
      { head: 'softest', align: 'right' },
      { head: 'stiffest way from x', align: 'right' },
    ],
    rows,
  );
  return [
    head,
    ...(inPlace ? [] : ['It can move there without resistance.']),
    ...(offered ? [] : ['Nothing is joined to it there, so the rest of the bay offers nothing.']),
    ...(rows.length > 0 ? ['', table] : ['']),
    ...(inPlace ? [IN_PLACE] : []),
    ...(offered ? [OFFERED] : []),
  ].join('\n');
}

/** The two are measured differently, and neither is a share of the other. */
const IN_PLACE = 'Bar in place: the whole bay gives under the push, the ends of the bar too.\n';
const OFFERED =
  'Offered by the rest: the bending of the bar left out and its ends held still, so that what is joined to it there answers alone.\n';

function rowOf(name: string, s: PushedStiffness, units: UnitSystem): readonly string[] {
  const figure = (value: number): string => showStiffness(value, units, 'bare');
  return [
    name,
    figure(s.inPlane),
    figure(s.outOfPlane),
    figure(s.stiff),
    figure(s.soft),
    `${grouped(s.stiffWayDegrees, 1)}°`,
  ];
}
