import { describe, expect, it } from "vitest";
import { MersenneTwister, seededBy } from "../../../src/solver/quantities/random.ts";

describe("Mersenne Twister", () => {
  it("gives the 10000th number that the C++ standard prescribes for the default seed", () => {
    // ISO/IEC 14882:2011, 26.5.5 [rand.predef]: mt19937, seed 5489, from memory; the first ones agree with Python's and NumPy's copies.
    const random = new MersenneTwister(5489);
    expect(Array.from({ length: 3 }, () => random.next())).toEqual([3499211612, 581869302, 3890346734]);
    for (let i = 3; i < 9999; i++) random.next();
    expect(random.next()).toBe(4123659995);
  });
  it("gives the first numbers of the authors' own output for a list as seed", () => {
    // mt19937ar.out, init_by_array {0x123, 0x234, 0x345, 0x456}, from memory.
    const random = new MersenneTwister([0x123, 0x234, 0x345, 0x456]);
    expect(Array.from({ length: 5 }, () => random.next())).toEqual([
      1067595299, 955945823, 477289528, 4107218783, 4228976476,
    ]);
  });
  it("takes every digit of a seed", () => {
    expect(seededBy(7).next()).toBe(seededBy(7).next());
    expect(new Set([7, 8, 7 + 2 ** 40].map((seed) => seededBy(seed).next())).size).toBe(3);
  });
});
