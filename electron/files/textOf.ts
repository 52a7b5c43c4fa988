/**
 * Bytes of a text file as text. UTF-8 and UTF-16 with a byte order mark are told by it; other bytes that are not
 * UTF-8 are read as Windows-1252, which spreadsheets still write.
 */
export function textOf(bytes: Uint8Array): string {
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return new TextDecoder('utf-16le').decode(bytes);
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return new TextDecoder('windows-1252').decode(bytes);
  }
}
