import { readFile, realpath } from 'node:fs/promises';
import path from 'node:path';

export interface BuiltFile {
  readonly bytes: Uint8Array<ArrayBuffer>;
  readonly type: string;
}

const TYPES: Readonly<Record<string, string>> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.json': 'application/json; charset=utf-8',
  '.map': 'application/json; charset=utf-8',
  '.svg': 'image/svg+xml',
  '.png': 'image/png',
  '.ico': 'image/x-icon',
  '.woff2': 'font/woff2',
  '.woff': 'font/woff',
  '.txt': 'text/plain; charset=utf-8',
};

/**
 * A file of the built window by the path of its address; null for anything that is not a file inside `folder`,
 * however the path is spelt (encoded dots, backslashes, links that lead out).
 *
 * @param pathname as in a URL: begins with "/", may be percent-encoded; "/" is the index page
 */
export async function builtFile(folder: string, pathname: string): Promise<BuiltFile | null> {
  const full = pathInside(folder, pathname);
  if (full === null) return null;
  try {
    const [root, real] = await Promise.all([realpath(folder), realpath(full)]);
    if (!isInside(root, real)) return null;
    return {
      bytes: new Uint8Array(await readFile(real)),
      type: TYPES[path.extname(real).toLowerCase()] ?? 'application/octet-stream',
    };
  } catch {
    return null;
  }
}

/** The path that an address means under `folder`, or null when it means to leave it. */
export function pathInside(folder: string, pathname: string): string | null {
  let decoded: string;
  try {
    decoded = decodeURIComponent(pathname);
  } catch {
    return null;
  }
  if (!decoded.startsWith('/') || decoded.includes('\0') || decoded.includes('\\')) return null;
  const parts = decoded.split('/').slice(1);
  // A colon names a drive or a stream on Windows; built files have none.
  if (parts.some((part) => part === '..' || part === '.' || part.includes(':'))) return null;
  const full = path.join(folder, ...parts, decoded.endsWith('/') ? 'index.html' : '');
  return isInside(folder, full) ? full : null;
}

function isInside(folder: string, full: string): boolean {
  const relative = path.relative(folder, full);
  return relative !== '' && !relative.startsWith('..') && !path.isAbsolute(relative);
}
