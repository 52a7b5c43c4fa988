import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { csvText } from '../../../core/documents/csv.ts';

describe('comma-separated text', () => {
  // RFC 4180, section 2: lines end in CRLF (1, 2), fields with commas, quotes or breaks are quoted (6), quotes inside doubled (7).
  it('ends lines in CRLF and quotes only what must be', () => {
    expect(
      csvText([
        ['a', 1],
        ['b, c', 'say "d"'],
      ]),
    ).toBe('a,1\r\n"b, c","say ""d"""\r\n');
    expect(csvText([['two\nlines', null, 'x']])).toBe('"two\nlines",,x\r\n');
  });

  it('leaves a figure that is none empty', () => {
    expect(csvText([[Number.NaN, Number.POSITIVE_INFINITY, -2.5]])).toBe(',,-2.5\r\n');
  });

  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', ' =1', '＝1'])(
    'turns the formula %j into text',
    (formula) => {
      const [line] = csvText([[formula]]).split('\r\n');
      expect(line?.replace(/^"/, '').startsWith("'")).toBe(true);
    },
  );

  it('guards a formula before it quotes it', () => {
    expect(csvText([['=HYPERLINK("x", "y")']])).toBe('"\'=HYPERLINK(""x"", ""y"")"\r\n');
  });

  // A reader written here by the grammar of RFC 4180, a route the writer does not take.
  it('gives back every cell to a reader that keeps to the standard', () => {
    const plain = fc
      .string({ unit: 'grapheme' })
      .filter((text) => !/^\s*[=+\-@＝＋－＠]/.test(text) && !/^[\t\r]/.test(text));
    fc.assert(
      fc.property(
        fc.array(fc.array(plain, { minLength: 1, maxLength: 4 }), { minLength: 1, maxLength: 4 }),
        (lines) => {
          expect(readBack(csvText(lines))).toEqual(lines);
        },
      ),
      { seed: 4180, numRuns: 200 },
    );
  });
});

function readBack(text: string): string[][] {
  const lines: string[][] = [];
  let at = 0;
  while (at < text.length) {
    const cells: string[] = [];
    for (;;) {
      let cell = '';
      if (text[at] === '"') {
        at++;
        while (!(text[at] === '"' && text[at + 1] !== '"')) {
          cell += text[at];
          at += text[at] === '"' ? 2 : 1;
        }
        at++;
      } else while (text[at] !== ',' && !text.startsWith('\r\n', at)) cell += text[at++];
      cells.push(cell);
      if (text[at] !== ',') break;
      at++;
    }
    at += 2;
    lines.push(cells);
  }
  return lines;
}
