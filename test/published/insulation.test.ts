/** IEC 60664-1:2020 (ed. 3) tables F.5, F.2, F.8, A.2; figures from a secondary copy, primary not seen. Compared cell by cell. */
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { metre, volt } from "../../src/solver/quantities/quantity.ts";
import { altitudeFactor, impulseClearance, steadyClearance } from "../../src/solver/standards/clearance.ts";
import { creepage } from "../../src/solver/standards/creepage.ts";
import { expectRelative } from "../support/relative.ts";

const table = (name: string) => JSON.parse(readFileSync(new URL(`./${name}.json`, import.meta.url), "utf8"));
const value = <T>(found: { ok: true; value: T } | { ok: false; error: unknown }): T | null =>
  found.ok ? found.value : null;
const printed = "as printed, mm to m";

describe("creepage, table F.5", () => {
  const { voltage_rms, columns } = table("iec60664_creepage") as {
    voltage_rms: number[];
    columns: Record<string, number[]>;
  };
  const places = [
    ["pd1", 1, "I"],
    ["pd1", 1, "IIIb"],
    ["pd2_I", 2, "I"],
    ["pd2_II", 2, "II"],
    ["pd2_III", 2, "IIIa"],
    ["pd2_III", 2, "IIIb"],
    ["pd3_I", 3, "I"],
    ["pd3_II", 3, "II"],
    ["pd3_III", 3, "IIIa"],
  ] as const;
  it.each(places)("has every cell of column %s (pollution degree %i, group %s)", (column, degree, group) => {
    columns[column]!.forEach((mm, i) => {
      expectRelative(value(creepage(volt(voltage_rms[i]!), degree, group)), mm / 1000, 1e-12, printed);
    });
    for (let i = columns[column]!.length; i < voltage_rms.length; i++) {
      expect(creepage(volt(voltage_rms[i]!), degree, group).ok).toBe(false);
    }
  });
  it("steps up between rows and refuses beyond the last", () => {
    expectRelative(value(creepage(volt(5500), 2, "IIIa")), 0.063, 1e-12, "the row of 6.3 kV");
    expect(creepage(volt(63001), 2, "I").ok).toBe(false);
    expectRelative(value(creepage(volt(0), 2, "I")), 0.0004, 1e-12, "the first row");
  });
  it("does not read pollution degree 3 above 10 kV, nor group IIIb there above 630 V", () => {
    for (const group of ["I", "II", "IIIa"] as const) {
      expect(creepage(volt(10_000), 3, group).ok).toBe(true);
      const beyond = creepage(volt(10_001), 3, group);
      expect(beyond.ok ? "" : beyond.error.why).toMatch(/to 10 kV only/);
    }
    expectRelative(value(creepage(volt(630), 3, "IIIb")), 0.01, 1e-12, "the column of group III");
    const b = creepage(volt(631), 3, "IIIb");
    expect(b.ok ? "" : b.error.why).toMatch(/IIIb is not recommended/);
    expect(creepage(volt(63_000), 2, "IIIb").ok).toBe(true);
  });
  it("is near V/200, V/141, V/100 at degree 2 and V/80, V/70.7, V/62.5 at degree 3 from 200 V up (computed here)", () => {
    const rule = { 2: { I: 200, II: 141, IIIa: 100 }, 3: { I: 80, II: 70.7, IIIa: 62.5 } } as const;
    for (const degree of [2, 3] as const) {
      for (const group of ["I", "II", "IIIa"] as const) {
        for (const V of voltage_rms.filter((each) => each >= 200 && each <= (degree === 3 ? 1e4 : 63e3))) {
          const mm = value(creepage(volt(V), degree, group))! * 1000;
          expectRelative(mm, V / rule[degree][group], 0.051, `${V} V: printed figures are rounded numbers`);
        }
      }
    }
  });
  it("never falls when voltage, pollution or group get worse", () => {
    let before = 0;
    for (let V = 10; V <= 63000; V *= 1.07) {
      const now = value(creepage(volt(V), 2, "IIIa"))!;
      expect(now).toBeGreaterThanOrEqual(before);
      expect(now).toBeGreaterThanOrEqual(value(creepage(volt(V), 2, "I"))!);
      expect(now).toBeGreaterThanOrEqual(value(creepage(volt(V), 1, "IIIa"))!);
      before = now;
    }
  });
});

describe("clearance, tables F.2 and F.8", () => {
  it("has every cell for a steady or recurring peak", () => {
    const { kV_peak, caseA, caseB } = table("iec60664_clearance_F8") as {
      kV_peak: number[];
      caseA: (number | null)[];
      caseB: number[];
    };
    kV_peak.forEach((kV, i) => {
      const a = steadyClearance(volt(kV * 1000), "A");
      if (caseA[i] === null) expect(a.ok).toBe(false);
      else expectRelative(value(a), caseA[i]! / 1000, 1e-12, printed);
      expectRelative(value(steadyClearance(volt(kV * 1000), "B")), caseB[i]! / 1000, 1e-12, printed);
    });
  });
  it("has every cell for a required impulse withstand", () => {
    const t = table("iec60664_clearance_F2") as {
      kV_peak: number[];
      caseA: Record<string, number[]>;
      caseB: Record<string, number[]>;
    };
    for (const degree of [1, 2, 3] as const) {
      t.kV_peak.forEach((kV, i) => {
        expectRelative(
          value(impulseClearance(volt(kV * 1000), "A", degree)),
          t.caseA[`pd${degree}`]![i]! / 1000,
          1e-12,
          printed,
        );
        expectRelative(
          value(impulseClearance(volt(kV * 1000), "B", degree)),
          t.caseB[`pd${degree}`]![i]! / 1000,
          1e-12,
          printed,
        );
      });
    }
  });
  it("steps up between rows and refuses beyond", () => {
    expectRelative(value(steadyClearance(volt(9000), "A")), 0.0152, 1e-12, "the row of 10 kV");
    expect(steadyClearance(volt(50001), "A").ok).toBe(false);
    expect(steadyClearance(volt(100001), "B").ok).toBe(false);
    expect(impulseClearance(volt(100001), "A", 2).ok).toBe(false);
  });
});

describe("altitude factor, table A.2", () => {
  it("has every row, is 1 to 2000 m, interpolates, and refuses above 20 000 m", () => {
    const { altitude_m, factor } = table("iec60664_altitude_A2") as { altitude_m: number[]; factor: number[] };
    for (const [i, h] of altitude_m.entries()) {
      expectRelative(value(altitudeFactor(metre(h))), factor[i]!, 1e-12, "as printed");
    }
    expect(value(altitudeFactor(metre(-50)))).toBe(1);
    expectRelative(value(altitudeFactor(metre(3500))), 1.215, 1e-12, "half way between 1.14 and 1.29");
    expect(altitudeFactor(metre(30000)).ok).toBe(false);
  });
});
