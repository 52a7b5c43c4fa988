/** Answers that change the pattern, or what a bar is counted on for. */
import type { Assessment } from '../assessment.ts';
import type { Finding } from '../findings/model.ts';
import type { BarId } from '../layout/model.ts';
import type { Bay, Pattern, Recipe } from '../project/model.ts';
import { barsOf } from './places.ts';
import type { Proposal } from './proposal.ts';

export function countOnBoth(bars: readonly BarId[]): Proposal {
  return {
    label: 'Count it on in compression too',
    detail: 'its limit then follows the compression class',
    edits: [{ kind: 'bars', bars, change: { countedOn: 'both' } }],
  };
}

export function changePattern(
  assessment: Assessment,
  finding: Finding,
  pattern: Pattern,
  label: string,
): readonly Proposal[] {
  const bay = assessment.project.bays.find((each) => each.id === finding.bay);
  const key = barsOf(assessment, finding.bars)[0]?.key;
  if (!bay || !key) return [];
  const recipe = withPattern(bay.recipe, key, pattern);
  return recipe ? [patternProposal(bay, recipe, label, 'a second diagonal for the reversed load')] : [];
}

/** Knees on one side of a chord get their partners on the other. */
export function kneesOnBothSides(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const bay = assessment.project.bays.find((each) => each.id === finding.bay);
  if (bay?.recipe.kind !== 'knee' || bay.recipe.sides === 'both') return [];
  const recipe = { ...bay.recipe, sides: 'both' } as const;
  return [patternProposal(bay, recipe, 'Put knees on both sides', 'one of each pair is always pulled')];
}

/** A partner whose end is free as a rule stands over an open tier: bracing that tier holds it. */
export function crossOpenPanels(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const bay = assessment.project.bays.find((each) => each.id === finding.bay);
  if (finding.id.startsWith('free-line') || bay?.recipe.kind !== 'wall') return [];
  if (!bay.recipe.tiers.some((tier) => tier.pattern === 'open')) return [];
  const tiers = bay.recipe.tiers.map((tier) =>
    tier.pattern === 'open' ? { ...tier, pattern: 'crossed' as const } : tier,
  );
  return [
    patternProposal(
      bay,
      { ...bay.recipe, tiers },
      'Brace the open tier',
      'crossed, so that what stands on it is held',
    ),
  ];
}

function patternProposal(bay: Bay, recipe: Recipe, label: string, detail: string): Proposal {
  return { label, detail, edits: [{ kind: 'recipe', bay: bay.id, recipe, what: 'the pattern' }] };
}

/** The recipe with another pattern in the tier or panel to which the bar belongs; null where there is no such thing. */
function withPattern(recipe: Recipe, key: string, pattern: Pattern): Recipe | null {
  const panel = key.slice(0, key.lastIndexOf('.'));
  if (recipe.kind === 'wall')
    return {
      ...recipe,
      tiers: recipe.tiers.map((tier) => (tier.id === panel ? { ...tier, pattern } : tier)),
    };
  if (recipe.kind === 'roof')
    return {
      ...recipe,
      slopes: recipe.slopes.map((slope) => ({
        ...slope,
        panels: slope.panels.map((each) =>
          `${slope.id}.${each.id}` === panel ? { ...each, pattern } : each,
        ),
      })),
    };
  return null;
}
