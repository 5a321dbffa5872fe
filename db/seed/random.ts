/** Random numbers that are the same every time: mulberry32, seeded with a word. Not for secrets. */
export class Random {
  private state: number;

  /** Each part of the seed has its own word, so that a change in one part does not move the others. */
  constructor(word: string) {
    this.state = fnv1a(word);
  }

  /** 0 ≤ value < 1. */
  next(): number {
    this.state = (this.state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(this.state ^ (this.state >>> 15), 1 | this.state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  }

  /** low ≤ value < high. */
  between(low: number, high: number): number {
    return low + (high - low) * this.next();
  }

  /** A whole number, both ends included. */
  whole(low: number, high: number): number {
    return Math.floor(this.between(low, high + 1));
  }

  chance(probability: number): boolean {
    return this.next() < probability;
  }

  pick<T>(first: T, ...others: T[]): T {
    return [first, ...others][this.whole(0, others.length)] ?? first;
  }

  bytes(count: number): Uint8Array {
    return Uint8Array.from({ length: count }, () => this.whole(0, 255));
  }
}

/** FNV-1a, 32 bit: turns a word into a seed. */
function fnv1a(word: string): number {
  let hash = 0x811c9dc5;
  for (const char of word) hash = Math.imul(hash ^ (char.codePointAt(0) ?? 0), 0x01000193);
  return hash >>> 0;
}
