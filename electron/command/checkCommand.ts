import { type Command, Option } from 'commander';
import { assess } from '../../core/assess.ts';
import { checkRows } from '../../core/documents/checkRows.ts';
import { builtInCatalogues } from './catalogues.ts';
import { checkTable } from './checkTable.ts';
import type { Ending } from './ending.ts';
import { jsonText } from './json.ts';
import { deliver } from './output.ts';
import { readProjectFile } from './projectFile.ts';
import { exitCodeFor } from './projectTroubles.ts';

interface CheckOptions {
  readonly format: 'table' | 'json';
  readonly out?: string;
}

export function addCheckCommand(program: Command, ending: Ending): void {
  program
    .command('check')
    .description(
      'what every diagonal and its ends, and every squeezed strut and beam, resist by the practice, clause by clause, against what acts',
    )
    .argument('<file>', 'project file')
    .addOption(
      new Option('-f, --format <format>', 'how to write it').choices(['table', 'json']).default('table'),
    )
    .option('-o, --out <file>', 'write to this file in place of the terminal')
    .action(async (file: string, options: CheckOptions) => {
      const { terminal } = ending;
      const project = await readProjectFile(file);
      if (!project.ok) return ending.trouble(project.trouble);
      const assessment = assess(project.value, builtInCatalogues());
      const rows = checkRows(assessment);
      const text =
        options.format === 'json'
          ? jsonText({ format: 'tautline-checks', version: 1, bars: rows })
          : checkTable(rows, project.value.settings.units);
      const delivered = await deliver(text, options.out, terminal, 'replace');
      if (!delivered.ok) return ending.trouble(delivered.trouble);
      ending.with(exitCodeFor(assessment, file, terminal));
    });
}
