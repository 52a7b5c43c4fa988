#!/usr/bin/env node
/** The command line. Never loads Electron: it runs wherever Node does. */
import { runCommandLine } from './commandLine.ts';

// A reader that has seen enough (`… | head`) closes the pipe: that is no error.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code === 'EPIPE') process.exit();
  throw error;
});

process.exitCode = await runCommandLine(process.argv.slice(2), {
  out: (text) => process.stdout.write(text),
  err: (text) => process.stderr.write(text),
});
