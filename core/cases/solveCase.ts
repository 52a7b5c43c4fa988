import { degreesOf } from '../geometry/vector.ts';
import { AXES, type Axis } from '../section/model.ts';
import { criticalLoad } from '../stability/criticalLoad.ts';
import { bucklingMode } from '../stability/mode.ts';
import type { BarCase, SolvedBar, SolvedCase, SolvedLoad, SolvedMode, StabilityCase } from './model.ts';
import { barInWords } from './modeWords.ts';
import { ruleBeside } from './ruleBeside.ts';
import { solvePair } from './solvePair.ts';

export function solveCase(given: StabilityCase): SolvedCase {
  return given.type === 'xbrace-planar' ? solvePair(given) : solveBar(given);
}

function solveBar(given: BarCase): SolvedBar {
  const { id, type, problem } = given;
  const critical = loadOf(given);
  const mode = critical && bucklingMode(problem, critical.factor);
  const solved: SolvedMode | null = mode && {
    halfWaves: mode.halfWaves,
    symmetry: mode.symmetry,
    energyAboutV: mode.energyAboutV,
    energyAboutU: mode.energyAboutU,
    largestAt: mode.largestAt / problem.length,
    largestDirection: degreesOf(mode.directionAtLargest),
  };
  return {
    type,
    id,
    length: problem.length,
    critical,
    says: barInWords(mode, solved),
    mode: solved,
    rule: ruleBeside(given, critical?.N ?? null),
    bowingOnly: problem.twist ? criticalLoad({ ...problem, twist: null }, { second: false }).N : null,
  };
}

function loadOf({ problem, section }: BarCase): SolvedLoad | null {
  const { factor, N, second } = criticalLoad(problem);
  if (factor === null || N === null || second === null) return null;
  const { E } = problem;
  const effective = (I: number): number => Math.PI * Math.sqrt((E * I) / N);
  const about: Readonly<Record<Axis, number>> = {
    x: section.Ixx,
    y: section.Iyy,
    u: section.Iu,
    v: section.Iv,
  };
  const [x, y, u, v] = AXES.map((axis) => effective(about[axis]));
  return {
    N,
    factor,
    secondN: (N / factor) * second,
    secondFactor: second,
    slenderness: effective(section.area),
    effectiveLength: { x: x ?? 0, y: y ?? 0, u: u ?? 0, v: v ?? 0 },
  };
}
