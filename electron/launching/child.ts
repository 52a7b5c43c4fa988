import { type ChildProcess, spawn } from 'node:child_process';

/** A program started from here, with everything it starts itself. */
export interface StartedProgram {
  /** Its exit code, or null when it was ended by a signal or never ran; and how long it ran, ms. */
  readonly ended: Promise<{ readonly code: number | null; readonly ran: number }>;
  end(): void;
}

export function startProgram(file: string, args: readonly string[], quiet: boolean): StartedProgram {
  const began = performance.now();
  // A process group of its own, so that what it starts in turn ends with it.
  const child = spawn(file, args, {
    stdio: quiet ? 'ignore' : 'inherit',
    detached: process.platform !== 'win32',
  });
  const ended = new Promise<{ readonly code: number | null; readonly ran: number }>((resolve) => {
    const finish = (code: number | null) => resolve({ code, ran: performance.now() - began });
    child.on('error', () => finish(null));
    child.on('exit', finish);
  });
  return { ended, end: () => endGroup(child) };
}

function endGroup(child: ChildProcess): void {
  if (child.pid === undefined || child.exitCode !== null || child.signalCode !== null) return;
  if (process.platform === 'win32') child.kill();
  else process.kill(-child.pid, 'SIGTERM');
}
