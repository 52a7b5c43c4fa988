/** What the find box can find: commands, bays, diagonals, struts, beams, crossings and findings, each with what choosing it does. */
import type { Assessment } from '../../../core/assessment.ts';
import type { Crossing } from '../../../core/layout/model.ts';
import { shownSection } from '../../controls/figures.ts';
import { shownAssessment } from '../../store/shown.ts';
import type { WindowState } from '../../store/windowState.ts';
import { shortcutText } from '../commands/command.ts';
import { COMMANDS, runCommand } from '../commands/commands.ts';
import type { Services } from '../services.tsx';
import { isWhole, scoreOf } from './fuzzy.ts';

export type FindableKind = 'Diagonals' | 'Struts and beams' | 'Bays' | 'Crossings' | 'Findings' | 'Commands';

export interface Findable {
  readonly id: string;
  readonly kind: FindableKind;
  readonly label: string;
  readonly aside: string;
  choose(services: Services): void;
}

const KINDS: readonly FindableKind[] = [
  'Diagonals',
  'Struts and beams',
  'Bays',
  'Crossings',
  'Findings',
  'Commands',
];
/** Of one kind, so that a long project leaves room for the others. */
const MOST_OF_A_KIND = 6;
/** Puts what is called exactly so before all that only fits, however long the rest of what is told of it. */
const WHOLE_NAME = 100;

/** What fits what was typed, best first within each kind, the kind of the best fit first. */
export function found(typed: string, state: WindowState): readonly Findable[] {
  const all = [...inProject(shownAssessment(state)), ...commands(state)];
  if (typed.trim() === '') return all.filter(({ kind }) => kind === 'Commands').slice(0, 12);
  const fitting = all.flatMap((findable) => {
    const score = scoreOf(typed, `${findable.label} ${findable.aside}`);
    if (score === null) return [];
    return [{ findable, score: score + (isWhole(typed, findable.label) ? WHOLE_NAME : 0) }];
  });
  const byKind = KINDS.map((kind) =>
    fitting
      .filter(({ findable }) => findable.kind === kind)
      .sort((a, b) => b.score - a.score)
      .slice(0, MOST_OF_A_KIND),
  ).filter((group) => group.length > 0);
  byKind.sort((a, b) => (b[0]?.score ?? 0) - (a[0]?.score ?? 0));
  return byKind.flat().map(({ findable }) => findable);
}

function inProject(assessment: Assessment | null): readonly Findable[] {
  if (assessment === null) return [];
  const { layout, findings, members, schedule } = assessment;
  const markOf = (bar: string): string => layout.bars.get(bar)?.mark ?? bar;
  return [
    ...schedule.map(
      (row): Findable => ({
        id: `bar ${row.bar}`,
        kind: 'Diagonals',
        label: row.mark,
        aside: `${row.bay}, ${shownSection(row.section)}`,
        choose: ({ actions }) => actions.selectBar(row.bar),
      }),
    ),
    ...[...members.values()].map(
      ({ bar, member }): Findable => ({
        id: `member ${bar}`,
        kind: 'Struts and beams',
        label: markOf(bar),
        aside: `${layout.bars.get(bar)?.bay ?? ''}, ${member.name}`,
        choose: ({ actions }) => actions.selectBar(bar),
      }),
    ),
    ...layout.bays.map(
      (bay): Findable => ({
        id: `bay ${bay.id}`,
        kind: 'Bays',
        label: bay.id,
        aside: bay.name,
        choose: ({ actions }) => actions.selectBay(bay.id),
      }),
    ),
    ...[...layout.crossings.values()].map(
      (crossing: Crossing): Findable => ({
        id: `crossing ${crossing.id}`,
        kind: 'Crossings',
        label: `${markOf(crossing.a)} × ${markOf(crossing.b)}`,
        aside: crossing.bay,
        choose: ({ actions }) => actions.selectCrossing(crossing.id),
      }),
    ),
    ...findings.map(
      (finding): Findable => ({
        id: `finding ${finding.id}`,
        kind: 'Findings',
        label: finding.title,
        aside: finding.bay,
        choose: ({ actions }) => {
          actions.showTab('findings');
          const [bar] = finding.bars;
          if (finding.crossing !== null) actions.selectCrossing(finding.crossing);
          else if (bar !== undefined) actions.selectBar(bar);
        },
      }),
    ),
  ];
}

function commands(state: WindowState): readonly Findable[] {
  return COMMANDS.filter((command) => command.hidden !== true && (command.enabled?.(state) ?? true)).map(
    (command): Findable => ({
      id: `command ${command.id}`,
      kind: 'Commands',
      label: command.label(state),
      aside: command.shortcut === undefined ? command.menu : shortcutText(command.shortcut),
      choose: (services) => runCommand(command, services),
    }),
  );
}
