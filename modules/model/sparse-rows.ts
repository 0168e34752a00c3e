/** Entries of a sparse matrix, row by row, in typed arrays that double when they are full. */
export class SparseRows {
  readonly #starts: number[] = [0];
  #indices = new Int32Array(1024);
  #values = new Float64Array(1024);
  #count = 0;

  /** Adds a row; entries are not kept as objects, of which a large model would have millions. */
  addRow(entries: readonly (readonly [column: number, value: number])[]): void {
    this.#reserve(this.#count + entries.length);
    for (const [column, value] of entries) {
      this.#indices[this.#count] = column;
      this.#values[this.#count] = value;
      this.#count += 1;
    }
    this.#starts.push(this.#count);
  }

  pack(): {
    readonly starts: Int32Array;
    readonly indices: Int32Array;
    readonly values: Float64Array;
  } {
    return {
      starts: Int32Array.from(this.#starts),
      indices: this.#indices.slice(0, this.#count),
      values: this.#values.slice(0, this.#count),
    };
  }

  #reserve(count: number): void {
    if (count <= this.#indices.length) return;
    const length = Math.max(count, 2 * this.#indices.length);
    const indices = new Int32Array(length);
    indices.set(this.#indices);
    this.#indices = indices;
    const values = new Float64Array(length);
    values.set(this.#values);
    this.#values = values;
  }
}
