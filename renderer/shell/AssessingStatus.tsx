import { type JSX, useEffect, useState } from 'react';
import { isUpToDate, shownAssessed, shownProject } from '../store/shown.ts';
import { useServices, useWindow } from './services.tsx';

/** ms after which waiting is worth a word. */
const SLOW = 250;

/** How the figures stand: how long they took, how far they are, or that they are old. */
export function AssessingStatus(): JSX.Element | null {
  const since = useWindow((state) => state.assessing.workingSince);
  const failed = useWindow((state) => state.assessing.failure !== null);
  const outOfDate = useWindow((state) => state.assessing.stopped && !isUpToDate(state));
  const took = useWindow((state) => shownAssessed(state)?.took ?? null);
  const [slow, setSlow] = useState(false);
  useEffect(() => {
    setSlow(false);
    if (since === null) return;
    const timer = setTimeout(() => setSlow(true), SLOW);
    return () => clearTimeout(timer);
  }, [since]);
  if (failed) return <span className="status-failure">Not assessed: the figures are missing or old</span>;
  if (outOfDate) return <OutOfDate />;
  if (slow) return <Working />;
  return took === null ? null : <span>Assessed in {tookText(took)}</span>;
}

function tookText(ms: number): string {
  return ms < 10_000 ? `${Math.max(1, Math.round(ms))} ms` : `${Math.round(ms / 1000)} s`;
}

function Working(): JSX.Element {
  const { assessor } = useServices();
  const bays = useWindow((state) => shownProject(state).bays.length);
  const progress = useWindow((state) => state.assessing.progress);
  return (
    <span className="status-working">
      <span role="status">
        Assessing {bays} {bays === 1 ? 'bay' : 'bays'}…
      </span>
      {progress !== null && (
        <>
          <progress aria-label="Bays worked out" value={progress.done} max={progress.of} />
          <span className="status-count">
            {progress.done} of {progress.of}
          </span>
        </>
      )}
      <button type="button" className="link-button" onClick={() => assessor.stop()}>
        Cancel
      </button>
    </span>
  );
}

function OutOfDate(): JSX.Element {
  const { assessor } = useServices();
  const some = useWindow((state) => shownAssessed(state) !== null);
  return (
    <span className="status-working status-failure">
      <span role="status">
        {some ? 'Stopped: the figures are out of date' : 'Stopped: there are no figures yet'}
      </span>
      <button type="button" className="link-button" onClick={() => assessor.retry()}>
        Work out
      </button>
    </span>
  );
}
