import { type Command, Option } from 'commander';
import { readCases } from '../../core/cases/readCases.ts';
import { solveCase } from '../../core/cases/solveCase.ts';
import { bowJson } from './bowJson.ts';
import { bowTable } from './bowTable.ts';
import type { Ending } from './ending.ts';
import { jsonText } from './json.ts';
import { readJsonFile } from './jsonFile.ts';
import { deliver } from './output.ts';

interface BowOptions {
  readonly format: 'table' | 'json';
  readonly out?: string;
}

export function addBowCommand(program: Command, ending: Ending): void {
  program
    .command('bow')
    .description(
      'elastic critical loads of bars and crossed pairs given one by one in a file, how they bow, and the rule beside',
    )
    .argument('<file>', 'JSON file: an object with the list “cases”, or the list itself')
    .addOption(
      new Option('-f, --format <format>', 'how to write it').choices(['table', 'json']).default('table'),
    )
    .option('-o, --out <file>', 'write to this file in place of the terminal')
    .action(async (file: string, { format, out }: BowOptions) => {
      const data = await readJsonFile(file);
      if (!data.ok) return ending.trouble(data.trouble);
      const read = readCases(data.value);
      if (!read.ok) return ending.trouble({ kind: 'no cases', file, problem: read.problem });
      const solved = read.cases.flatMap((each) => (each.ok ? [solveCase(each.case)] : []));
      const text = format === 'json' ? jsonText(solved.map(bowJson)) : bowTable(solved);
      const delivered = await deliver(text, out, ending.terminal, 'replace');
      if (!delivered.ok) return ending.trouble(delivered.trouble);
      for (const each of read.cases)
        if (!each.ok) ending.trouble({ kind: 'bad case', file, id: each.id, problems: each.problems });
    });
}
