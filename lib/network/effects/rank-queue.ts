/** A set of ranks taken from the lowest up; what is put in must lie above what was taken last. */
export class RankQueue {
  private readonly bits: Int32Array;
  private word = 0;
  private size = 0;

  constructor(count: number) {
    this.bits = new Int32Array((count >>> 5) + 1);
  }

  add(rank: number): void {
    const word = rank >>> 5;
    const bit = 1 << (rank & 31);
    if (this.bits[word]! & bit) return;
    this.bits[word]! |= bit;
    this.size++;
    if (this.size === 1 || word < this.word) this.word = word;
  }

  clear(): void {
    while (this.take() !== -1);
  }

  /** The lowest rank, taken out; −1 where there is none. */
  take(): number {
    if (this.size === 0) return -1;
    while (this.bits[this.word] === 0) this.word++;
    const bits = this.bits[this.word]!;
    this.bits[this.word] = bits & (bits - 1);
    this.size--;
    return this.word * 32 + 31 - Math.clz32(bits & -bits);
  }
}
