/** Text of the user's own on one line: what would move the cursor or change the terminal becomes a space. */
export function oneLine(text: string): string {
  return text.replaceAll(/\p{Cc}+/gu, ' ');
}
