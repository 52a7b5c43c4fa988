import type { z } from 'zod';
import { migrated } from './migrations.ts';
import { PROJECT_FORMAT, PROJECT_VERSION, type Project } from './model.ts';
import type { ProjectProblem } from './problem.ts';
import { asProject, projectSchema } from './schema.ts';
import { structureProblems } from './structure.ts';

export type ProjectRead =
  | { readonly ok: true; readonly project: Project; readonly migratedFrom: number | null }
  | { readonly ok: false; readonly problems: readonly ProjectProblem[] };

const refuse = (path: string, what: string, todo: string): ProjectRead => ({
  ok: false,
  problems: [{ path, what, todo }],
});

/** Longest list of problems that helps anyone. */
const MOST_PROBLEMS = 20;

/**
 * Reads a project file. Older versions are brought up to date; nothing is guessed.
 * A section that no stock list has is not refused here: `assess` reports it as a finding, so that the file can be opened and mended.
 */
export function readProject(text: string): ProjectRead {
  let data: unknown;
  try {
    // Some editors put a byte-order mark before a text.
    data = JSON.parse(text.replace(/^\uFEFF/, ''));
  } catch (error) {
    const where = error instanceof Error ? ` (${error.message})` : '';
    return refuse(
      '',
      `The file is not readable as JSON${where}.`,
      'Open the last good copy kept beside it, or a backup.',
    );
  }
  return readProjectData(data);
}

/** As `readProject`, for data already parsed. */
export function readProjectData(data: unknown): ProjectRead {
  if (typeof data !== 'object' || data === null || Array.isArray(data))
    return refuse('', 'The file does not hold a project.', 'Choose a file that Tautline saved.');
  const { format, version } = data as { format?: unknown; version?: unknown };
  if (format !== PROJECT_FORMAT)
    return refuse(
      'format',
      `The file says its format is ${shown(format)}, not "${PROJECT_FORMAT}".`,
      'Choose a file that Tautline saved.',
    );
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 1)
    return refuse(
      'version',
      version === undefined
        ? 'The file does not say its version.'
        : `The version ${shown(version)} is not a whole number from 1.`,
      'Open a backup of the file.',
    );
  if (version > PROJECT_VERSION)
    return refuse(
      'version',
      `The file is of version ${version}; this program knows versions up to ${PROJECT_VERSION}.`,
      'Open it with a newer Tautline. Nothing was changed.',
    );

  const parsed = projectSchema.safeParse(migrated(data as Record<string, unknown>, version));
  if (!parsed.success)
    return {
      ok: false,
      problems: parsed.error.issues.slice(0, MOST_PROBLEMS).map((issue) => problemOf(issue, data)),
    };
  const project = asProject(parsed.data);
  const problems = structureProblems(project);
  if (problems.length > 0) return { ok: false, problems: problems.slice(0, MOST_PROBLEMS) };
  return { ok: true, project, migratedFrom: version === PROJECT_VERSION ? null : version };
}

function problemOf(issue: z.core.$ZodIssue, data: unknown): ProjectProblem {
  const path = pathText(issue.path);
  const value = valueAt(data, issue.path);
  switch (issue.code) {
    case 'invalid_type':
      return value === undefined
        ? { path, what: 'A value is missing here.', todo: `Give ${article(issue.expected)}.` }
        : {
            path,
            what: `${shown(value)} is not ${article(issue.expected)}.`,
            todo: `Give ${article(issue.expected)}.`,
          };
    case 'too_small':
      return {
        path,
        what: `${shown(value)} is too small.`,
        todo: `Give at least ${counted(Number(issue.minimum), issue.origin)}.`,
      };
    case 'too_big':
      return {
        path,
        what: `${shown(value)} is too large.`,
        todo: `Give at most ${counted(Number(issue.maximum), issue.origin)}.`,
      };
    case 'invalid_value':
      return {
        path,
        what: `${shown(value)} is not one of the choices.`,
        todo: `Choose ${issue.values.map((v) => shown(v)).join(', ')}.`,
      };
    case 'unrecognized_keys':
      return {
        path,
        what: `Unknown entry ${issue.keys.map((k) => `"${k}"`).join(', ')}.`,
        todo: 'Take it out, or correct its spelling.',
      };
    case 'invalid_union':
      return {
        path,
        what: `${shown(value)} is none of the kinds known here.`,
        todo: 'Correct its "kind", or take the entry out.',
      };
    case 'invalid_format':
    case 'invalid_key':
      return {
        path,
        what: `${shown(value ?? issue.path.at(-1))} is not usable as a name here.`,
        todo: 'Use letters, digits, dot, plus, hyphen and underscore, and begin with a letter or digit.',
      };
    default:
      return { path, what: issue.message, todo: 'Correct the value.' };
  }
}

/** "1 entry", "60 characters", "6000". */
function counted(value: number, origin: string): string {
  const one = value === 1;
  if (origin === 'array') return `${value} ${one ? 'entry' : 'entries'}`;
  return origin === 'string' ? `${value} ${one ? 'character' : 'characters'}` : String(value);
}

function article(expected: string): string {
  switch (expected) {
    case 'number':
      return 'a number';
    case 'int':
      return 'a whole number';
    case 'string':
      return 'a text in quotes';
    case 'boolean':
      return 'true or false';
    case 'array':
    case 'tuple':
      return 'a list in square brackets';
    case 'object':
    case 'record':
      return 'a group in braces';
    default:
      return `a value of type ${expected}`;
  }
}

export function pathText(path: readonly PropertyKey[]): string {
  return path.reduce<string>(
    (text, part) =>
      typeof part === 'number' ? `${text}[${part}]` : text ? `${text}.${String(part)}` : String(part),
    '',
  );
}

function valueAt(data: unknown, path: readonly PropertyKey[]): unknown {
  return path.reduce<unknown>(
    (value, part) =>
      typeof value === 'object' && value !== null ? (value as Record<PropertyKey, unknown>)[part] : undefined,
    data,
  );
}

function shown(value: unknown): string {
  const text = typeof value === 'number' ? String(value) : (JSON.stringify(value) ?? 'nothing');
  return text.length > 60 ? `${text.slice(0, 57)}…` : text;
}
