/**
 * Keeps what was looked up for a moment, so that a person who types does not read the same rows on every key. Each
 * process has its own; a change made elsewhere is seen after `lifeMs` at the latest.
 */
export class ShortMemory<T> {
  private readonly held = new Map<string, { value: Promise<T>; until: number }>();

  constructor(
    private readonly lifeMs: number,
    private readonly atMost: number,
    private readonly now: () => number = () => performance.now(),
  ) {}

  get(key: string, look: () => Promise<T>): Promise<T> {
    const known = this.held.get(key);
    if (known && known.until > this.now()) return known.value;
    const value = look();
    value.catch(() => this.held.delete(key));
    this.held.delete(key);
    this.held.set(key, { value, until: this.now() + this.lifeMs });
    const [oldest] = this.held.keys();
    if (this.held.size > this.atMost && oldest !== undefined) this.held.delete(oldest);
    return value;
  }
}
