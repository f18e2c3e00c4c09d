import { describe, expect, it } from "vitest";
import type { ResistorFamily } from "../../../src/solver/job/part.ts";
import { capacitorFamilies } from "../../../src/solver/parts/capacitorFamilies.ts";
import { catalogued } from "../../../src/solver/parts/catalogue.ts";
import { resistorFamilies } from "../../../src/solver/parts/resistorFamilies.ts";

const dividing = resistorFamilies.filter((each) => each.use === "divider");
const named = (id: string) => catalogued("resistors", id) as ResistorFamily;

describe("resistor families of the catalogue", () => {
  it("are a dozen or more, each under an id and a name of its own", () => {
    expect(dividing.length).toBeGreaterThanOrEqual(12);
    for (const key of ["id", "name"] as const)
      expect(new Set(resistorFamilies.map((each) => each[key])).size).toBe(resistorFamilies.length);
  });
  // Invented scenario, computed independently: three families compared at 15 kV rest on exactly these ratings.
  it.each([
    ["film-06", 350, 0.6, 10e6, 0.01, -0.5e-6],
    ["hv-film-1", 3500, 1, 68e6, 0.01, -1e-6],
    ["hv-body-2", 15e3, 2, 1e9, 0.05, -2e-6],
  ])("%s keeps its ratings to the digit", (id, limitingVoltage_V, ratedDissipation_W, greatest_ohm, tolerance, kv) => {
    const exact = { limitingVoltage_V, ratedDissipation_W, greatest_ohm, tolerance, voltageCoefficient_per_V: kv };
    expect(named(id)).toMatchObject(exact);
  });
  it("and of capacitors hold the decimals as written, to the last bit", () => {
    const figures = [...resistorFamilies, ...capacitorFamilies].flatMap((each) =>
      Object.entries(each).filter(([, value]) => typeof value === "number"),
    );
    expect(figures.filter(([, value]) => value !== Number((value as number).toPrecision(4)))).toEqual([]);
  });
  it("hold one of 1 kV and 1 % that reaches 100 MΩ", () => {
    const found = resistorFamilies.filter((each) => each.limitingVoltage_V === 1000 && each.tolerance === 0.01);
    expect(found.some((each) => each.greatest_ohm >= 100e6 && each.use === "divider")).toBe(true);
  });
  it("leave wirewound out, and keep ceramic bulk for damping", () => {
    expect(resistorFamilies.some((each) => /wire ?wound/i.test(each.name))).toBe(false);
    expect(resistorFamilies.filter((each) => /bulk/.test(each.name)).map((each) => each.use)).toEqual(["damping"]);
  });
});

describe.each(resistorFamilies.map((each) => [each.id, each] as const))("family %s", (_, family) => {
  it("has a range, a tolerance and a derating line in their order", () => {
    expect(family.least_ohm).toBeGreaterThan(0);
    expect(family.greatest_ohm).toBeGreaterThan(family.least_ohm);
    expect(family.tolerance).toBeGreaterThanOrEqual(0.001);
    expect(family.tolerance).toBeLessThanOrEqual(0.2);
    expect(family.deratingFrom_degC).toBe(70);
    expect(family.zeroDissipation_degC).toBeGreaterThanOrEqual(125);
    expect(family.zeroDissipation_degC).toBeLessThanOrEqual(230);
  });
  it("gets no hotter at its rated dissipation in 70 °C than where none is left, to a twentieth", () => {
    const rise_K = family.thermalResistance_K_per_W * family.ratedDissipation_W;
    expect(rise_K).toBeLessThanOrEqual(1.05 * (family.zeroDissipation_degC - 70));
  });
  it("bears no more along its body than air bears", () => {
    // Uniform air breaks down at about 3 kV/mm; dividing bodies stay far below, chips are coated.
    const field_V_per_m = family.limitingVoltage_V! / family.bodyLength_m;
    expect(field_V_per_m).toBeLessThan(0.6e6);
    expect(field_V_per_m).toBeGreaterThan(0.02e6);
  });
  it("dissipates what its surface can lose", () => {
    const surface_m2 = Math.PI * family.bodyDiameter_m * (family.bodyLength_m + family.bodyDiameter_m / 2);
    // Still air and radiation take 10 to 20 W/(m² K); short parts lose most through their leads or the board.
    const least = family.bodyLength_m > 0.02 ? 1 / (25 * surface_m2) : 1 / (600 * surface_m2);
    expect(family.thermalResistance_K_per_W).toBeGreaterThan(least);
    // Within a glass envelope the element is parted from the surface, and loses less.
    const poorest = family.id === "glass-sealed" ? 4 : 8;
    expect(family.thermalResistance_K_per_W).toBeLessThan(1 / (poorest * surface_m2));
  });
  it("has coefficients and capacitance of its kind", () => {
    // Generic published ranges: metal film < 2 ppm/V, high-voltage thick film ≤ 5 (10 for chips), ordinary thick film 10 … 100.
    const kv = family.voltageCoefficient_per_V;
    expect(kv).toBeLessThan(0);
    if (/^metal film/.test(family.name)) expect(kv).toBeGreaterThan(-2e-6);
    else if (family.use === "divider" && !family.id.startsWith("glass")) expect(kv).toBeGreaterThanOrEqual(-20e-6);
    expect(family.temperatureCoefficient_per_K).toBeGreaterThanOrEqual(25e-6);
    expect(family.temperatureCoefficient_per_K).toBeLessThanOrEqual(1500e-6);
    expect(family.selfCapacitance_F).toBeGreaterThan(0.01e-12);
    expect(family.selfCapacitance_F).toBeLessThanOrEqual(1e-12);
  });
  it("is sold above 10 MΩ in E24 at most and above 1 GΩ in E6 at most", () => {
    const at = (R: number) =>
      family.seriesAbove !== null && R > family.seriesAbove.from_ohm ? family.seriesAbove.series : family.series;
    if (family.greatest_ohm > 10e6) expect(["E24", "E12", "E6", "E3"]).toContain(at(10.1e6));
    if (family.greatest_ohm > 1e9) expect(["E6", "E3"]).toContain(at(1.01e9));
  });
});
