import type { JSX } from 'react';
import { useWindow } from '../../shell/services.tsx';
import { AboutDialog } from './AboutDialog.tsx';
import { BayDialog } from './BayDialog.tsx';
import { BrokenFileDialog } from './BrokenFileDialog.tsx';
import { ChangedOnDiskDialog } from './ChangedOnDiskDialog.tsx';
import { HostProblemDialog } from './HostProblemDialog.tsx';
import { KeyboardDialog } from './KeyboardDialog.tsx';
import { OwnStockDialog } from './OwnStockDialog.tsx';
import { RecoveryDialog } from './RecoveryDialog.tsx';
import { ReportDialog } from './ReportDialog.tsx';
import { SettingsDialog } from './SettingsDialog.tsx';
import { UnsavedDialog } from './UnsavedDialog.tsx';

/** The dialog that is open, if any. */
export function DialogOutlet(): JSX.Element | null {
  const dialog = useWindow((state) => state.dialog);
  if (dialog === null) return null;
  switch (dialog.kind) {
    case 'settings':
      return <SettingsDialog />;
    case 'own stock':
      return <OwnStockDialog />;
    case 'about':
      return <AboutDialog />;
    case 'keyboard':
      return <KeyboardDialog />;
    case 'report':
      return <ReportDialog />;
    case 'bay':
      return <BayDialog bayId={dialog.bay} />;
    case 'broken file':
      return <BrokenFileDialog name={dialog.name} problems={dialog.problems} />;
    case 'host problem':
      return <HostProblemDialog doing={dialog.doing} problem={dialog.problem} />;
    case 'changed on disk':
      return <ChangedOnDiskDialog name={dialog.name} />;
    case 'unsaved':
      return <UnsavedDialog next={dialog.next} />;
    case 'recovery':
      return <RecoveryDialog copy={dialog.copy} />;
    default:
      return dialog satisfies never;
  }
}
