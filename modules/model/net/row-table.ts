/**
 * Rows of whole numbers, each kept once: an open-addressing hash table over one Int32Array. Nets join
 * millions of states by it, for which a Map with text keys would be ten times slower.
 */
export class RowTable {
  /** Row `i` lies at `i x width`. */
  rows: Int32Array;
  count = 0;
  readonly #width: number;
  #slots: Int32Array;

  constructor(width: number) {
    this.#width = width;
    this.rows = new Int32Array(64 * width);
    this.#slots = new Int32Array(128).fill(-1);
  }

  /** The position of a row that lies in `source` from `at` on; added when it is new. */
  place(source: Int32Array, at: number): number {
    if (this.count * 2 >= this.#slots.length) this.#grow();
    let slot = this.#hash(source, at) & (this.#slots.length - 1);
    for (;;) {
      const held = this.#slots[slot] as number;
      if (held < 0) break;
      if (this.#isSame(held * this.#width, source, at)) return held;
      slot = (slot + 1) & (this.#slots.length - 1);
    }
    const position = this.count;
    for (let index = 0; index < this.#width; index += 1) {
      this.rows[position * this.#width + index] = source[at + index] as number;
    }
    this.#slots[slot] = position;
    this.count += 1;
    return position;
  }

  #isSame(held: number, source: Int32Array, at: number): boolean {
    for (let index = 0; index < this.#width; index += 1) {
      if (this.rows[held + index] !== source[at + index]) return false;
    }
    return true;
  }

  /** Multiply and shift, after FNV-1a (Fowler, Noll and Vo). */
  #hash(source: Int32Array, at: number): number {
    let hash = 0x811c9dc5;
    for (let index = 0; index < this.#width; index += 1) {
      hash = Math.imul(hash ^ (source[at + index] as number), 0x01000193);
      hash ^= hash >>> 15;
    }
    return hash >>> 0;
  }

  #grow(): void {
    const rows = new Int32Array(this.rows.length * 2);
    rows.set(this.rows);
    this.rows = rows;
    this.#slots = new Int32Array(this.#slots.length * 2).fill(-1);
    for (let position = 0; position < this.count; position += 1) {
      let slot = this.#hash(rows, position * this.#width) & (this.#slots.length - 1);
      while ((this.#slots[slot] as number) >= 0) slot = (slot + 1) & (this.#slots.length - 1);
      this.#slots[slot] = position;
    }
  }
}
