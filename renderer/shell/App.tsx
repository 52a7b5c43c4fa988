import { Tooltip } from 'radix-ui';
import { type JSX, useEffect } from 'react';
import { Hatches } from '../glyphs/Hatches.tsx';
import { DialogOutlet } from '../panels/dialogs/DialogOutlet.tsx';
import { keepTheme } from '../theme/themeSetting.ts';
import { useTheme } from '../theme/useTheme.ts';
import { runHostCommand } from './commands/commands.ts';
import { useShortcuts } from './keys/useShortcuts.ts';
import { Layout } from './Layout.tsx';
import { PartBoundary } from './PartBoundary.tsx';
import { StatusBar } from './StatusBar.tsx';
import { useServices, useWindow } from './services.tsx';
import { TopBar } from './top/TopBar.tsx';
import './app.css';

/** The whole window. */
export function App(): JSX.Element {
  const services = useServices();
  const setting = useWindow((state) => state.theme);
  const theme = useTheme(setting);
  useShortcuts();
  useEffect(() => keepTheme(localStorage, setting), [setting]);
  useEffect(() => services.host.onCommand((command) => runHostCommand(command, services)), [services]);

  return (
    <Tooltip.Provider delayDuration={400}>
      <div className="window">
        <Hatches />
        <TopBar />
        <main className="window-main">
          <Layout theme={theme} />
          <div id="overlays" />
        </main>
        <StatusBar />
        <PartBoundary part="the dialog">
          <DialogOutlet />
        </PartBoundary>
      </div>
    </Tooltip.Provider>
  );
}
