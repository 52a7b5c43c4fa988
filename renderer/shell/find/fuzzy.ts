/**
 * How well what was typed fits a text: every word of it must occur, as a beginning, inside, or letter by letter in order.
 * Higher is better; null when it does not fit. Made for short names, not for prose.
 */
export function scoreOf(typed: string, text: string): number | null {
  const words = plain(typed)
    .split(' ')
    .filter((word) => word !== '');
  const whole = plain(text);
  let total = 0;
  for (const word of words) {
    const score = wordFit(word, whole);
    if (score === null) return null;
    total += score;
  }
  // Of two texts that fit alike, the shorter says it more exactly.
  return total - whole.length / 1000;
}

/** Whether a text is what was typed, whole: "d1" is D1, and not D10. */
export function isWhole(typed: string, text: string): boolean {
  return plain(typed) !== '' && plain(typed) === plain(text);
}

function wordFit(word: string, text: string): number | null {
  if (text === word) return 5;
  const at = text.indexOf(word);
  if (at === 0) return text[word.length] === ' ' ? 4.5 : 4;
  if (at > 0) return text[at - 1] === ' ' ? 3 : 2;
  return inOrder(word, text) ? 1 : null;
}

function inOrder(word: string, text: string): boolean {
  let at = 0;
  for (const letter of word) {
    at = text.indexOf(letter, at);
    if (at < 0) return false;
    at += 1;
  }
  return word.length > 1;
}

function plain(text: string): string {
  return text
    .toLowerCase()
    .replace(/×/g, 'x')
    .replace(/[,.:;…]/g, ' ')
    .replace(/\s+/g, ' ')
    .trim();
}
