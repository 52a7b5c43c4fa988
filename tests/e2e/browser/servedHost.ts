import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import type { Page } from 'playwright-core';
import { build } from 'vite';
import type { HostCall } from '../../../electron/channels.ts';
import { type GivenFile, serveLoopback } from '../../../electron/loopback/server.ts';
import type { Host } from '../../../renderer/host/host.ts';

/** The page of `hostPage.ts`, built and served by the local server under its real policy. */
export async function serveHostPage(given: GivenFile | null) {
  const folder = await mkdtemp(path.join(os.tmpdir(), 'tautline-host-'));
  await build({
    configFile: false,
    logLevel: 'error',
    publicDir: false,
    build: {
      outDir: folder,
      target: 'chrome120',
      rolldownOptions: {
        input: path.join(import.meta.dirname, 'hostPage.ts'),
        output: { entryFileNames: 'page.js' },
      },
    },
  });
  await writeFile(
    path.join(folder, 'index.html'),
    '<!doctype html><html lang="en"><head><title>host</title></head><body><script type="module" src="/page.js"></script></body></html>',
  );
  const loopback = await serveLoopback({ folder, given, port: null });
  return {
    address: loopback.address,
    async close() {
      await loopback.close();
      await rm(folder, { recursive: true });
    },
  };
}

/** Calls the host of the page. */
export async function askHost<Call extends HostCall>(
  page: Page,
  call: Call,
  ...args: Parameters<Host[Call]>
): Promise<Awaited<ReturnType<Host[Call]>>> {
  const answer: unknown = await page.evaluate(
    async ([name, given]) => {
      const host: object = Reflect.get(window, 'hostUnderTest');
      const asked: (...all: readonly unknown[]) => unknown = Reflect.get(host, name);
      return await asked(...given);
    },
    [call, args] as const,
  );
  return answer as Awaited<ReturnType<Host[Call]>>;
}
