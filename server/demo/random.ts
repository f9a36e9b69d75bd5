/** A stream of reproducible pseudo-random draws. */
export interface Random {
  /** Uniform in [0, 1). */
  uniform(): number;
  /** Standard normal deviate. */
  normal(): number;
  /** Uniform in [low, high). */
  between(low: number, high: number): number;
  /** Whole number, both ends included. */
  integer(low: number, high: number): number;
  chance(probability: number): boolean;
  pick<T>(items: readonly T[]): T;
  /** One item, drawn in proportion to its weight. */
  pickWeighted<T>(items: readonly (readonly [T, number])[]): T;
  shuffle<T>(items: readonly T[]): T[];
}

/** Four 32-bit words from a text (FNV-1a with four offsets, finished by the murmur3 mixer). */
function hashKey(key: string): [number, number, number, number] {
  const words: [number, number, number, number] = [0x811c9dc5, 0x9e3779b9, 0x85ebca6b, 0xc2b2ae35];
  for (let index = 0; index < key.length; index++) {
    const code = key.charCodeAt(index);
    for (let word = 0; word < 4; word++) {
      words[word] = Math.imul((words[word] ?? 0) ^ (code + word * 131), 0x01000193);
    }
  }
  return words.map((word) => {
    let mixed = word ^ (word >>> 16);
    mixed = Math.imul(mixed, 0x85ebca6b);
    mixed = Math.imul(mixed ^ (mixed >>> 13), 0xc2b2ae35);
    return (mixed ^ (mixed >>> 16)) >>> 0;
  }) as [number, number, number, number];
}

/**
 * Opens the stream that belongs to a key, for example ("events", "CA-PCI", 17). Streams with
 * different keys are independent, so records may be made in any order and still come out the
 * same. Generator: sfc32 of C. Doty-Humphrey's PractRand, 128 bits of state (from memory).
 */
export function createRandom(...key: readonly (string | number)[]): Random {
  let [a, b, c, d] = hashKey(key.join('/'));
  const uniform = (): number => {
    const sum = (((a + b) | 0) + d) | 0;
    d = (d + 1) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = ((c << 21) | (c >>> 11)) + sum;
    c |= 0;
    return (sum >>> 0) / 4294967296;
  };
  for (let round = 0; round < 12; round++) uniform();
  const integer = (low: number, high: number): number => low + Math.floor(uniform() * (high - low + 1));
  return {
    uniform,
    // Box–Muller; 1 − u keeps the logarithm finite.
    normal: () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform()),
    between: (low, high) => low + uniform() * (high - low),
    integer,
    chance: (probability) => uniform() < probability,
    pick: (items) => items[integer(0, items.length - 1)] as (typeof items)[number],
    pickWeighted: (items) => {
      const total = items.reduce((sum, [, weight]) => sum + weight, 0);
      let rest = uniform() * total;
      for (const [item, weight] of items) {
        rest -= weight;
        if (rest < 0) return item;
      }
      return (items[items.length - 1] as (typeof items)[number])[0];
    },
    shuffle: (items) => {
      const shuffled = [...items];
      for (let index = shuffled.length - 1; index > 0; index--) {
        const other = integer(0, index);
        [shuffled[index], shuffled[other]] = [shuffled[other] as never, shuffled[index] as never];
      }
      return shuffled;
    },
  };
}
