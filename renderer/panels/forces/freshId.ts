/** "W", or "W2", "W3", … where that is taken. */
export function freshId(letter: string, taken: readonly string[]): string {
  if (!taken.includes(letter)) return letter;
  let number = 2;
  while (taken.includes(`${letter}${number}`)) number += 1;
  return `${letter}${number}`;
}
