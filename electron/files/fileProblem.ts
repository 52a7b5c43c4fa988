import type { HostProblem } from '../../renderer/host/host.ts';

/** What the file system refused, as the plain data that the window has words for. */
export function fileProblem(error: unknown, name: string): HostProblem {
  switch (errorCode(error)) {
    case 'ENOENT':
    case 'ENOTDIR':
      return { kind: 'not found', name };
    case 'EACCES':
    case 'EPERM':
    case 'EROFS':
      return { kind: 'not allowed', name };
    case 'ENOSPC':
    case 'EDQUOT':
      return { kind: 'no room', name };
    case 'EFBIG':
      return { kind: 'too large', name };
    default:
      return { kind: 'failed', name, detail: error instanceof Error ? error.message : String(error) };
  }
}

/** Node's short name for a system error ("ENOENT"), or null when the error has none. */
export function errorCode(error: unknown): string | null {
  if (!(error instanceof Error) || !('code' in error)) return null;
  return typeof error.code === 'string' ? error.code : null;
}
