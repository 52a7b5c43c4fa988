import type { JSX } from 'react';
import type { RecoveryCopy } from '../../host/host.ts';
import { useServices } from '../../shell/services.tsx';
import { DialogFrame } from './DialogFrame.tsx';

/** Work left over from a session that did not end well. */
export function RecoveryDialog({ copy }: { readonly copy: RecoveryCopy }): JSX.Element {
  const { actions, documents } = useServices();
  return (
    <DialogFrame
      title="Unsaved work was found"
      question
      onClose={actions.closeDialog}
      buttons={
        <>
          <button type="button" className="button apart" onClick={() => void documents.discardRecovery()}>
            Throw it away
          </button>
          <button type="button" className="button main" data-first onClick={() => documents.takeUp(copy)}>
            Take it up
          </button>
        </>
      }
    >
      <p>
        Tautline did not close as it should. A copy of “{copy.name}” with changes that were not saved was kept
        on {savedAt(copy.savedAt)}. Taken up, it counts as unsaved until you save it; its file is untouched.
      </p>
    </DialogFrame>
  );
}

function savedAt(iso: string): string {
  const at = new Date(iso);
  if (Number.isNaN(at.getTime())) return 'an unknown day';
  return at.toLocaleString('en-GB', { day: 'numeric', month: 'long', hour: '2-digit', minute: '2-digit' });
}
