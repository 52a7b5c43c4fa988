import type { JSX } from 'react';
import { useServices } from '../../shell/services.tsx';
import { DialogFrame } from './DialogFrame.tsx';

/** The file was written by someone else since it was opened: write over it, save elsewhere, or turn back. */
export function ChangedOnDiskDialog({ name }: { readonly name: string }): JSX.Element {
  const { actions, documents } = useServices();
  const then = (step: () => Promise<unknown>) => (): void => {
    actions.closeDialog();
    void step();
  };
  return (
    <DialogFrame
      title="The file has changed"
      question
      onClose={actions.closeDialog}
      buttons={
        <>
          <button type="button" className="button apart" onClick={then(() => documents.save(true))}>
            Write over it
          </button>
          <button type="button" className="button" onClick={actions.closeDialog}>
            Turn back
          </button>
          <button type="button" className="button main" data-first onClick={then(documents.saveAs)}>
            Save as…
          </button>
        </>
      }
    >
      <p>
        {name} was written by something else since it was opened here. Nothing has been saved. Writing over it
        loses what the other one wrote; saving under another name keeps both.
      </p>
    </DialogFrame>
  );
}
