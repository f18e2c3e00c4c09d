import { describe, expect, it } from "vitest";
import { dcSolution } from "../../../src/solver/network/dcSolution.ts";
import type { LadderNetwork } from "../../../src/solver/network/ladderNetwork.ts";
import { stepFigures } from "../../../src/solver/network/stepFigures.ts";
import { stepResponse } from "../../../src/solver/network/timeResponse.ts";
import { over, plus, type Rational, rational, times, toNumber } from "../../support/rational.ts";
import { expectRelative } from "../../support/relative.ts";
import { randomNetwork, seeded, sketch } from "./invented.ts";

const one = rational(1);
const nought = rational(0);

/** F·H(s) for a real s in exact fractions: the ladder eliminated from the electrode down, no rounding anywhere. */
function transferExactly(network: LadderNetwork, s: Rational): Rational {
  const y = (R: number, C: number) => plus(Number.isFinite(R) ? over(one, rational(R)) : nought, times(s, rational(C)));
  const { n, lv, protector, cable, instrument, seriesProtector } = network;
  let H = y(network.resistance_ohm[n - 1]!, network.capacitance_F[n - 1]!);
  let E = nought;
  for (let i = n - 2; i >= 0; i--) {
    E = plus(E, times(s, rational(network.toEarth_F[i]!)));
    H = plus(H, times(s, rational(network.toElectrode_F[i]!)));
    const below = y(network.resistance_ohm[i]!, network.capacitance_F[i]!);
    const sum = plus(plus(E, H), below);
    E = over(times(below, E), sum);
    H = over(times(below, H), sum);
  }
  const far = y(
    instrument.resistance_ohm,
    instrument.capacitance_F + (seriesProtector.at === "divider" ? cable.capacitance_F : 0),
  );
  const near = plus(
    y(lv.resistance_ohm, lv.capacitance_F + (seriesProtector.at === "instrument" ? cable.capacitance_F : 0)),
    y(protector.resistance_ohm, protector.capacitance_F),
  );
  const Rs = rational(seriesProtector.resistance_ohm);
  const share = over(one, plus(one, times(Rs, far)));
  const load = plus(near, times(far, share));
  return times(over(H, plus(plus(H, E), load)), share);
}

/** Weights of the Gaver-Stehfest inversion (H. Stehfest, Comm. ACM 13 (1970) 47, from memory), exact. */
function stehfest(n: number): Rational[] {
  const factorial = (k: number): bigint => (k < 2 ? 1n : BigInt(k) * factorial(k - 1));
  const choose = (a: number, b: number) => (b < 0 || b > a ? 0n : factorial(a) / (factorial(b) * factorial(a - b)));
  return Array.from({ length: 2 * n }, (_, i) => {
    const k = i + 1;
    let sum: Rational = nought;
    for (let j = Math.floor((k + 1) / 2); j <= Math.min(k, n); j++) {
      const term = BigInt(j) ** BigInt(n + 1) * choose(n, j) * choose(2 * j, j) * choose(j, k - j);
      sum = plus(sum, over({ n: term, d: 1n }, { n: factorial(n), d: 1n }));
    }
    return (n + k) % 2 === 0 ? sum : { n: -sum.n, d: sum.d };
  });
}

// ln 2 to 40 digits (any table of constants).
const ln2: Rational = { n: 6931471805599453094172321214581765680755n, d: 10n ** 40n };
const weights = stehfest(13);

/** Independent route: another inversion method on exact values; 26 terms give about 1e-8 on smooth responses. */
function stepExactly(network: LadderNetwork, t: number): number {
  const first = over(ln2, rational(t));
  let sum: Rational = nought;
  weights.forEach((weight, i) => {
    const s = times(first, { n: BigInt(i + 1), d: 1n });
    sum = plus(sum, times(weight, over(transferExactly(network, s), { n: BigInt(i + 1), d: 1n })));
  });
  return toNumber(sum) * dcSolution(network, 1)!.scaleFactor;
}

/** The same network with values of 24 bits, so that the fractions stay short. */
function shortNumbers(network: LadderNetwork): LadderNetwork {
  const short = <T extends object>(part: T): T =>
    Object.fromEntries(Object.entries(part).map(([key, x]) => [key, typeof x === "number" ? Math.fround(x) : x])) as T;
  return {
    ...network,
    resistance_ohm: network.resistance_ohm.map(Math.fround),
    capacitance_F: network.capacitance_F.map(Math.fround),
    toEarth_F: network.toEarth_F.map(Math.fround),
    toElectrode_F: network.toElectrode_F.map(Math.fround),
    lv: short(network.lv),
    cable: short(network.cable),
    instrument: short(network.instrument),
    seriesProtector: short(network.seriesProtector),
  };
}

describe("step response against a second inversion on exact fractions", () => {
  it("agrees to 1e-6 of full scale on random stiff networks, picoseconds to hours", () => {
    const random = seeded(23);
    for (let round = 0; round < 4; round++) {
      const network = shortNumbers(randomNetwork(random, 1 + Math.floor(random() * 3)));
      for (const t of [1e-11, 1e-6, 1e-3, 30]) {
        const expected = stepExactly(network, t);
        expectRelative(
          stepResponse(network, [t])![0],
          expected,
          1e-6,
          "Stehfest on exact fractions",
          Math.max(1, Math.abs(expected)),
        );
      }
    }
  });

  it("holds for elements of 1e12 Ω and 1e-15 F, and for nodes without any capacitance", () => {
    const bare = sketch({ n: 3, R: [1e12, 1e3, 5e12], C: [1e-15, 0, 0], R2: 1e6, C2: 1e-8, Rm: 1e7 });
    const huge = sketch({ n: 2, R: [1, 1e13], C: [1e-5, 1e-16], Ce: 1e-16, R2: 1e3, C2: 1e-12 });
    for (const network of [bare, huge]) {
      for (const t of [1e-12, 1e-9, 1e-5, 1e-2, 10, 1e4]) {
        const expected = stepExactly(network, t);
        expectRelative(
          stepResponse(network, [t])![0],
          expected,
          1e-6,
          "Stehfest on exact fractions",
          Math.max(1, Math.abs(expected)),
        );
      }
      expect(Number.isFinite(stepFigures(network)!.responseTime_s)).toBe(true);
    }
  });

  it("does not overflow or drift on 400 and 5000 bare elements", () => {
    for (const n of [400, 5000]) {
      const network = sketch({ n, R: 1e6, Ce: 1e-9, R2: 1e3 });
      const g = stepResponse(network, [1e-12, 1e-3, 1, 1e5])!;
      expect(Array.from(g).every(Number.isFinite)).toBe(true);
      expectRelative(g[3], 1, 1e-9, "settled");
      expectRelative(g[0], 0, 1e-9, "nothing has arrived", 1);
    }
  });
});
