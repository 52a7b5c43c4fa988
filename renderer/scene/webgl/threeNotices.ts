import { setConsoleFunction } from 'three';

/** The clock that the drawing library still makes for itself, which we do not use. */
const NOT_OURS = /^THREE\.Clock: This module has been deprecated/;

/** Passes on what three.js has to say, but for what only its wrapper can mend. */
export function hearThree(): void {
  setConsoleFunction((type, message, ...rest) => {
    if (!NOT_OURS.test(message)) console[type](message, ...rest);
  });
}
