import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { ResistorFamily } from "../../../src/solver/job/part.ts";
import type { Build } from "../../../src/solver/sizing/line.ts";
import { poolOf } from "../../../src/solver/sizing/pool.ts";
import { search } from "../../../src/solver/sizing/search.ts";
import { everyBuild, frontOf } from "./bruteForce.ts";
import { document, family } from "./inventedBrief.ts";

const one = <T>(...values: T[]) => fc.constantFrom(...values);
const families = fc.array(
  fc.record({
    tolerance: one(0.01, 0.02, 0.05),
    limitingVoltage_V: one(350, 800, 1600, 3500, 7500),
    ratedDissipation_W: one(0.05, 0.25, 1),
    bodyLength_m: one(0.006, 0.012, 0.03, 0.09),
    leadSpace_m: one(0.002, 0.01),
    greatest_ohm: one(10e6, 47e6, 220e6),
    voltageCoefficient_per_V: one(0, -1e-6, -5e-6),
    temperatureCoefficient_per_K: one(0, 50e-6, 200e-6),
  }),
  { minLength: 1, maxLength: 4 },
);
const brief = fc.record({
  families,
  kind: one("dc" as const, "sine" as const),
  nominal_V: fc.integer({ min: 800, max: 30e3 }),
  frequency_Hz: one(50, 400, 3000),
  source_ohm: one(0, 220e3, 5e6),
  wantedUncertainty: one(0.01, 0.03, 0.1),
  greatestLength_m: one(null, 0.3, 1),
  altitude_m: one(0, 3000),
  pollutionDegree: one(1 as const, 2 as const, 3 as const),
});

const asDocument = (x: typeof brief extends fc.Arbitrary<infer T> ? T : never) => {
  const parts: ResistorFamily[] = x.families.map((over, i) =>
    family(`f${i}`, { ...over, series: "E3", least_ohm: over.greatest_ohm / 5 }),
  );
  const sine = x.kind === "sine";
  const given = document(
    {
      brief: { wantedUncertainty: x.wantedUncertainty },
      waveform: {
        kind: x.kind,
        statedAs: sine ? "rms" : "dc",
        nominal_V: x.nominal_V,
        greatest_Vpeak: null,
        frequency_Hz: sine ? x.frequency_Hz : null,
      },
      source: { resistance_ohm: x.source_ohm },
      surroundings: { altitude_m: x.altitude_m, pollutionDegree: x.pollutionDegree },
      policy: { greatestLength_m: x.greatestLength_m, leastCurrent_A: x.nominal_V / 150e6, compensation: "whenNeeded" },
    },
    parts,
  );
  const peak = sine ? x.nominal_V * Math.SQRT2 : x.nominal_V;
  const greatest = peak * (sine ? 1.1 : 1.2);
  const rms = sine ? Math.SQRT1_2 : 1;
  return { given, parts, V: { peak, greatest, greatestRms: greatest * rms, creepage: peak * rms } };
};

const key = (each: Build) => `${each.kind.family.id} ${each.elements} ${each.strings}`;
const searched = (given: ReturnType<typeof document>, top: number) => {
  const result = search(given, poolOf(given, []), top);
  if (!result.ok) throw new Error(result.error.why);
  return result.value;
};

describe("search against every combination tried one by one", () => {
  it("lists exactly what nothing else betters, and no better one exists", () => {
    let compared = 0;
    fc.assert(
      fc.property(brief, (x) => {
        const { given, parts, V } = asDocument(x);
        const { limits, picked } = searched(given, 1e6);
        const all = everyBuild(given, parts, [limits.least_ohm, limits.greatest_ohm], V);
        if (all.length > 5000) return;
        const expected = [...new Set(frontOf(all).map((each) => each.key))].sort();
        expect(picked.builds.map(key).sort()).toEqual(expected);
        compared += expected.length;
      }),
      { numRuns: 250, seed: 20, endOnFailure: true },
    );
    expect(compared).toBeGreaterThan(300);
  });

  it("a short list holds the first of the order and each family's best; every other family is accounted for", () => {
    fc.assert(
      fc.property(brief, (x) => {
        const { given } = asDocument(x);
        const all = searched(given, 1e6).picked.builds.map(key);
        const { picked } = searched(given, 4);
        const few = picked.builds.map(key);
        expect(few.length).toBe(Math.min(4, all.length));
        expect(few[0]).toBe(all[0]);
        const places = few.map((each) => all.indexOf(each));
        expect(places).toEqual([...places].sort((a, b) => a - b));
        expect(places).not.toContain(-1);
        for (const [id, { best, dominator }] of picked.behind) {
          expect(all.some((each) => each.startsWith(`${id} `))).toBe(dominator === null);
          if (dominator === null) expect(all).toContain(key(best));
        }
      }),
      { numRuns: 60, seed: 4 },
    );
  });
});
