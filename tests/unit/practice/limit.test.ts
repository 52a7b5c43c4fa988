import { describe, expect, it } from 'vitest';
import { limitInForce } from '../../../core/practice/limit.ts';
import { PRACTICES, practiceFor } from '../../../core/practice/practices.ts';

const plain = { memberClass: null, ownLimit: null };

describe('the limit in force', () => {
  // Clauses from memory: SANS 10162-1 and CSA S16, 10.4.2; AISC 360, user notes of D1 and E2; IS 800, Table 3.
  it.each([
    ['sans10162', 300, 200, 'shall'],
    ['csaS16', 300, 200, 'shall'],
    ['aisc360', 300, 200, 'advice'],
    ['is800', 350, 180, 'shall'],
  ] as const)('is that of %s: %d in tension, %d in compression', (id, tension, compression, standing) => {
    const practice = practiceFor(id);
    expect(limitInForce(practice, plain, 'tension')).toMatchObject({
      limit: tension,
      source: 'practice',
      standing,
    });
    expect(limitInForce(practice, plain, 'both')).toMatchObject({
      limit: compression,
      source: 'practice',
      standing,
    });
  });

  // EN 1993-1-1 and AS 4100 give none; 300 for ties is common practice.
  it.each(['en1993', 'as4100'] as const)(
    'is 300 or the own one in %s, which gives none, and says so',
    (id) => {
      const practice = practiceFor(id);
      const none = { source: 'own limit, practice gives none', standing: 'own' };
      expect(limitInForce(practice, plain, 'tension')).toMatchObject({ ...none, limit: 300 });
      expect(limitInForce(practice, { ...plain, ownLimit: 250 }, 'tension')).toMatchObject({
        ...none,
        limit: 250,
      });
    },
  );

  it('is the own one when set, in tension and in compression', () => {
    const settings = { ...plain, ownLimit: 350 };
    for (const countedOn of ['tension', 'both'] as const)
      expect(limitInForce(practiceFor('sans10162'), settings, countedOn)).toMatchObject({
        limit: 350,
        source: 'own limit',
        standing: 'own',
      });
  });

  // IS 800:2007, Table 3, from memory: 180, 250, 350, 400.
  it.each([
    ['wind', 'tension', 350],
    ['other loads', 'tension', 180],
    ['always in tension', 'tension', 400],
    ['wind', 'both', 250],
    ['other loads', 'both', 180],
    ['always in tension', 'both', 180],
    ['no such class', 'tension', 350],
  ] as const)(
    'follows the class of member of IS 800: %s, counted on for %s',
    (memberClass, countedOn, limit) => {
      expect(limitInForce(practiceFor('is800'), { ...plain, memberClass }, countedOn).limit).toBe(limit);
    },
  );
});

describe('the practices', () => {
  it('are found by their ids, each once', () => {
    for (const practice of PRACTICES) expect(practiceFor(practice.id)).toBe(practice);
    expect(new Set(PRACTICES.map(({ id }) => id)).size).toBe(6);
  });

  it('have a class for either way of counting on a bar, with a clause and how sure it is', () => {
    for (const practice of PRACTICES)
      for (const classes of [practice.tension, practice.compression]) {
        expect(classes.length).toBeGreaterThan(0);
        expect(new Set(classes.map(({ id }) => id)).size).toBe(classes.length);
        for (const { clause, limit, confidence } of classes) {
          expect(clause).not.toBe('');
          expect(confidence).toMatch(/memory|read/);
          expect(limit === null).toBe(practice.standing === 'none');
        }
      }
  });

  it('give each of the four axes a letter of its own', () => {
    for (const { axisLetters } of PRACTICES) expect(new Set(Object.values(axisLetters)).size).toBe(4);
    // AISC calls the minor principal axis z, EN v, AS 4100 y.
    expect(practiceFor('aisc360').axisLetters.v).toBe('z');
    expect(practiceFor('en1993').axisLetters.v).toBe('v');
    expect(practiceFor('as4100').axisLetters.v).toBe('y');
  });
});
