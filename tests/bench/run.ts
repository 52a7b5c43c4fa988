/**
 * `npm run bench`: figures beside goals, as a table. It never fails on a time, which is the machine's as much as the program's.
 * The code is built first, as for the window: run from its sources it would carry a tenth more, which no user pays.
 */
import { cpus } from 'node:os';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { build } from 'vite';
import type { Part } from './parts.ts';
import { ms, type Row, row, table } from './row.ts';

const ROOT = path.resolve(import.meta.dirname, '../..');
const OUT = path.join(ROOT, '.cache/bench');

async function builtParts(): Promise<readonly Part[]> {
  await build({
    root: ROOT,
    configFile: false,
    publicDir: false,
    logLevel: 'error',
    build: {
      ssr: path.join(import.meta.dirname, 'parts.ts'),
      outDir: OUT,
      emptyOutDir: true,
      minify: false,
      target: 'node20',
      rolldownOptions: { output: { entryFileNames: 'parts.mjs' } },
    },
  });
  const built = (await import(
    pathToFileURL(path.join(OUT, 'parts.mjs')).href
  )) as typeof import('./parts.ts');
  return built.PARTS;
}

function rowsOf(part: Part): readonly Row[] {
  process.stderr.write(`measuring: ${part.name}…\n`);
  try {
    return part.rows(ROOT);
  } catch (error) {
    const what = error instanceof Error ? error.message.split('\n')[0] : String(error);
    return [row(part.name, `not measured: ${what}`)];
  }
}

const start = performance.now();
const rows = (await builtParts()).flatMap(rowsOf);
const [cpu] = cpus();
process.stdout.write(`${table(rows)}\n\n`);
process.stdout.write(
  `Node ${process.versions.node}, one core of ${cpus().length} (${cpu?.model.trim() || 'unknown'}), ${ms(performance.now() - start)} in all.\n`,
);
