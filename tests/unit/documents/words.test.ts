import { describe, expect, it } from 'vitest';
import { listed } from '../../../core/documents/listed.ts';
import { designationText, reasonText, trailText } from '../../../core/documents/words.ts';
import { slendernessWorking } from '../../../core/documents/working.ts';
import type { HoldReason } from '../../../core/restraint/model.ts';

describe('words of documents', () => {
  it('lists names once each', () => {
    expect(listed([])).toBe('');
    expect(listed(['P1'])).toBe('P1');
    expect(listed(['P1', 'P2', 'P1', 'P3'])).toBe('P1, P2 and P3');
  });

  it('prints designations with the sign of multiplication and leaves letters alone', () => {
    expect(designationText('70x70x6')).toBe('70×70×6');
    expect(designationText('L3X3X1/4')).toBe('L3×3×1/4');
    expect(designationText('90x90x8EA')).toBe('90×90×8EA');
  });

  it('parts the ways of a trail that forks', () => {
    expect(
      trailText([
        { text: 'D1, end-on', bar: 'W1/a', node: null, state: 'on the way' },
        { text: 'left foot', bar: null, node: 'a', state: 'held' },
        { text: 'right head', bar: null, node: 'b', state: 'free' },
      ]),
    ).toBe('D1, end-on → left foot (held); right head (free)');
    expect(trailText([])).toBe('');
  });

  it('has a sentence for every reason, naming the holder', () => {
    const reasons: readonly HoldReason[] = [
      { kind: 'partner end-on', partner: 'D7', join: 'bolted' },
      { kind: 'partner half free', partner: 'D7', node: 'head' },
      { kind: 'partner only bends', partner: 'D7' },
      { kind: 'single plate hinges', partner: 'D7' },
      { kind: 'not joined', partner: 'D7', marked: true },
      { kind: 'not joined', partner: 'D7', marked: false },
      { kind: 'hung', line: 'D7' },
      { kind: 'line held along itself', line: 'D7', by: 'W1' },
      { kind: 'line free along itself', line: 'D7', why: 'tied to nothing' },
      { kind: 'line stiff across', line: 'D7' },
      { kind: 'bar ends here', bar: 'D7' },
      { kind: 'bar ends here, itself free', bar: 'D7', node: 'head' },
      { kind: 'twist held', line: 'D7' },
      { kind: 'nearly along the bar', holder: 'D7' },
    ];
    for (const reason of reasons) expect(reasonText(reason)).toMatch(/^[A-Z].*\.$/);
    for (const reason of reasons) expect(reasonText(reason)).toContain('D7');
  });

  // 7324 / 21.3 = 343.8, and 288.3 / 0.839 = 343.7 in inches.
  it('writes a division that the checker can repeat, in the units of the reader', () => {
    expect(slendernessWorking(7324, 21.3, 343.85, 'metric')).toBe('7\u202f324 / 21.3 = 344');
    expect(slendernessWorking(7324, 21.3, 343.85, 'us')).toBe('288.3 / 0.839 = 344');
  });
});
