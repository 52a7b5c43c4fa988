/**
 * HTML and SVG put together so that nothing of the user's can become markup: whatever is put into a template is escaped,
 * unless it came out of one.
 */

const made = Symbol('made by the template');

export interface Markup {
  readonly [made]: true;
  readonly text: string;
}

export type Content = Markup | string | number | null | readonly Content[];

/** `markup\`<b>${name}</b>\``: a name with angle brackets stands as text. Null puts in nothing, an array all of it. */
export function markup(parts: TemplateStringsArray, ...contents: readonly Content[]): Markup {
  const text = parts.reduce(
    (before, part, index) => before + contentText(contents[index - 1] ?? null) + part,
  );
  return { [made]: true, text };
}

export const NOTHING: Markup = markup``;

function contentText(content: Content): string {
  if (content === null) return '';
  if (typeof content === 'string') return escaped(content);
  if (typeof content === 'number') return numberText(content);
  if (isMarkup(content)) return content.text;
  return content.map(contentText).join('');
}

function isMarkup(content: Markup | readonly Content[]): content is Markup {
  return made in content;
}

/** Coordinates to the hundredth of a pixel: a hundred-thousandth of the sheet, and a third of the length. */
function numberText(value: number): string {
  return String(Math.round(value * 100) / 100);
}

const ESCAPES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Characters that HTML cannot hold at all, even escaped, are left out. */
const UNWANTED = /[^\P{Cc}\t\n\r]/gu;

function escaped(text: string): string {
  return text.replace(UNWANTED, '').replace(/[&<>"']/g, (character) => ESCAPES[character] ?? '');
}

/**
 * Style text of the project's own or of its host, put in as it is. A closing tag in it would end the style sheet, so it may hold none.
 */
export function styleText(css: string): Markup {
  if (/<\//.test(css)) throw new Error('style text with a closing tag in it');
  return { [made]: true, text: css };
}

/** A string for `content:` in CSS, every character but letters, digits and spaces written as an escape. */
export function cssString(text: string): string {
  const inside = [...text.replace(UNWANTED, '')].map((character) =>
    /[A-Za-z0-9 ]/.test(character) ? character : `\\${(character.codePointAt(0) ?? 32).toString(16)} `,
  );
  return `"${inside.join('')}"`;
}
