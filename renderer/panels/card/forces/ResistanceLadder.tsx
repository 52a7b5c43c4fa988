import type { JSX } from 'react';
import type { BarChecks } from '../../../../core/checks/model.ts';
import type { UnitSystem } from '../../../../core/project/model.ts';
import { showForce } from '../../../../core/units/loads.ts';

const WIDTH = 390;
const LEFT = 2;

/** What acts against every resistance on one axis of force; the governing one heavy. */
export function ResistanceLadder({
  checks,
  units,
}: {
  readonly checks: BarChecks;
  readonly units: UnitSystem;
}): JSX.Element | null {
  const { governing } = checks;
  const rungs = checks.checks.flatMap((check) => {
    const { resistance } = check.resistance;
    const counted =
      check.resistance.against !== 'compression' || check.resistance.kind === checks.compressionBy?.kind;
    return resistance === null || !counted
      ? []
      : [{ N: resistance, name: SHORT[check.resistance.kind], governs: check === governing }];
  });
  const alike = new Map(rungs.map((rung) => [`${rung.name} ${rung.N.toFixed(0)}`, rung]));
  for (const rung of rungs) if (rung.governs) alike.set(`${rung.name} ${rung.N.toFixed(0)}`, rung);
  const shown = [...alike.values()].sort((a, b) => a.N - b.N);
  const demand = governing?.demand?.force ?? 0;
  const most = Math.max(demand, ...shown.map(({ N }) => N)) * 1.04;
  if (most <= 0 || shown.length === 0) return null;
  const at = (N: number): number => LEFT + (N / most) * (WIDTH - 2 * LEFT);
  return (
    <figure className="ladder">
      <svg viewBox={`0 0 ${WIDTH} 20`} role="img" aria-label={spoken(shown, demand, units)}>
        <rect x={LEFT} y="5" width={WIDTH - 2 * LEFT} height="10" className="ladder-axis" />
        <rect x={LEFT} y="5" width={Math.max(0, at(demand) - LEFT)} height="10" className="ladder-demand" />
        {shown.map(({ N, name, governs }) => (
          <line
            key={`${name} ${N}`}
            x1={at(N)}
            x2={at(N)}
            y1={governs ? 0 : 3}
            y2={governs ? 20 : 17}
            className={governs ? 'ladder-rung governs' : 'ladder-rung'}
          />
        ))}
      </svg>
      <ol className="ladder-names">
        {shown.map(({ N, name, governs }) => (
          <li key={`${name} ${N}`} data-governs={governs || undefined}>
            {name} {showForce(N, units, 'bare')}
          </li>
        ))}
      </ol>
    </figure>
  );
}

const SHORT: Readonly<Record<BarChecks['checks'][number]['resistance']['kind'], string>> = {
  'gross yield': 'gross',
  'net rupture': 'net',
  'block shear': 'block',
  'bolt shear': 'bolts',
  'bolt bearing': 'bearing',
  weld: 'weld',
  'compression, critical load': 'critical load',
  'compression, lengths by the practice': 'lengths',
  'compression, one leg': 'one leg',
};

function spoken(
  shown: readonly { readonly N: number; readonly name: string }[],
  demand: number,
  units: UnitSystem,
): string {
  const rungs = shown.map(({ N, name }) => `${name} ${showForce(N, units)}`).join(', ');
  return `Acts: ${showForce(demand, units)}. Resists: ${rungs}.`;
}
