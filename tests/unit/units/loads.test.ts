import { describe, expect, it } from 'vitest';
import {
  forceIn,
  newtonsPerForceUnit,
  showForce,
  showMovement,
  showStiffness,
  threeFigures,
} from '../../../core/units/loads.ts';

const THIN = '\u202f';

describe('showing a force', () => {
  it('gives kilonewtons to three figures', () => {
    expect(showForce(22_474, 'metric')).toBe('22.5 kN');
    expect(showForce(100, 'metric')).toBe('0.100 kN');
    expect(showForce(1_234_567, 'metric', 'bare')).toBe(`1${THIN}230`);
  });

  // One pound-force is 4.4482216152605 N by definition, so a kip is 4448.22 N: 22 474 N is 5.052 kip.
  it('gives kips', () => {
    expect(newtonsPerForceUnit('us')).toBeCloseTo(4448.2216152605, 9);
    expect(showForce(22_474, 'us')).toBe('5.05 kip');
    expect(forceIn(4448.2216152605, 'us')).toBeCloseTo(1, 12);
  });
});

describe('showing a stiffness', () => {
  it('gives newtons for each millimetre, however stiff or soft', () => {
    expect(showStiffness(62_158.7, 'metric')).toBe(`62${THIN}200 N/mm`);
    expect(showStiffness(9.0127, 'metric')).toBe('9.01 N/mm');
    expect(showStiffness(0.0312, 'metric', 'bare')).toBe('0.0312');
  });

  // 1 kip/in is 4448.22 N / 25.4 mm = 175.127 N/mm.
  it('gives kips for each inch', () => {
    expect(showStiffness(175.1268, 'us')).toBe('1.00 kip/in');
    expect(showStiffness(9.0127, 'us')).toBe('0.0515 kip/in');
  });

  it('calls a trace of arithmetic nothing', () => {
    expect(showStiffness(1e-6, 'metric')).toBe('0 N/mm');
    expect(showStiffness(0, 'us')).toBe('0 kip/in');
  });
});

describe('showing a movement', () => {
  it('gives millimetres or inches to three figures', () => {
    expect(showMovement(5.5476, 'metric')).toBe('5.55 mm');
    expect(showMovement(0.0018, 'metric')).toBe('0.00180 mm');
    expect(showMovement(25.4, 'us')).toBe('1.00 in');
  });
});

describe('three figures', () => {
  it('keep their number when rounding carries over', () => {
    expect(threeFigures(9.996)).toBe('10.0');
    expect(threeFigures(99.96)).toBe('100');
    expect(threeFigures(999.6)).toBe(`1${THIN}000`);
    expect(threeFigures(-0.5)).toBe('−0.500');
  });
});
