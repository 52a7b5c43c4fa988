import { type Command, Option } from 'commander';
import { assess } from '../../core/assess.ts';
import type { Assessment } from '../../core/assessment.ts';
import { pushOf } from '../../core/study/study.ts';
import { builtInCatalogues } from './catalogues.ts';
import { type DiagonalBar, diagonalNamed } from './diagonalNamed.ts';
import type { Ending } from './ending.ts';
import { jsonText } from './json.ts';
import { deliver } from './output.ts';
import { readProjectFile } from './projectFile.ts';
import { pushed } from './pushed.ts';
import { pushTable } from './pushTable.ts';
import type { Attempt } from './trouble.ts';
import { lengthValue } from './values.ts';

interface PushOptions {
  readonly bar: string;
  readonly at: number;
  readonly format: 'table' | 'json';
  readonly out?: string;
}

/** A push is tried no nearer to an end than this, mm. */
const FROM_END = 1;

export function addPushCommand(program: Command, ending: Ending): void {
  program
    .command('push')
    .description(
      'how stiff a diagonal is against being pushed aside at a place, in its bay, and what the rest of the bay offers it there',
    )
    .argument('<file>', 'project file')
    .requiredOption('--bar <mark>', 'the diagonal: its mark, its bay and mark (W1/D1), or its id')
    .requiredOption('--at <length>', 'from its end A (i) along the set-out line', lengthValue)
    .addOption(
      new Option('-f, --format <format>', 'how to write it').choices(['table', 'json']).default('table'),
    )
    .option('-o, --out <file>', 'write to this file in place of the terminal')
    .action(async (file: string, options: PushOptions) => {
      const project = await readProjectFile(file);
      if (!project.ok) return ending.trouble(project.trouble);
      const assessment = assess(project.value, builtInCatalogues());
      const bar = diagonalNamed(assessment, options.bar);
      if (!bar.ok) return ending.trouble(bar.trouble);
      const test = pushedAt(assessment, bar.value, options.at);
      if (!test.ok) return ending.trouble(test.trouble);
      const { format, out } = options;
      const text =
        format === 'json' ? jsonText(test.value) : pushTable(test.value, assessment.project.settings.units);
      const delivered = await deliver(text, out, ending.terminal, 'replace');
      if (!delivered.ok) return ending.trouble(delivered.trouble);
    });
}

function pushedAt(assessment: Assessment, bar: DiagonalBar, at: number) {
  const { length, mark } = bar;
  const test = pushOf(assessment, bar.id, at);
  if (test) return { ok: true, value: pushed(assessment, bar, test) } as const;
  const refused: Attempt<never> = {
    ok: false,
    trouble: {
      kind: 'bad value',
      what: `${at} mm is not on ${mark}, which is ${Number(length.toFixed(1))} mm long.`,
      todo: `Give --at between ${FROM_END} and ${Math.floor(length - FROM_END)} mm from its end A.`,
    },
  };
  return refused;
}
