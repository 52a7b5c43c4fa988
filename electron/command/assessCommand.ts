import { type Command, Option } from 'commander';
import { assess } from '../../core/assess.ts';
import { BowingMemory } from '../../core/bowing/memory.ts';
import { remediesFor } from '../../core/remedies/remedies.ts';
import { builtInCatalogues } from './catalogues.ts';
import type { Ending } from './ending.ts';
import { jsonText } from './json.ts';
import { deliver } from './output.ts';
import { readProjectFile } from './projectFile.ts';
import { exitCodeFor } from './projectTroubles.ts';

export function addAssessCommand(program: Command, ending: Ending): void {
  program
    .command('assess')
    .description(
      'everything derived from a project: layout, holds, lanes, verdicts, findings with the remedies and their effects',
    )
    .argument('<file>', 'project file')
    .addOption(new Option('-f, --format <format>', 'how to write it').choices(['json']).default('json'))
    .option('-o, --out <file>', 'write to this file in place of the terminal')
    .action(async (file: string, options: { readonly out?: string }) => {
      const { terminal } = ending;
      const project = await readProjectFile(file);
      if (!project.ok) return ending.trouble(project.trouble);
      const catalogues = builtInCatalogues();
      const memory = new BowingMemory();
      const assessment = assess(project.value, catalogues, 'all levels', memory);
      const findings = assessment.findings.map((finding) => ({
        ...finding,
        remedies: remediesFor(assessment, finding, catalogues, memory),
      }));
      const text = jsonText({ format: 'tautline-assessment', version: 1, ...assessment, findings });
      const delivered = await deliver(text, options.out, terminal, 'replace');
      if (!delivered.ok) return ending.trouble(delivered.trouble);
      ending.with(exitCodeFor(assessment, file, terminal));
    });
}
