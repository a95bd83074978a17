import { NAME_MAX } from '@/features/ground/read-form';

/** Hands out names that nobody in a club has yet: 'Oak' becomes 'Oak 2' when there is one. */
export class FreshNames {
  private readonly taken: Set<string>;
  private readonly next = new Map<string, number>();

  constructor(names: Iterable<string>) {
    this.taken = new Set([...names].map((name) => name.toLowerCase()));
  }

  /** The name itself, or with the first free number behind it. `plain`: what to call a thing without a name, always numbered. */
  take(name: string, plain: string): string {
    const base = name === '' ? plain : name;
    const key = base.toLowerCase();
    let result = name;
    for (
      let n = this.next.get(key) ?? (name === '' ? 1 : 2);
      result === '' || this.taken.has(result.toLowerCase());
      n++
    ) {
      const tail = ` ${n}`;
      result = base.slice(0, NAME_MAX - tail.length) + tail;
      this.next.set(key, n + 1);
    }
    this.taken.add(result.toLowerCase());
    return result;
  }
}
