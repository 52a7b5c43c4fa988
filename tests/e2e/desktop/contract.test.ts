import { readFile } from 'node:fs/promises';
import { builtinModules } from 'node:module';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { HOST_CALLS, type HostCall } from '../../../electron/channels.ts';
import { ask, askAnything } from './asking.ts';
import type { Desktop } from './desktop.ts';
import { MAIN, startDesktop } from './startDesktop.ts';

let desktop: Desktop;
beforeAll(async () => {
  desktop = await startDesktop({ blank: true });
  process.stdout.write(
    `Desktop tests run on ${desktop.host === 'electron' ? 'Electron' : 'the stand-in'}.\n`,
  );
});
afterAll(() => desktop.end());

describe('what the preload shows to the page', () => {
  it('is a desktop host with every member of the interface and nothing else', async () => {
    const members = await desktop.page.evaluate(() => {
      const host = Reflect.get(window, 'tautlineHost');
      return { kind: host.kind, names: Object.keys(host) };
    });
    expect(members.kind).toBe('desktop');
    expect(members.names.toSorted()).toEqual([...HOST_CALLS, 'kind', 'onCommand'].toSorted());
  });

  it('cannot be changed by the page', async () => {
    const changed = await desktop.page.evaluate(() => {
      const host = Reflect.get(window, 'tautlineHost');
      try {
        host.save = () => 'mine';
      } catch {
        return false;
      }
      return host.save() === 'mine';
    });
    expect(changed).toBe(false);
  });

  it('brings nothing of Node or Electron into the page', async () => {
    const there = await desktop.page.evaluate(() =>
      ['require', 'process', 'module', 'Buffer', 'global', 'electron', 'ipcRenderer', '__dirname'].filter(
        (name) => Reflect.get(window, name) !== undefined,
      ),
    );
    expect(there).toEqual([]);
  });

  it('is built from Electron alone, without a module of Node', async () => {
    const preload = await readFile(path.join(path.dirname(MAIN), 'preload.cjs'), 'utf8');
    const required = [...preload.matchAll(/(?:require|import)\(\s*["'`]([^"'`]+)["'`]\s*\)/g)].map(
      (one) => one[1],
    );
    expect(required).toEqual(['electron']);
    const node = builtinModules.filter((name) => preload.includes(`"node:${name}"`));
    expect(node).toEqual([]);
  });
});

describe('what main takes from the page', () => {
  const token = '123e4567-e89b-42d3-a456-426614174000';
  const copy = { name: 'Shed', token: null, text: '{}', savedAt: '2026-01-01T10:00:00.000Z' };
  const refused: readonly [string, HostCall, readonly unknown[]][] = [
    ['a path in place of a token', 'save', ['/etc/passwd', 'text', false]],
    ['a path to open', 'openRecent', ['../secrets.json']],
    ['a token of another type', 'openRecent', [42]],
    ['a missing argument', 'save', [token, 'text']],
    ['a text that is not one', 'saveAs', ['shed.json', { toString: 'text' }]],
    ['an empty name', 'saveAs', ['', 'text']],
    ['a recovery copy with a path in it', 'autosave', [{ ...copy, path: '/etc/passwd' }]],
    ['a recovery copy without its time', 'autosave', [{ ...copy, savedAt: 'yesterday' }]],
    ['an extension with a path in it', 'importText', [['../../etc/passwd']]],
    ['a media type that is none', 'exportText', ['a.csv', 'text', 'csv']],
    ['a report that is not text', 'print', [null]],
    ['a state of the document with more in it', 'setDocumentState', [{ title: 'a', dirty: true, path: '/' }]],
    ['a flag that is not one', 'setDocumentState', [{ title: 'a', dirty: 'yes' }]],
  ];

  it.each(refused)('refuses %s', async (_what, call, args) => {
    // Two calls only tell main something: the page does not wait for them, so main's own door is asked.
    if (call === 'setDocumentState') {
      const before = await desktop.title();
      await askAnything(desktop.page, call, args);
      await ask(desktop.page, 'recent');
      expect(await desktop.title()).toBe(before);
    } else
      await expect(askAnything(desktop.page, call, args)).rejects.toThrow(
        new RegExp(`Refused ${call}: argument`),
      );
  });

  it('answers a well-formed token that it never gave with "not found"', async () => {
    const saved = await ask(desktop.page, 'save', token, 'text', false);
    expect(saved).toEqual({ ok: false, problem: { kind: 'not found', name: '' } });
    const opened = await ask(desktop.page, 'openRecent', token);
    expect(opened).toEqual({ ok: false, problem: { kind: 'not found', name: '' } });
  });
});

describe('who may call main', () => {
  it('refuses a page of another origin, although it has the preload', async () => {
    await desktop.lead('app://report/elsewhere');
    await expect(ask(desktop.page, 'recent')).rejects.toThrow('does not come from Tautline');
    await desktop.lead('app://tautline/index.html');
    await expect(ask(desktop.page, 'recent')).resolves.toEqual([]);
  });

  it('shows no host to a frame inside the page', async () => {
    const inFrame = await desktop.page.evaluate(async () => {
      const frame = document.createElement('iframe');
      frame.srcdoc = '<p>inside</p>';
      const loaded = new Promise((resolve) => frame.addEventListener('load', resolve));
      document.body.append(frame);
      await loaded;
      return Reflect.get(frame.contentWindow ?? {}, 'tautlineHost') !== undefined;
    });
    expect(inFrame).toBe(false);
  });
});
