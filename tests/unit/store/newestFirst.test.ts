import { describe, expect, it } from 'vitest';
import { newestFirst } from '../../../renderer/assessing/newestFirst.ts';

/** Questions that are answered only when told to, in the order in which they were begun. */
function asking() {
  const begun: { readonly name: string; answer(): void; fail(): void }[] = [];
  const inTurn = newestFirst(['push', 'study']);
  const ask = (kind: 'push' | 'study', name: string): Promise<string> =>
    inTurn(
      kind,
      () =>
        new Promise<string>((resolve, reject) => {
          begun.push({ name, answer: () => resolve(name), fail: () => reject(new Error(name)) });
        }),
    );
  return { begun, ask };
}

const settle = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, 0));

describe('questions of which the newest counts', () => {
  it('begins the first at once, and of those that wait only the newest of each kind', async () => {
    const { begun, ask } = asking();
    const answers = [ask('study', 'D1'), ask('study', 'D2'), ask('study', 'D3')];
    expect(begun.map(({ name }) => name)).toEqual(['D1']);
    expect(await answers[1]).toBe('overtaken');
    begun[0]?.answer();
    await settle();
    begun[1]?.answer();
    expect(await Promise.all(answers)).toEqual(['D1', 'overtaken', 'D3']);
  });

  it('lets the more pressing kind go first', async () => {
    const { begun, ask } = asking();
    void ask('study', 'D1');
    void ask('study', 'D2');
    void ask('push', 'a push');
    begun[0]?.answer();
    await settle();
    expect(begun.map(({ name }) => name)).toEqual(['D1', 'a push']);
  });

  it('goes on after a failure', async () => {
    const { begun, ask } = asking();
    const first = ask('study', 'D1');
    const second = ask('push', 'a push');
    begun[0]?.fail();
    await expect(first).rejects.toThrow('D1');
    begun[1]?.answer();
    expect(await second).toBe('a push');
  });
});
