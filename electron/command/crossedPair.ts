import type { CatalogueId } from '../../core/catalogue/model.ts';
import type { PracticeId, Project } from '../../core/project/model.ts';
import { newWallBay } from '../../core/project/newBay.ts';
import { newProject } from '../../core/project/newProject.ts';
import { readProjectData } from '../../core/project/readProject.ts';
import type { Attempt } from './trouble.ts';

export interface CrossedPairInput {
  /** Set-out length of each diagonal, mm. */
  readonly length: number;
  readonly crossing: 'joined' | 'free';
  readonly limit?: number;
  readonly practice: PracticeId;
  readonly catalogue: CatalogueId;
  readonly legs: 'longer' | 'shorter' | 'both';
  readonly countedOn: 'tension' | 'both';
  /** Diameter of the end bolts, mm. */
  readonly bolt: number;
}

export interface CrossedPair {
  readonly project: Project;
  /** One of the two diagonals. */
  readonly bar: string;
}

/** From the last bolt to the end of the bar, mm. */
const END_DISTANCE = 40;

/**
 * A bay of one crossed tier whose diagonals have a given length and cross at their middle, as fabricated over that whole length.
 *
 * @param section what the diagonals are; null takes any, for a list that tries them all
 */
export function crossedPair(input: CrossedPairInput, section: string | null): Attempt<CrossedPair> {
  const bay = newWallBay('W1', 'crossed pair', input.catalogue);
  const { recipe, diagonals } = bay;
  if (recipe.kind !== 'wall') throw new Error('a wall bay with another recipe');
  const project = newProject('crossed pair');
  const read = readProjectData({
    ...project,
    settings: {
      ...project.settings,
      practice: input.practice,
      catalogue: input.catalogue,
      ownLimit: input.limit ?? null,
    },
    bays: [
      {
        ...bay,
        // Three, four, five: the diagonal comes out at the very length.
        recipe: {
          ...recipe,
          width: input.length * 0.8,
          tiers: [{ id: 't1', height: input.length * 0.6, pattern: 'crossed' }],
        },
        diagonals: {
          ...diagonals,
          section: section ?? diagonals.section,
          countedOn: input.countedOn,
          legInPlane: input.legs === 'shorter' ? 'shorter' : 'longer',
          // Steel from set-out point to set-out point, so that handling is judged over the whole length.
          ends: {
            ...diagonals.ends,
            boltDiameter: input.bolt,
            endDistance: END_DISTANCE,
            setBack: END_DISTANCE,
          },
        },
        joins: { 't1.fall+t1.rise': input.crossing === 'joined' ? { kind: 'bolted' } : { kind: 'none' } },
      },
    ],
  });
  if (!read.ok) {
    const [problem] = read.problems;
    return {
      ok: false,
      trouble: {
        kind: 'bad value',
        what: `${optionFor(problem?.path ?? '')}: ${problem?.what ?? 'The bay cannot be made.'}`,
        todo: problem?.todo ?? '',
      },
    };
  }
  return { ok: true, value: { project: read.project, bar: 'W1/t1.rise' } };
}

/** The option that a place of the made project comes from. Its width and height are 0.8 and 0.6 of the length. */
function optionFor(path: string): string {
  if (path.includes('recipe')) return '--length, of which the made bay takes 0.8 across and 0.6 up';
  if (path.includes('boltDiameter')) return '--bolt';
  return path.includes('ownLimit') ? '--limit' : 'The bay made from these options';
}
