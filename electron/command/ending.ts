import { BAD_INPUT, type ExitCode, FINE } from './exitCode.ts';
import type { Terminal } from './terminal.ts';
import { type Trouble, troubleText } from './trouble.ts';

/** How the command that ran came to its end. */
export interface Ending {
  readonly terminal: Terminal;
  with(code: ExitCode): void;
  /** Says what went wrong and ends with the exit code for bad input. */
  trouble(trouble: Trouble): void;
  code(): ExitCode;
}

export function endingOn(terminal: Terminal): Ending {
  let ended: ExitCode = FINE;
  return {
    terminal,
    with: (code) => {
      ended = code;
    },
    trouble: (trouble) => {
      terminal.err(`${troubleText(trouble)}\n`);
      ended = BAD_INPUT;
    },
    code: () => ended,
  };
}
