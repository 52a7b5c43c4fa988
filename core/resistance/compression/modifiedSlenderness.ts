import type { CompressionQuestion } from '../model.ts';
import type { Working } from '../working.ts';
import { longAndShort } from './legs.ts';
import { CROSSED } from './oneLegTerms.ts';

/** Lines of the modified slenderness over L/r_a; each pair meets at its knee, at 132 and at 120. */
const LINES = {
  planar: {
    knee: 80,
    below: { at: 72, slope: 0.75, says: '72 + 0.75 L/r_a' },
    above: { at: 32, slope: 1.25, says: '32 + 1.25 L/r_a' },
    short: { more: 4, floor: 0.95 },
  },
  space: {
    knee: 75,
    below: { at: 60, slope: 0.8, says: '60 + 0.80 L/r_a' },
    above: { at: 45, slope: 1, says: '45 + L/r_a' },
    short: { more: 6, floor: 0.82 },
  },
} as const;

/**
 * Modified slenderness of AISC 360 E5 and CSA S16 13.3.3: the fixity and the eccentricity of both ends in one number, to be used as L_c/r in the column curve.
 * L is the whole length between working points, r_a the radius about the axis along the connected leg. Practice-facts D1, D2.
 */
export function modifiedSlenderness(question: CompressionQuestion, working: Working): number {
  const { section, system } = question;
  const { knee, below, above, short } = LINES[system];
  const L = working.given('whole length between working points', 'L', question.length, 'length');
  const r = working.given(
    'radius about the axis along the connected leg',
    'r_a',
    connectedRadius(question),
    'length',
  );
  const ratio = working.step('slenderness', 'L/r_a', 'L/r_a', L / r, 'slenderness');
  const line = ratio <= knee ? below : above;
  const byLine = line.at + line.slope * ratio;
  if (!isByShorterLeg(question))
    return working.step('modified slenderness', 'L_c/r', line.says, byLine, 'slenderness');
  working.step('by the line of the longer leg', 'λ_1', line.says, byLine, 'slenderness');
  const [b_l, b_s] = longAndShort(section);
  working.given('longer leg', 'b_l', b_l, 'length');
  working.given('shorter leg', 'b_s', b_s, 'length');
  const added = working.step(
    'with the shorter leg connected',
    'λ_2',
    `λ_1 + ${short.more} [(b_l/b_s)² − 1]`,
    byLine + short.more * ((b_l / b_s) ** 2 - 1),
    'slenderness',
  );
  const rv = working.given('least radius', 'r_v', section.properties.rv, 'length');
  return working.step(
    'modified slenderness',
    'L_c/r',
    `max(λ_2, ${short.floor.toFixed(2)} L/r_v)`,
    Math.max(added, (short.floor * L) / rv),
    'slenderness',
  );
}

export const isByShorterLeg = ({ section }: CompressionQuestion): boolean =>
  section.connectedLeg < section.outstandingLeg;

/** x runs along the shorter leg and y along the longer, whichever of them is connected. */
function connectedRadius(question: CompressionQuestion): number {
  const { rx, ry } = question.section.properties;
  return isByShorterLeg(question) ? rx : ry;
}

/** Why the whole length is taken; null for a bar that nothing crosses. */
export const wholeLengthNote = ({ joinedBetween }: CompressionQuestion): string | null =>
  joinedBetween ? `${CROSSED}; so L is the whole length.` : null;
