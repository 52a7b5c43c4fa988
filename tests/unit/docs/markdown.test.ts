import { describe, expect, it } from 'vitest';
import { documentedCommands, documentedPaths, documentedScripts } from './markdown.ts';

const text = [
  'Run `npm run bench` or `npm test`; `core/section/outlinePath.ts` draws, see [methods](core/METHODS.md#holds).',
  'Not a path: `r_v`, `a/b` ratio, `npm ci`, [web](https://example.org/a).',
  '```sh',
  'npm run --silent tautline -- schedule a.json   # exit code 1: something is over',
  '$ npm run --silent tautline -- section 70x70x6 \\',
  '    --format json',
  'npm run --silent tautline -- schedule b.json # ends with 2',
  '```',
  'npm run --silent tautline -- outside any block',
].join('\n');

describe('what a document says', () => {
  it('is read as commands with the exit code that a remark names', () => {
    expect(documentedCommands('A.md', text)).toEqual([
      { line: 'npm run --silent tautline -- schedule a.json', where: 'A.md:4', exitCode: 1 },
      { line: 'npm run --silent tautline -- section 70x70x6 --format json', where: 'A.md:5', exitCode: 0 },
      { line: 'npm run --silent tautline -- schedule b.json', where: 'A.md:7', exitCode: 2 },
    ]);
  });

  it('is read as names of scripts', () => {
    expect(documentedScripts(text).toSorted()).toEqual(['bench', 'tautline', 'test']);
  });

  it('is read as paths, in backticks and in links', () => {
    expect(documentedPaths(text, ['core', 'tests'])).toEqual([
      'core/section/outlinePath.ts',
      'core/METHODS.md',
    ]);
  });
});
