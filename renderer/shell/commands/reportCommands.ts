import type { Command } from './command.ts';

export const reportCommands: readonly Command[] = [
  {
    id: 'report',
    menu: 'Report',
    group: 1,
    label: () => 'Report…',
    shortcut: { key: 'p', ctrl: true },
    run: ({ actions }) => actions.openDialog({ kind: 'report' }),
  },
  {
    id: 'print',
    menu: 'Report',
    group: 1,
    label: () => 'Print the report…',
    run: ({ documents }) => void documents.print(),
  },
  {
    id: 'pdf',
    menu: 'Report',
    group: 1,
    label: () => 'Save the report as PDF…',
    run: ({ documents }) => void documents.savePdf(),
  },
  {
    id: 'html',
    menu: 'Report',
    group: 1,
    label: () => 'Save the report as HTML…',
    run: ({ documents }) => void documents.saveReport(),
  },
  {
    id: 'export csv',
    menu: 'Report',
    group: 2,
    label: () => 'Export the schedule as CSV…',
    run: ({ documents }) => void documents.exportSchedule('csv'),
  },
  {
    id: 'export json',
    menu: 'Report',
    group: 2,
    label: () => 'Export the schedule as JSON…',
    run: ({ documents }) => void documents.exportSchedule('json'),
  },
];
