import type { ResistingSection } from '../model.ts';

/** Diameter of a round bar of that area, mm. */
export const rodDiameter = ({ properties }: ResistingSection): number =>
  Math.sqrt((4 * properties.area) / Math.PI);
