import { type Command, Option } from 'commander';
import { assess } from '../../core/assess.ts';
import { BowingMemory } from '../../core/bowing/memory.ts';
import { reportHtml } from '../../core/documents/report.ts';
import type { UnitSystem } from '../../core/project/model.ts';
import { remediesFor } from '../../core/remedies/remedies.ts';
import { builtInCatalogues } from './catalogues.ts';
import type { Ending } from './ending.ts';
import { deliver } from './output.ts';
import { readProjectFile } from './projectFile.ts';
import { exitCodeFor } from './projectTroubles.ts';
import { embeddedFonts } from './reportFonts.ts';

interface ReportCommandOptions {
  readonly out: string;
  readonly units?: UnitSystem;
  readonly date?: string;
}

export function addReportCommand(program: Command, ending: Ending): void {
  program
    .command('report')
    .description('a report for checking line by line: one HTML file that stands alone, to print on A4')
    .argument('<file>', 'project file')
    .requiredOption('-o, --out <file>', 'HTML file to write')
    .addOption(
      new Option('-u, --units <units>', 'in place of those of the project').choices(['metric', 'us']),
    )
    .option(
      '--date <text>',
      'as printed on the first page; without it none is, so that the same project gives the same file',
    )
    .action(async (file: string, options: ReportCommandOptions) => {
      const project = await readProjectFile(file);
      if (!project.ok) return ending.trouble(project.trouble);
      const catalogues = builtInCatalogues();
      const units = options.units ?? project.value.settings.units;
      // The reasons are worded by the assessment, in the units of the project.
      const shown = { ...project.value, settings: { ...project.value.settings, units } };
      const memory = new BowingMemory();
      const assessment = assess(shown, catalogues, 'all levels', memory);
      const remedies = new Map(
        assessment.findings.map((finding) => [
          finding.id,
          remediesFor(assessment, finding, catalogues, memory),
        ]),
      );
      const html = reportHtml(assessment, {
        units,
        date: options.date ?? null,
        fonts: await embeddedFonts(),
        remedies,
      });
      const delivered = await deliver(html, options.out, ending.terminal, 'replace');
      if (!delivered.ok) return ending.trouble(delivered.trouble);
      ending.with(exitCodeFor(assessment, file, ending.terminal));
    });
}
