/** What is wrong, where in the file, and what to do. */
export interface ProjectProblem {
  /** "bays[0].recipe.width"; "" for the file as a whole. */
  readonly path: string;
  readonly what: string;
  readonly todo: string;
}
