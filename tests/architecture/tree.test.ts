import { readdir, readFile } from 'node:fs/promises';
import path from 'node:path';
import { describe, expect, it } from 'vitest';

/** What the top level is for. */
const PARTS = [
  'electron',
  'renderer',
  'core',
  'tests',
  'assets',
  'package.json',
  'tsconfig.json',
  'README.md',
  'DEVELOPERS.md',
  'LICENSE',
  '.ci',
];

/** Files that tools look for at the top level and nowhere else. */
const FOR_TOOLS = [
  'package-lock.json',
  'tsconfig.base.json',
  'vite.config.ts',
  'biome.json',
  '.npmrc',
  '.editorconfig',
  '.gitattributes',
  '.gitignore',
];

/** Made by tools, and ignored by Git. */
const MADE = ['node_modules', 'out', '.cache', 'coverage', '.git'];

const SOURCES = ['core', 'renderer', 'electron', 'tests', 'assets'];

async function sourceFiles(): Promise<readonly string[]> {
  const listed = await Promise.all(
    SOURCES.map(async (folder) =>
      (await readdir(folder, { recursive: true })).map((name) =>
        path.posix.join(folder, name.replaceAll('\\', '/')),
      ),
    ),
  );
  return listed.flat().filter((name) => /\.tsx?$/.test(name));
}

describe('the tree', () => {
  it('has nothing at the top but its parts and what tools need', async () => {
    const top = await readdir('.');
    expect(top.filter((name) => ![...PARTS, ...FOR_TOOLS, ...MADE].includes(name))).toEqual([]);
    expect(PARTS.filter((name) => !top.includes(name))).toEqual([]);
  });

  it('has no room for odds and ends', async () => {
    const odds = (await sourceFiles()).filter((name) =>
      /(^|\/)(utils?|helpers?|common|misc|shared)(\/|\.tsx?$)/i.test(name),
    );
    expect(odds).toEqual([]);
  });

  it('has no barrels: a module that only passes on what others export', async () => {
    const files = await sourceFiles();
    expect(files.length).toBeGreaterThan(100);
    const barrels: string[] = [];
    for (const file of files) {
      const code = (await readFile(file, 'utf8')).replace(/\/\*[\s\S]*?\*\/|\/\/.*$/gm, '').trim();
      const rest = code
        .replace(/export\s+(type\s+)?(\*(\s+as\s+\w+)?|\{[^}]*\})\s+from\s+['"][^'"]+['"];?/g, '')
        .trim();
      if (/(^|\/)index\.tsx?$/.test(file) || (code !== '' && rest === '')) barrels.push(file);
    }
    expect(barrels).toEqual([]);
  });

  it('has no test that is left out, or that keeps the others out', async () => {
    const tests = (await sourceFiles()).filter((name) => name.endsWith('.test.ts'));
    const left: string[] = [];
    for (const file of tests)
      if (/\b(it|test|describe)\.(skip|only|todo|skipIf|runIf|fails)\b/.test(await readFile(file, 'utf8')))
        left.push(file);
    expect(left).toEqual([]);
  });
});
