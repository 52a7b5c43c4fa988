import { readProjectData } from '../../../core/project/readProject.ts';
import { isChanged } from '../../store/shown.ts';
import type { Services } from '../services.tsx';
import type { Command } from './command.ts';

/** As at the first start: a project of its own, in no file. */
async function openExample({ actions }: Services): Promise<void> {
  const name = 'marrow-lane.json';
  const { default: example } = await import('../../../assets/examples/marrow-lane.json');
  const read = readProjectData(example);
  if (read.ok) actions.replaceProject(read.project, { name, token: null, saved: true });
  else actions.openDialog({ kind: 'broken file', name, problems: read.problems });
}

export const fileCommands: readonly Command[] = [
  {
    id: 'new',
    menu: 'File',
    group: 1,
    label: () => 'New project',
    run: ({ documents }) => void documents.newProject(),
  },
  {
    id: 'open',
    menu: 'File',
    group: 1,
    label: () => 'Open…',
    shortcut: { key: 'o', ctrl: true },
    run: ({ documents }) => void documents.open(),
  },
  {
    id: 'example',
    menu: 'File',
    group: 1,
    label: () => 'Open the example',
    // What is in no file yet would be lost.
    enabled: (state) => !isChanged(state),
    run: (services) => void openExample(services),
  },
  {
    id: 'save',
    menu: 'File',
    group: 2,
    label: () => 'Save',
    shortcut: { key: 's', ctrl: true },
    run: ({ documents }) => void documents.save(),
  },
  {
    id: 'save as',
    menu: 'File',
    group: 2,
    label: () => 'Save as…',
    shortcut: { key: 's', ctrl: true, shift: true },
    run: ({ documents }) => void documents.saveAs(),
  },
  {
    id: 'settings',
    menu: 'File',
    group: 3,
    label: () => 'Project settings…',
    shortcut: { key: ',', ctrl: true },
    run: ({ actions }) => actions.openDialog({ kind: 'settings' }),
  },
  {
    id: 'own stock',
    menu: 'File',
    group: 3,
    label: () => 'Own stock list…',
    run: ({ actions }) => actions.openDialog({ kind: 'own stock' }),
  },
];
