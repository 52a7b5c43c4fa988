import type { CaseProblem } from '../../core/cases/model.ts';
import type { ProjectProblem } from '../../core/project/problem.ts';

/** What a command could not do, as plain data. */
export type Trouble =
  | { readonly kind: 'unreadable'; readonly file: string; readonly why: string }
  | { readonly kind: 'no project'; readonly file: string; readonly problems: readonly ProjectProblem[] }
  | { readonly kind: 'no JSON'; readonly file: string; readonly why: string }
  | { readonly kind: 'no cases'; readonly file: string; readonly problem: CaseProblem }
  | {
      readonly kind: 'bad case';
      readonly file: string;
      readonly id: string;
      readonly problems: readonly CaseProblem[];
    }
  | { readonly kind: 'unwritable'; readonly file: string; readonly why: string }
  | { readonly kind: 'would overwrite'; readonly file: string }
  | { readonly kind: 'over a project'; readonly file: string }
  | { readonly kind: 'no such section'; readonly typed: string; readonly nearest: readonly string[] }
  | {
      readonly kind: 'section in another list';
      readonly typed: string;
      readonly list: string;
      readonly other: string;
    }
  | { readonly kind: 'bad value'; readonly what: string; readonly todo: string };

export type Attempt<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly trouble: Trouble };

/** Lines for the error stream: what is wrong, where, and what to do. */
export function troubleText(trouble: Trouble): string {
  switch (trouble.kind) {
    case 'unreadable':
      return `${trouble.file}: cannot be read (${trouble.why}). Check the name and your rights to it.`;
    case 'no project':
      return trouble.problems
        .map(({ path, what, todo }) => `${trouble.file}${path === '' ? '' : `: ${path}`}: ${what} ${todo}`)
        .join('\n');
    case 'no JSON':
      return `${trouble.file}: is no JSON (${trouble.why}). Check that it is the file meant, and whole.`;
    case 'no cases':
      return `${trouble.file}: ${trouble.problem.what} ${trouble.problem.todo}`;
    case 'bad case':
      return trouble.problems
        .map(
          ({ path, what, todo }) =>
            `${trouble.file}: ${trouble.id}${path === '' ? '' : `: ${path}`}: ${what} ${todo}`,
        )
        .join('\n');
    case 'unwritable':
      return `${trouble.file}: cannot be written (${trouble.why}). Check the folder and your rights to it; nothing was changed.`;
    case 'would overwrite':
      return `${trouble.file}: is there already. Choose another name, or give --force to replace it; nothing was changed.`;
    case 'over a project':
      return `${trouble.file}: is a project, which this would replace. Choose another name for what is written; nothing was changed.`;
    case 'no such section':
      return `${trouble.typed.trim() === '' ? '“”' : trouble.typed}: in no stock list. ${nearestText(trouble.nearest)}`;
    case 'section in another list':
      return `${trouble.typed}: not in the list asked for (${trouble.list}), but in ${trouble.other}. Leave --catalogue out, or give --catalogue ${trouble.other}.`;
    case 'bad value':
      return `${trouble.what} ${trouble.todo}`;
    default:
      return trouble satisfies never;
  }
}

export function nearestText(nearest: readonly string[]): string {
  return nearest.length > 0 ? `Nearest: ${nearest.join(', ')}.` : 'Type it like 70x70x6 or L3x3x1/4.';
}
