/** Plates: how slender they may be and still yield before they buckle. From memory, verify. */
import type { CompressionQuestion, Plate, Steel } from '../model.ts';
import type { Working } from '../working.ts';

export interface WallLimit {
  readonly most: (steel: Steel) => number;
  readonly says: string;
}

/** Of tubes D/t and (side − 3t)/t, of the others width over thickness. */
export type WallLimits = Readonly<Record<'round' | 'square' | Plate['name'], WallLimit>>;

/** Beyond the limit no rule is held here for what is left of a tube's wall. */
export function requireStoutWall(
  { section, steel }: CompressionQuestion,
  limits: WallLimits,
  working: Working,
): void {
  const { shape, connectedLeg: across, thickness: t } = section;
  if (shape !== 'round tube' && shape !== 'square tube') return;
  const round = shape === 'round tube';
  const slender = round ? across / t : (across - 3 * t) / t;
  const { most, says } = round ? limits.round : limits.square;
  working.requires(
    `${round ? 'D/t' : '(side − 3t)/t'} not above ${says} = ${most(steel).toFixed(1)}: a thinner wall buckles before it yields`,
    slender <= most(steel) * (1 + 1e-9),
    slender.toFixed(1),
  );
}

/**
 * The question with the yield stress at which no plate of the section buckles before it yields: every limit goes by 1/√f_y, so f_y (limit/(b/t))² for the most slender. On the
 * safe side of what the standards do with slender plates, which is to take width off.
 */
export function withStoutPlates(
  question: CompressionQuestion,
  limits: WallLimits,
  working: Working,
): CompressionQuestion {
  const { steel } = question;
  const worst = mostSlender(question, limits);
  if (!worst || worst.over <= 1 + 1e-9) return question;
  const { plate, over } = worst;
  const { says, most } = limits[plate.name];
  working.given(`slenderness of the ${plate.name}`, 'b/t', plate.width / plate.thickness, 'slenderness');
  working.step('its limit at yield', 'λ_r', says, most(steel), 'slenderness');
  const fy = working.step(
    `yield stress that the ${plate.name} allows`,
    'f_y,red',
    'f_y (λ_r/(b/t))²',
    steel.fy / over ** 2,
    'stress',
  );
  return { ...question, steel: { ...steel, fy }, slenderPlate: true };
}

/** Says that a plate is slender, and what is done about it; null where none is. */
export function plateRemark(question: CompressionQuestion, limits: WallLimits): string | null {
  const worst = mostSlender(question, limits);
  return worst && worst.over > 1 + 1e-9
    ? `The ${worst.plate.name} is too slender to yield: the yield stress is lowered to what it allows, on the safe side of taking width off.`
    : null;
}

function mostSlender(
  { section, steel }: CompressionQuestion,
  limits: WallLimits,
): { readonly plate: Plate; readonly over: number } | null {
  return (section.plates ?? [])
    .map((plate) => ({ plate, over: plate.width / plate.thickness / limits[plate.name].most(steel) }))
    .reduce<{ plate: Plate; over: number } | null>(
      (most, each) => (most === null || each.over > most.over ? each : most),
      null,
    );
}
