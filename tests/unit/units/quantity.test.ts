import { describe, expect, it } from 'vitest';
import {
  exactBehind,
  showLength,
  showMass,
  showMassPerMetre,
  showRadius,
  showSlenderness,
} from '../../../core/units/quantity.ts';

const THIN = '\u202f';

describe('showing a length', () => {
  it('groups millimetres by threes with a narrow space', () => {
    expect(showLength(6000, 'metric')).toBe(`6${THIN}000 mm`);
    expect(showLength(1_234_567, 'metric', 'bare')).toBe(`1${THIN}234${THIN}567`);
    expect(showLength(-0.2, 'metric', 'bare')).toBe('0');
    expect(showLength(-1500, 'metric', 'bare')).toBe(`−1${THIN}500`);
  });

  it('speaks of metres in sentences and keeps the half millimetre of small sizes', () => {
    expect(showLength(7324, 'metric', 'spoken')).toBe('7.32 m');
    expect(showLength(4.5, 'metric', 'small')).toBe('4.5 mm');
    expect(showLength(20, 'metric', 'small')).toBe('20 mm');
  });

  // 7324 mm / 25.4 = 288.35 in = 24 ft 0.35 in, nearest sixteenth 6/16.
  it('shows feet, inches and sixteenths', () => {
    expect(showLength(7324, 'us')).toBe(`24'-0 3/8"`);
    expect(showLength(304.8 * 24, 'us')).toBe(`24'-0"`);
    expect(showLength(304.7, 'us')).toBe(`1'-0"`);
    expect(showLength(88.9, 'us')).toBe(`3 1/2"`);
    expect(showLength(0, 'us')).toBe(`0"`);
    expect(showLength(-88.9, 'us')).toBe(`−3 1/2"`);
  });

  it('does not pass a metric thickness off as a fraction of an inch', () => {
    expect(showLength(9.525, 'us', 'small')).toBe(`3/8"`);
    expect(showLength(12, 'us', 'small')).toBe(`0.472"`);
  });
});

describe('showing masses and radii', () => {
  // One pound is 0.45359237 kg.
  it('keeps tenths of small masses and drops them from large ones', () => {
    expect(showMass(46.72, 'metric')).toBe('46.7 kg');
    expect(showMass(1234.4, 'metric')).toBe(`1${THIN}234 kg`);
    expect(showMass(45.359237, 'us')).toBe('100 lb');
    expect(showMass(4.5359237, 'us', 'bare')).toBe('10.0');
  });

  // 6.38 kg/m × 0.3048/0.45359237 = 4.287 lb/ft.
  it('shows mass per length as the tables print it', () => {
    expect(showMassPerMetre(6.38, 'metric')).toBe('6.38 kg/m');
    expect(showMassPerMetre(6.38, 'us')).toBe('4.29 lb/ft');
    expect(showMassPerMetre(71.1, 'metric')).toBe('71.1 kg/m');
  });

  it('shows a radius of gyration to the tenth of a mm or the thousandth of an inch', () => {
    expect(showRadius(13.7065, 'metric')).toBe('13.7 mm');
    expect(showRadius(13.7065, 'us')).toBe('0.540 in');
  });
});

describe('showing a slenderness', () => {
  it('is a whole number', () => {
    expect(showSlenderness(343.8)).toBe('344');
    expect(showSlenderness(299.6, 300)).toBe('300');
    expect(showSlenderness(300, 300)).toBe('300');
  });

  it('never shows one above its limit as equal to it', () => {
    expect(showSlenderness(300.4, 300)).toBe('300.4');
    expect(showSlenderness(300.04, 300)).toBe('300.04');
    expect(showSlenderness(300.000_01, 300)).toBe('300.001');
    expect(showSlenderness(300.6, 300)).toBe('301');
    expect(showSlenderness(212.6, 212.5)).toBe('213');
  });
});

describe('a set-back, a gusset or a gauge in a field', () => {
  it('is in inches to the sixteenth, without feet, and in mm to the tenth', () => {
    // 350 mm is 13.780 in, 13 12.5/16; 10 mm is 0.394 in, 6.3/16.
    expect(showLength(350, 'us', 'tape')).toBe('13 3/4"');
    expect(showLength(10, 'us', 'tape')).toBe('3/8"');
    expect(showLength(-9.525, 'us', 'tape')).toBe('−3/8"');
    expect(showLength(350, 'metric', 'tape')).toBe('350 mm');
    expect(showLength(4.5, 'metric', 'tape')).toBe('4.5 mm');
  });

  it('tells the mm behind it where the inches are only near', () => {
    expect(exactBehind(350, showLength(350, 'us', 'tape'))).toBe('350 mm exactly');
    expect(exactBehind(12.25, showLength(12.25, 'us', 'tape'))).toBe('12.25 mm exactly');
    // 3/8 in is 9.525 mm by definition.
    expect(exactBehind(9.525, showLength(9.525, 'us', 'tape'))).toBeNull();
    expect(exactBehind(7315.2, showLength(7315.2, 'us'))).toBeNull();
  });
});
