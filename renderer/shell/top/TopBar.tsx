import type { JSX } from 'react';
import { IconButton } from '../../controls/IconButton.tsx';
import { RedoSign, TautlineMark, UndoSign } from '../../glyphs/signs.tsx';
import { redoLabel, undoLabel } from '../../store/history.ts';
import { FindBox } from '../find/FindBox.tsx';
import { useActions, useWindow } from '../services.tsx';
import { FindingCounts } from './FindingCounts.tsx';
import { MenuBar } from './MenuBar.tsx';
import { PracticeButton } from './PracticeButton.tsx';
import { ProjectName } from './ProjectName.tsx';
import { UnitsSwitch } from './UnitsSwitch.tsx';
import './top.css';

export function TopBar(): JSX.Element {
  return (
    <header className="top" data-region tabIndex={-1}>
      <h1 className="brand">
        <TautlineMark />
        Tautline
      </h1>
      <MenuBar />
      <Rule />
      <ProjectName />
      <Rule />
      <UndoButtons />
      <FindBox />
      <FindingCounts />
      <Rule />
      <UnitsSwitch />
      <Rule />
      <PracticeButton />
    </header>
  );
}

function Rule(): JSX.Element {
  return <span className="top-rule" aria-hidden="true" />;
}

function UndoButtons(): JSX.Element {
  const actions = useActions();
  const trying = useWindow((state) => state.trying !== null);
  const undo = useWindow((state) => undoLabel(state.history));
  const redo = useWindow((state) => redoLabel(state.history));
  return (
    <>
      <IconButton
        label="Undo"
        tip={
          trying
            ? 'Put back the change on trial (Ctrl Z)'
            : undo === null
              ? 'Nothing to undo'
              : `Undo: ${undo} (Ctrl Z)`
        }
        disabled={!trying && undo === null}
        onClick={actions.undo}
      >
        <UndoSign />
      </IconButton>
      <IconButton
        label="Redo"
        tip={redo === null ? 'Nothing to redo' : `Redo: ${redo} (Ctrl Shift Z)`}
        disabled={trying || redo === null}
        onClick={actions.redo}
      >
        <RedoSign />
      </IconButton>
    </>
  );
}
