import type { Page } from 'playwright-core';
import type { HostCall } from '../../../electron/channels.ts';
import type { Host, HostCommand, HostResult } from '../../../renderer/host/host.ts';

/** Calls the host as the window does, through what the preload shows to the page. */
export async function ask<Call extends HostCall>(
  page: Page,
  call: Call,
  ...args: Parameters<Host[Call]>
): Promise<Awaited<ReturnType<Host[Call]>>> {
  return (await askAnything(page, call, args)) as Awaited<ReturnType<Host[Call]>>;
}

/** As `ask`, with arguments that the types would refuse. */
export async function askAnything(page: Page, call: HostCall, args: readonly unknown[]): Promise<unknown> {
  return await page.evaluate(
    async ([name, given]) => {
      const host: object = Reflect.get(window, 'tautlineHost');
      const asked: (...all: readonly unknown[]) => unknown = Reflect.get(host, name);
      return await asked(...given);
    },
    [call, args] as const,
  );
}

/** What a call that must succeed gave. */
export function given<T>(result: HostResult<T> | null): T {
  if (result === null) throw new Error('the host says that the user turned back');
  if (!result.ok) throw new Error(`the host refused: ${JSON.stringify(result.problem)}`);
  return result.value;
}

/** Begins to note the commands that main sends to the page. */
export async function noteCommands(page: Page): Promise<() => Promise<readonly HostCommand[]>> {
  await page.evaluate(() => {
    const heard: unknown[] = [];
    Reflect.set(window, 'heardCommands', heard);
    Reflect.get(window, 'tautlineHost').onCommand((command: unknown) => heard.push(command));
  });
  return () => page.evaluate(() => Reflect.get(window, 'heardCommands'));
}

/** Waits up to ten seconds until `look` gives what is wanted; the message names what was seen last. */
export async function until<T>(look: () => Promise<T>, wanted: (seen: T) => boolean): Promise<T> {
  let seen = await look();
  for (let tries = 0; tries < 330 && !wanted(seen); tries += 1) {
    await new Promise((resolve) => setTimeout(resolve, 30));
    seen = await look();
  }
  if (!wanted(seen)) throw new Error(`waited in vain; last seen: ${JSON.stringify(seen)}`);
  return seen;
}
