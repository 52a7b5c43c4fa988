import { Tabs } from 'radix-ui';
import { type JSX, useState } from 'react';
import { useActions, useWindow } from '../../shell/services.tsx';
import { shownAssessment } from '../../store/shown.ts';
import { shownForces } from '../../store/shownForces.ts';
import type { DockTab } from '../../store/windowState.ts';
import { BowingBar } from '../bowing/BowingBar.tsx';
import { BowingPanel } from '../bowing/BowingPanel.tsx';
import { FindingsBar } from '../findings/FindingsBar.tsx';
import { FindingsPanel } from '../findings/FindingsPanel.tsx';
import { ForcesBar, type ForcesView } from '../forces/ForcesBar.tsx';
import { ForcesPanel } from '../forces/ForcesPanel.tsx';
import { ScheduleBar } from '../schedule/ScheduleBar.tsx';
import { SchedulePanel } from '../schedule/SchedulePanel.tsx';
import { FIRST_SCHEDULE_VIEW } from '../schedule/scheduleView.ts';
import { ShortlistBar } from '../shortlist/ShortlistBar.tsx';
import { ShortlistPanel } from '../shortlist/ShortlistPanel.tsx';
import { FIRST_SHORTLIST_VIEW } from '../shortlist/shortlistView.ts';
import { useShortlist } from '../shortlist/useShortlist.ts';
import './dock.css';

/** The tables below: schedule, shortlist, findings, and how the chosen bar bows. */
export function Dock(): JSX.Element {
  const actions = useActions();
  const tab = useWindow((state) => state.tab);
  const rows = useWindow((state) => shownAssessment(state)?.schedule.length ?? 0);
  const findings = useWindow((state) => shownAssessment(state)?.findings.length ?? 0);
  const bay = useWindow((state) => state.selection.bay);
  const mark = useWindow((state) => {
    const { bar } = state.selection;
    const chosen = bar === null ? undefined : shownAssessment(state)?.layout.bars.get(bar);
    return chosen?.angle ? chosen.mark : '';
  });
  const [schedule, setSchedule] = useState(FIRST_SCHEDULE_VIEW);
  const [shortlist, setShortlist] = useState(FIRST_SHORTLIST_VIEW);
  const answer = useShortlist(tab === 'shortlist', shortlist);
  const [onlyBay, setOnlyBay] = useState(false);
  const [forcesView, setForcesView] = useState<ForcesView>('combinations');
  const states = useWindow((state) => shownForces(state)?.states.length ?? 0);
  return (
    <Tabs.Root
      className="dock"
      value={tab}
      onValueChange={(value) => {
        if (isTab(value)) actions.showTab(value);
      }}
      data-region
      tabIndex={-1}
      aria-label="Tables"
      role="region"
    >
      <div className="dock-bar">
        <Tabs.List className="dock-tabs" aria-label="Tables">
          <Tabs.Trigger value="schedule" className="dock-tab">
            Schedule <small>{rows}</small>
          </Tabs.Trigger>
          <Tabs.Trigger value="shortlist" className="dock-tab">
            Shortlist <small>{mark}</small>
          </Tabs.Trigger>
          <Tabs.Trigger value="findings" className="dock-tab">
            Findings <small>{findings}</small>
          </Tabs.Trigger>
          <Tabs.Trigger value="bowing" className="dock-tab">
            Bowing <small>{mark}</small>
          </Tabs.Trigger>
          <Tabs.Trigger value="forces" className="dock-tab">
            Forces <small>{states === 0 ? '' : states}</small>
          </Tabs.Trigger>
        </Tabs.List>
        <div className="dock-tools">
          {tab === 'schedule' && <ScheduleBar view={schedule} onChange={setSchedule} />}
          {tab === 'findings' && <FindingsBar onlyBay={onlyBay} onOnlyBay={setOnlyBay} />}
          {tab === 'bowing' && <BowingBar />}
          {tab === 'forces' && <ForcesBar view={forcesView} onChange={setForcesView} />}
          {tab === 'shortlist' && <ShortlistBar view={shortlist} answer={answer} onChange={setShortlist} />}
        </div>
      </div>
      <Tabs.Content value="schedule" className="dock-content" tabIndex={-1}>
        <SchedulePanel view={schedule} onChange={setSchedule} />
      </Tabs.Content>
      <Tabs.Content value="shortlist" className="dock-content" tabIndex={-1}>
        <ShortlistPanel view={shortlist} answer={answer} onChange={setShortlist} />
      </Tabs.Content>
      <Tabs.Content value="findings" className="dock-content" tabIndex={-1}>
        <FindingsPanel bay={onlyBay ? bay : null} />
      </Tabs.Content>
      <Tabs.Content value="bowing" className="dock-content" tabIndex={-1}>
        <BowingPanel />
      </Tabs.Content>
      <Tabs.Content value="forces" className="dock-content" tabIndex={-1}>
        <ForcesPanel view={forcesView} onView={setForcesView} />
      </Tabs.Content>
    </Tabs.Root>
  );
}

function isTab(value: string): value is DockTab {
  return ['schedule', 'shortlist', 'findings', 'bowing', 'forces'].includes(value);
}
