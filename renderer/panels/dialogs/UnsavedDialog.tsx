import type { JSX } from 'react';
import { useServices, useWindow } from '../../shell/services.tsx';
import type { NextStep } from '../../store/dialog.ts';
import { presentProject } from '../../store/shown.ts';
import { DialogFrame } from './DialogFrame.tsx';

/** Before something that would lose unsaved changes: save them, leave them, or turn back. */
export function UnsavedDialog({ next }: { readonly next: NextStep }): JSX.Element {
  const { actions, documents } = useServices();
  const name = useWindow((state) => presentProject(state).name);
  const save = async (): Promise<void> => {
    actions.closeDialog();
    if (await documents.save()) await documents.goOn(next);
  };
  const leave = (): void => {
    actions.closeDialog();
    void documents.goOn(next);
  };
  return (
    <DialogFrame
      title="Save the changes?"
      question
      onClose={actions.closeDialog}
      buttons={
        <>
          <button type="button" className="button apart" onClick={leave}>
            Don’t save
          </button>
          <button type="button" className="button" onClick={actions.closeDialog}>
            Cancel
          </button>
          <button type="button" className="button main" data-first onClick={() => void save()}>
            Save
          </button>
        </>
      }
    >
      <p>“{name}” has changes that are in no file yet. Unless you save them they are lost.</p>
    </DialogFrame>
  );
}
