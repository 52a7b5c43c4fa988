import type { Project } from '../project/model.ts';

/** Eight hexadecimal digits that differ when anything in the project does, so that a print can be told from another. Not for security. */
export function projectState(project: Project): string {
  const text = JSON.stringify(project);
  // FNV-1a, 32 bits.
  let hash = 0x811c9dc5;
  for (let index = 0; index < text.length; index++) {
    hash ^= text.charCodeAt(index);
    hash = Math.imul(hash, 0x01000193);
  }
  const digits = (hash >>> 0).toString(16).padStart(8, '0');
  return `${digits.slice(0, 4)}·${digits.slice(4)}`;
}
