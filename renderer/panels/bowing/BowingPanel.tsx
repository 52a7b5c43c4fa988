import { type JSX, useState } from 'react';
import { Segmented } from '../../controls/Segmented.tsx';
import { useWindow } from '../../shell/services.tsx';
import { latestStudy } from '../../store/closer.ts';
import { shownAssessment, shownProject } from '../../store/shown.ts';
import { BayPart } from './BayPart.tsx';
import { PositionPart } from './PositionPart.tsx';
import { ReliancePart } from './ReliancePart.tsx';
import { StationsPart } from './StationsPart.tsx';
import { TautPart } from './TautPart.tsx';
import './bowing.css';

type PlotName = 'force' | 'place';

/** How the chosen bar really bows: what its stations offer, its critical load, its bay, and what they lean on. */
export function BowingPanel(): JSX.Element {
  const assessment = useWindow(shownAssessment);
  const chosen = useWindow((state) => state.selection.bar);
  const units = useWindow((state) => shownProject(state).settings.units);
  const study = useWindow(latestStudy);
  const [plot, setPlot] = useState<PlotName>('force');
  const bar = chosen === null ? undefined : assessment?.layout.bars.get(chosen);
  const diagonal = bar === undefined ? undefined : assessment?.diagonals.get(bar.id);
  if (assessment === null || bar?.angle == null || diagonal?.bowing == null)
    return (
      <p className="bowing-none">
        {bar?.angle == null
          ? 'Choose a diagonal in the view or in the schedule.'
          : `${bar.mark} has no figures so far; its card says why.`}
      </p>
    );
  const choice = (
    <span className="plot-choice">
      <Segmented<PlotName>
        bare
        label="Critical load against"
        value={plot}
        options={[
          { value: 'force', label: 'partner’s force' },
          { value: 'place', label: 'its place' },
        ]}
        onChange={setPlot}
      />
    </span>
  );
  const shared = { bar, diagonal, assessment, study, units, choice };
  return (
    // Scrolled by keys as well: it holds more than fits.
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a part that scrolls must be reached by keys
    <section className="bowing" aria-label={`How ${bar.mark} bows`} tabIndex={0}>
      <StationsPart
        key={bar.id}
        bar={bar}
        angle={bar.angle}
        bowing={diagonal.bowing}
        assessment={assessment}
        needs={study?.needs ?? null}
        units={units}
      />
      <TautPart {...shared} hidden={plot !== 'force'} />
      <PositionPart {...shared} hidden={plot !== 'place'} />
      <div className="bowing-column">
        <ReliancePart bar={bar} assessment={assessment} />
        {study !== null && <BayPart bar={bar} study={study} practice={assessment.practice} units={units} />}
      </div>
    </section>
  );
}
