import type { JoinKind } from './model.ts';

/** What a join is called, on screens and in documents. */
export const JOIN_NAMES: Readonly<Record<JoinKind, string>> = {
  none: 'not joined',
  bolted: 'bolted through',
  packed: 'bolted with packer',
  cut: 'one bar cut and plated',
  welded: 'welded',
  purlin: 'bolted to purlin',
  hung: 'hung, sag only',
};
