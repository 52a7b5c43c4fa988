/** What the window loads before it shows anything: the entry, all that it imports at once, and its style. */
import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { type Row, row } from './row.ts';

const GOAL = 600_000;

/** @param root folder of the project, with what was built under `out` */
export function bundle(root: string): readonly Row[] {
  const page = path.join(root, 'out/renderer/index.html');
  if (!existsSync(page))
    return [row('renderer bundle', 'not built: run npm run build', 'under 600 kB gzipped')];
  const files = initialFiles(page);
  const sizes = files.map((file) => ({ file, size: gzipSync(readFileSync(file)).byteLength }));
  const total = sizes.reduce((sum, { size }) => sum + size, 0);
  const kB = (size: number): string => `${(size / 1000).toFixed(0)} kB`;
  const largest = [...sizes].sort((a, b) => b.size - a.size).slice(0, 4);
  return [
    row(`initial renderer bundle, ${files.length} files gzipped`, kB(total), 'under 600 kB', total < GOAL),
    ...largest.map(({ file, size }) => row(`  ${path.basename(file)}`, kB(size))),
  ];
}

/** The page, the scripts and styles it names, and what these scripts import statically, each once. */
function initialFiles(page: string): readonly string[] {
  const html = readFileSync(page, 'utf8');
  const named = [...html.matchAll(/<(?:script|link)\b[^>]*>/g)]
    .map(([tag]) => tag)
    .filter((tag) => /<script\b/.test(tag) || /rel="(?:stylesheet|modulepreload)"/.test(tag))
    .flatMap((tag) => /(?:src|href)="([^"]+)"/.exec(tag)?.[1] ?? [])
    .map((name) => path.resolve(path.dirname(page), name));
  const found = new Set<string>([page]);
  const waiting = [...named];
  for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) {
    if (found.has(next) || !existsSync(next)) continue;
    found.add(next);
    if (next.endsWith('.js')) waiting.push(...staticImports(next));
  }
  return [...found];
}

/** `import … from "./x.js"`, `import "./x.js"` and `export … from "./x.js"`, not `import("./x.js")`, which loads later. */
function staticImports(file: string): readonly string[] {
  const code = readFileSync(file, 'utf8');
  const names = [
    ...code.matchAll(/\b(?:import|export)\s*(?:[\w$*{},\s]+?\bfrom\s*)?["'](\.{1,2}\/[^"']+)["']/g),
  ];
  return names.flatMap(([, name]) => (name ? [path.resolve(path.dirname(file), name)] : []));
}
