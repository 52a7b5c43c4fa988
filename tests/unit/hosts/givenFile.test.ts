import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { givenFile } from '../../../electron/desktop/givenFile.ts';
import { safeFileName } from '../../../electron/files/safeFileName.ts';

const main = path.resolve('/made/out/electron/main.cjs');
const at = (name: string): string => path.resolve('/work', name);

describe('the file named on a command line', () => {
  it.each([
    ['follows the main script', ['electron', main, 'shed.json'], 'shed.json'],
    ['follows switches of Chromium', ['electron', '--no-sandbox', main, 'shed.json'], 'shed.json'],
    ['stands among switches added by Chromium', ['electron', main, '--inspect', 'shed.json'], 'shed.json'],
    ['may lie in another folder', ['electron', main, '../shed.json'], '../shed.json'],
  ])('%s', (_what, argv, name) => {
    expect(givenFile(argv, main, '/work')).toBe(at(name));
  });

  it('is missing when only the program is named', () => {
    expect(givenFile(['electron', '--no-sandbox', main], main, '/work')).toBeNull();
    expect(givenFile(['electron'], main, '/work')).toBeNull();
  });

  it('follows the program itself once that is packaged', () => {
    expect(givenFile(['tautline', 'shed.json'], null, '/work')).toBe(at('shed.json'));
    expect(givenFile(['tautline'], null, '/work')).toBeNull();
  });
});

describe('a suggested file name', () => {
  it.each([
    ['Shed A/B: north?.json', 'Shed A B north .json'],
    ['../../etc/passwd', 'etc passwd'],
    ['C:\\shed.json', 'C shed.json'],
    ['  shed.json. ', 'shed.json'],
    ['\u0000\u001f', 'Tautline'],
    ['...', 'Tautline'],
  ])('%j becomes %j, which every system takes', (suggested, name) => {
    expect(safeFileName(suggested)).toBe(name);
  });
});
