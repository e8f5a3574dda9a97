/** Keeps what was last used, up to a total weight; what is forgotten can be made again. */
export class BoundedCache<T> {
  private readonly kept = new Map<string, { value: T; weight: number }>();
  private readonly capacity: number;
  private load = 0;

  constructor(capacity: number) {
    this.capacity = capacity;
  }

  get(key: string): T | undefined {
    const found = this.kept.get(key);
    if (!found) return undefined;
    // A map keeps the order of insertion: put back at its end, the least used stand first.
    this.kept.delete(key);
    this.kept.set(key, found);
    return found.value;
  }

  set(key: string, value: T, weight: number): void {
    this.forget(key);
    if (weight > this.capacity) return;
    for (const oldest of this.kept.keys()) {
      if (this.load + weight <= this.capacity) break;
      this.forget(oldest);
    }
    this.kept.set(key, { value, weight });
    this.load += weight;
  }

  /** What is kept under the key, made where it is not. */
  remember(key: string, weight: number, make: () => T): T {
    const found = this.get(key);
    if (found !== undefined) return found;
    const value = make();
    this.set(key, value, weight);
    return value;
  }

  private forget(key: string): void {
    this.load -= this.kept.get(key)?.weight ?? 0;
    this.kept.delete(key);
  }
}
