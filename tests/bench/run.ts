/**
 * `npm run bench`: figures beside goals, as a table. It never fails on a time, which is the machine's as much as the program's.
 * Each part is loaded when its turn comes, and one that cannot be loaded says so and leaves the others alone.
 */
import { cpus } from 'node:os';
import { ms, type Row, row, table } from './row.ts';

interface Part {
  readonly name: string;
  readonly rows: () => Promise<readonly Row[]>;
}

const PARTS: readonly Part[] = [
  { name: 'assess', rows: async () => (await import('./assessing.ts')).assessing() },
  { name: 'shortlist and remedies', rows: async () => (await import('./choosing.ts')).choosing() },
  { name: 'drawing', rows: async () => (await import('./drawing.ts')).drawing() },
  { name: 'bundle', rows: async () => (await import('./bundle.ts')).bundle() },
];

async function rowsOf(part: Part): Promise<readonly Row[]> {
  try {
    return await part.rows();
  } catch (error) {
    return [
      row(
        part.name,
        `not measured: ${error instanceof Error ? error.message.split('\n')[0] : String(error)}`,
      ),
    ];
  }
}

const start = performance.now();
const rows: Row[] = [];
for (const part of PARTS) {
  process.stderr.write(`measuring: ${part.name}…\n`);
  rows.push(...(await rowsOf(part)));
}
const [cpu] = cpus();
process.stdout.write(`${table(rows)}\n\n`);
process.stdout.write(
  `Node ${process.versions.node}, one core of ${cpus().length} (${cpu?.model.trim() || 'unknown'}), ${ms(performance.now() - start)} in all.\n`,
);
