/** RFC 5545, 3.1: octets of a content line without its line break. */
const longestLineOctets = 75;

/** Undoes folding: deletes every CRLF that a space or a tab follows, with that one character. */
export const unfoldLines = (text: string): string => text.replace(/\r\n[ \t]/g, '');

/**
 * Folds content lines at 75 octets of UTF-8 and ends each with CRLF, the last one too. Never splits a
 * character; a line of exactly 75 octets stays whole. RFC 5545, 3.1.
 */
export function foldLines(lines: readonly string[]): string {
  return lines.map((line) => `${foldLine(line)}\r\n`).join('');
}

function foldLine(line: string): string {
  let folded = '';
  let octets = 0;
  for (const character of line) {
    const size = Buffer.byteLength(character);
    if (octets + size > longestLineOctets) {
      folded += '\r\n ';
      octets = 1;
    }
    folded += character;
    octets += size;
  }
  return folded;
}
