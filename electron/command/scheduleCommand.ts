import { type Command, Option } from 'commander';
import { assess } from '../../core/assess.ts';
import { csvFile } from '../../core/documents/csv.ts';
import { scheduleCsv } from '../../core/documents/scheduleCsv.ts';
import { barlessLines, scheduleTable } from '../../core/documents/scheduleTable.ts';
import type { UnitSystem } from '../../core/project/model.ts';
import { builtInCatalogues } from './catalogues.ts';
import type { Ending } from './ending.ts';
import { jsonText } from './json.ts';
import { deliver } from './output.ts';
import { readProjectFile } from './projectFile.ts';
import { exitCodeFor } from './projectTroubles.ts';

interface ScheduleOptions {
  readonly format: 'table' | 'csv' | 'json';
  readonly units?: UnitSystem;
  readonly out?: string;
}

export function addScheduleCommand(program: Command, ending: Ending): void {
  program
    .command('schedule')
    .description(
      'the bracing schedule of a project: one row a diagonal, with lengths, slenderness and verdicts',
    )
    .argument('<file>', 'project file')
    .addOption(
      new Option('-f, --format <format>', 'how to write it')
        .choices(['table', 'csv', 'json'])
        .default('table'),
    )
    .addOption(
      new Option('-u, --units <units>', 'for table and csv, in place of those of the project').choices([
        'metric',
        'us',
      ]),
    )
    .option('-o, --out <file>', 'write to this file in place of the terminal')
    .action(async (file: string, options: ScheduleOptions) => {
      const { terminal } = ending;
      const project = await readProjectFile(file);
      if (!project.ok) return ending.trouble(project.trouble);
      const assessment = assess(project.value, builtInCatalogues());
      const units = options.units ?? project.value.settings.units;
      const text = {
        table: () => scheduleTable(assessment.schedule, units, assessment.findings),
        csv: () => {
          const csv = scheduleCsv(assessment.schedule, units);
          // What goes on to another program begins with its first head.
          return options.out === undefined ? csv : csvFile(csv);
        },
        json: () => jsonText(assessment.schedule),
      }[options.format]();
      const delivered = await deliver(text, options.out, terminal, 'replace');
      if (!delivered.ok) return ending.trouble(delivered.trouble);
      // Rows have no place for what names no diagonal; it must not be lost where it may break the run.
      if (options.format !== 'table')
        for (const line of barlessLines(assessment.schedule, assessment.findings))
          terminal.err(`${file}: ${line}\n`);
      ending.with(exitCodeFor(assessment, file, terminal));
    });
}
