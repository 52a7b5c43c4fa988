/** Where a function that rises or falls from one sign to the other crosses zero, to the last digit. */
export function bisected(f: (x: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  const rises = f(from) < 0;
  for (let step = 0; step < 200; step++) {
    const middle = (low + high) / 2;
    if (f(middle) < 0 === rises) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
