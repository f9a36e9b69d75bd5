/** A generator that gives the same numbers for the same seed and case, so that a case can be made again by its number. */
export class Random {
  private state: number;

  constructor(seed: number, caseNumber: number) {
    this.state = Math.imul(seed, 0x9e3779b1) ^ Math.imul(caseNumber + 1, 0x85ebca6b);
    for (let round = 0; round < 4; round += 1) this.bits();
  }

  /** 32 bits: Steele, Lea and Flood's mixing as in the public "mulberry32" (from memory). */
  bits(): number {
    this.state = (this.state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(this.state ^ (this.state >>> 15), this.state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return (mixed ^ (mixed >>> 14)) >>> 0;
  }

  /** A whole number from 0 to below the bound; 0 for a bound below 1. */
  below(bound: number): number {
    return bound < 1 ? 0 : Math.floor((this.bits() / 0x1_0000_0000) * bound);
  }

  chance(share: number): boolean {
    return this.bits() / 0x1_0000_0000 < share;
  }

  /** One of them; throws for none. */
  pick<T>(choices: readonly T[]): T {
    if (choices.length === 0) throw new Error('Nothing to choose from.');
    return choices[this.below(choices.length)] as T;
  }

  /** Small numbers far more often than large ones: 1 to the largest. */
  skewed(largest: number): number {
    return 1 + this.below(this.below(this.below(largest) + 1) + 1);
  }
}
