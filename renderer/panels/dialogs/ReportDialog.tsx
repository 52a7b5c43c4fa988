import { type JSX, useEffect, useState } from 'react';
import { useServices } from '../../shell/services.tsx';
import { DialogFrame } from './DialogFrame.tsx';

/** The report as it will be printed, before it is. */
export function ReportDialog(): JSX.Element {
  const { actions, documents } = useServices();
  const [html, setHtml] = useState<string | null>(null);
  const [failure, setFailure] = useState<string | null>(null);
  useEffect(() => {
    let wanted = true;
    documents.report().then(
      (text) => {
        if (wanted) setHtml(text);
      },
      (error: unknown) => {
        if (wanted) setFailure(error instanceof Error ? error.message : String(error));
      },
    );
    return () => {
      wanted = false;
    };
  }, [documents]);
  const ready = html !== null;
  return (
    <DialogFrame
      title="Report"
      wide
      onClose={actions.closeDialog}
      buttons={
        <>
          <button
            type="button"
            className="button"
            disabled={!ready}
            onClick={() => void documents.saveReport()}
          >
            Save as HTML…
          </button>
          <button type="button" className="button" disabled={!ready} onClick={() => void documents.savePdf()}>
            Save as PDF…
          </button>
          <button
            type="button"
            className="button main"
            disabled={!ready}
            onClick={() => void documents.print()}
          >
            Print…
          </button>
        </>
      }
    >
      {failure !== null ? (
        <p className="report-wait" role="alert">
          The report could not be laid out: {failure}
        </p>
      ) : ready ? (
        <iframe className="report-preview" title="Report preview" sandbox="" srcDoc={html} />
      ) : (
        <p className="report-wait" role="status">
          Laying the report out…
        </p>
      )}
    </DialogFrame>
  );
}
