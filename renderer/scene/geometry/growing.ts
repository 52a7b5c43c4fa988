/** Numbers in a typed array that grows by doubling: room for millions without a list of boxed ones. */
export class Growing<A extends Float32Array | Uint32Array> {
  readonly #make: (length: number) => A;
  #array: A;
  length = 0;

  constructor(make: (length: number) => A) {
    this.#make = make;
    this.#array = make(1024);
  }

  push(value: number): void {
    if (this.length === this.#array.length) this.#grow();
    this.#array[this.length++] = value;
  }

  push3(a: number, b: number, c: number): void {
    if (this.length + 3 > this.#array.length) this.#grow();
    this.#array[this.length] = a;
    this.#array[this.length + 1] = b;
    this.#array[this.length + 2] = c;
    this.length += 3;
  }

  /** What has been pushed, in an array of its own and of that length. */
  taken(): A {
    const exact = this.#make(this.length);
    exact.set(this.#array.subarray(0, this.length));
    return exact;
  }

  #grow(): void {
    const larger = this.#make(2 * this.#array.length);
    larger.set(this.#array);
    this.#array = larger;
  }
}

export const growingFloats = (): Growing<Float32Array> => new Growing((length) => new Float32Array(length));
export const growingIndices = (): Growing<Uint32Array> => new Growing((length) => new Uint32Array(length));
