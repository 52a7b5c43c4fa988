/**
 * `npm test`: types, lint and format, dependency rules, build, unit tests and end-to-end tests, each run whatever the
 * ones before came to. The last line is "N passed, N failed": every test of the last two, and each other step as one.
 */
import { spawn } from 'node:child_process';
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { electronBinary } from '../electron/electronBinary.ts';
import { haveChromium } from './browser/findChromium.ts';
import { type Count, countOf } from './count.ts';

const ROOT = path.resolve(import.meta.dirname, '..');

/** A tool of the project, run by its own file: nothing is looked up, fetched or wrapped in another process. */
const TOOLS = {
  tsc: 'node_modules/typescript/bin/tsc',
  biome: 'node_modules/@biomejs/biome/bin/biome',
  vite: 'node_modules/vite/bin/vite.js',
  vitest: 'node_modules/vitest/vitest.mjs',
} as const;

interface Step {
  readonly name: string;
  readonly run: () => Promise<Count>;
}

const say = (line: string): void => void process.stdout.write(`${line}\n`);

const STEPS: readonly Step[] = [
  { name: 'types', run: () => single([TOOLS.tsc, '-b']) },
  { name: 'lint and format', run: () => single([TOOLS.biome, 'check', '.']) },
  {
    name: 'dependency rules',
    run: () => single(['--import', 'tsx', 'tests/architecture/dependencyRules.ts']),
  },
  { name: 'build', run: () => single([TOOLS.vite, 'build', '--app']) },
  { name: 'unit, published and property tests', run: () => tests('unit') },
  { name: 'end-to-end tests', run: () => endToEnd() },
];

process.exitCode = await runAll();

async function runAll(): Promise<number> {
  const rows: { readonly name: string; readonly count: Count; readonly seconds: number }[] = [];
  for (const { name, run } of STEPS) {
    say(`\n── ${name} ──`);
    const began = performance.now();
    rows.push({ name, count: await run(), seconds: (performance.now() - began) / 1000 });
  }
  say('\n── summary ──');
  for (const { name, count, seconds } of rows) {
    const figures = `${String(count.passed).padStart(5)} passed ${String(count.failed).padStart(4)} failed`;
    say(`${name.padEnd(36)}${figures}${seconds.toFixed(1).padStart(8)} s`);
  }
  const passed = rows.reduce((sum, { count }) => sum + count.passed, 0);
  const failed = rows.reduce((sum, { count }) => sum + count.failed, 0);
  say(`${passed} passed, ${failed} failed`);
  return failed === 0 ? 0 : 1;
}

/** A step that passes or fails as a whole. */
async function single(args: readonly string[]): Promise<Count> {
  const code = await node(args);
  return code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

async function endToEnd(): Promise<Count> {
  const chromium = haveChromium(say);
  if (chromium === null) {
    say('There is no Chromium, and none could be had. Name one in TAUTLINE_CHROMIUM.');
    return { passed: 0, failed: 1 };
  }
  say(`Browser: ${chromium.path} (found on ${chromium.from}).`);
  const electron = electronBinary();
  say(
    electron === null
      ? 'Desktop: a stand-in for Electron, whose binary is not here.'
      : `Desktop: ${electron}.`,
  );
  return await tests('e2e', { TAUTLINE_CHROMIUM: chromium.path });
}

async function tests(project: 'unit' | 'e2e', more: NodeJS.ProcessEnv = {}): Promise<Count> {
  const folder = await mkdtemp(path.join(os.tmpdir(), 'tautline-test-'));
  const file = path.join(folder, 'report.json');
  try {
    const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${file}`];
    const code = await node([TOOLS.vitest, 'run', '--project', project, ...reporters], more);
    const count = countOf(await readFile(file, 'utf8').catch(() => ''), code);
    for (const trouble of count.troubles) say(trouble);
    return count;
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

/** Runs Node with these arguments in the project's folder; its exit code, 1 when it was ended by a signal. */
function node(args: readonly string[], more: NodeJS.ProcessEnv = {}): Promise<number> {
  const child = spawn(process.execPath, args, {
    cwd: ROOT,
    env: { ...process.env, ...more },
    stdio: ['ignore', 'inherit', 'inherit'],
  });
  return new Promise((resolve) => {
    child.on('error', () => resolve(1));
    child.on('close', (code) => resolve(code ?? 1));
  });
}
