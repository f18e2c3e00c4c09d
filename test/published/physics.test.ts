import { describe, expect, it } from "vitest";
import { loadingFormulas } from "../../src/solver/checks/loadingFormulas.ts";
import { stressFormulas } from "../../src/solver/checks/stressFormulas.ts";
import { parseQuantity } from "../../src/solver/quantities/parse.ts";
import { metre } from "../../src/solver/quantities/quantity.ts";
import { airDensityAtAltitude, pressureShare } from "../../src/solver/standards/airDensity.ts";
import { sphereCapacitance, verticalCylinderCapacitance } from "../../src/solver/standards/strayCapacitance.ts";
import { expectRelative } from "../support/relative.ts";

describe("IEC 60115-1 (ed. 4:2008 / ed. 5:2020, from memory): the derating line, 70 °C to 155 °C", () => {
  it.each([
    [70, 1],
    [85, 0.8235],
    [100, 0.6471],
    [125, 0.3529],
    [155, 0],
    [180, 0],
  ])("at %i °C leaves %f", (T, share) => {
    const left = stressFormulas.dissipationRating.compute({ P: 1, Tr: 70, Tz: 155, T });
    expectRelative(left, share, 1e-4, "four printed digits", 1);
  });
  it("as a maker's tutorial prints it for 70 °C to 200 °C: 77 % at 100 °C, 38 % at 150 °C (common practice, no source)", () => {
    expectRelative(
      stressFormulas.dissipationRating.compute({ P: 1, Tr: 70, Tz: 200, T: 100 }),
      0.77,
      1e-2,
      "two digits",
    );
    expectRelative(
      stressFormulas.dissipationRating.compute({ P: 1, Tr: 70, Tz: 200, T: 150 }),
      0.38,
      2e-2,
      "two digits",
    );
  });
});

describe("critical resistance, IEC 60115-1 (ed. 4:2008 / ed. 5:2020, from memory): V²/P", () => {
  it.each([
    [250, 0.25, 250e3],
    [3500, 0.5, 24.5e6],
  ])("%f V and %f W cross at %f Ω", (Vlim, P, R) => {
    expectRelative(stressFormulas.critical.compute({ dv: 1, Vlim, P }), R, 1e-12, "both limits reached together");
    expectRelative(Math.sqrt(P * R), Vlim, 1e-12, "the voltage that dissipates P in it is the limit itself");
  });
  // Derated to 0.6 of the voltage and 0.5 of the dissipation; computed here.
  it.each([
    [350, 0.6, 147e3],
    [3500, 1, 8.82e6],
    [15e3, 2, 81e6],
  ])("%f V and %f W cross at %f Ω when derated", (Vlim, P, R) => {
    expectRelative(stressFormulas.critical.compute({ dv: 0.6, Vlim, P: 0.5 * P }), R, 1e-12, "closed form");
  });
  it("does not exist where no dissipation is left", () => {
    expect(stressFormulas.critical.compute({ dv: 0.6, Vlim: 350, P: 0 })).toBeNull();
  });
});

describe("stray capacitance", () => {
  // Kuffel, Zaengl, Kuffel, High Voltage Engineering, 2nd ed. (2000), ch. 3, from memory; values recomputed independently.
  it.each([
    [1, 0.1, 0.5, 20.3],
    [1, 0.1, 0.05, 22.21],
    [1, 0.05, 0.2, 16.78],
    [2, 0.1, 0.2, 34.29],
    [0.3, 0.02, 0.1, 5.398],
  ])("of a vertical cylinder l = %f, d = %f, h = %f m is %f pF", (l, d, h, pF) => {
    expectRelative(verticalCylinderCapacitance(metre(l), metre(d), metre(h)), pF * 1e-12, 5e-4, "four printed digits");
  });
  it("of an isolated sphere of 5 cm is 5.563 pF (exact; any field theory text)", () => {
    expectRelative(sphereCapacitance(metre(0.05)), 5.563e-12, 1e-4, "four printed digits");
  });
});

describe("air", () => {
  // Standard atmosphere, from memory: 65.75 kPa at 3500 m, relative density 0.6490 at 20 °C.
  it("has its pressure and density at 3500 m", () => {
    expectRelative(101.3 * pressureShare(metre(3500)), 65.75, 1e-3, "four printed digits");
    expectRelative(airDensityAtAltitude(metre(3500)), 0.649, 1e-3, "four printed digits");
  });
  it("gets thinner all the way up", () => {
    for (let h = 0; h < 20000; h += 500)
      expect(airDensityAtAltitude(metre(h + 500))).toBeLessThan(airDensityAtAltitude(metre(h)));
  });
});

describe("conductance (common practice, no source)", () => {
  it("a reading of 5 nS is 200 MΩ, and 100 kV across it drive 0.5 mA", () => {
    const read = parseQuantity("5 nS", "S");
    const R = read.kind === "value" ? 1 / read.value : 0;
    expectRelative(R, 200e6, 1e-12, "reciprocal");
    expectRelative(loadingFormulas.current.compute({ V: 100e3, Rin: R }), 0.5e-3, 1e-12, "Ohm's law");
  });
});
