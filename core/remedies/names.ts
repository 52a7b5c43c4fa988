/** Answers that take away what names nothing. */
import type { Assessment } from '../assessment.ts';
import type { Finding } from '../findings/model.ts';
import type { Edit } from '../project/edit.ts';
import type { Bay, Line } from '../project/model.ts';
import type { Proposal } from './proposal.ts';

export function takeIdleEntriesAway(assessment: Assessment, finding: Finding): readonly Proposal[] {
  const { project } = assessment;
  const bay = project.bays.find(({ id }) => id === finding.bay);
  if (!bay) return [];
  const edits = [...classEdits(assessment), ...markEdits(assessment, bay), ...holderEdits(assessment, bay)];
  return [
    {
      label: edits.length > 1 ? 'Take these entries away' : 'Take this entry away',
      detail: 'nothing else changes',
      edits,
    },
  ];
}

function classEdits({ project, practice }: Assessment): readonly Edit[] {
  const { memberClass } = project.settings;
  const known = [...practice.tension, ...practice.compression].some(({ id }) => id === memberClass);
  return memberClass === null || known ? [] : [{ kind: 'settings', change: { memberClass: null } }];
}

function markEdits({ layout }: Assessment, bay: Bay): readonly Edit[] {
  const bars = Object.entries(bay.bars).flatMap(([key, mark]): readonly Edit[] =>
    layout.bars.get(`${bay.id}/${key}`)?.angle
      ? []
      : [
          {
            kind: 'bars',
            bars: [`${bay.id}/${key}`],
            change: {},
            clear: Object.keys(mark) as (keyof typeof mark)[],
          },
        ],
  );
  const joins = Object.keys(bay.joins).flatMap((key): readonly Edit[] => {
    const id = `${bay.id}/${key}`;
    return layout.crossings.get(id)?.join ? [] : [{ kind: 'join', crossings: [id], join: null }];
  });
  const shares = Object.keys(bay.tensionShares ?? {}).flatMap((crossing): readonly Edit[] =>
    layout.crossings.has(`${bay.id}/${crossing}`)
      ? []
      : [{ kind: 'tension share', bay: bay.id, crossing, share: null }],
  );
  return [...bars, ...joins, ...shares];
}

function holderEdits({ project }: Assessment, bay: Bay): readonly Edit[] {
  const isIdle = ({ heldBy }: Line): boolean =>
    heldBy.kind === 'bay' && (heldBy.bay === bay.id || !project.bays.some(({ id }) => id === heldBy.bay));
  const { recipe } = bay;
  const lines =
    recipe.kind === 'wall'
      ? recipe.lines
      : recipe.kind === 'roof'
        ? recipe.slopes.flatMap((slope) => slope.lines)
        : [];
  return lines
    .filter(isIdle)
    .map(({ id }) => ({ kind: 'line holder', bay: bay.id, line: id, heldBy: { kind: 'nothing' } }));
}
