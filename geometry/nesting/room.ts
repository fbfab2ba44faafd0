/** Where on one sheet a part may still lie: a bit for each place of its first corner, column by column. */

import type { Barred } from './barred';
import type { Cover } from './cover';

const FULL = 0xffffffff;

export class Room {
  private readonly words: number;
  private readonly blank: Uint32Array;
  private bits: Uint32Array;
  private columns = 0;
  /** No place is free before this column; places are only ever taken away. */
  private from = 0;

  /**
   * @param width cells, of the sheet
   * @param height cells, of the sheet
   */
  constructor(
    private readonly cover: Cover,
    private readonly width: number,
    private readonly height: number,
  ) {
    const rows = Math.max(0, height - cover.height + 1);
    this.words = Math.max(1, Math.ceil(rows / 32));
    this.blank = new Uint32Array(this.words);
    const spare = this.words * 32 - rows;
    for (let bit = 0; bit < spare; bit++) {
      const row = rows + bit;
      this.blank[row >> 5]! |= 1 << (row & 31);
    }
    this.bits = new Uint32Array(0);
  }

  private get lastColumn(): number {
    return this.height < this.cover.height ? -1 : this.width - this.cover.width;
  }

  private reach(columns: number): void {
    const needed = Math.min(columns, this.lastColumn + 1);
    if (needed <= this.columns) return;
    const grown = new Uint32Array(Math.max(needed, 2 * this.columns) * this.words);
    grown.set(this.bits);
    for (let at = this.columns * this.words; at < grown.length; at += this.words) {
      grown.set(this.blank, at);
    }
    this.bits = grown;
    this.columns = grown.length / this.words;
  }

  /** Takes away what a part placed at a cell bars. */
  bar(barred: Barred, x: number, y: number): void {
    const first = Math.max(0, -(x + barred.first));
    const last = Math.min(barred.columns.length - 1, this.lastColumn - x - barred.first);
    if (last < first) return;
    this.reach(x + barred.first + last + 1);
    const limit = this.words * 32 - 1;
    for (let k = first; k <= last; k++) {
      const stretches = barred.columns[k]!;
      const base = (x + barred.first + k) * this.words;
      for (let s = 0; s < stretches.length; s += 2) {
        const low = Math.max(0, y + stretches[s]!);
        const high = Math.min(limit, y + stretches[s + 1]!);
        if (low > high) continue;
        this.set(base, low, high);
      }
    }
  }

  private set(base: number, low: number, high: number): void {
    const a = low >> 5;
    const b = high >> 5;
    const head = (FULL << (low & 31)) >>> 0;
    const tail = FULL >>> (31 - (high & 31));
    if (a === b) {
      this.bits[base + a]! |= head & tail;
      return;
    }
    this.bits[base + a]! |= head;
    this.bits.fill(FULL, base + a + 1, base + b);
    this.bits[base + b]! |= tail;
  }

  /** The free place furthest to the left, the lowest there; null where the sheet has none. */
  first(): { x: number; y: number } | null {
    for (let x = this.from; x <= this.lastColumn; x++) {
      if (x >= this.columns) this.reach(x + 1);
      const base = x * this.words;
      for (let w = 0; w < this.words; w++) {
        const free = ~this.bits[base + w]! >>> 0;
        if (free === 0) continue;
        this.from = x;
        return { x, y: w * 32 + 31 - Math.clz32(free & -free) };
      }
    }
    this.from = this.lastColumn + 1;
    return null;
  }
}
