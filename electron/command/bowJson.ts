import type { SolvedBar, SolvedCase, SolvedPair } from '../../core/cases/model.ts';

/** One solved case as it is written: names as in the files of cases, N and mm, degrees from x; nothing rounded. */
export function bowJson(solved: SolvedCase) {
  return solved.type === 'xbrace-planar' ? pairJson(solved) : barJson(solved);
}

function pairJson({ id, type, N, secondN, effectiveLength, K, says }: SolvedPair) {
  return {
    id,
    type,
    N_cr: N,
    lambda_cr: N,
    N_second: secondN,
    lambda_second: secondN,
    L_eff_mm: effectiveLength,
    K,
    mode: says,
  };
}

function barJson({ id, type, length, critical, says, mode, rule, bowingOnly }: SolvedBar) {
  const lengths = critical?.effectiveLength ?? null;
  return {
    id,
    type,
    N_cr: critical?.N ?? null,
    lambda_cr: critical?.factor ?? null,
    N_second: critical?.secondN ?? null,
    lambda_second: critical?.secondFactor ?? null,
    L_eff_mm: lengths && { xx: lengths.x, yy: lengths.y, u: lengths.u, v: lengths.v },
    K: lengths && {
      xx: lengths.x / length,
      yy: lengths.y / length,
      u: lengths.u / length,
      v: lengths.v / length,
    },
    slenderness: critical?.slenderness ?? null,
    mode: says,
    mode_data: mode && {
      half_waves: mode.halfWaves,
      symmetry: mode.symmetry,
      bending_energy_about_v: mode.energyAboutV,
      bending_energy_about_u: mode.energyAboutU,
      z_max_over_L: mode.largestAt,
      dir_at_max_deg: mode.largestDirection,
    },
    ...(bowingOnly === null
      ? {}
      : { N_cr_flexural_only: bowingOnly, ratio: critical ? critical.N / bowingOnly : null }),
    rule: rule && {
      unbraced: rule.unbraced,
      slenderness: rule.slenderness,
      axis: rule.axis,
      basis: rule.basis,
      N: rule.N,
      difference_percent: rule.difference,
    },
  };
}
