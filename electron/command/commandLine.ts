import { Command, CommanderError } from 'commander';
import { oneLine } from '../../core/documents/oneLine.ts';
import { addAssessCommand } from './assessCommand.ts';
import { addBowCommand } from './bowCommand.ts';
import { addCheckCommand } from './checkCommand.ts';
import { endingOn } from './ending.ts';
import { BAD_INPUT, type ExitCode, FINE } from './exitCode.ts';
import { addForcesCommand } from './forcesCommand.ts';
import { addNewCommand } from './newCommand.ts';
import { addPushCommand } from './pushCommand.ts';
import { addReportCommand } from './reportCommand.ts';
import { addScheduleCommand } from './scheduleCommand.ts';
import { addSectionCommand } from './sectionCommand.ts';
import { addShortlistCommand } from './shortlistCommand.ts';
import type { Terminal } from './terminal.ts';

const AFTER_HELP = `
Exit codes
  0  fine
  1  a finding breaks a limit; of shortlist: nothing in the list passes
  2  bad input: a file that cannot be read or written, a section in no stock list, an option that makes no sense;
     of bow: a case that cannot be understood (the others are solved)

Results go to the standard output, everything else to the error stream. Bare lengths are mm.

Examples
  tautline new wall-bay --width 6000 --tier 4200:crossed --tier 3600:crossed --crossings bolted -o shed.json
  tautline schedule shed.json
  tautline shortlist --length 4000 --crossing joined
  tautline report shed.json -o shed.html
  tautline push shed.json --bar D1 --at 2500
  tautline bow cases.json
  tautline forces shed.json --combination C2
  tautline check shed.json`;

/**
 * Runs one command.
 *
 * @param words what was typed after the program's name
 * @returns how it ended; nothing is thrown for what the user typed
 */
export async function runCommandLine(words: readonly string[], where: Terminal): Promise<ExitCode> {
  const terminal = withPlainMessages(where);
  const ending = endingOn(terminal);
  const program = new Command('tautline')
    .description(
      'Sets out braced bays, finds how far each angle diagonal can bow and about which axis, and hands over a schedule with its reasons.',
    )
    .addHelpText('after', AFTER_HELP)
    .showSuggestionAfterError()
    .exitOverride()
    .configureOutput({
      writeOut: terminal.out,
      writeErr: terminal.err,
      outputError: (text, write) =>
        write(`${text.trimEnd()}\nSee tautline --help, or --help after a command.\n`),
    });
  addScheduleCommand(program, ending);
  addAssessCommand(program, ending);
  addSectionCommand(program, ending);
  addShortlistCommand(program, ending);
  addNewCommand(program, ending);
  addReportCommand(program, ending);
  addBowCommand(program, ending);
  addPushCommand(program, ending);
  addForcesCommand(program, ending);
  addCheckCommand(program, ending);
  try {
    await program.parseAsync(words, { from: 'user' });
    return ending.code();
  } catch (error) {
    if (error instanceof CommanderError) return error.exitCode === 0 ? FINE : BAD_INPUT;
    throw error;
  }
}

/** Names out of project files stand in messages, and must not move the cursor or change the terminal. */
function withPlainMessages({ out, err }: Terminal): Terminal {
  return { out, err: (text) => err(text.split('\n').map(oneLine).join('\n')) };
}
