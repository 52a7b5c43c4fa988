/** What the standards ask of a point that holds a compressed member: a force, and as a rule a stiffness. N, mm. */
import type { PracticeId } from '../project/model.ts';
import type { Confidence } from './model.ts';

export interface RestraintCase {
  /** Compression in the member held, N. */
  readonly compression: number;
  /** Between points that hold, mm. */
  readonly spacing: number;
  /** Points that hold, equally spaced. */
  readonly points: number;
  /** Initial misalignment of the point held, mm; spacing/500 as a rule. */
  readonly misalignment: number;
  /** What the softest of the holds offers, N/mm: how far the bracing gives, where a rule asks. Left out: it does not give. */
  readonly offered?: number;
}

export interface RestraintDemand {
  readonly rule: string;
  /** N. */
  readonly force: number;
  /** N/mm; null where the standard gives none. */
  readonly stiffness: number | null;
  readonly clause: string;
  readonly confidence: Confidence;
}

/** All the rules of one practice that apply to a point hold, the first the one to show where there is room for one; last, for comparison, BS 5950. */
export function restraintDemands(practice: PracticeId, given: RestraintCase): readonly RestraintDemand[] {
  return [...ownDemands(practice, given), bsOnePerCent(given)];
}

function ownDemands(practice: PracticeId, given: RestraintCase): readonly RestraintDemand[] {
  switch (practice) {
    case 'aisc360':
      return [aiscPoint(given), aiscPanel(given)];
    case 'sans10162':
      return [twoPerCent(given, 'SANS 10162-1 9.2.5'), detailed(given, 'SANS 10162-1 9.2.6')];
    case 'csaS16':
      return [twoPerCent(given, 'CSA S16 9.2.5'), detailed(given, 'CSA S16 9.2.6')];
    case 'en1993':
      return [enStabilising(given, 1, enDeflection(given))];
    case 'as4100':
      return [share(given, 0.025, '2.5 % of the compression', 'AS 4100 6.6', 'from memory, sure')];
    case 'is800':
      return [
        share(given, 0.025, '2.5 % of the compression, by analogy', 'IS 800 7.6', 'from memory, verify'),
      ];
    default:
      return practice satisfies never;
  }
}

/** AISC 360-16 Appendix 6.2, LRFD, φ = 0.75. */
export function aiscPoint({ compression, spacing }: RestraintCase): RestraintDemand {
  return {
    rule: 'point hold: 1 % of the compression; stiffness 8P/φLb',
    force: 0.01 * compression,
    stiffness: (8 * compression) / (0.75 * spacing),
    clause: 'AISC 360 A-6-3, A-6-4a',
    confidence: 'read in a source',
  };
}

export function aiscPanel({ compression, spacing }: RestraintCase): RestraintDemand {
  return {
    rule: 'panel hold: 0.5 % of the compression as shear; stiffness 2P/φLb',
    force: 0.005 * compression,
    stiffness: (2 * compression) / (0.75 * spacing),
    clause: 'AISC 360 A-6-1, A-6-2a',
    confidence: 'from memory, sure',
  };
}

function twoPerCent({ compression, misalignment }: RestraintCase, clause: string): RestraintDemand {
  return {
    rule: '2 % of the compression; gives no more than the misalignment under it',
    force: 0.02 * compression,
    stiffness: (0.02 * compression) / misalignment,
    clause,
    confidence: 'from memory, verify',
  };
}

/** β for 1, 2, 3, 4 and more points. */
const DETAILED = [2, 3, 3.41, 3.63, 4];

/** Pb = β(Δ0 + Δb)C/Lb with the displacement Δb taken as Δ0, as the first round of the clause does. */
export function detailed(
  { compression, spacing, points, misalignment }: RestraintCase,
  clause: string,
): RestraintDemand {
  const beta = DETAILED[Math.min(points, DETAILED.length) - 1] ?? 2;
  const force = (beta * 2 * misalignment * compression) / spacing;
  return {
    rule: `detailed: β(Δ0 + Δb)C/Lb with β = ${beta} and Δb = Δ0`,
    force,
    stiffness: force / misalignment,
    clause,
    confidence: 'from memory, verify',
  };
}

function share(
  { compression }: RestraintCase,
  part: number,
  rule: string,
  clause: string,
  confidence: Confidence,
): RestraintDemand {
  return { rule, force: part * compression, stiffness: null, clause, confidence };
}

/** α_m of EN 1993-1-1 5.3.3 for m members held together. */
export const bowReduction = (members: number): number => Math.sqrt(0.5 * (1 + 1 / members));

/**
 * How far one point gives under its share of the stabilising load of one member, mm: δ = F/k with F = 8N(e0 + δ)s/L², so δ = e0/(k/c − 1), c = 8Ns/L².
 * Infinite where the bracing is too soft for any balance.
 */
export function enDeflection({ compression, spacing, points, offered }: RestraintCase): number {
  if (offered === undefined) return 0;
  const length = spacing * (points + 1);
  const c = (8 * compression * spacing) / length ** 2;
  return offered > c ? (bowReduction(1) * length) / 500 / (offered / c - 1) : Number.POSITIVE_INFINITY;
}

/**
 * EN 1993-1-1 5.3.3 (5.12), (5.13): the uniform load q = N·8(e0 + δ)/L² of a bracing over the whole length, here as the force on one of its points.
 * @param members compressed members that the bracing holds, each with the given compression
 * @param deflection of the bracing under that load and the outer ones, mm
 */
export function enStabilising(given: RestraintCase, members: number, deflection: number): RestraintDemand {
  const length = given.spacing * (given.points + 1);
  const bow = (bowReduction(members) * length) / 500;
  const q = (members * given.compression * 8 * (bow + deflection)) / length ** 2;
  return {
    rule: Number.isFinite(q)
      ? `stabilising load ${q.toPrecision(3)} N/mm over the length, as a force at one point; ${members === 1 ? 'this bar alone' : `${members} bars`}, bracing that gives ${deflection.toFixed(1)} mm`
      : 'stabilising load: the bracing gives so much that no force is in balance with it',
    force: q * given.spacing,
    stiffness: null,
    clause: 'EN 1993-1-1 5.3.3, (5.12), (5.13)',
    confidence: 'from memory, sure',
  };
}

/** BS 5950-1:2000 4.7.1.2: shown for comparison. */
export function bsOnePerCent(given: RestraintCase): RestraintDemand {
  return share(
    given,
    0.01,
    'for comparison: 1 % of the compression',
    'BS 5950-1 4.7.1.2',
    'from memory, verify',
  );
}
