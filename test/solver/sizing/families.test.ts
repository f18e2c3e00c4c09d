import { describe, expect, it } from "vitest";
import { candidateFormulas } from "../../../src/solver/sizing/candidateFormulas.ts";
import type { Candidate, Sizing } from "../../../src/solver/sizing/outcome.ts";
import { sizeFrom } from "../../../src/solver/sizing/sizeFrom.ts";
import { expectRelative } from "../../support/relative.ts";
import { document, family, trim } from "./inventedBrief.ts";

// Invented scenario, computed independently: 15 kV dc on about 300 MΩ, three families, derated to 0.6 of the voltage and 0.5 of
// the dissipation. Bodies are long enough here that voltage alone decides.
const A = family("A", {
  ratedDissipation_W: 0.6,
  limitingVoltage_V: 350,
  greatest_ohm: 10e6,
  voltageCoefficient_per_V: -0.5e-6,
});
const B = family("B", { ratedDissipation_W: 1, limitingVoltage_V: 3500, greatest_ohm: 68e6 });
const C = family("C", {
  ratedDissipation_W: 2,
  limitingVoltage_V: 15e3,
  tolerance: 0.05,
  voltageCoefficient_per_V: -2e-6,
});

const counts = candidateFormulas.leastCount;
const asked = (each: typeof A) => ({
  V: 15e3,
  dv: 0.6,
  Vlim: each.limitingVoltage_V as number,
  R1: 300e6,
  Rmax: each.greatest_ohm,
  Vrms: 15e3,
  dp: 0.5,
  P: each.ratedDissipation_W,
});

describe("least number of elements", () => {
  it("is set by voltage for all three", () => {
    expect([A, B, C].map((each) => counts.compute(asked(each)))).toEqual([72, 8, 2]);
  });

  it("would be 30 by the largest value and 3 by dissipation for the small one", () => {
    expect(counts.compute({ ...asked(A), Vlim: 1e9, P: 1e9 })).toBe(30);
    expect(counts.compute({ ...asked(A), Vlim: 1e9, Rmax: 1e12 })).toBe(3);
  });

  it("meets a limit that is reached to the last digit", () => {
    expect(counts.compute({ ...asked(A), V: 72 * 0.6 * 350 })).toBe(72);
  });
});

describe("through the search", () => {
  const window = { policy: { leastCurrent_A: 15e3 / 330e6, greatestDissipation_W: 15e3 ** 2 / 290e6 } };
  const sizing = sized(sizeFrom(document(window, [A, B, C, trim]), [], 3));
  const of = (id: string) => sizing.candidates.find((each) => each.family === id) as Candidate;

  it("each family stands with its least count in a window about 300 MΩ", () => {
    expect(sizing.window.open).toBe(true);
    expectRelative(sizing.window.least_ohm, 290e6, 1e-12, "V²/P");
    expectRelative(sizing.window.greatest_ohm, 330e6, 1e-12, "V/I");
    expect(["A", "B", "C"].map((id) => of(id).elements)).toEqual([72, 8, 2]);
    expect(sizing.candidates.map((each) => each.family)).toEqual(["C", "B", "A"]);
  });

  it("element voltages are 208, 1875 and 7500 V less the LV arm's thousandth", () => {
    const expected = { A: 15e3 / 72, B: 1875, C: 7500 };
    for (const [id, V] of Object.entries(expected))
      expectRelative(of(id).elementVoltage_Vpeak, V * 0.999, 1e-12, "equal shares of V(1 − 1/F)");
  });
});

describe("uncertainty of the string", () => {
  const f = candidateFormulas.partsUncertainty;
  const tolerance = (t: number, n: number) => f.compute({ t, n, p: 1, s: 0, tc: 0, kv: 0, Ve: 0 });

  it("with the lot term is 0.680, 0.782 and 5.27 %", () => {
    expectRelative(tolerance(0.01, 72), 0.0068, 1e-3, "three digits given");
    expectRelative(tolerance(0.01, 8), 0.00782, 1e-3, "three digits given");
    expectRelative(tolerance(0.05, 2), 0.0527, 1e-3, "three digits given");
  });

  it("as independent parts would be 0.136, 0.408 and 4.08 %", () => {
    const independent = (t: number, n: number) => Math.sqrt((tolerance(t, n) as number) ** 2 - ((2 * t) / 3) ** 2);
    expectRelative(independent(0.01, 72), 0.00136, 2e-3, "three digits given");
    expectRelative(independent(0.01, 8), 0.00408, 2e-3, "three digits given");
    expectRelative(independent(0.05, 2), 0.0408, 2e-3, "three digits given");
  });

  it("counts the voltage effect of -104 ppm, -0.1875 % and -1.5 % as a rectangular half-width", () => {
    const effect = (kv: number, Ve: number) => {
      const U = f.compute({ t: 0, n: 1, p: 1, s: 0, tc: 0, kv, Ve }) as number;
      return (U / 2) * Math.sqrt(3);
    };
    expectRelative(effect(-0.5e-6, 15e3 / 72), 104e-6, 2e-3, "three digits given");
    expectRelative(effect(-1e-6, 1875), 0.001875, 1e-12, "k_v·V/n");
    expectRelative(effect(-2e-6, 7500), 0.015, 1e-12, "k_v·V/n");
  });
});

function sized(result: ReturnType<typeof sizeFrom>): Sizing {
  if (!result.ok) throw new Error(result.error.why);
  return result.value;
}
