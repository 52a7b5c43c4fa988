/** Rooms of core from the lowest up. A room imports from itself and from those before it. */
export const ROOMS: readonly (readonly string[])[] = [
  ['geometry', 'units', 'sparse'],
  ['section'],
  ['catalogue'],
  ['project'],
  ['layout'],
  ['practice'],
  ['restraint', 'resistance'],
  ['stability'],
  ['frame'],
  ['forces'],
  ['bowing'],
  ['checks'],
  ['cases', 'shortlist'],
  ['findings'],
  ['schedule'],
  ['documents'],
  ['assess'],
  ['remedies', 'study'],
];

/** `core/assessment.ts`: the type of everything derived, which those that work on the whole of it may name. */
export const READS_THE_ASSESSMENT: readonly string[] = [
  'shortlist',
  'findings',
  'documents',
  'assess',
  'remedies',
  'study',
];
