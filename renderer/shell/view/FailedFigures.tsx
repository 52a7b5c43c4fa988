import type { JSX } from 'react';
import { useServices } from '../services.tsx';

/** The figures could not be worked out; the project is safe, and can be saved or tried again. */
export function FailedFigures({ failure }: { readonly failure: string }): JSX.Element {
  const { assessor, documents, actions } = useServices();
  return (
    <div className="failed" role="alert">
      <h2>The figures could not be worked out</h2>
      <p>
        What you set out is safe: nothing of the project is lost. The figures shown, if any, belong to an
        earlier state. Undo the last change, or try again.
      </p>
      <p className="failed-detail">{failure}</p>
      <p className="failed-buttons">
        <button type="button" className="button" onClick={() => assessor.retry()}>
          Try again
        </button>
        <button type="button" className="button" onClick={() => actions.undo()}>
          Undo the last change
        </button>
        <button type="button" className="button" onClick={() => void documents.saveAs()}>
          Save as…
        </button>
      </p>
    </div>
  );
}
