import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { CatalogueId, FoundAngle } from '../../../core/catalogue/model.ts';
import { stockOf } from '../../../core/catalogue/stock.ts';
import { stockCatalogues } from './stockCatalogues.ts';

const own = {
  designation: 'Yard 80x80x6',
  longLeg: 80,
  shortLeg: 80,
  thickness: 6,
  rootRadius: 10,
  toeRadius: 5,
};

function find(typed: string, chosen: CatalogueId = 'en'): FoundAngle {
  return stockOf(chosen, [], stockCatalogues).find(typed);
}

function named(found: FoundAngle): string {
  return found.ok ? `${found.angle.catalogue} ${found.angle.designation}` : 'not found';
}

describe('looking an angle up', () => {
  it.each([
    ['70x70x6', 'en 70x70x6'],
    ['L70×70×6', 'en 70x70x6'],
    ['l 70 X 70 x 6', 'en 70x70x6'],
    ['RSA 70*70*6', 'en 70x70x6'],
    ['70x6', 'en 70x70x6'],
    ['70x70x6 L', 'en 70x70x6'],
    ['70 mm x 70 mm x 6 mm', 'en 70x70x6'],
    ['45x45x4,5', 'en 45x45x4.5'],
    ['125x75x8', 'en 125x75x8'],
    ['75x125x8', 'en 125x75x8'],
    ['L3x3x1/4', 'us L3X3X1/4'],
    ['L3X3X1/4', 'us L3X3X1/4'],
    ['L3x3x0.25', 'us L3X3X1/4'],
    ['3 x 3 x 1/4', 'us L3X3X1/4'],
    ['3" x 3" x 1/4"', 'us L3X3X1/4'],
    ['l3x3x.313', 'us L3X3X5/16'],
    ['L6 x 3 1/2 x 5/16', 'us L6X3-1/2X5/16'],
    ['L3.5x6x0.3125', 'us L6X3-1/2X5/16'],
    ['70 70 6', 'en 70x70x6'],
    ['70,70,6', 'en 70x70x6'],
    ['L70-70-6', 'en 70x70x6'],
    ['70/70/6', 'en 70x70x6'],
    ['Angle 70x70x6', 'en 70x70x6'],
    ['ISA 70x70x6', 'en 70x70x6'],
    ['EA70x70x6', 'en 70x70x6'],
    ['3-1/2x3x1/4', 'us L3-1/2X3X1/4'],
    ['L 70; 70; 6', 'en 70x70x6'],
    ['EQ 70x70x6', 'en 70x70x6'],
    ['L31/2X3X1/4', 'us L3-1/2X3X1/4'],
    ['L3½×3×¼', 'us L3-1/2X3X1/4'],
    ['3-½ x 3 x ¼', 'us L3-1/2X3X1/4'],
    ['3 3 1/4', 'us L3X3X1/4'],
    ['6x31/2x5/16', 'us L6X3-1/2X5/16'],
    ['90x90x8EA', 'au 90x90x8EA'],
    ['90 x 90 x 8 ea', 'au 90x90x8EA'],
    ['150x90x10UA', 'au 150x90x10UA'],
  ])('finds “%s”', (typed, expected) => {
    expect(named(find(typed))).toBe(expected);
  });

  it('takes sizes without a mark from the chosen catalogue', () => {
    expect(named(find('90x90x8', 'en'))).toBe('en 90x90x8');
    expect(named(find('90x90x8', 'au'))).toBe('au 90x90x8EA');
  });

  it('finds an Australian angle by its nominal and by its actual thickness', () => {
    expect(named(find('150x150x10', 'au'))).toBe('au 150x150x10EA');
    expect(named(find('150x150x9.5', 'au'))).toBe('au 150x150x10EA');
  });

  it('looks in the own list first', () => {
    const stock = stockOf('en', [{ ...own, designation: '70x70x6', thickness: 6.2 }], stockCatalogues);
    const found = stock.find('70X70X6');
    expect(found.ok && found.angle.catalogue).toBe('own');
    expect(found.ok && found.angle.outline.thickness).toBe(6.2);
  });

  it('finds an own angle by its name and by its sizes', () => {
    const stock = stockOf('en', [own], stockCatalogues);
    expect(named(stock.find('yard 80x80X6'))).toBe('own Yard 80x80x6');
    expect(named(stock.find('80x80x6'))).toBe('own Yard 80x80x6');
  });

  it('leaves out an own row that is no angle, without a word of its own and without failing', () => {
    const stock = stockOf('en', [{ ...own, thickness: 90 }], stockCatalogues);
    expect(stock.choices).toHaveLength(stockCatalogues.en.angles.length);
    expect(stock.find(own.designation).ok).toBe(false);
  });

  it('offers the own list and the chosen catalogue to choose from', () => {
    const stock = stockOf('au', [own], stockCatalogues);
    expect(stock.choices.map(({ catalogue }) => catalogue).filter((id) => id !== 'au')).toEqual(['own']);
    expect(stock.choices).toHaveLength(66);
  });

  it.each(['en', 'us', 'au'] as const)(
    'finds every designation of every catalogue, with %s chosen',
    (chosen) => {
      const stock = stockOf(chosen, [], stockCatalogues);
      const australian = stockCatalogues.au.angles;
      for (const { angles } of Object.values(stockCatalogues))
        for (const angle of angles) {
          const found = stock.find(angle.designation.toLowerCase().replaceAll('x', ' × '));
          // A European name is nothing but sizes: with the Australian catalogue chosen it means the angle of those sizes there.
          const suffix = angle.kind === 'equal' ? 'EA' : 'UA';
          const namesake = australian.find((a) => a.designation === `${angle.designation}${suffix}`);
          const expected = chosen === 'au' && angle.catalogue === 'en' ? (namesake ?? angle) : angle;
          expect(found.ok && found.angle).toBe(expected);
        }
    },
  );

  it('never throws, whatever is typed', () => {
    const stock = stockOf('en', [own], stockCatalogues);
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.stringMatching(/^[L0-9xX×*/. -]{1,14}$/)), (typed) => {
        const found = stock.find(typed);
        if (!found.ok) expect(found.nearest.length).toBeLessThanOrEqual(5);
      }),
      { seed: 3, numRuns: 500 },
    );
  });
});

describe('what is not in stock', () => {
  const nearest = (typed: string, chosen: CatalogueId = 'en'): readonly string[] => {
    const found = find(typed, chosen);
    return found.ok ? [] : found.nearest;
  };

  it('is answered with at most five that are near in size, the nearest first', () => {
    expect(nearest('72x72x6')).toHaveLength(5);
    expect(nearest('72x72x6')[0]).toBe('70x70x6');
    expect(nearest('125x75x9')[0]).toMatch(/^125x75x(8|10)$/);
  });

  it('is answered in inches when it was typed in inches', () => {
    for (const designation of nearest('L7x7x1')) expect(designation).toMatch(/^L/);
    expect(nearest('L7x7x1')[0]).toBe('L8X8X1');
  });

  it('is answered by the legs when the thickness is still to come', () => {
    expect(nearest('70x70').slice(0, 2).toSorted()).toEqual(['70x70x6', '70x70x7']);
    expect(nearest('70x70x').slice(0, 2).toSorted()).toEqual(['70x70x6', '70x70x7']);
  });

  it('is answered by its letters when it does not read as an angle', () => {
    const stock = stockOf('en', [own], stockCatalogues);
    const found = stock.find('yard80');
    expect(!found.ok && found.nearest[0]).toBe('Yard 80x80x6');
  });

  it('is answered with nothing when nothing is like it', () => {
    expect(nearest('channel')).toEqual([]);
    expect(nearest('')).toEqual([]);
  });
});
