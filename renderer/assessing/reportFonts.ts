/** The report's typefaces as style text with the faces embedded, so that a report stands alone wherever it is opened. */

import sans400 from '@fontsource/ibm-plex-sans/files/ibm-plex-sans-latin-400-normal.woff2?url';
import sans600 from '@fontsource/ibm-plex-sans/files/ibm-plex-sans-latin-600-normal.woff2?url';
import condensed400 from '@fontsource/ibm-plex-sans-condensed/files/ibm-plex-sans-condensed-latin-400-normal.woff2?url';
import condensed500 from '@fontsource/ibm-plex-sans-condensed/files/ibm-plex-sans-condensed-latin-500-normal.woff2?url';
import condensed600 from '@fontsource/ibm-plex-sans-condensed/files/ibm-plex-sans-condensed-latin-600-normal.woff2?url';

const FACES = [
  { family: 'IBM Plex Sans', weight: 400, url: sans400 },
  { family: 'IBM Plex Sans', weight: 600, url: sans600 },
  { family: 'IBM Plex Sans Condensed', weight: 400, url: condensed400 },
  { family: 'IBM Plex Sans Condensed', weight: 500, url: condensed500 },
  { family: 'IBM Plex Sans Condensed', weight: 600, url: condensed600 },
] as const;

/** A face that cannot be fetched is left out: the reader's own then serves. */
export async function reportFonts(): Promise<string> {
  const rules = await Promise.allSettled(
    FACES.map(async ({ family, weight, url }) => {
      const bytes = new Uint8Array(await (await fetch(url)).arrayBuffer());
      return `@font-face { font-family: '${family}'; font-weight: ${weight}; src: url(data:font/woff2;base64,${base64(bytes)}) format('woff2'); }`;
    }),
  );
  return rules.flatMap((rule) => (rule.status === 'fulfilled' ? [rule.value] : [])).join('\n');
}

function base64(bytes: Uint8Array): string {
  let binary = '';
  for (const byte of bytes) binary += String.fromCharCode(byte);
  return btoa(binary);
}
