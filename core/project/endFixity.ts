import type { EndFixity, Settings } from './model.ts';

/** Gusset stiff in its plane, a hinge out of it: what a project takes that says nothing. */
export const GUSSETED: EndFixity = { inPlane: 'stiff', outOfPlane: 'hinged' };

export const endFixityOf = ({ endFixity = GUSSETED }: Pick<Settings, 'endFixity'>): EndFixity => endFixity;
