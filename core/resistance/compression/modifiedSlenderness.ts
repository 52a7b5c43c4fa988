import type { CompressionQuestion } from '../model.ts';
import type { Working } from '../working.ts';
import { connectedRadius, legsOf, oneLegLength } from './pack.ts';

/**
 * Modified slenderness of AISC 360 E5 and CSA S16 13.3.3: end fixity and eccentricity in one number. Both pairs of lines meet, at 80 and at 75.
 * Practice-facts D1, D2.
 */
export function slenderOneLeg(question: CompressionQuestion, working: Working): number {
  const L = oneLegLength(question, working);
  const r = working.given(
    'radius about the axis along the connected leg',
    'r_a',
    connectedRadius(question),
    'length',
  );
  const ratio = working.step('slenderness', 'L/r_a', 'L/r_a', L / r, 'slenderness');
  const planar = question.system === 'planar';
  const [knee, low, high] = planar
    ? [80, '72 + 0.75 L/r_a', '32 + 1.25 L/r_a']
    : [75, '60 + 0.80 L/r_a', '45 + L/r_a'];
  const base = planar
    ? ratio <= knee
      ? 72 + 0.75 * ratio
      : 32 + 1.25 * ratio
    : ratio <= knee
      ? 60 + 0.8 * ratio
      : 45 + ratio;
  const first = working.step(
    'modified slenderness',
    'L_c/r',
    ratio <= knee ? low : high,
    base,
    'slenderness',
  );
  const [long, short] = legsOf(question);
  if (question.section.connectedLeg >= question.section.outstandingLeg) return first;
  const more = (planar ? 4 : 6) * ((long / short) ** 2 - 1);
  const floor = ((planar ? 0.95 : 0.82) * L) / question.section.properties.rv;
  return working.step(
    'with the shorter leg connected',
    'L_c/r',
    planar ? '+ 4[(b_l/b_s)² − 1], not below 0.95 L/r_v' : '+ 6[(b_l/b_s)² − 1], not below 0.82 L/r_v',
    Math.max(first + more, floor),
    'slenderness',
  );
}
