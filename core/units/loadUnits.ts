import { grouped } from './figures.ts';
import { MM_PER_INCH, N_PER_KIP, type UnitSystem, unitNames } from './unitSystem.ts';

export interface LoadUnit {
  readonly unit: string;
  /** Shown units in one kN, kN/m or kN/m². */
  readonly shown: number;
  readonly step: number;
  readonly decimals: number;
}

const FEET_PER_METRE = 1000 / (12 * MM_PER_INCH);
const KIP_PER_KN = 1000 / N_PER_KIP;

/** What loads are typed in: files keep kN, kN/m and kN/m². */
export function loadUnits(units: UnitSystem): Readonly<Record<'force' | 'perLength' | 'pressure', LoadUnit>> {
  if (units === 'us')
    return {
      force: { unit: unitNames(units).force, shown: KIP_PER_KN, step: 1, decimals: 2 },
      perLength: { unit: 'kip/ft', shown: KIP_PER_KN / FEET_PER_METRE, step: 0.05, decimals: 3 },
      pressure: { unit: 'psf', shown: (1000 * KIP_PER_KN) / FEET_PER_METRE ** 2, step: 1, decimals: 1 },
    };
  return {
    force: { unit: unitNames(units).force, shown: 1, step: 1, decimals: 2 },
    perLength: { unit: 'kN/m', shown: 1, step: 0.5, decimals: 3 },
    pressure: { unit: 'kN/m²', shown: 1, step: 0.05, decimals: 3 },
  };
}

/** kN, kN/m or kN/m² of a file in the project's units: "0.75 kN/m²", "15.7 psf". */
export function showLoad(value: number, of: 'force' | 'perLength' | 'pressure', units: UnitSystem): string {
  const { unit, shown, decimals } = loadUnits(units)[of];
  return `${grouped(value * shown, decimals)} ${unit}`;
}
