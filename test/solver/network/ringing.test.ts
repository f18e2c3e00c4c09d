import { describe, expect, it } from "vitest";
import { invert, weighted, wideContour } from "../../../src/solver/network/contour.ts";
import { scaleFactorOf } from "../../../src/solver/network/dcSolution.ts";
import { over } from "../../../src/solver/network/decade.ts";
import type { LadderNetwork, Reference } from "../../../src/solver/network/ladderNetwork.ts";
import { ringingPoles } from "../../../src/solver/network/ringing.ts";
import { timeResponse } from "../../../src/solver/network/timeResponse.ts";
import { transfer } from "../../../src/solver/network/transfer.ts";
import { expectRelative } from "../../support/relative.ts";
import { randomNetwork, seeded, sketch } from "./invented.ts";

const matchedPair = sketch({ n: 1, R: 1e12, C: 2e-9, R2: 1e12, C2: 2e-9 });
const lead = (inductance_H: number, damping_ohm: number): LadderNetwork => ({
  ...matchedPair,
  source: { resistance_ohm: 0, capacitance_F: 0, inductance_H, damping_ohm },
});

describe("complex natural frequencies", () => {
  it("an R-C network has none", () => {
    for (let seed = 1; seed < 20; seed++) expect(ringingPoles(randomNetwork(seeded(seed), 10), "source")).toEqual([]);
  });
  it.each([0, 0.01, 0.3, 0.9])(
    "a lead before a capacitance rings at −ζω ± jω√(1 − ζ²), ζ = %f (closed form)",
    (zeta) => {
      const [pole, ...more] = ringingPoles(lead(1e-3, 2 * zeta * 1e3), "source");
      expect(more).toEqual([]);
      expectRelative(pole!.im, 1e6 * Math.sqrt(1 - zeta * zeta), 3e-9, "the 2 TΩ input takes some 1e-9");
      expectRelative(pole!.re, -zeta * 1e6, 1e-9, "the same", 1e6);
    },
  );
  it("the source's inductance does not ring with the electrode held", () => {
    expect(ringingPoles(lead(1e-3, 10), "electrode")).toEqual([]);
  });
  it("an LV capacitor's inductance rings with what lies beside it: 1/√(L C2 ∥ C)", () => {
    const C = { n: 1, R: 1e12, C: 1e-10, R2: 1e12, C2: 1e-8 };
    const base = sketch({ ...C, cable: 4e-10 });
    const [pole] = ringingPoles({ ...base, lv: { ...base.lv, inductance_H: 1e-8 } }, "electrode");
    const beside = 5e-10;
    expectRelative(
      pole!.im,
      1 / Math.sqrt((1e-8 * 1e-8 * beside) / (1e-8 + beside)),
      1e-9,
      "capacitors in series around the loop",
    );
  });
});

/** Independent route: the whole transform on one contour wide enough for whatever rings, no pole looked for. */
function wide(network: LadderNetwork, reference: Reference, t: number): number {
  const contour = wideContour(t, 400 / t);
  const H = transfer(network, contour.sre, contour.sim, reference);
  const F = scaleFactorOf(network, reference)!;
  const step = weighted(contour, (k) => over(H.re[k]! * F, H.im[k]! * F, contour.sre[k]!, contour.sim[k]!));
  return invert(contour, step, t);
}

describe("the response with its ringing pairs taken out", () => {
  it("is that of a contour around them all, on random networks with inductances", () => {
    const random = seeded(11);
    const decades = (from: number, to: number) => 10 ** (from + (to - from) * random());
    for (let round = 0; round < 40; round++) {
      const base = randomNetwork(random, 1 + Math.floor(random() * 20));
      const network: LadderNetwork = {
        ...base,
        lv: { ...base.lv, inductance_H: random() < 0.6 ? decades(-10, -5) : 0 },
        source: {
          resistance_ohm: random() < 0.5 ? 0 : decades(-1, 8),
          capacitance_F: random() < 0.5 ? 0 : decades(-13, -8),
          inductance_H: random() < 0.7 ? decades(-8, 0) : 0,
          damping_ohm: random() < 0.5 ? 0 : decades(0, 5),
        },
      };
      const g = timeResponse(network, "source")!;
      const fastest = g.ringing.reduce((most, p) => Math.max(most, Math.hypot(p.re, p.im)), 0);
      const times = Array.from({ length: 16 }, (_, i) => 10 ** (i - 12.3)).filter((t) => fastest * t < 330);
      const scale = times.reduce((most, t) => Math.max(most, Math.abs(g.at(t))), 1);
      for (const t of times) expect(Math.abs(g.at(t) - wide(network, "source", t))).toBeLessThan(1e-8 * scale);
    }
  });
});
