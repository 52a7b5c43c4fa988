import type { Edit } from '../project/edit.ts';

/** A change that might answer a finding, before its effect is known. */
export interface Proposal {
  readonly label: string;
  readonly detail: string;
  readonly edits: readonly Edit[];
}
