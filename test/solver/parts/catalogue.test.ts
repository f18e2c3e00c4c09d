import { describe, expect, it } from "vitest";
import type { InstrumentFunction } from "../../../src/solver/job/instrument.ts";
import type { CapacitorFamily } from "../../../src/solver/job/part.ts";
import { dielectricFits, dielectricRefusal } from "../../../src/solver/parts/capacitorFamilies.ts";
import { catalogue, catalogued } from "../../../src/solver/parts/catalogue.ts";
import { catalogueSource } from "../../../src/solver/parts/catalogueSource.ts";
import { pointerResistance } from "../../../src/solver/parts/instruments.ts";
import { materials } from "../../../src/solver/parts/materials.ts";
import { expectRelative } from "../../support/relative.ts";

const { resistors, capacitors, trimmers, protectors, instruments, cables } = catalogue;

describe("the catalogue", () => {
  it("gives one id to one record and says where its figures come from", () => {
    const ids = [...resistors, ...capacitors, ...trimmers, ...protectors, ...instruments].map((each) => each.id);
    expect(new Set(ids).size).toBe(ids.length);
    expect(Object.keys(catalogueSource).sort()).toEqual([...ids].sort());
    for (const source of Object.values(catalogueSource)) expect(source.status).toBe("from memory");
  });
  it("is looked up by id, and knows what it has not", () => {
    expect(catalogued("protectors", "gas-90")?.type).toBe("gasTube");
    expect(catalogued("resistors", "gas-90")).toBeUndefined();
    expect(catalogued("resistors", "toString")).toBeUndefined();
  });
});

describe("capacitor families", () => {
  const of = (dielectricClass: CapacitorFamily["dielectricClass"]) => ({ ...capacitors[0]!, dielectricClass });
  it("are eight or more, with ranges, ratings and losses of their dielectric", () => {
    expect(capacitors.length).toBeGreaterThanOrEqual(8);
    for (const each of capacitors) {
      expect(each.greatest_F, each.id).toBeGreaterThan(each.least_F);
      expect(each.ratedVoltage_V / each.bodyLength_m, each.id).toBeLessThan(1e6);
      const steady = each.dielectricClass !== "class2";
      expect(Math.abs(each.temperatureCoefficient_per_K) <= 250e-6, each.id).toBe(steady);
      expect(each.dissipationFactor <= 2e-3, each.id).toBe(steady);
      expect(each.leadInductance_H, each.id).toBeGreaterThan(0.3e-9);
      expect(each.leadInductance_H, each.id).toBeLessThanOrEqual(20e-9);
      // Energy that such a body can hold: ½CV² per volume, far below 1 MJ/m³ for anything steady.
      const volume_m3 = each.bodyLength_m * each.bodyDiameter_m ** 2;
      expect((0.5 * each.greatest_F * each.ratedVoltage_V ** 2) / volume_m3, each.id).toBeLessThan(1e6);
    }
    const rated = new Set(capacitors.map((each) => `${each.dielectricClass} ${each.ratedVoltage_V}`));
    for (const one of ["class1 50", "class1 1000", "class1 2000", "class1 3000", "film 1000", "film 2000", "mica 2500"])
      expect(rated).toContain(one);
  });
  it("of class 2 are refused where they would spoil the scale factor, with the reason and what to take", () => {
    for (const place of ["hvArm", "lvArm"] as const) {
      expect(dielectricRefusal(of("class2"), place)).toMatchObject({
        why: expect.stringContaining("20 to 60 %"),
        cure: expect.stringContaining("C0G"),
      });
      expect(dielectricFits(of("class2"), place)).toBe(false);
      expect(dielectricFits(of("electrolytic"), place)).toBe(false);
      for (const good of ["class1", "film", "mica", "air"] as const) expect(dielectricFits(of(good), place)).toBe(true);
    }
    expect(dielectricRefusal(of("class2"), "decoupling")).toBeNull();
  });
});

describe("trimmers and protectors", () => {
  it("end where they are still sold: rheostats at 2 MΩ, capacitors at 100 pF, one from 5 to 60 pF", () => {
    for (const each of trimmers) {
      expect([...each.spans].sort((a, b) => a - b)).toEqual(each.spans);
      expect(each.spans.at(-1)).toBeLessThanOrEqual(each.quantity === "ohm" ? 2e6 : 100e-12);
    }
    const film = catalogued("trimmers", "trim-film")!;
    expect(film.spans).toContain(60e-12);
    expectRelative(film.leastShare * 60e-12, 5e-12, 1e-12, "least of the 60 pF one");
  });
  it("strike from a fifth below their rating and let more through than that", () => {
    const kinds = new Set(protectors.map((each) => each.type));
    expect([...kinds].sort()).toEqual(
      ["clampDiodes", "gasTube", "neon", "seriesResistor", "sparkGap", "surgeDiode", "varistor"].sort(),
    );
    expect(catalogued("protectors", "gas-90")?.leastStrike_V).toBe(72);
    for (const each of protectors) {
      expect(each.type === "seriesResistor", each.id).toBe(each.resistance_ohm !== null);
      if (each.leastStrike_V !== null) expect(each.letThrough_V, each.id).toBeGreaterThan(each.leastStrike_V);
    }
  });
});

describe("instruments", () => {
  const functions: Record<InstrumentFunction, readonly [least_ohm: number, greatest_ohm: number]> = {
    "meter dc": [10e6, 11.1e6],
    "meter dc high impedance": [100e6, 1e11],
    "meter ac": [5e6, 10e6],
    "bench meter dc": [10e6, 10e6],
    "bench meter ac": [1e6, 1e6],
    "pointer meter": [2e4, 1e8],
    "scope 1 MΩ": [1e6, 1e6],
    "scope with 10:1 probe": [10e6, 10e6],
    "scope 50 Ω": [50, 50],
    "data logger": [1e9, 1e9],
    microammeter: [100, 1000],
  };
  it.each(Object.entries(functions))("read as %s has a typical input", (name, [least, greatest]) => {
    const found = instruments.filter((each) => each.function === name);
    expect(found.length).toBeGreaterThan(0);
    for (const each of found) {
      expect(each.resistance_ohm, each.id).toBeGreaterThanOrEqual(least);
      expect(each.resistance_ohm, each.id).toBeLessThanOrEqual(greatest);
      expect(each.capacitance_F, each.id).toBeLessThanOrEqual(100e-12);
      expect(each.greatestInput_Vpeak, each.id).toBeGreaterThanOrEqual(each.range_V);
      expect(each.resolution_V, each.id).toBeLessThanOrEqual(each.range_V / 50);
      expect(each.readingAccuracy, each.id).toBeLessThanOrEqual(0.05);
    }
  });
  it("read by a pointer have ohms per volt times the range", () => {
    for (const { range_V, resistance_ohm } of instruments.filter((each) => each.function === "pointer meter"))
      expectRelative(resistance_ohm, pointerResistance(20e3, range_V), 0, "product");
  });
  it("hang on cables of the capacitance that 5 ns a metre over the impedance gives", () => {
    expectRelative(cables.coax50.capacitance_F_per_m, 5e-9 / 50, 0.01, "C' = delay/Z");
    expectRelative(cables.coax75.capacitance_F_per_m, 5e-9 / 75, 0.01, "C' = delay/Z");
  });
});

it("materials have a permittivity in order, and a group where they have a surface", () => {
  for (const { id, permittivity, materialGroup } of materials) {
    const [least, usual, greatest] = permittivity;
    expect(least >= 1 && usual >= least && greatest >= usual, id).toBe(true);
    expect(materialGroup === null, id).toBe(/^(air|.*oil)$/.test(id));
  }
});
