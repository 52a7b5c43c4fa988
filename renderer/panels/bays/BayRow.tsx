import { DropdownMenu } from 'radix-ui';
import { type JSX, useEffect, useRef } from 'react';
import type { BaySummary } from '../../../core/assessment.ts';
import type { Bay } from '../../../core/project/model.ts';
import { showSlenderness } from '../../../core/units/quantity.ts';
import { useOverlays } from '../../controls/useOverlays.ts';
import { NearnessChip } from '../../glyphs/NearnessChip.tsx';
import { SeverityGlyph } from '../../glyphs/SeverityGlyph.tsx';
import { MoreSign } from '../../glyphs/signs.tsx';
import { duplicateBay } from '../../shell/commands/bayCommands.ts';
import { useServices, useWindow } from '../../shell/services.tsx';
import { beforeAssessment, shownAssessment } from '../../store/shown.ts';
import { BayThumbnail } from './BayThumbnail.tsx';

export function BayRow({ bay }: { readonly bay: Bay }): JSX.Element {
  const { actions } = useServices();
  const chosen = useWindow((state) => state.selection.bay === bay.id);
  const summary = useWindow((state) => shownAssessment(state)?.bays.get(bay.id) ?? null);
  const before = useWindow((state) => beforeAssessment(state)?.bays.get(bay.id) ?? null);
  const row = useRef<HTMLLIElement>(null);
  useEffect(() => {
    if (chosen) row.current?.scrollIntoView({ block: 'nearest' });
  }, [chosen]);
  return (
    <li ref={row} className="bay" data-chosen={chosen || undefined}>
      <button
        type="button"
        className="bay-choose"
        aria-current={chosen || undefined}
        onClick={() => actions.selectBay(bay.id)}
      >
        <BayThumbnail recipe={bay.recipe} />
        <span className="bay-words">
          <b>
            {bay.id} <span>{bay.name}</span>
          </b>
          <em>
            {summary?.says ?? ' '}
            {bay.numberOff > 1 && `, ${bay.numberOff} off`}
          </em>
        </span>
        <Worst summary={summary} before={before} />
      </button>
      <BayMenu bay={bay} />
    </li>
  );
}

function Worst({
  summary,
  before,
}: {
  readonly summary: BaySummary | null;
  readonly before: BaySummary | null;
}): JSX.Element {
  if (summary !== null && summary.turning > 0)
    return (
      <span className="bay-worst">
        <SeverityGlyph severity="must fix" />
        <span
          title={`${summary.turning} ${summary.turning === 1 ? 'bar turns' : 'bars turn'} without resistance`}
        >
          loose
        </span>
      </span>
    );
  const worst = summary?.worst ?? null;
  if (worst === null) return <span className="bay-worst">{summary === null ? '' : '–'}</span>;
  const now = showSlenderness(worst.slenderness, worst.limit);
  const was = before?.worst == null ? now : showSlenderness(before.worst.slenderness, before.worst.limit);
  return (
    <span className="bay-worst">
      <NearnessChip ratio={worst.slenderness / worst.limit} />
      <span>
        <span className="unseen">worst slenderness </span>
        {was !== now && (
          <>
            <s className="was">{was}</s>
            <br />
          </>
        )}
        {now}
        {worst.slenderness > worst.limit && <span className="unseen">, over {worst.limit}</span>}
      </span>
    </span>
  );
}

function BayMenu({ bay }: { readonly bay: Bay }): JSX.Element {
  const overlays = useOverlays();
  const services = useServices();
  const trying = useWindow((state) => state.trying !== null);
  return (
    <DropdownMenu.Root modal={false}>
      <DropdownMenu.Trigger
        className="bay-more icon-button small"
        aria-label={`More for ${bay.id}`}
        disabled={trying}
      >
        <MoreSign />
      </DropdownMenu.Trigger>
      <DropdownMenu.Portal container={overlays}>
        <DropdownMenu.Content className="menu" align="start" sideOffset={3} collisionPadding={6}>
          <DropdownMenu.Item
            className="menu-item"
            onSelect={() => services.actions.openDialog({ kind: 'bay', bay: bay.id })}
          >
            <span />
            <span>Name and place…</span>
          </DropdownMenu.Item>
          <DropdownMenu.Item className="menu-item" onSelect={() => duplicateBay(services, bay.id)}>
            <span />
            <span>Duplicate</span>
          </DropdownMenu.Item>
          <DropdownMenu.Separator className="menu-rule" />
          <DropdownMenu.Item
            className="menu-item"
            onSelect={() => services.actions.edit({ kind: 'remove bay', bay: bay.id })}
          >
            <span />
            <span>Remove</span>
          </DropdownMenu.Item>
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}
