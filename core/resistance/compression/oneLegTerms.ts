/** What the practices' rules for an angle by one leg ask alike. */
import type { CompressionQuestion, ResistingEnd } from '../model.ts';
import type { Working } from '../working.ts';
import { longAndShort } from './legs.ts';

export const ONE_LEG = {
  kind: 'compression, one leg',
  title: 'Compression of an angle by one leg',
  against: 'compression',
} as const;

export function requireSameLeg({ ends }: CompressionQuestion, working: Working): void {
  const both = ends.filter(({ legs }) => legs === 'both');
  working.requires(
    'held at both ends through the same one leg',
    both.length === 0,
    `both legs at ${namesOf(both)}`,
  );
}

export function requireFirmEnds({ ends }: CompressionQuestion, working: Working): void {
  const loose = ends.filter((end) => !isFirm(end));
  working.requires('two bolts or a weld at each end', loose.length === 0, `one bolt at ${namesOf(loose)}`);
}

export function requireNothingAcross({ loadedAcross }: CompressionQuestion, working: Working): void {
  working.requires(
    'no load across the bar between its ends, own weight apart',
    loadedAcross !== true,
    'a load acts across it',
  );
}

/** AISC 360 E5, CSA S16 13.3.3. */
export function requireEvenLegs({ section }: CompressionQuestion, working: Working): void {
  const [long, short] = longAndShort(section);
  working.requires(
    'the longer leg less than 1.7 times the shorter',
    long < 1.7 * short,
    `${(long / short).toFixed(2)} times`,
  );
}

/** Two bolts or a weld keep an end from turning with the leg. */
export const isFirm = ({ kind, bolts }: ResistingEnd): boolean => kind === 'welded' || bolts >= 2;

const namesOf = (ends: readonly ResistingEnd[]): string =>
  ends.length === 2 ? 'either end' : `end ${ends[0]?.end ?? ''}`;

/** Why a piece that ends where another bar crosses gets no relief. */
export const CROSSED =
  'The bar is joined to another between its ends. A crossing does not keep a bar from turning as the two bolts at an end do, which the rule takes for granted';
