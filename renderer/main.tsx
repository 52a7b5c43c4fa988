import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { createStore } from 'zustand/vanilla';
import { assessWorker, createAssessor } from './assessing/assessor.ts';
import { bowingPool, bowingWorker, workersFor } from './assessing/bowingPool.ts';
import { followCloser } from './assessing/closerLook.ts';
import { chooseHost } from './host/chooseHost.ts';
import { App } from './shell/App.tsx';
import { type Services, ServicesProvider } from './shell/services.tsx';
import { startAutosaving } from './store/autosaving.ts';
import { documents } from './store/documents.ts';
import { windowActions } from './store/windowActions.ts';
import { firstState, type WindowState } from './store/windowState.ts';
import { keptTheme } from './theme/themeSetting.ts';
import './theme/fonts.css';
import './theme/tokens.css';
import './theme/base.css';
import './theme/controls.css';
import './glyphs/glyphs.css';

const place = document.getElementById('window');
if (place === null) throw new Error('the page has no place for the window');

const now = (): number => performance.now();
const host = chooseHost();
const store = createStore<WindowState>(() => firstState(keptTheme(localStorage)));
const actions = windowActions(store, now);
const assessor = createAssessor(store, assessWorker, now, () =>
  bowingPool(bowingWorker, workersFor(navigator.hardwareConcurrency)),
);
const services: Services = {
  host,
  store,
  actions,
  assessor,
  documents: documents({ host, store, actions, assessor }),
};

assessor.start();
followCloser(store, assessor);
startAutosaving(store, host);
void services.documents.begin();

createRoot(place).render(
  <StrictMode>
    <ServicesProvider services={services}>
      <App />
    </ServicesProvider>
  </StrictMode>,
);
