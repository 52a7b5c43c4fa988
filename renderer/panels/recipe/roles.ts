import type { Role } from '../../../core/project/model.ts';

/** What a bar of a free bay may be; diagonals, knees and ties are checked, beams and struts for what squeezes them. */
export const ROLES: readonly { readonly value: Role; readonly label: string }[] = [
  { value: 'diagonal', label: 'diagonal' },
  { value: 'knee', label: 'knee' },
  { value: 'tie', label: 'tie' },
  { value: 'column', label: 'column' },
  { value: 'beam', label: 'beam' },
  { value: 'strut', label: 'strut' },
  { value: 'rafter', label: 'rafter' },
  { value: 'purlin', label: 'purlin' },
  { value: 'rail', label: 'side rail' },
  { value: 'chord', label: 'chord' },
];
