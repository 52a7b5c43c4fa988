/**
 * `npm start [-- FILE] [-- --browser]`: opens Tautline's window. In Electron when its binary is there or can be had;
 * else the same window, served on this machine alone, in a Chromium, Chrome or Edge; else it prints the address.
 */
import { randomUUID } from 'node:crypto';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { type FoundChromium, findChromium } from './browser/findChromium.ts';
import { hasNoGraphicsCard, QUIET, SOFTWARE_DRAWING, sandboxSwitches } from './browser/softwareDrawing.ts';
import { electronBinary, fetchElectronBinary } from './electronBinary.ts';
import { readTextFile } from './files/fileStore.ts';
import { type StartedProgram, startProgram } from './launching/child.ts';
import { build, isStale } from './launching/freshBuild.ts';
import { stateFolder } from './launching/stateFolder.ts';
import { windowProfile } from './launching/windowProfile.ts';
import { serveLoopback } from './loopback/server.ts';

const ROOT = path.resolve(import.meta.dirname, '..');

/** A window that fails sooner than this never came up; ms. */
const TOO_SOON = 5000;

const say = (line: string): void => void process.stdout.write(`${line}\n`);
const complain = (line: string): void => void process.stderr.write(`${line}\n`);

/** Set off by Ctrl-C: whatever is running then ends, and nothing more is begun. */
const interruption = new AbortController();
for (const signal of ['SIGINT', 'SIGTERM'] as const)
  process.on(signal, () => {
    // Asked for a second time, when something does not want to end.
    if (interruption.signal.aborted) process.exit(130);
    interruption.abort();
  });

process.exitCode = await launch(process.argv.slice(2));

/** Returns the exit code: 0, 1 when building failed, 2 for a file that is not there. */
async function launch(args: readonly string[]): Promise<number> {
  const name = args.find((one) => !one.startsWith('-'));
  // npm runs this in the project's folder; names are meant from where the user stands.
  const file = name === undefined ? null : path.resolve(process.env.INIT_CWD ?? process.cwd(), name);
  if (file !== null && !existsSync(file)) {
    complain(`${file} is not there. Give the path of a Tautline project, or none to begin with the example.`);
    return 2;
  }

  if (isStale(ROOT)) {
    say('Building the window…');
    const failure = await build(ROOT, interruption.signal);
    if (interruption.signal.aborted) return 0;
    if (failure !== null) {
      complain(`The window could not be built:\n${failure}`);
      return 1;
    }
  }

  if (hasNoDisplay()) return await serve(file, null, 'There is no display here.');
  if (!args.includes('--browser') && (await openInElectron(file))) return 0;
  const chromium = findChromium();
  return await serve(file, chromium, 'There is no Electron, and no Chromium, Chrome or Edge was found.');
}

/** True once the user has closed the window; false when there never was one. */
async function openInElectron(file: string | null): Promise<boolean> {
  let binary = electronBinary();
  if (binary === null) {
    say('Fetching Electron for the first time…');
    binary = fetchElectronBinary();
  }
  if (interruption.signal.aborted) return true;
  if (binary === null) {
    say('Electron could not be fetched: taking a browser window instead.');
    return false;
  }
  say('Tautline opens in Electron, as a desktop program.');
  const main = path.join(ROOT, 'out/electron/main.cjs');
  const program = startProgram(binary, [...sandboxSwitches(), main, ...(file === null ? [] : [file])], false);
  const { code, ran } = await untilEnded(program);
  if (code === 0 || ran > TOO_SOON) return true;
  say('Electron does not run on this machine: taking a browser window instead.');
  return false;
}

/** Serves the window until the browser window is closed, or for good when there is none to open. */
async function serve(file: string | null, chromium: FoundChromium | null, whyNone: string): Promise<number> {
  const content = file === null ? null : await readTextFile(file);
  if (content !== null && !content.ok) {
    complain(`${file} cannot be opened: ${content.problem.kind}.`);
    return 2;
  }
  const given = content === null ? null : { key: randomUUID(), ...content.value };
  const first = await windowProfile(stateFolder());
  const folder = path.join(ROOT, 'out/renderer');
  const loopback = await serveLoopback({ folder, given, port: first.port });
  const profile = await first.settle(loopback.port);
  try {
    if (chromium !== null) {
      say(
        `Tautline opens in a window of ${chromium.path} (found on ${chromium.from}), from ${loopback.address}`,
      );
      if (given !== null) say(`${given.name} is opened as a copy: the first save asks where to put it.`);
      say('Closing the window, or Ctrl-C here, ends it.');
      const { code, ran } = await untilEnded(
        startProgram(chromium.path, appWindowSwitches(loopback.address, profile.folder), true),
      );
      if (code === 0 || ran > TOO_SOON) return 0;
      say('The browser window did not come up.');
    } else say(whyNone);
    say(`Open this address in a browser on this machine: ${loopback.address}`);
    say('Ctrl-C ends it.');
    await untilInterrupted();
    return 0;
  } finally {
    await loopback.close();
    await profile.remove();
  }
}

function appWindowSwitches(address: string, profile: string): readonly string[] {
  return [
    `--app=${address}`,
    `--user-data-dir=${profile}`,
    '--window-size=1440,900',
    '--class=Tautline',
    ...QUIET,
    ...sandboxSwitches(),
    ...(hasNoGraphicsCard() ? SOFTWARE_DRAWING : []),
  ];
}

function hasNoDisplay(): boolean {
  const { DISPLAY, WAYLAND_DISPLAY } = process.env;
  return process.platform === 'linux' && !DISPLAY && !WAYLAND_DISPLAY;
}

/** Waits for a program to end by itself; Ctrl-C ends it and whatever it started, and counts as a good end. */
async function untilEnded(program: StartedProgram): StartedProgram['ended'] {
  const { signal } = interruption;
  if (signal.aborted) program.end();
  signal.addEventListener('abort', program.end, { once: true });
  const end = await program.ended;
  return signal.aborted ? { ...end, code: 0 } : end;
}

function untilInterrupted(): Promise<void> {
  return new Promise((resolve) => {
    if (interruption.signal.aborted) resolve();
    else interruption.signal.addEventListener('abort', () => resolve(), { once: true });
  });
}
