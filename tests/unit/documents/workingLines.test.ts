import { describe, expect, it } from 'vitest';
import { substituted, workingLines } from '../../../core/documents/workingLines.ts';
import type { Resistance, Step } from '../../../core/resistance/model.ts';

const given = (symbol: string, value: number, quantity: Step['quantity']): Step => ({
  name: symbol,
  symbol,
  value,
  quantity,
});

describe('a formula with its values put in', () => {
  const steps = [given('A_g', 813, 'area'), given('d_h', 20, 'length'), given('t', 6, 'length')];

  it('has each symbol replaced, and values side by side multiplied', () => {
    expect(substituted('A_g − d_h t', steps, 'metric')).toBe('813 − 20.0 × 6.0');
  });

  it('leaves symbols alone that only begin alike', () => {
    expect(substituted('A_gv f_y', steps, 'metric')).toBe('A_gv f_y');
  });

  it('is taken for a symbol after a sum sign too', () => {
    expect(substituted('Σd_h t', steps, 'metric')).toBe('Σ20.0 × 6.0');
  });

  it('multiplies a plain number by the value after it', () => {
    expect(substituted('0.90 A_g', steps, 'metric')).toBe('0.90 × 813');
  });
});

describe('the working of a check', () => {
  it('gives each step its line, in the units of the project', () => {
    const resistance = {
      steps: [
        given('A_g', 645.16, 'area'),
        given('f_y', 344.738, 'stress'),
        { name: 'resistance', symbol: 'T_r', value: 222_411, quantity: 'force', formula: 'A_g f_y' },
      ],
    } as unknown as Resistance;
    const lines = workingLines(resistance, 'us');
    // 1 in² at 50 ksi is 50 kip.
    expect(lines.map(({ result }) => result)).toEqual(['1.000 in²', '50.0 ksi', '50.0 kip']);
    expect(lines[2]?.values).toBe('1.000 × 50.0');
  });
});
