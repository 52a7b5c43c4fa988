import type { PlanarBar } from '../stability/pair.ts';
import { type CaseReader, shown } from './caseReader.ts';
import type { PairCase } from './model.ts';

export function readPairCase(reader: CaseReader, id: string): PairCase {
  return {
    type: 'xbrace-planar',
    id,
    considered: readBar(reader, 'considered'),
    partner: readBar(reader, 'partner'),
    tensionShare: reader.at('T_over_C').number(),
  };
}

function readBar(reader: CaseReader, name: 'considered' | 'partner'): PlanarBar {
  const bar = reader.at(name).object('a bar with L, EI and at_crossing');
  const length = bar.at('L').number('above zero');
  return {
    length,
    EI: bar.at('EI').number('above zero'),
    crossingAt: crossingAt(reader, name, length),
    cut: isCut(bar.at('at_crossing')),
  };
}

/** "continuous", or one of the words for a hinge out of the plane. */
function isCut(given: CaseReader): boolean {
  const word = given.text().trim().toLowerCase();
  if (/^(continuous|runs? through)/.test(word)) return false;
  if (/^(cut|interrupted|hinged?|discontinuous|pinned)/.test(word)) return true;
  given.problem(
    given.isGiven ? `${shown(given.value)} says neither.` : 'It is not given.',
    'Give “continuous”, or “cut”, “interrupted” or “hinged” for a hinge out of the plane.',
  );
  return false;
}

/** At mid-length, unless `crossing_at` says where, mm from z = 0: with the bar, or for the pair as a number or one for each bar. */
function crossingAt(reader: CaseReader, name: 'considered' | 'partner', length: number): number {
  const whole = reader.at('crossing_at');
  const places = [reader.at(name).at('crossing_at'), whole.at(name), whole];
  const given = places.find(({ value }) => typeof value === 'number') ?? places.find((each) => each.isGiven);
  if (given) {
    const at = given.number('above zero');
    if (at < length || length !== reader.at(name).at('L').value) return at;
    given.problem(`${at} is not on the bar, which is ${length} long.`, 'Give mm from the end z = 0.');
    return length / 2;
  }
  const inWords = reader.at('crossing');
  if (inWords.isGiven && !/\b(mid|middle|centre|center)/i.test(inWords.text()))
    inWords.problem(
      `${shown(inWords.value)} does not say “mid”, and there is no crossing_at.`,
      'Give crossing_at, mm from the end z = 0 of each bar: {"considered": 2000, "partner": 2500}.',
    );
  return length / 2;
}
