import type { IpcMain, IpcMainInvokeEvent, WebContents } from 'electron';
import { describe, expect, it } from 'vitest';
import { channelOf, HOST_CALLS, type HostCall } from '../../../electron/channels.ts';
import { answerCheckedCalls } from '../../../electron/desktop/checkedCalls.ts';
import type { HostAnswers } from '../../../electron/desktop/hostAnswers.ts';

type Listener = (event: IpcMainInvokeEvent, ...args: unknown[]) => Promise<unknown>;

/** Main's door alone, with a note of every answer that was asked for. */
function door(window: Partial<WebContents> | null) {
  const listeners = new Map<string, Listener>();
  const answered: HostCall[] = [];
  const ipcMain = {
    handle: (channel: string, listener: Listener) => void listeners.set(channel, listener),
  } as unknown as IpcMain;
  const answers = Object.fromEntries(
    HOST_CALLS.map((call) => [
      call,
      () => {
        answered.push(call);
        return null;
      },
    ]),
  ) as unknown as HostAnswers;
  answerCheckedCalls(ipcMain, () => window as WebContents | null, answers);
  const call = (name: HostCall, event: object, ...args: unknown[]): Promise<unknown> =>
    listeners.get(channelOf(name))?.(event as IpcMainInvokeEvent, ...args) ??
    Promise.reject(new Error('no door'));
  return { call, answered };
}

const event = (change: object = {}, frame: object = {}): object => ({
  sender: { id: 1 },
  senderFrame: { url: 'app://tautline/index.html', parent: null, ...frame },
  ...change,
});

describe('calls to main', () => {
  it('are answered when they come from the page of the window', async () => {
    const { call, answered } = door({ id: 1 });
    await call('recent', event());
    expect(answered).toEqual(['recent']);
  });

  it.each([
    ['another window', event({ sender: { id: 2 } })],
    ['a frame inside the page', event({}, { parent: {} })],
    ['a page from the network', event({}, { url: 'https://example.org/index.html' })],
    ['a page that only looks like the window', event({}, { url: 'app://tautline.example.org/index.html' })],
    ['the page of a report', event({}, { url: 'app://report/1' })],
    ['a file', event({}, { url: 'file:///index.html' })],
    ['an address that is none', event({}, { url: '' })],
    ['a frame that has gone', event({ senderFrame: null })],
  ])('are refused, every one of them, when they come from %s', async (_from, from) => {
    const { call, answered } = door({ id: 1 });
    for (const name of HOST_CALLS)
      await expect(call(name, from)).rejects.toThrow(`Refused ${name}: it does not come from`);
    expect(answered).toEqual([]);
  });

  it('are refused when there is no window any more', async () => {
    await expect(door(null).call('recent', event())).rejects.toThrow('does not come from');
  });

  it.each([
    ['an argument too many', 'save', ['123e4567-e89b-42d3-a456-426614174000', 'text', false, 'more']],
    ['arguments where there are none', 'open', ['/etc/passwd']],
    ['a text beyond any project', 'saveAs', ['a.json', 'x'.repeat(64 * 1024 * 1024 + 1)]],
  ] as const)('are refused with %s, and nothing is done', async (_what, name, args) => {
    const { call, answered } = door({ id: 1 });
    await expect(call(name, event(), ...args)).rejects.toThrow(`Refused ${name}: argument`);
    expect(answered).toEqual([]);
  });
});
