import { describe, expect, it } from 'vitest';
import { usualGauge } from '../../../core/section/gauge.ts';

describe('the usual gauge of a leg', () => {
  // Usual metric back marks, from memory.
  it.each([
    [45, 25, 12],
    [60, 35, 16],
    // The bolt from the Canadian handbook.
    [50, 28, 16],
    [70, 40, 20],
    [100, 55, 24],
  ])('is the listed one of a %d mm leg', (leg, gauge, maxBolt) => {
    expect(usualGauge(leg)).toMatchObject({ gauge, maxBolt });
  });

  // One line in a wide leg: usual gauges of the Canadian handbook.
  it.each([
    [125, 80, 30],
    [150, 90, 36],
    [200, 115, 36],
  ])('is that of one line of bolts in a %d mm leg', (leg, gauge, maxBolt) => {
    expect(usualGauge(leg)).toMatchObject({ gauge, maxBolt });
  });

  // Half way between 100 (55) and 125 (80): 67.5, to the whole mm; the bolt stays that of the smaller leg.
  it('lies between those of the listed legs on either side', () => {
    expect(usualGauge(112.5)).toMatchObject({ gauge: 68, maxBolt: 24 });
  });

  it('keeps the proportion of the nearest listed leg outside the list', () => {
    // 115/200 × 250.
    expect(usualGauge(250).gauge).toBe(144);
    // 15.9/25.4 × 20.
    expect(usualGauge(20).gauge).toBe(13);
  });

  // US workable gages: 1 3/4 in in a 3 in leg, 2 1/2 in a 4 in one.
  it.each([
    [3, 1.75],
    [4, 2.5],
    [8, 4.5],
  ])('follows the US workable gages on asking: leg of %d in', (leg, gauge) => {
    expect(usualGauge(leg * 25.4, 'us').gauge / 25.4).toBeCloseTo(gauge, 9);
  });

  it('grows with the leg, stays inside it, and says where it is from', () => {
    for (let leg = 20; leg <= 300; leg += 1) {
      const here = usualGauge(leg);
      expect(here.gauge).toBeGreaterThanOrEqual(usualGauge(leg - 1).gauge);
      expect(here.gauge).toBeLessThan(leg);
      expect(here.source).toMatch(/memory|read in a source/);
    }
  });

  it('leaves room for the largest bolt that it allows', () => {
    for (const habit of ['metric', 'us'] as const)
      for (let leg = 20; leg <= 203; leg += 1) {
        const { gauge, maxBolt } = usualGauge(leg, habit);
        // The toe side must keep at least one diameter, less than any standard's least edge distance.
        expect(leg - gauge, `leg ${leg}, ${habit}`).toBeGreaterThanOrEqual(maxBolt);
      }
  });
});
