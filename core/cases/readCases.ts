import { CaseReader, shown } from './caseReader.ts';
import type { CaseProblem, CaseRead, CasesRead, CaseType, StabilityCase } from './model.ts';
import { readBarCase } from './readBarCase.ts';
import { readPairCase } from './readPairCase.ts';

const TYPES: readonly CaseType[] = ['bar', 'xbrace-planar', 'bar-flexural-torsional'];

/**
 * Stability cases out of parsed JSON: an object with the list `cases`, or the list itself. `result` and `check` of a case are passed over, like
 * every field that is not known. A case that cannot be understood says why and keeps no other from being read.
 */
export function readCases(data: unknown): CasesRead {
  const whole = new CaseReader(data, '', []);
  const list = whole.isList ? whole : whole.at('cases');
  if (!list.isList)
    return {
      ok: false,
      problem: {
        path: whole.isList ? '' : list.path,
        what: 'There is no list of cases.',
        todo: 'Give an object with the list “cases”, or the list itself.',
      },
    };
  return { ok: true, cases: withoutDoubles(list.list().map(({ value }, k) => readCase(value, k))) };
}

/** Results go by their id: a second case of one name could not be told from the first. */
function withoutDoubles(cases: readonly CaseRead[]): readonly CaseRead[] {
  const seen = new Set<string>();
  return cases.map((each): CaseRead => {
    const id = each.ok ? each.case.id : each.id;
    if (!seen.has(id)) {
      seen.add(id);
      return each;
    }
    const problem = {
      path: 'id',
      what: 'Another case before this one has the same id.',
      todo: 'Give each an id of its own.',
    };
    return { ok: false, id, problems: [...(each.ok ? [] : each.problems), problem] };
  });
}

function readCase(value: unknown, index: number): CaseRead {
  const problems: CaseProblem[] = [];
  const reader = new CaseReader(value, '', problems).object('a case with names and values');
  const given = reader.at('id').value;
  const named = typeof given === 'string' || typeof given === 'number' ? String(given) : '';
  const id = named === '' ? `cases[${index}]` : named;
  if (named === '' && problems.length === 0)
    reader.at('id').problem('The case has no id.', 'Give it a text of its own, such as “bar-1”.');
  const read = problems.length === 0 ? readByType(reader, id) : null;
  return read && problems.length === 0 ? { ok: true, case: read } : { ok: false, id, problems };
}

function readByType(reader: CaseReader, id: string): StabilityCase | null {
  const given = reader.at('type');
  const type = TYPES.find((each) => each === given.value);
  switch (type) {
    case 'bar':
    case 'bar-flexural-torsional':
      return readBarCase(reader, id, type);
    case 'xbrace-planar':
      return readPairCase(reader, id);
    case undefined:
      given.problem(
        given.isGiven ? `${shown(given.value)} is no type of case.` : 'The case has no type.',
        `Give one of ${TYPES.join(', ')}.`,
      );
      return null;
    default:
      return type satisfies never;
  }
}
