import { shownForces } from '../../store/shownForces.ts';
import type { DockTab, ViewName } from '../../store/windowState.ts';
import type { ThemeSetting } from '../../theme/themeSetting.ts';
import type { Command } from './command.ts';

const VIEWS: readonly { readonly name: ViewName; readonly label: string }[] = [
  { name: 'elevation', label: 'Elevation' },
  { name: 'plan', label: 'Plan' },
  { name: 'side', label: 'Side' },
  { name: 'axonometric', label: 'Axonometric' },
];

const TABS: readonly { readonly tab: DockTab; readonly label: string }[] = [
  { tab: 'schedule', label: 'Schedule' },
  { tab: 'shortlist', label: 'Shortlist' },
  { tab: 'findings', label: 'Findings' },
  { tab: 'bowing', label: 'Bowing' },
  { tab: 'forces', label: 'Forces' },
];

const THEMES: readonly { readonly theme: ThemeSetting; readonly label: string }[] = [
  { theme: 'light', label: 'Light' },
  { theme: 'dark', label: 'Dark' },
  { theme: 'system', label: 'Light or dark as the machine is set' },
];

export const viewCommands: readonly Command[] = [
  ...VIEWS.map(
    ({ name, label }, index): Command => ({
      id: `view ${name}`,
      menu: 'View',
      group: 1,
      label: () => label,
      shortcut: { key: String(index + 1) },
      checked: ({ view }) => view.name === name && !view.turned,
      run: ({ actions }) => actions.look(name),
    }),
  ),
  {
    id: 'scale',
    menu: 'View',
    group: 2,
    label: () => 'Angles drawn twice their size',
    shortcut: { key: 'd' },
    checked: ({ view }) => view.scale === 'doubled',
    run: ({ store, actions }) =>
      actions.setView({ scale: store.getState().view.scale === 'doubled' ? 'true' : 'doubled' }),
  },
  {
    id: 'bow',
    menu: 'View',
    group: 2,
    label: () => 'Bow the chosen diagonal',
    shortcut: { key: 'b' },
    checked: ({ view }) => view.bow && !view.forces,
    run: ({ store, actions }) => {
      const { view } = store.getState();
      actions.setBow(!view.bow || view.forces);
    },
  },
  {
    id: 'play shape',
    menu: 'View',
    group: 2,
    label: () => 'Swing the computed shape',
    shortcut: { key: 'a' },
    checked: ({ view }) => view.playing,
    run: ({ store, actions }) => actions.setView({ playing: !store.getState().view.playing }),
  },
  {
    id: 'push',
    menu: 'View',
    group: 2,
    label: () => 'Push the chosen diagonal',
    shortcut: { key: 'p' },
    checked: ({ view }) => view.push,
    run: ({ store, actions }) => actions.setPushMode(!store.getState().view.push),
  },
  {
    id: 'forces',
    menu: 'View',
    group: 2,
    label: () => 'Draw the forces',
    shortcut: { key: 'f' },
    checked: ({ view }) => view.forces,
    run: ({ store, actions }) => actions.showForces(!store.getState().view.forces),
  },
  {
    id: 'next combination',
    menu: 'View',
    group: 2,
    label: () => 'Next combination',
    shortcut: { key: '.' },
    enabled: (state) => shownForces(state) !== null,
    run: ({ actions }) => actions.stepForceState(1),
  },
  {
    id: 'combination before',
    menu: 'View',
    group: 2,
    label: () => 'Combination before',
    shortcut: { key: ',' },
    enabled: (state) => shownForces(state) !== null,
    run: ({ actions }) => actions.stepForceState(-1),
  },
  {
    id: 'trail',
    menu: 'View',
    group: 2,
    label: () => 'Trail from holds to supports',
    shortcut: { key: 't' },
    checked: ({ view }) => view.trail,
    run: ({ store, actions }) => actions.setView({ trail: !store.getState().view.trail }),
  },
  ...TABS.map(
    ({ tab, label }, index): Command => ({
      id: `tab ${tab}`,
      menu: 'View',
      group: 3,
      label: () => label,
      shortcut: { key: String(index + 5) },
      checked: (state) => state.tab === tab,
      run: ({ actions }) => actions.showTab(tab),
    }),
  ),
  ...THEMES.map(
    ({ theme, label }): Command => ({
      id: `theme ${theme}`,
      menu: 'View',
      group: 4,
      label: () => label,
      checked: (state) => state.theme === theme,
      run: ({ actions }) => actions.setTheme(theme),
    }),
  ),
];
