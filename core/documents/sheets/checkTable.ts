import { type Content, type Markup, markup } from '../markup.ts';

/** Statements for the checker, lettered, each with a box to agree and one not to. */
export function checkTable(statements: readonly Content[]): Markup {
  return markup`<table class="check"><thead><tr><th></th><th class="l">Taken as so</th><th>agreed</th><th>not agreed</th></tr></thead><tbody>${statements.map(
    (statement, index) =>
      markup`<tr><td class="l">${letter(index)}</td><td class="l wrap">${statement}</td><td><i class="box"></i></td><td><i class="box"></i></td></tr>`,
  )}</tbody></table>`;
}

const ALPHABET = 26;

/** a … z, then aa, ab and so on. */
function letter(index: number): string {
  const last = String.fromCharCode(97 + (index % ALPHABET));
  return index < ALPHABET ? last : letter(Math.floor(index / ALPHABET) - 1) + last;
}
