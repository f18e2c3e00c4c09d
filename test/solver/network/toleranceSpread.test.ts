/** Invented networks; slopes against differences of the dc answer, spreads against closed forms. */
import { describe, expect, it } from "vitest";
import { dcScaleFactor } from "../../../src/solver/network/dcScaleFactor.ts";
import { dcSolution } from "../../../src/solver/network/dcSolution.ts";
import type { LadderNetwork } from "../../../src/solver/network/ladderNetwork.ts";
import type { ToleranceAsk } from "../../../src/solver/network/networkForm.ts";
import { quantile, toleranceSpread } from "../../../src/solver/network/toleranceSpread.ts";
import { expectRelative } from "../../support/relative.ts";
import { randomNetwork, seeded, sketch } from "./invented.ts";

const ask = (n: number, more: Partial<ToleranceAsk> = {}): ToleranceAsk => ({
  element: new Array<number>(n).fill(0.01),
  lvArm: 0.002,
  instrument: 0.05,
  k: 2,
  samples: null,
  seed: 1,
  ...more,
});
const scaleFactor = (network: LadderNetwork) => dcSolution(network, 1)!.scaleFactor;
const withLv = (network: LadderNetwork, factor: number): LadderNetwork => ({
  ...network,
  lv: { ...network.lv, resistance_ohm: network.lv.resistance_ohm * factor },
});
const withInstrument = (network: LadderNetwork, factor: number): LadderNetwork => ({
  ...network,
  instrument: { ...network.instrument, resistance_ohm: network.instrument.resistance_ohm * factor },
});
const withElement = (network: LadderNetwork, index: number, factor: number): LadderNetwork => ({
  ...network,
  resistance_ohm: network.resistance_ohm.map((R, i) => (i === index ? R * factor : R)),
});

function drawn(random: () => number, n: number): LadderNetwork {
  const network = randomNetwork(random, n);
  const line = { impedance_ohm: 50, delay_s: 5e-9, seriesAtTap_ohm: 300, terminationAtEnd_ohm: 1e5 };
  const protector = { resistance_ohm: random() < 0.5 ? 1e7 : Number.POSITIVE_INFINITY, capacitance_F: 0 };
  return {
    ...network,
    protector,
    cable: { ...network.cable, line: random() < 0.5 ? line : null },
    instrument: { ...network.instrument, protector },
  };
}

describe("tolerance of the scale factor", () => {
  it("has the slopes of the dc answer, and its corners", () => {
    const random = seeded(3);
    for (let trial = 0; trial < 30; trial++) {
      const network = drawn(random, 1 + Math.floor(random() * 8));
      const { sensitivity, worst } = toleranceSpread(network, ask(network.n));
      expectRelative(
        dcScaleFactor(network).at(sumOf(network), network.lv.resistance_ohm, network.instrument.resistance_ohm),
        scaleFactor(network),
        1e-13,
        "the ladder's dc answer",
      );
      const slope = (change: (factor: number) => LadderNetwork) => {
        const h = 1e-4;
        const [a, b, c, d] = [1 + h, 1 - h, 1 + 2 * h, 1 - 2 * h].map((factor) => scaleFactor(change(factor)));
        return (8 * (a! - b!) - (c! - d!)) / (12 * h * scaleFactor(network));
      };
      sensitivity.element.forEach((each, i) => {
        expectRelative(
          each,
          slope((factor) => withElement(network, i, factor)),
          1e-10,
          "fourth-order difference",
          1,
        );
      });
      expectRelative(
        sensitivity.lvArm,
        slope((factor) => withLv(network, factor)),
        1e-10,
        "fourth-order difference",
        1,
      );
      expectRelative(
        sensitivity.instrument,
        slope((factor) => withInstrument(network, factor)),
        1e-10,
        "fourth-order difference",
        1,
      );
      const up = network.resistance_ohm.map((R) => R * 1.01);
      const greatest = withInstrument(withLv({ ...network, resistance_ohm: up }, 0.998), 0.95);
      expectRelative(worst.greatest, scaleFactor(greatest), 1e-13, "elements up, the others down");
      expect(worst.least).toBeLessThan(scaleFactor(network));
    }
  });
  it("of equal elements falls with the root of their number", () => {
    const network = sketch({ n: 100, R: 1e6, R2: 1e5 });
    const { standardUncertainty, sensitivity } = toleranceSpread(network, ask(100, { lvArm: 0, instrument: 0 }));
    const share = 1000 / 1001;
    expectRelative(standardUncertainty.rectangular, (share * 0.01) / Math.sqrt(3) / 10, 1e-12, "n equal uncertainties");
    expectRelative(standardUncertainty.normal, (share * 0.01) / 2 / 10, 1e-12, "half-width of two standard deviations");
    expectRelative(sensitivity.lvArm, -share, 1e-12, "R1/(R1 + R2)");
    expectRelative(sensitivity.instrument, 0, 0, "no instrument", 1);
  });
  it("does not exist where dc is blocked, and is nothing where no current flows", () => {
    const blocked = toleranceSpread(sketch({ n: 2, R: Number.POSITIVE_INFINITY, R2: 1e5 }), ask(2, { samples: 3 }));
    expect(JSON.stringify(blocked)).not.toMatch(/:[^{n[]/);
    expect(blocked.sampled?.mean).toBeNull();
    const floating = toleranceSpread(sketch({ n: 2, R: 1e6 }), ask(2, { samples: 3 }));
    expect(floating.worst).toEqual({ least: 1, greatest: 1 });
    expect(floating.sampled).toMatchObject({ mean: 1, standardDeviation: 0, q025: 0, q500: 0, q975: 0 });
  });
});

const sumOf = ({ resistance_ohm }: LadderNetwork) => resistance_ohm.reduce((sum, R) => sum + R, 0);

describe("sampled tolerance", () => {
  it("reaches the closed form, and is the same for the same seed", () => {
    const network = sketch({ n: 12, R: 1e6, R2: 1e4, Rm: 1e6, Rs: 1000 });
    const asked = ask(12, { samples: 200_000, seed: 2 ** 40 + 3 });
    const { sampled, standardUncertainty } = toleranceSpread(network, asked);
    const u = standardUncertainty.rectangular!;
    expectRelative(sampled!.standardDeviation, u, 0.01, "first order; 0.2 % of sampling");
    expectRelative(sampled!.mean, scaleFactor(network), 5 * (u / Math.sqrt(200_000)) + u * u, "five standard errors");
    // The sum of a dozen equal rectangular parts is near normal: 1.96 standard deviations.
    expectRelative(sampled!.q975, 1.96 * u, 0.02, "near normal");
    expectRelative(sampled!.q025, -1.96 * u, 0.02, "near normal");
    expectRelative(sampled!.q500, 0, 0.02 * u, "middle", 1);
    expect(toleranceSpread(network, asked).sampled).toEqual(sampled);
    expect(toleranceSpread(network, { ...asked, seed: 4 }).sampled).not.toEqual(sampled);
  });
  it("of one element is rectangular, LV arm and instrument counted with their inverse", () => {
    const network = sketch({ n: 1, R: 1e6, R2: 1e6 });
    const { sampled } = toleranceSpread(network, ask(1, { samples: 100_000, lvArm: 0 }));
    expectRelative(sampled!.q975, 0.95 * 0.005, 0.005, "19/20 of the half-width, half of it felt");
    const inverse = toleranceSpread(network, ask(1, { element: [0], samples: 100_000, lvArm: 0.5 })).sampled!;
    // F = 1 + 1/(1 + u), u rectangular within ±½: mean 1 + ln 3.
    expectRelative(inverse.mean, 1 + Math.log(3), 3e-3, "mean of the inverse");
    expectRelative(inverse.q500, 0, 3e-3, "middle", 1);
  });
  it("reads quantiles between order statistics", () => {
    const sorted = Float64Array.of(1, 2, 4, 8, 16);
    expect([0, 0.25, 0.5, 1].map((share) => quantile(sorted, share))).toEqual([1, 2, 4, 16]);
    expectRelative(quantile(sorted, 0.9), 12.8, 1e-14, "0.6 of the way from 8 to 16");
    expect(quantile(Float64Array.of(3), 0.975)).toBe(3);
  });
});
