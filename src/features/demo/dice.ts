import { ID_PREFIXES, type IdKind } from '@/lib/ids';

const ALPHABET = '0123456789abcdefghjkmnpqrstvwxyz';

/** Chance that comes out the same every time it starts from the same text. */
export interface Dice {
  /** From 0 up to, not including, 1. */
  share(): number;
  /** A whole number from one to another, both inside. */
  whole(least: number, most: number): number;
  pick<T>(all: readonly T[]): T;
  chance(share: number): boolean;
  shuffle<T>(all: readonly T[]): T[];
  /** How many of something that comes so often on average (Knuth's product method). */
  count(mean: number): number;
  id(kind: IdKind): string;
  /** Shaped like a UUID: what a form sends as its request key. */
  requestKey(): string;
}

/** FNV-1a, 32 bits. */
function hashText(text: string): number {
  let hash = 0x811c9dc5;
  for (const char of text) hash = Math.imul(hash ^ (char.codePointAt(0) ?? 0), 0x01000193);
  return hash >>> 0;
}

export function makeDice(seed: string): Dice {
  let state = hashText(seed);
  // mulberry32
  const share = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
  const whole = (least: number, most: number) => least + Math.floor(share() * (most - least + 1));
  const text = (length: number, alphabet: string) =>
    Array.from({ length }, () => alphabet[whole(0, alphabet.length - 1)]).join('');
  const hex = (length: number) => text(length, '0123456789abcdef');
  return {
    share,
    whole,
    pick<T>(all: readonly T[]): T {
      const found = all[whole(0, all.length - 1)];
      if (found === undefined) throw new Error('There is nothing to pick from.');
      return found;
    },
    chance: (least) => share() < least,
    shuffle<T>(all: readonly T[]): T[] {
      return all
        .map((value) => ({ value, at: share() }))
        .sort((a, b) => a.at - b.at)
        .map(({ value }) => value);
    },
    count(mean) {
      const limit = Math.exp(-mean);
      let n = 0;
      for (let product = share(); product > limit; product *= share()) n++;
      return n;
    },
    id: (kind) => `${ID_PREFIXES[kind]}_${text(16, ALPHABET)}`,
    requestKey: () => `${hex(8)}-${hex(4)}-4${hex(3)}-8${hex(3)}-${hex(12)}`,
  };
}
