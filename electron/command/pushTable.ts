import { textTable } from '../../core/documents/textTable.ts';
import { grouped } from '../../core/units/figures.ts';
import type { Pushed, PushedStiffness } from './pushed.ts';

export function pushTable(test: Pushed): string {
  const { mark, bay, section, length, at, inPlace, offered } = test;
  const head = `${mark} of ${bay}, ${section}, ${grouped(length, 0)} mm; pushed ${grouped(at, 0)} mm from end A`;
  const rows = [
    ...(inPlace ? [rowOf('bar in place', inPlace)] : []),
    ...(offered ? [rowOf('offered by the rest', offered)] : []),
  ];
  const table = textTable(
    [
      { head: 'N/mm', align: 'left' },
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
  ].join('\n');
}

function rowOf(name: string, s: PushedStiffness): readonly string[] {
  const figure = (value: number): string => grouped(value, value < 100 ? 2 : 0);
  return [
    name,
    figure(s.inPlane),
    figure(s.outOfPlane),
    figure(s.stiff),
    figure(s.soft),
    `${grouped(s.stiffWayDegrees, 1)}°`,
  ];
}
