import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { noteCommands, until } from './asking.ts';
import type { Desktop } from './desktop.ts';
import { startDesktop } from './startDesktop.ts';

let desktop: Desktop;
beforeAll(async () => {
  desktop = await startDesktop({ blank: true });
});
afterAll(() => desktop.end());

describe('the menu', () => {
  it.each([
    ['file.new', 'new'],
    ['file.open', 'open'],
    ['file.save', 'save'],
    ['file.saveAs', 'save as'],
    ['file.exportCsv', 'export csv'],
    ['file.exportJson', 'export json'],
    ['file.report', 'report'],
    ['file.print', 'print'],
    ['file.pdf', 'pdf'],
    ['edit.undo', 'undo'],
    ['edit.redo', 'redo'],
    ['edit.find', 'find'],
    ['view.light', 'theme light'],
    ['view.dark', 'theme dark'],
    ['view.system', 'theme system'],
    ['help.about', 'about'],
  ])('sends by its entry %s the command "%s" to the window', async (entry, command) => {
    const heard = await noteCommands(desktop.page);
    await desktop.clickMenu(entry);
    expect(await until(heard, (all) => all.length > 0)).toEqual([command]);
  });

  it('sends nothing more once the window has stopped listening', async () => {
    await desktop.page.evaluate(() => {
      const stop = Reflect.get(window, 'tautlineHost').onCommand(() => Reflect.set(window, 'heard', true));
      stop();
    });
    const heard = await noteCommands(desktop.page);
    await desktop.clickMenu('file.save');
    await until(heard, (all) => all.length > 0);
    expect(await desktop.page.evaluate(() => Reflect.get(window, 'heard'))).toBeUndefined();
  });
});
