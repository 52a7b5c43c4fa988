import type { Bar } from '../layout/model.ts';
import type { Member } from '../project/model.ts';

/** A member that a freely drawn bay does not name. Shown as an assumption wherever a force rests on it. */
const ASSUMED: Member = { name: 'assumed member', shape: 'I', depth: 150, width: 100 };

export const structuralMember = (bar: Bar): Member => bar.member ?? ASSUMED;
