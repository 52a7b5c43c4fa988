import type { CompressionQuestion, Resistance, ResistingEnd } from '../model.ts';
import type { Working } from '../working.ts';

/** A practice's column strength for an elastic stress, with its steps; N. */
export interface ColumnRule {
  readonly standard: string;
  readonly clause: string;
  readonly confidence: Resistance['confidence'];
  /** N, from the elastic buckling stress, N/mm². */
  readonly strength: (question: CompressionQuestion, Fe: number, working: Working) => number;
  /** Clause of the lengths by the practice, where bowing with twist stands. */
  readonly twistClause: string;
}

export interface CompressionPack {
  readonly column: ColumnRule;
  readonly oneLeg: (question: CompressionQuestion) => Resistance;
}

/** Conditions that the one-leg rules share, told one by one. */
export function oneLegConditions(
  question: CompressionQuestion,
  working: Working,
  ratio: number | null,
): void {
  const { section, ends } = question;
  working.requires('a single angle', section.shape === 'angle', section.shape);
  working.requires(
    'held at both ends through the same one leg',
    ends.every(({ legs }) => legs === 'one'),
    'both legs are connected at an end',
  );
  const short = ends.filter((end) => !isFirm(end));
  working.requires(
    'at least two bolts, or a weld, at each end',
    short.length === 0,
    `one bolt at end ${short.map(({ end }) => end).join(' and ')}`,
  );
  working.requires('no load across the bar between its ends, own weight apart', true, '');
  if (ratio !== null) {
    const [long, shortLeg] = legsOf(question);
    working.requires(
      `legs no more unequal than ${ratio}`,
      long / shortLeg < ratio,
      `${(long / shortLeg).toFixed(2)}`,
    );
  }
}

const isFirm = ({ kind, bolts }: ResistingEnd): boolean => kind === 'welded' || bolts >= 2;

export function legsOf({ section }: CompressionQuestion): readonly [number, number] {
  const { connectedLeg, outstandingLeg } = section;
  return [Math.max(connectedLeg, outstandingLeg), Math.min(connectedLeg, outstandingLeg)];
}

/** Radius about the axis along the connected leg. */
export function connectedRadius({ section }: CompressionQuestion): number {
  const { rx, ry } = section.properties;
  // x runs along the shorter leg, and r_x belongs to it.
  return section.connectedLeg >= section.outstandingLeg ? ry : rx;
}

/** Length that the one-leg rules speak of: the whole between working points, whatever crosses it. */
export function oneLegLength(question: CompressionQuestion, working: Working): number {
  return working.given(
    question.joinedBetween
      ? 'length between working points (the crossing’s one bolt does not fix an end as these rules take for granted)'
      : 'length between working points',
    'L',
    question.length,
    'length',
  );
}
