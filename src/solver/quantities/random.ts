const size = 624;
const middle = 397;

/**
 * Mersenne Twister MT19937 (M. Matsumoto and T. Nishimura, ACM TOMACS 8 (1998) 3, from memory): whole numbers 0 … 2³²−1, the same on
 * every machine for the same seed.
 */
export class MersenneTwister {
  private readonly state = new Int32Array(size);
  private at = size;

  /** One number seeds as the authors' init_genrand, a list as their init_by_array (32 bits each). */
  constructor(seed: number | readonly number[]) {
    if (typeof seed === "number") this.fill(seed);
    else this.mix(seed);
  }

  next(): number {
    if (this.at === size) this.twist();
    let y = this.state[this.at++]!;
    y ^= y >>> 11;
    y ^= (y << 7) & 0x9d2c5680;
    y ^= (y << 15) & 0xefc60000;
    y ^= y >>> 18;
    return y >>> 0;
  }

  private fill(seed: number): void {
    const { state } = this;
    state[0] = seed;
    for (let i = 1; i < size; i++) state[i] = Math.imul(1812433253, carried(state[i - 1]!)) + i;
  }

  private mix(key: readonly number[]): void {
    const { state } = this;
    this.fill(19650218);
    let i = 1;
    const step = (factor: number, added: number) => {
      state[i] = (state[i]! ^ Math.imul(carried(state[i - 1]!), factor)) + added;
      i += 1;
      if (i < size) return;
      state[0] = state[size - 1]!;
      i = 1;
    };
    for (let k = 0; k < Math.max(size, key.length); k++) step(1664525, key[k % key.length]! + (k % key.length));
    for (let k = 1; k < size; k++) step(1566083941, -i);
    state[0] = 0x80000000;
  }

  private twist(): void {
    const { state } = this;
    for (let i = 0; i < size; i++) {
      const y = (state[i]! & 0x80000000) | (state[i + 1 < size ? i + 1 : 0]! & 0x7fffffff);
      const far = i + middle < size ? i + middle : i + middle - size;
      state[i] = state[far]! ^ (y >>> 1) ^ (-(y & 1) & 0x9908b0df);
    }
    this.at = 0;
  }
}

const carried = (x: number): number => x ^ (x >>> 30);

/** A generator for any whole seed 0 … 2⁵³−1. */
export const seededBy = (seed: number): MersenneTwister =>
  new MersenneTwister([seed >>> 0, Math.floor(seed / 2 ** 32)]);
