import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';

const FACES = [
  { family: 'IBM Plex Sans', folder: 'ibm-plex-sans', weights: [400, 600] },
  { family: 'IBM Plex Sans Condensed', folder: 'ibm-plex-sans-condensed', weights: [400, 500, 600] },
] as const;

/** The report's typefaces embedded as style text; empty where they are not installed beside the program: the reader's own faces then serve. */
export async function embeddedFonts(): Promise<string> {
  const { resolve } = createRequire(import.meta.url);
  const rules = FACES.flatMap(({ family, folder, weights }) =>
    weights.map(async (weight) => {
      const file = resolve(`@fontsource/${folder}/files/${folder}-latin-${weight}-normal.woff2`);
      const bytes = await readFile(file);
      return `@font-face { font-family: '${family}'; font-weight: ${weight}; src: url(data:font/woff2;base64,${bytes.toString('base64')}) format('woff2'); }`;
    }),
  );
  const settled = await Promise.allSettled(rules);
  return settled.flatMap((rule) => (rule.status === 'fulfilled' ? [rule.value] : [])).join('\n');
}
