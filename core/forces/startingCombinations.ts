/** Combinations to begin with, by practice. All from memory, to be checked against the loading standard in force: the user's own take their place. */

import type { Confidence } from '../practice/model.ts';
import type { CaseKind, Combination, LoadCase } from '../project/actions.ts';
import type { PracticeId, ResistanceSettings } from '../project/model.ts';

export interface CombinationRule {
  readonly use: Combination['use'];
  readonly permanent: number;
  readonly imposed: number;
  readonly wind: number;
  readonly leaning: boolean;
}

export interface CombinationSet {
  readonly source: string;
  readonly confidence: Confidence;
  readonly rules: readonly CombinationRule[];
}

const strength = (permanent: number, imposed: number, wind: number): CombinationRule => ({
  use: 'strength',
  permanent,
  imposed,
  wind,
  leaning: true,
});
const service = (permanent: number, imposed: number, wind: number): CombinationRule => ({
  use: 'service',
  permanent,
  imposed,
  wind,
  leaning: false,
});
const SERVICE = [service(1, 1, 0), service(1, 0, 1)];

export function combinationSet(practice: PracticeId, method: ResistanceSettings['method']): CombinationSet {
  switch (practice) {
    case 'sans10162':
      return {
        source: 'SANS 10160-1',
        confidence: 'from memory, verify',
        rules: [strength(1.2, 1.6, 0), strength(1.2, 0.5, 1.3), strength(0.9, 0, 1.3), ...SERVICE],
      };
    case 'csaS16':
      return {
        source: 'National Building Code of Canada, Table 4.1.3.2',
        confidence: 'from memory, verify',
        rules: [
          strength(1.25, 1.5, 0),
          strength(1.25, 1.5, 0.4),
          strength(1.25, 0.5, 1.4),
          strength(0.9, 0, 1.4),
          ...SERVICE,
        ],
      };
    case 'aisc360':
      return method === 'ASD'
        ? {
            source: 'ASCE 7, allowable stress',
            confidence: 'from memory, sure',
            rules: [
              strength(1, 1, 0),
              strength(1, 0, 0.6),
              strength(1, 0.75, 0.45),
              strength(0.6, 0, 0.6),
              ...SERVICE,
            ],
          }
        : {
            source: 'ASCE 7, strength',
            confidence: 'from memory, sure',
            rules: [strength(1.2, 1.6, 0), strength(1.2, 1, 1), strength(0.9, 0, 1), ...SERVICE],
          };
    case 'en1993':
      return {
        source: 'EN 1990, (6.10) with recommended factors, ψ₀ 0.7 for imposed loads, 0.6 for wind',
        confidence: 'from memory, sure',
        rules: [
          strength(1.35, 1.5, 0),
          strength(1.35, 1.5, 0.9),
          strength(1.35, 1.05, 1.5),
          strength(1, 0, 1.5),
          ...SERVICE,
        ],
      };
    case 'as4100':
      return {
        source: 'AS/NZS 1170.0, 4.2.2',
        confidence: 'from memory, sure',
        rules: [strength(1.2, 1.5, 0), strength(1.2, 0.4, 1), strength(0.9, 0, 1), ...SERVICE],
      };
    case 'is800':
      return {
        source: 'IS 800 Table 4',
        confidence: 'from memory, sure',
        rules: [
          strength(1.5, 1.5, 0),
          strength(1.2, 1.2, 1.2),
          strength(1.5, 0, 1.5),
          strength(0.9, 0, 1.5),
          ...SERVICE,
        ],
      };
    default:
      return practice satisfies never;
  }
}

/** The set laid over the project's cases: wind cases one at a time, all others together. Combinations that would come to nothing, or twice, are left out. */
export function startingCombinations(
  { rules }: CombinationSet,
  cases: readonly LoadCase[],
): readonly Combination[] {
  const winds = cases.filter(({ kind }) => kind === 'wind');
  const seen = new Set<string>();
  const found: Combination[] = [];
  for (const rule of rules)
    for (const wind of rule.wind !== 0 && winds.length > 0 ? winds : [null]) {
      const factors = Object.fromEntries(
        cases.flatMap(({ id, kind }) => {
          const factor = factorOf(rule, kind);
          return factor !== 0 && (kind !== 'wind' || id === wind?.id) ? [[id, factor]] : [];
        }),
      );
      const says = `${rule.use} ${JSON.stringify(factors)}`;
      const needed = rule.wind !== 0 ? wind !== null : Object.keys(factors).length > 0;
      if (!needed || seen.has(says)) continue;
      seen.add(says);
      const letter = rule.use === 'strength' ? 'C' : 'S';
      const number = found.filter(({ use }) => use === rule.use).length + 1;
      found.push({ id: `${letter}${number}`, name: '', use: rule.use, factors, leaning: rule.leaning });
    }
  return found;
}

function factorOf(rule: CombinationRule, kind: CaseKind): number {
  switch (kind) {
    case 'permanent':
      return rule.permanent;
    case 'imposed':
      return rule.imposed;
    case 'wind':
      return rule.wind;
    case 'other':
      // What is neither, such as pretension, is there throughout.
      return 1;
    default:
      return kind satisfies never;
  }
}
