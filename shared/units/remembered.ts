/** What is slow to make and always the same, kept by its key: so many at most, and the one asked for longest ago gives way. */
export class Remembered<T> {
  private readonly kept = new Map<string, T>();

  constructor(private readonly most: number) {}

  /** What the key stands for: as it was made before, else made now; whatever `make` throws is thrown, and nothing is kept. */
  of(key: string, make: () => T): T {
    const value = this.kept.has(key) ? (this.kept.get(key) as T) : make();
    this.kept.delete(key);
    this.kept.set(key, value);
    const [oldest] = this.kept.keys();
    if (this.kept.size > this.most && oldest !== undefined) this.kept.delete(oldest);
    return value;
  }

  /** Makes it anew the next time. */
  forget(key: string): void {
    this.kept.delete(key);
  }
}
