/** What is measured, in order. Each part makes its rows when its turn comes. */
import { assessing } from './assessing.ts';
import { bundle } from './bundle.ts';
import { choosing } from './choosing.ts';
import { drawing } from './drawing.ts';
import { forces } from './forces.ts';
import type { Row } from './row.ts';
import { sparse } from './sparse.ts';
import { stability } from './stability.ts';

export interface Part {
  readonly name: string;
  /** @param root folder of the project */
  readonly rows: (root: string) => readonly Row[];
}

export const PARTS: readonly Part[] = [
  { name: 'assess', rows: assessing },
  { name: 'shortlist and remedies', rows: choosing },
  { name: 'critical loads', rows: stability },
  { name: 'sparse factors', rows: sparse },
  { name: 'forces and checks', rows: forces },
  { name: 'drawing', rows: drawing },
  { name: 'bundle', rows: bundle },
];
