/** The wording of every case. The figures in it have their checks where they are computed. */
import { describe, expect, it } from 'vitest';
import { assess } from '../../../core/assess.ts';
import type { Join, LineHolder } from '../../../core/project/model.ts';
import { bay, line, project, roof, wall } from '../assess/given/bays.ts';
import { CATALOGUES } from '../assess/given/catalogues.ts';
import { crossedTier, RISE, type TierGiven } from './given.ts';

const reasonOf = (given: TierGiven): string => plain(crossedTier(given).diagonals.get(RISE)?.reason ?? '');

/** Groups of digits are parted by a narrow space that does not break; plain ones read better here. */
const plain = (text: string): string => text.replaceAll('\u202f', ' ');

describe('why a bar bows where it does', () => {
  // 5000 / 21.3 = 234.7, METHODS.md §1 for the radius.
  it('tells of a partner that stops the push in the plane and swings out of it', () => {
    expect(reasonOf({ join: { kind: 'bolted' } })).toBe(
      "Pushed in the plane, D1 meets D2 end-on and stays. Pushed out of the plane, it meets only D2's bending and swings, so all 5.00 m bows about y: 5 000 / 21.3 = 235.",
    );
  });

  it('tells of a plate that is a hinge', () => {
    expect(reasonOf({ join: { kind: 'cut', cutBar: 't1.rise' } })).toContain(
      'it finds at D2 only a plate, which is a hinge, so all 5.00 m bows about y',
    );
  });

  it('tells an unmarked crossing from one that is marked as not joined', () => {
    expect(reasonOf({})).toBe(
      'D1 has an unmarked crossing with D2, taken as not joined, so all 5.00 m bows about v, the axis of least radius: 5 000 / 13.7 = 365.',
    );
    expect(reasonOf({ join: { kind: 'none' } })).toMatch(
      /^D1 is not joined to D2, so all 5\.00 m bows about v/,
    );
  });

  it('says when nothing meets the bar at all', () => {
    const assessment = assess(project([bay(wall(3000, [[4000, 'rising']]))]), CATALOGUES);
    expect(assessment.diagonals.get(RISE)?.reason).toMatch(
      /^Nothing holds D1 between its ends, so all 5\.00 m bows about v/,
    );
  });

  it('names the stations that a governing span lies between', () => {
    const section = { section: '125x75x8', legInPlane: 'shorter' } as const;
    expect(reasonOf({ join: { kind: 'bolted' }, diagonals: section })).toMatch(
      /^Nothing holds D1 between end i and D2, so the 2\.50 m there bows about v, the axis of least radius: 2 500 \/ 16\.3 = 154\.$/,
    );
  });

  it('tells of a length set by hand with the length found and the reason', () => {
    const overrides = [{ axis: 'y', length: 4800, factor: 0.95, reason: 'fixed by the cladding' }] as const;
    expect(reasonOf({ join: { kind: 'bolted' }, bars: { 't1.rise': { overrides } } })).toBe(
      'About y, D1 takes 4.80 m times 0.95, set by hand, in place of the 5.00 m found from the marks; reason given: “fixed by the cladding”. 4 560 / 21.3 = 214.',
    );
  });

  it('speaks in feet and inches to a US project, and divides in inches', () => {
    // 5000 / 25.4 = 196.9 in; 21.304 / 25.4 = 0.839 in.
    expect(reasonOf({ join: { kind: 'bolted' }, settings: { units: 'us' } })).toContain(
      'so all 16\'-4 7/8" bows about y: 196.9 / 0.839 = 235.',
    );
  });

  it('names a direction that is none of the four by its angle', () => {
    const reason = reasonOf({ join: { kind: 'bolted' }, bars: { 't1.rise': { roll: 20 } } });
    expect(reason).toMatch(/bows about an axis −?\d+° from x, which is none of the four/);
  });
});

describe('why a bar under purlins bows where it does', () => {
  // Diagonals of a panel 3 m by 4 m cross 2 m up the slope.
  const under = (places: readonly number[], join: Join, heldBy: LineHolder = { kind: 'nothing' }): string => {
    const lines = places.map((at, index) => line(`P${index + 1}`, at, heldBy));
    const toLines = lines.flatMap(({ id }) =>
      ['a.p1.fall', 'a.p1.rise'].map((bar) => [[bar, id].sort().join('+'), join] as const),
    );
    const made = bay(roof(3000, 10, [[4000, 'crossed']], lines), {
      joins: { 'a.p1.fall+a.p1.rise': { kind: 'bolted' }, ...Object.fromEntries(toLines) },
    });
    return plain(assess(project([made]), CATALOGUES).diagonals.get('B/a.p1.rise')?.reason ?? '');
  };
  const bolted: Join = { kind: 'purlin', boltsAcross: 1 };

  it('takes the exact reading for mixed holds, with the bound beside it on the safe side, and says what holds which way', () => {
    expect(under([1000, 3000], bolted)).toMatch(
      /^D1 is held out of the plane only at P1 and P2, in the plane only at D2, so between them it can bow both ways at once\. Worked out exactly, with these holds rigid, that reads \d+, which is taken; the rule's bound, on the safe side, is .* = \d+\.$/,
    );
  });

  it('tells of purlins that stop the push out of the plane and go along in it', () => {
    const lines = [line('P1', 1000), line('P2', 3000)];
    const joins = Object.fromEntries(lines.map(({ id }) => [`${id}+a.p1.rise`, bolted]));
    const made = bay(roof(3000, 10, [[4000, 'rising']], lines), { joins });
    const { diagonals } = assess(project([made]), CATALOGUES);
    expect(plain(diagonals.get('B/a.p1.rise')?.reason ?? '')).toBe(
      'Pushed out of the plane, D1 meets P1 and P2, stiff across, and stays. Pushed in the plane, it only moves P1 and P2 along with it, so all 5.00 m bows about x: 5 000 / 21.3 = 235.',
    );
  });

  it('names the end and the station between which nothing holds', () => {
    expect(under([2000], bolted)).toMatch(
      /^Nothing holds D1 between end i and D2·P1, so the 2\.50 m there bows about v/,
    );
  });

  it('gives every cause once, the partner first', () => {
    expect(under([1000, 2000, 3000], { kind: 'hung' })).toContain(
      "it meets only D2's bending and only hangs from P1, P2 and P3, so all 5.00 m bows",
    );
  });
});
