/** A name that every system takes for a file, near to what was suggested; "Tautline" when nothing is left. */
export function safeFileName(suggested: string): string {
  const cleaned = suggested
    // biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what must go
    .replace(/[\u0000-\u001f\u007f<>:"/\\|?*]+/g, ' ')
    .replace(/\s+/g, ' ')
    .replace(/^[ .]+|[ .]+$/g, '');
  const name = cleaned.slice(0, 150);
  return name === '' ? 'Tautline' : name;
}
