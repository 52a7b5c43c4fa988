/** Which units figures are shown in. Only what is read and shown knows of it; inside, everything is N, mm and rad. */
export type UnitSystem = 'metric' | 'us';

export const MM_PER_INCH = 25.4;
export const KG_PER_POUND = 0.45359237;
/** kg/m in one lb/ft. */
export const KG_PER_METRE_PER_POUND_FOOT = KG_PER_POUND / 0.3048;
/** A kip is the weight of 1000 lb under the standard 9.80665 m/s². */
export const N_PER_KIP = 1000 * KG_PER_POUND * 9.80665;

/** Unit names for the heads of columns and the axes of charts. */
export function unitNames(units: UnitSystem): {
  readonly length: string;
  readonly radius: string;
  readonly mass: string;
  readonly massPerMetre: string;
  readonly force: string;
  readonly stiffness: string;
} {
  return units === 'us'
    ? {
        length: 'ft-in',
        radius: 'in',
        mass: 'lb',
        massPerMetre: 'lb/ft',
        force: 'kip',
        stiffness: 'kip/in',
      }
    : { length: 'mm', radius: 'mm', mass: 'kg', massPerMetre: 'kg/m', force: 'kN', stiffness: 'N/mm' };
}
