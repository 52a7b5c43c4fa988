import type { Project } from './model.ts';

/** The text of a project file: JSON with two spaces, a line end at the end, so that versions compare line by line. */
export function writeProject(project: Project): string {
  return `${JSON.stringify(project, null, 2)}\n`;
}
