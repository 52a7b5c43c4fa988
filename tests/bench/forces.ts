/** Time of forces and checks: many bays in eight combinations, and ten times the bars in one connected building. */

import { assess } from '../../core/assess.ts';
import { stockOf } from '../../core/catalogue/stock.ts';
import { barChecks } from '../../core/checks/barChecks.ts';
import { combinationStates } from '../../core/forces/combinationStates.ts';
import { forcesOf } from '../../core/forces/forces.ts';
import { layOut } from '../../core/layout/layOut.ts';
import { practiceFor } from '../../core/practice/practices.ts';
import type { Actions } from '../../core/project/actions.ts';
import type { Project } from '../../core/project/model.ts';
import { CATALOGUES, DIAGONALS_EACH, fourPanelBays } from './given.ts';
import { timed } from './measured.ts';
import { ms, type Row, row } from './row.ts';

const BAYS = 1000;
/** Bays of one building with about a thousand bars, with ten thousand, and with twenty thousand. */
const BUILDINGS = [50, 500, 1000] as const;
const LINEAR = 12;

/** Dead load, and wind along every bay: one combination for each factor of the dead load, each with the wind both ways round. */
function actionsOn({ bays }: Project, factors: readonly number[] = [0.9, 1, 1.1, 1.2]): Actions {
  const both = { use: 'strength', leaning: false } as const;
  return {
    cases: [
      { id: 'G', name: 'dead', kind: 'permanent', selfWeight: true, reverses: false, loads: [] },
      {
        id: 'W',
        name: 'wind',
        kind: 'wind',
        selfWeight: false,
        reverses: true,
        loads: bays.map(({ id }) => ({ kind: 'side', id: `s${id}`, bay: id, pressure: 0.5, width: 4000 })),
      },
    ],
    combinations: factors.map((G, k) => ({
      id: `C${k + 1}`,
      name: '',
      factors: { G, W: 1.3 },
      ...both,
    })),
    carries: [],
  };
}

/** All in one row: each bay shares its columns with its neighbours. */
function connected(count: number): Project {
  const project = fourPanelBays(count);
  return {
    ...project,
    bays: project.bays.map((bay, k) => ({ ...bay, place: { origin: [k * 6000, 0, 0], turn: 0 } })),
  };
}

export function forces(): readonly Row[] {
  const practice = practiceFor('sans10162');
  const apart = fourPanelBays(BAYS);
  const laid = (project: Project) =>
    layOut(project, stockOf(project.settings.catalogue, project.ownStock, CATALOGUES));
  const layout = laid(apart);
  const actions = actionsOn(apart);
  const states = combinationStates(actions).length;
  const thousand = timed(() => forcesOf(actions, layout, practice), 3, 1);

  const assessment = assess({ ...apart, actions }, CATALOGUES);
  const input = { project: apart, practice, forces: assessment.forces };
  const diagonals = [...assessment.diagonals.values()].flatMap((each) => {
    const bar = layout.bars.get(each.bar);
    const { restraint, turns, bowing } = each;
    return bar?.angle ? [{ bar, angle: bar.angle, restraint, turns, bowing }] : [];
  });
  const checks = timed(() => diagonals.map((each) => barChecks(input, each)), 3, 1);

  const buildings = BUILDINGS.map((bays) => {
    const project = connected(bays);
    const buildingLayout = laid(project);
    const buildingActions = actionsOn(project, [1]);
    const bars = [...buildingLayout.bars.values()].filter(({ line }) => line === null).length;
    return { bars, time: timed(() => forcesOf(buildingActions, buildingLayout, practice), 3, 1).least };
  });
  const [small, ten] = buildings;
  const growth = (ten?.time ?? 0) / (small?.time ?? 1);

  return [
    row(
      `forces, 1 000 four-panel bays × ${states} combinations, median of ${thousand.runs}`,
      ms(thousand.median),
    ),
    row('  for each combination', ms(thousand.median / states)),
    row('  for each bay and combination', `${((thousand.median / states / BAYS) * 1000).toFixed(0)} µs`),
    row(`checks of their ${BAYS * DIAGONALS_EACH} diagonals, median of ${checks.runs}`, ms(checks.median)),
    ...buildings.map(({ bars, time }) =>
      row(`forces, one connected building of ${bars} bars × 2 combinations, least of 3`, ms(time)),
    ),
    row(
      '  growth over ten times the bars',
      `× ${growth.toFixed(1)}`,
      `about × 10, at most × ${LINEAR}`,
      growth <= LINEAR,
    ),
  ];
}
