/** Questions for a worker that answers one at a time, of which only the newest of each kind is still of interest. */
export type AskInTurn<Kind extends string> = <T>(
  kind: Kind,
  question: () => Promise<T>,
) => Promise<T | 'overtaken'>;

interface Waiting {
  begin(): Promise<unknown>;
  overtaken(): void;
}

/** @param kinds the most pressing first: when the worker is free, its question goes first */
export function newestFirst<Kind extends string>(kinds: readonly Kind[]): AskInTurn<Kind> {
  const waiting = new Map<Kind, Waiting>();
  let busy = false;

  const next = (): void => {
    const kind = kinds.find((each) => waiting.has(each));
    const first = kind === undefined ? undefined : waiting.get(kind);
    if (busy || kind === undefined || first === undefined) return;
    waiting.delete(kind);
    busy = true;
    void first.begin().finally(() => {
      busy = false;
      next();
    });
  };

  return <T>(kind: Kind, question: () => Promise<T>) =>
    new Promise<T | 'overtaken'>((resolve, reject) => {
      waiting.get(kind)?.overtaken();
      waiting.set(kind, {
        begin: () => question().then(resolve, reject),
        overtaken: () => resolve('overtaken'),
      });
      next();
    });
}
