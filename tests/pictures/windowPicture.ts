/** `npm run make:picture`: takes the README's picture of the window from the built program. */
import { choose, WindowStand } from '../e2e/window/openedWindow.ts';

const TARGET = 'assets/pictures/window.png';

const stand = new WindowStand();
await stand.start();
const { page } = await stand.open({ width: 1440, height: 900, theme: 'light' });
await choose(page, 'D2');
// The last of the drawing's own settling.
await page.waitForTimeout(2500);
await page.screenshot({ path: TARGET });
await stand.stop();
process.stdout.write(`${TARGET} written\n`);
