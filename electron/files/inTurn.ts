/** Runs jobs one after another in the order asked, whatever each of them comes to. */
export function inTurn(): <T>(job: () => Promise<T>) => Promise<T> {
  let last: Promise<unknown> = Promise.resolve();
  return (job) => {
    const done = last.then(job, job);
    last = done.catch(() => undefined);
    return done;
  };
}
