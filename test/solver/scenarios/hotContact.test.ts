import { describe, expect, it } from "vitest";
import { edgeSharing } from "../../../src/solver/network/edgeSharing.ts";
import { timeResponse } from "../../../src/solver/network/timeResponse.ts";
import { bank, figureOf, finding, fixed, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";
import { randomNetwork, seeded, sketch } from "../network/invented.ts";

// Invented scenario, computed independently: 24 × 39 MΩ, 0.35 pF each, 7 pF to earth, 6 kV touched on, the tap at earth.
const n = 24;
const touched = (fitted_F: number, more: Partial<Sketch> = {}): Sketch => ({
  waveform: { kind: "dc", nominal_V: 6000, greatest_Vpeak: 6000 },
  family: { selfCapacitance_F: 0.35e-12 },
  elements: n,
  resistance_ohm: 39e6,
  ...(fitted_F > 0 ? { capacitance_F: fitted_F } : {}),
  strays: { from: "typed", toEarth_F: new Array(n - 1).fill(7e-12 / n), toElectrode_F: [] },
  branches: [fixed("R2", 1e6), bank("C2", 1e-6)],
  ...more,
});
/** Closed form of the uniform ladder without strays to the electrode: cosh θ = 1 + c/2C. */
function top(C: number, c: number): number {
  const theta = Math.acosh(1 + c / (2 * C));
  return 1 - Math.sinh((n - 1) * theta) / Math.sinh(n * theta);
}

describe("6 kV touched on a bare string", () => {
  const bare = proven(touched(0));
  it("puts 58.68 % on the top element instead of 4.17 %", () => {
    expectRelative(figureOf(bare, "element.edgeShare", n - 1), 0.5868, 1e-4, "four digits given");
    expectRelative(figureOf(bare, "element.voltage_VhotContact", n - 1), 0.5868 * 6000, 1e-4, "four digits given");
    expectRelative(top(0.35e-12, 7e-12 / n), 0.5868, 1e-4, "closed form of the same ladder");
  });
  it("with 100 pF across each, 6.125 %", () => {
    const fitted = proven(touched(100e-12));
    expectRelative(figureOf(fitted, "element.edgeShare", n - 1), 0.06125, 1e-4, "four digits given");
    expectRelative(
      figureOf(fitted, "element.edgeShare", n - 1),
      top(100.35e-12, 7e-12 / n),
      5e-6,
      "closed form; the tap at 1 µF",
    );
    expect(finding(fitted, "element.voltage.hotContact")?.level).toBe("clear");
  });
  it("is a caution where nobody need touch it on, and a stop where edges are what is measured", () => {
    expect(finding(bare, "element.voltage.hotContact")).toMatchObject({ level: "caution", element: n });
    const pulse = proven(
      touched(0, {
        waveform: {
          kind: "pulse",
          nominal_V: 6000,
          statedAs: "peak",
          greatest_Vpeak: 6000,
          riseTime_s: 1e-7,
          width_s: 1e-5,
        },
      }),
    );
    expect(finding(pulse, "element.voltage.step")?.level).toBe("stop");
    expect(finding(pulse, "element.voltage.hotContact")).toBeUndefined();
    expect(pulse.sheet.values["element.voltage_VhotContact"]).toBeUndefined();
    const slow = proven(
      touched(0, {
        waveform: {
          kind: "pulse",
          nominal_V: 6000,
          statedAs: "peak",
          greatest_Vpeak: 6000,
          riseTime_s: 1,
          width_s: 10,
        },
      }),
    );
    expect(finding(slow, "element.voltage.step")?.level).toBe("caution");
  });
});

describe("sharing at the instant of an edge", () => {
  it("adds up to the whole, and never puts less than its even share on the top where strays go to earth alone", () => {
    for (const C of [0, 1e-13, 1e-12, 1e-10]) {
      const { element, tap } = edgeSharing(sketch({ n: 10, R: 1e6, C, Ce: 5e-12, R2: 1e4, C2: 1e-9 }));
      expectRelative(
        element.reduce((a, b) => a + b, tap),
        1,
        1e-12,
        "one path from electrode to earth",
      );
      expect(element[9]).toBeGreaterThanOrEqual((1 - tap) / 10 - 1e-12);
    }
  });
  it("leaves at the tap what the step response starts with", () => {
    // Independent route: the inverse Laplace transform at t = 0+.
    const random = seeded(3);
    for (let k = 0; k < 10; k++) {
      const network = {
        ...randomNetwork(random, 7),
        seriesProtector: { resistance_ohm: 0, at: "instrument" as const },
      };
      const g = timeResponse(network)!;
      const scale = g.initial / edgeSharing(network).tap;
      const dc =
        network.resistance_ohm.reduce((a, b) => a + b, 0) *
          (1 / network.lv.resistance_ohm + 1 / network.instrument.resistance_ohm) +
        1;
      if (g.initial > 0) expectRelative(scale, dc, 1e-7, "step response over the scale factor");
    }
  });
  it("of resistors alone is that of dc", () => {
    const { element } = edgeSharing(sketch({ n: 3, R: [1e6, 2e6, 3e6], R2: 1e5 }));
    element.forEach((share, i) => {
      expectRelative(share, ((i + 1) * 1e6) / 6.1e6, 1e-12, "no capacitance anywhere");
    });
  });
});
