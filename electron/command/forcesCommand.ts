import { type Command, Option } from 'commander';
import { assess } from '../../core/assess.ts';
import { type ForceRow, forceRows } from '../../core/documents/forceRows.ts';
import { builtInCatalogues } from './catalogues.ts';
import type { Ending } from './ending.ts';
import { forcesTable } from './forcesTable.ts';
import { jsonText } from './json.ts';
import { deliver } from './output.ts';
import { readProjectFile } from './projectFile.ts';
import { exitCodeFor } from './projectTroubles.ts';
import type { Attempt } from './trouble.ts';

interface ForcesOptions {
  readonly combination?: string;
  readonly format: 'table' | 'json';
  readonly out?: string;
}

export function addForcesCommand(program: Command, ending: Ending): void {
  program
    .command('forces')
    .description(
      'forces of every bar in every combination, each way round: who carries what, what goes slack, how far it moves',
    )
    .argument('<file>', 'project file')
    .option('-c, --combination <name>', 'only this one: its id or its name, every way round')
    .addOption(
      new Option('-f, --format <format>', 'how to write it').choices(['table', 'json']).default('table'),
    )
    .option('-o, --out <file>', 'write to this file in place of the terminal')
    .action(async (file: string, options: ForcesOptions) => {
      const { terminal } = ending;
      const project = await readProjectFile(file);
      if (!project.ok) return ending.trouble(project.trouble);
      const assessment = assess(project.value, builtInCatalogues());
      const rows = chosen(forceRows(assessment), options.combination);
      if (!rows.ok) return ending.trouble(rows.trouble);
      for (const { path, what, todo } of assessment.forces?.problems ?? [])
        terminal.err(`${path}: ${what} ${todo}\n`);
      const text =
        options.format === 'json'
          ? jsonText({ format: 'tautline-forces', version: 1, combinations: rows.value })
          : forcesTable(rows.value, project.value.settings.units);
      const delivered = await deliver(text, options.out, terminal, 'replace');
      if (!delivered.ok) return ending.trouble(delivered.trouble);
      ending.with(exitCodeFor(assessment, file, terminal));
    });
}

function chosen(rows: readonly ForceRow[], name: string | undefined): Attempt<readonly ForceRow[]> {
  if (rows.length === 0)
    return {
      ok: false,
      trouble: {
        kind: 'bad value',
        what: 'Nothing acts on this project: it has no combinations of load cases.',
        todo: 'Give it cases and combinations under "actions".',
      },
    };
  if (name === undefined) return { ok: true, value: rows };
  const like = name.trim().toLowerCase();
  const value = rows.filter((row) =>
    [row.id, row.combination, row.name].some((each) => each.toLowerCase() === like),
  );
  if (value.length > 0) return { ok: true, value };
  return {
    ok: false,
    trouble: {
      kind: 'bad value',
      what: `There is no combination "${name}".`,
      todo: `Name one of ${[...new Set(rows.map(({ combination }) => combination))].join(', ')}.`,
    },
  };
}
