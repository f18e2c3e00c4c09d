import { describe, expect, it } from "vitest";
import type { LadderNetwork } from "../../../src/solver/network/ladderNetwork.ts";
import { slowestDecay } from "../../../src/solver/network/slowestMode.ts";
import { steadySquare } from "../../../src/solver/network/steadySquare.ts";
import { sweep } from "../../../src/solver/network/sweep.ts";
import { timeResponse } from "../../../src/solver/network/timeResponse.ts";
import { square } from "../../../src/solver/network/waveforms.ts";
import { expectRelative } from "../../support/relative.ts";
import { randomNetwork, seeded, sketch } from "./invented.ts";

// Invented scenario, computed independently: R1 = 36 MΩ, C1 = 9 pF, F = 1000, C2p 6 % low.
const low = sketch({ n: 1, R: 36e6, C: 9e-12, R2: 36e6 / 999, C2: 8.45154e-9 });

const heldDecay = (network: LadderNetwork) => slowestDecay(network, true);

/** Start and end of a half period in mV, from the settled level of the opposite half, for a step of 20 mV. */
function halfOf(network: LadderNetwork, frequency_Hz: number): [number, number] {
  const half = 0.5 / frequency_Hz;
  const at = steadySquare(timeResponse(network)!, half);
  return [20 * (at(0) + 0.5), 20 * (at(half * (1 - 1e-12)) + 0.5)];
}

describe("a square wave through an LV capacitance 6 % too small", () => {
  it.each([
    [20, 21.275, 20.0],
    [1e3, 21.068, 20.207],
    [10e3, 20.69, 20.585],
    [100e3, 20.643, 20.632],
  ])("at %d Hz falls from %f to %f mV", (f, start, end) => {
    const [a, b] = halfOf(low, f);
    expectRelative(a, start, 2.5e-5, "half of the last digit given");
    expectRelative(b, end, 2.5e-5, "half of the last digit given");
  });
  it("hands over from its resistors to its capacitors at 522.5 Hz, after 304.6 µs", () => {
    const decay = heldDecay(low)!;
    expectRelative(decay / (2 * Math.PI), 522.5, 2e-4, "four digits given");
    expectRelative(1 / decay, 304.6e-6, 2e-4, "four digits given");
    const tau = ((36e6 * (36e6 / 999)) / (36e6 + 36e6 / 999)) * (9e-12 + 8.45154e-9);
    expectRelative(decay, 1 / tau, 1e-12, "two resistances beside two capacitances");
  });
  it("starts at x0 = δ/(1 + e^(−T/τ)) and falls by e^(−T/τ)", () => {
    const tau = 1 / heldDecay(low)!;
    const delta = timeResponse(low)!.initial - 1;
    for (const f of [1, 300, 2e3, 5e4]) {
      const [a, b] = halfOf(low, f);
      const fall = Math.exp(-0.5 / f / tau);
      expectRelative(a / 20 - 1, delta / (1 + fall), 1e-9, "closed form of one exponential", 1);
      expectRelative(b / 20 - 1, (delta * fall) / (1 + fall), 1e-9, "closed form of one exponential", 1);
    }
  });
});

describe("the settled square response", () => {
  const random = seeded(7);
  const ladders = Array.from({ length: 6 }, () => randomNetwork(random, 5));
  it("is the sum of the odd harmonics of the frequency response", () => {
    // Independent route: the Fourier series, both sides averaged under a short triangle so that the series ends.
    for (const network of [low, ...ladders.map((each) => ({ ...each, seriesProtector: low.seriesProtector }))]) {
      const half = 1e-3;
      const at = steadySquare(timeResponse(network)!, half);
      const wide = half / 25;
      const orders = Array.from({ length: 2000 }, (_, i) => 2 * i + 1);
      const { real, imaginary } = sweep(
        network,
        orders.map((n) => n / (2 * half)),
      )!;
      for (const t of [0.31 * half, 0.62 * half, 0.9 * half]) {
        let mean = 0;
        for (let i = -199; i <= 199; i++) mean += ((1 - Math.abs(i) / 200) * at(t + (i / 200) * wide)) / 200;
        const sum = orders.reduce((total, n, i) => {
          const angle = (n * Math.PI * t) / half;
          const short = (n * Math.PI * wide) / half / 2;
          const part = real[i]! * Math.sin(angle) + imaginary[i]! * Math.cos(angle);
          return total + (2 / (n * Math.PI)) * part * (Math.sin(short) / short) ** 2;
        }, 0);
        expectRelative(mean, sum, 2e-5, "2000 harmonics", 1);
      }
    }
  });
  it("is what a wave from rest tends to", () => {
    for (const network of [low, ladders[0]!]) {
      const g = timeResponse(network)!;
      const half = 2 / heldDecay(network)!;
      for (const t of [0, 0.4 * half, 0.99 * half]) {
        const settled = square(g, 2 * half, 0.5, t + 60 * half);
        expectRelative(settled - 0.5, steadySquare(g, half)(t), 1e-9, "after thirty periods of four time constants", 1);
      }
    }
  });
  it("goes through with its sign turned after half a period", () => {
    for (const network of ladders) {
      const g = timeResponse(network)!;
      const at = steadySquare(g, 1e-4);
      expectRelative(at(1e-4), -at(0) + (g.initial - 0), 1e-9, "an edge adds its own instant", 1);
    }
  });
  it("of a ringing network is that of its harmonics too", () => {
    const ringing: LadderNetwork = {
      ...low,
      lv: { ...low.lv, inductance_H: 1e-4, capacitance_F: 1e-9 },
      instrument: { ...low.instrument, capacitance_F: 7e-9, resistance_ohm: 2e3 },
    };
    const g = timeResponse(ringing)!;
    expect(g.ringing.length).toBeGreaterThan(0);
    const half = 2e-5;
    const settled = square(g, 2 * half, 0.5, 0.37 * half + 4000 * half);
    expectRelative(settled - 0.5, steadySquare(g, half)(0.37 * half), 1e-6, "from rest, 2000 periods later", 1);
  });
});

describe("the slowest decay under an ideal source", () => {
  it("is the slope of the late response", () => {
    const random = seeded(11);
    for (let k = 0; k < 8; k++) {
      const network = randomNetwork(random, 6);
      const decay = heldDecay(network);
      if (decay === null) continue;
      const g = timeResponse(network)!;
      const late = [12, 13].map((each) => Math.log(Math.abs(g.at(each / decay) - 1)));
      if (late[1]! < -22) continue;
      expectRelative(late[0]! - late[1]!, 1, 0.02, "one time constant further on; faster decays have gone");
    }
  });
  it("does not exist without a capacitance", () => {
    expect(heldDecay(sketch({ n: 2, R: 1e6, R2: 1e3, Rm: 1e6 }))).toBeNull();
  });
});
