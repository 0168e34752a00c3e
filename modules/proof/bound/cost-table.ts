/** The least cost known of each of many histories, by whole numbers below 2^53. */
export class CostTable {
  #count = 0;
  #keys = new Float64Array(256);
  #costs = new Float64Array(256);
  /** Places in `#keys`, one more; 0: free. At most half of them are taken. */
  #slots = new Int32Array(512);

  get count(): number {
    return this.#count;
  }

  keyAt(place: number): number {
    return this.#keys[place] ?? 0;
  }

  costAt(place: number): number {
    return this.#costs[place] ?? 0;
  }

  /** Cost of a history; Infinity when it is not known. */
  costOf(key: number): number {
    const place = (this.#slots[this.#slotOf(key)] ?? 0) - 1;
    return place < 0 ? Number.POSITIVE_INFINITY : this.costAt(place);
  }

  /** Notes a way to a history, unless one that costs no more is known. */
  lower(key: number, cost: number): void {
    const slot = this.#slotOf(key);
    const place = (this.#slots[slot] ?? 0) - 1;
    if (place >= 0) {
      if (cost < this.costAt(place)) this.#costs[place] = cost;
      return;
    }
    if (this.#count === this.#keys.length) this.#grow();
    this.#keys[this.#count] = key;
    this.#costs[this.#count] = cost;
    this.#count += 1;
    this.#slots[this.#slotOf(key)] = this.#count;
  }

  clear(): void {
    this.#count = 0;
    this.#slots.fill(0);
  }

  /** The slot of a key, or the free one where it belongs: open addressing (Knuth, TAOCP 3, 6.4). */
  #slotOf(key: number): number {
    const mask = this.#slots.length - 1;
    // The lower 32 bits times a large odd number: neighbouring keys lie far apart.
    let slot = (Math.imul(key | 0, 0x9e3779b1) >>> 8) & mask;
    for (;;) {
      const place = (this.#slots[slot] ?? 0) - 1;
      if (place < 0 || this.#keys[place] === key) return slot;
      slot = (slot + 1) & mask;
    }
  }

  #grow(): void {
    const [keys, costs] = [this.#keys, this.#costs];
    this.#keys = new Float64Array(2 * keys.length);
    this.#costs = new Float64Array(2 * costs.length);
    this.#keys.set(keys);
    this.#costs.set(costs);
    this.#slots = new Int32Array(2 * this.#slots.length);
    for (let place = 0; place < this.#count; place += 1) {
      this.#slots[this.#slotOf(this.keyAt(place))] = place + 1;
    }
  }
}
