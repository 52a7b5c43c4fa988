import { existsSync, readdirSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

export interface FoundChromium {
  readonly path: string;
  /** Where it was found, in words. */
  readonly from: string;
}

const NAMES = [
  'chromium',
  'chromium-browser',
  'google-chrome',
  'google-chrome-stable',
  'chrome',
  'microsoft-edge',
  'microsoft-edge-stable',
  'msedge',
];

/** Where Chrome and Edge stand when they are not on PATH, by `process.platform`. */
const USUAL_PLACES: Readonly<Partial<Record<NodeJS.Platform, readonly string[]>>> = {
  darwin: [
    '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
    '/Applications/Chromium.app/Contents/MacOS/Chromium',
    '/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge',
  ],
  win32: ['ProgramFiles', 'ProgramFiles(x86)', 'LOCALAPPDATA'].flatMap((variable) => {
    const root = process.env[variable];
    return root === undefined
      ? []
      : [
          path.join(root, 'Google/Chrome/Application/chrome.exe'),
          path.join(root, 'Microsoft/Edge/Application/msedge.exe'),
        ];
  }),
};

/** A Chromium, Chrome or Edge on this machine, or null. `TAUTLINE_CHROMIUM` comes first, then PATH. */
export function findChromium(env: NodeJS.ProcessEnv = process.env): FoundChromium | null {
  const named = env.TAUTLINE_CHROMIUM;
  if (named !== undefined && named !== '')
    return existsSync(named) ? { path: named, from: 'TAUTLINE_CHROMIUM' } : null;
  return (
    firstThere(onPath(env), 'PATH') ??
    firstThere(USUAL_PLACES[process.platform] ?? [], 'its usual place') ??
    firstThere(fetchedByPlaywright(env), "Playwright's cache")
  );
}

function onPath(env: NodeJS.ProcessEnv): readonly string[] {
  const folders = (env.PATH ?? env.Path ?? '').split(path.delimiter).filter((folder) => folder !== '');
  const ending = process.platform === 'win32' ? '.exe' : '';
  return NAMES.flatMap((name) => folders.map((folder) => path.join(folder, name + ending)));
}

/** Browsers that `playwright-core install chromium` has put in its cache, the newest first. */
function fetchedByPlaywright(env: NodeJS.ProcessEnv): readonly string[] {
  const cache = env.PLAYWRIGHT_BROWSERS_PATH ?? playwrightCache(env);
  if (!existsSync(cache)) return [];
  const builds = readdirSync(cache).filter((name) => name.startsWith('chromium-'));
  return builds
    .sort((a, b) => buildNumber(b) - buildNumber(a))
    .flatMap((build) =>
      [
        'chrome-linux/chrome',
        'chrome-linux64/chrome',
        'chrome-linux-arm64/chrome',
        'chrome-mac/Chromium.app/Contents/MacOS/Chromium',
        'chrome-mac-arm64/Google Chrome for Testing.app/Contents/MacOS/Google Chrome for Testing',
        'chrome-win/chrome.exe',
        'chrome-win64/chrome.exe',
      ].map((inside) => path.join(cache, build, inside)),
    );
}

function playwrightCache(env: NodeJS.ProcessEnv): string {
  switch (process.platform) {
    case 'darwin':
      return path.join(os.homedir(), 'Library/Caches/ms-playwright');
    case 'win32':
      return path.join(env.LOCALAPPDATA ?? os.homedir(), 'ms-playwright');
    default:
      return path.join(env.XDG_CACHE_HOME ?? path.join(os.homedir(), '.cache'), 'ms-playwright');
  }
}

function buildNumber(name: string): number {
  return Number(name.slice('chromium-'.length)) || 0;
}

function firstThere(candidates: readonly string[], from: string): FoundChromium | null {
  const found = candidates.find((candidate) => existsSync(candidate));
  return found === undefined ? null : { path: found, from };
}
