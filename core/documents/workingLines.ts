/** The working of a check in lines that a person can follow with a pencil. */

import type { UnitSystem } from '../project/model.ts';
import type { Quantity, Resistance, Step } from '../resistance/model.ts';
import { grouped } from '../units/figures.ts';
import { showForce, threeFigures } from '../units/loads.ts';
import { MM_PER_INCH, N_PER_KIP } from '../units/unitSystem.ts';

export interface WorkingLine {
  readonly name: string;
  /** "A_n"; an underscore sets the rest low. */
  readonly symbol: string;
  /** "A_g − d_h t"; null for what is given. */
  readonly formula: string | null;
  /** The formula with its values, "813 − 20 × 6"; null where there is nothing to put in. */
  readonly values: string | null;
  /** "693 mm²". */
  readonly result: string;
}

/** One line a step, in order, in the project's units. */
export function workingLines({ steps }: Resistance, units: UnitSystem): readonly WorkingLine[] {
  return steps.map((step, index) => {
    const before = steps.slice(0, index);
    const formula = step.formula ?? null;
    const values = formula === null ? null : substituted(formula, before, units);
    return {
      name: step.name,
      symbol: step.symbol,
      formula,
      values: values === formula ? null : values,
      result: quantityText(step.value, step.quantity, units),
    };
  });
}

/** Symbols of earlier steps replaced by their values, the longest first, so that A_n′ is not taken for A_n. */
export function substituted(formula: string, steps: readonly Step[], units: UnitSystem): string {
  // The last step of a name is the one in force.
  const known = new Map(steps.map((step) => [step.symbol, bareText(step, units)]));
  const symbols = [...known.keys()].sort((a, b) => b.length - a.length);
  const parts: { readonly text: string; readonly done: boolean }[] = [{ text: formula, done: false }];
  for (const symbol of symbols) {
    const next: typeof parts = [];
    for (const part of parts) {
      if (part.done) {
        next.push(part);
        continue;
      }
      const pieces = part.text.split(boundary(symbol));
      pieces.forEach((text, k) => {
        if (k > 0) next.push({ text: known.get(symbol) ?? symbol, done: true });
        if (text !== '') next.push({ text, done: false });
      });
    }
    parts.splice(0, parts.length, ...next);
  }
  return spaced(parts);
}

/** The symbol where it stands alone: not inside a word or a longer symbol. */
function boundary(symbol: string): RegExp {
  const plain = symbol.replaceAll(/[.*+?^${}()|[\]\\]/g, '\\$&');
  // A sum or a root sign stands before a symbol, and is no part of it.
  return new RegExp(`(?<!(?![Σ√])[\\p{L}_])${plain}(?![\\p{L}_′])`, 'u');
}

/** Values beside each other are multiplied, as symbols beside each other were. */
function spaced(parts: readonly { readonly text: string; readonly done: boolean }[]): string {
  let out = '';
  parts.forEach((part, k) => {
    const before = parts[k - 1];
    const between = part.text.trim() === '' && before?.done && parts[k + 1]?.done;
    if (between) {
      out += ' × ';
      return;
    }
    const factor = part.done && /[\d)] ?$/.test(out) && !/[−+×/(√] ?$/.test(out);
    if (factor) out = `${out.trimEnd()} × `;
    out += part.text;
  });
  return out;
}

const bareText = ({ value, quantity }: Step, units: UnitSystem): string =>
  quantityText(value, quantity, units).replace(/ [^\d]+$/u, '');

/** A value with its unit. */
export function quantityText(value: number, quantity: Quantity, units: UnitSystem): string {
  const inches = units === 'us';
  const size = (mm: number, power: number): number => (inches ? mm / MM_PER_INCH ** power : mm);
  switch (quantity) {
    case 'length':
      return inches ? `${grouped(size(value, 1), 3)} in` : `${grouped(value, value < 100 ? 1 : 0)} mm`;
    case 'area':
      return inches ? `${grouped(size(value, 2), 3)} in²` : `${grouped(value, 0)} mm²`;
    case 'secondMoment':
    case 'torsion':
      return inches ? `${threeFigures(size(value, 4))} in⁴` : `${threeFigures(value)} mm⁴`;
    case 'warping':
      return inches ? `${threeFigures(size(value, 6))} in⁶` : `${threeFigures(value)} mm⁶`;
    case 'stress':
      return inches
        ? `${grouped((value * MM_PER_INCH ** 2) / N_PER_KIP, 1)} ksi`
        : `${grouped(value, value < 100 ? 1 : 0)} N/mm²`;
    case 'force':
      return showForce(value, units);
    case 'slenderness':
      return grouped(value, 1);
    case 'count':
      return grouped(value, 0);
    case 'ratio':
    case 'factor':
      return grouped(value, 3);
    default:
      return quantity satisfies never;
  }
}
