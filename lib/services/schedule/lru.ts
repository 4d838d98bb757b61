/** Keeps what was used last, up to a total weight; one entry is kept however heavy it is. */
export class Lru<Value> {
  private readonly entries = new Map<string, { readonly value: Value; readonly weight: number }>();
  private total = 0;

  constructor(
    private readonly limit: number,
    private readonly weightOf: (value: Value) => number,
  ) {}

  get(key: string): Value | undefined {
    const entry = this.entries.get(key);
    if (!entry) return undefined;
    this.entries.delete(key);
    this.entries.set(key, entry);
    return entry.value;
  }

  set(key: string, value: Value): void {
    this.drop(key);
    const weight = this.weightOf(value);
    this.entries.set(key, { value, weight });
    this.total += weight;
    for (const oldest of this.entries.keys()) {
      if (this.total <= this.limit || this.entries.size === 1) break;
      this.drop(oldest);
    }
  }

  private drop(key: string): void {
    const entry = this.entries.get(key);
    if (!entry) return;
    this.entries.delete(key);
    this.total -= entry.weight;
  }
}
