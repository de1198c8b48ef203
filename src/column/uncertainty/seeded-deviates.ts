/**
 * A stream of random numbers that a seed determines: xoshiro128** (Blackman & Vigna 2018, "Scrambled linear
 * pseudorandom number generators"), its state filled by the mixing steps of SplitMix (Steele, Lea & Flood 2014) on 32
 * bits. Period 2^128 - 1.
 */
export class SeededDeviates {
  #a: number;
  #b: number;
  #c: number;
  #d: number;
  #spare = Number.NaN;

  /** @param seedIndex any whole number; its lowest 32 bits count */
  constructor(seedIndex: number) {
    let state = seedIndex | 0;
    const mixed = (): number => {
      state = (state + 0x9e3779b9) | 0;
      let z = state;
      z = Math.imul(z ^ (z >>> 16), 0x85ebca6b);
      z = Math.imul(z ^ (z >>> 13), 0xc2b2ae35);
      return z ^ (z >>> 16);
    };
    this.#a = mixed();
    this.#b = mixed();
    this.#c = mixed();
    this.#d = mixed();
  }

  /** Uniform between 0 and 1, 1 excluded, in steps of 2^-32. */
  uniform(): number {
    const scrambled = Math.imul(this.#b, 5);
    const result = Math.imul((scrambled << 7) | (scrambled >>> 25), 9);
    const shifted = this.#b << 9;
    this.#c ^= this.#a;
    this.#d ^= this.#b;
    this.#b ^= this.#c;
    this.#a ^= this.#d;
    this.#c ^= shifted;
    this.#d = (this.#d << 11) | (this.#d >>> 21);
    return (result >>> 0) / 2 ** 32;
  }

  /** Normal with mean 0 and variance 1, by the polar method (Marsaglia & Bray 1964). */
  normal(): number {
    if (!Number.isNaN(this.#spare)) {
      const spare = this.#spare;
      this.#spare = Number.NaN;
      return spare;
    }
    for (;;) {
      const x = 2 * this.uniform() - 1;
      const y = 2 * this.uniform() - 1;
      const square = x * x + y * y;
      if (square >= 1 || square === 0) continue;
      const factor = Math.sqrt((-2 * Math.log(square)) / square);
      this.#spare = y * factor;
      return x * factor;
    }
  }
}
