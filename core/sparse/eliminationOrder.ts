/**
 * An order of elimination with little fill: minimum degree on a quotient graph, with degrees bounded from above and elements absorbed.
 * Source: the approximate minimum degree idea of Amestoy, Davis and Duff (1996); supervariables are not sought, since callers give whole
 * joints, not single unknowns.
 */

/** @param neighbours of each vertex, without itself; symmetric */
export function eliminationOrder(neighbours: readonly (readonly number[])[]): Int32Array {
  const n = neighbours.length;
  const order = new Int32Array(n);
  const graph = new QuotientGraph(neighbours);
  for (let k = 0; k < n; k++) order[k] = graph.eliminateLeast();
  return order;
}

class QuotientGraph {
  readonly #variables: number[][];
  /** Elements (eliminated vertices) that each variable still touches. */
  readonly #elements: number[][];
  /** Variables of each living element. */
  readonly #members: (number[] | null)[];
  readonly #degree: Int32Array;
  readonly #gone: Uint8Array;
  /** Buckets by degree, as doubly linked lists. */
  readonly #head: Int32Array;
  readonly #next: Int32Array;
  readonly #last: Int32Array;
  readonly #mark: Int32Array;
  readonly #outside: Int32Array;
  readonly #seen: Int32Array;
  #stamp = 0;
  #least = 0;

  constructor(neighbours: readonly (readonly number[])[]) {
    const n = neighbours.length;
    this.#variables = neighbours.map((list) => [...list]);
    this.#elements = neighbours.map(() => []);
    this.#members = new Array<number[] | null>(n).fill(null);
    this.#degree = new Int32Array(n);
    this.#gone = new Uint8Array(n);
    this.#head = new Int32Array(n + 1).fill(-1);
    this.#next = new Int32Array(n).fill(-1);
    this.#last = new Int32Array(n).fill(-1);
    this.#mark = new Int32Array(n).fill(-1);
    this.#outside = new Int32Array(n);
    this.#seen = new Int32Array(n).fill(-1);
    for (let v = n - 1; v >= 0; v--) {
      this.#degree[v] = this.#variables[v]?.length ?? 0;
      this.#put(v);
    }
  }

  eliminateLeast(): number {
    while ((this.#head[this.#least] ?? -1) < 0) this.#least += 1;
    const pivot = this.#head[this.#least] ?? 0;
    this.#take(pivot);
    this.#gone[pivot] = 1;
    const members = this.#neighboursOf(pivot);
    this.#absorb(pivot, members);
    return pivot;
  }

  /** Variables next to the pivot, straight or through its elements. Its elements are used up. */
  #neighboursOf(pivot: number): number[] {
    const stamp = ++this.#stamp;
    this.#mark[pivot] = stamp;
    const found: number[] = [];
    const note = (v: number): void => {
      if (this.#gone[v] || this.#mark[v] === stamp) return;
      this.#mark[v] = stamp;
      found.push(v);
    };
    for (const v of this.#variables[pivot] ?? []) note(v);
    for (const e of this.#elements[pivot] ?? []) {
      for (const v of this.#members[e] ?? []) note(v);
      this.#members[e] = null;
    }
    this.#variables[pivot] = [];
    this.#elements[pivot] = [];
    return found;
  }

  #absorb(pivot: number, members: number[]): void {
    const stamp = this.#stamp;
    this.#members[pivot] = members;
    // For every element met: how many of its variables lie outside the new one.
    for (const v of members)
      for (const e of this.#elements[v] ?? []) {
        const list = this.#members[e];
        if (!list) continue;
        if (this.#seen[e] !== stamp) {
          this.#seen[e] = stamp;
          let living = 0;
          for (const w of list) if (!this.#gone[w]) list[living++] = w;
          list.length = living;
          this.#outside[e] = living;
        }
        this.#outside[e] = (this.#outside[e] ?? 0) - 1;
      }
    for (const v of members) {
      this.#take(v);
      let degree = members.length - 1;
      this.#elements[v] = (this.#elements[v] ?? []).filter((e) => {
        if (!this.#members[e]) return false;
        const outside = this.#outside[e] ?? 0;
        // An element that lies wholly in the new one says nothing more.
        if (outside === 0) return false;
        degree += outside;
        return true;
      });
      this.#elements[v]?.push(pivot);
      this.#variables[v] = (this.#variables[v] ?? []).filter(
        (w) => !this.#gone[w] && this.#mark[w] !== stamp,
      );
      degree += this.#variables[v]?.length ?? 0;
      this.#degree[v] = Math.min(degree, this.#head.length - 1);
      this.#put(v);
      if ((this.#degree[v] ?? 0) < this.#least) this.#least = this.#degree[v] ?? 0;
    }
  }

  #put(v: number): void {
    const d = this.#degree[v] ?? 0;
    const first = this.#head[d] ?? -1;
    this.#next[v] = first;
    this.#last[v] = -1;
    if (first >= 0) this.#last[first] = v;
    this.#head[d] = v;
  }

  #take(v: number): void {
    const before = this.#last[v] ?? -1;
    const after = this.#next[v] ?? -1;
    if (before >= 0) this.#next[before] = after;
    else this.#head[this.#degree[v] ?? 0] = after;
    if (after >= 0) this.#last[after] = before;
  }
}
