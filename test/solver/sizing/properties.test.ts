import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { sizeFrom } from "../../../src/solver/sizing/sizeFrom.ts";
import { document, family, type Over, trim } from "./inventedBrief.ts";

const hv = (limitingVoltage_V: number, ratedDissipation_W = 1) =>
  family("hv", { limitingVoltage_V, ratedDissipation_W, bodyLength_m: 0.03, least_ohm: 1e6, greatest_ohm: 22e6 });

/** The fewest elements that stand, or null where the window is closed or nothing does. */
function fewest(over: Over, limitingVoltage_V: number): number | null {
  const result = sizeFrom(
    document({ brief: { wantedUncertainty: 0.1 }, ...over }, [hv(limitingVoltage_V), trim]),
    [],
    1,
  );
  if (!result.ok) throw new Error(result.error.why);
  return result.value.candidates[0]?.elementCount ?? null;
}
const at = (nominal_V: number): Over => ({
  waveform: { nominal_V, greatest_Vpeak: null },
  policy: { leastCurrent_A: 1e-9 },
});

describe("count of elements", () => {
  it("never falls when the voltage rises", () => {
    fc.assert(
      fc.property(fc.integer({ min: 2000, max: 60e3 }), fc.integer({ min: 1, max: 20e3 }), (V, more) => {
        const low = fewest(at(V), 1600);
        const high = fewest(at(V + more), 1600);
        if (low !== null && high !== null) expect(high).toBeGreaterThanOrEqual(low);
      }),
      { numRuns: 60 },
    );
  });

  it("never rises when the limiting voltage rises", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 2000, max: 60e3 }),
        fc.integer({ min: 200, max: 3000 }),
        fc.integer({ min: 1, max: 2000 }),
        (V, limit, more) => {
          const weak = fewest(at(V), limit);
          const strong = fewest(at(V), limit + more);
          if (weak !== null) expect(strong).toBeLessThanOrEqual(weak);
        },
      ),
      { numRuns: 60 },
    );
  });

  it("does not know the sign of the voltage", () => {
    fc.assert(
      fc.property(fc.integer({ min: 2000, max: 60e3 }), (V) => {
        const sized = (nominal_V: number) => {
          const result = sizeFrom(document(at(nominal_V), [hv(1600), trim]), [], 5);
          if (!result.ok) throw new Error(result.error.why);
          return { candidates: result.value.candidates, window: result.value.window, lost: result.value.lost };
        };
        expect(sized(-V)).toEqual(sized(V));
      }),
      { numRuns: 20 },
    );
  });
});

describe("bad input is refused with where, why and a cure", () => {
  const refusal = (over: Over, change: (doc: ReturnType<typeof document>) => object = () => ({})) => {
    const doc = document(over, [hv(1600), trim]);
    const result = sizeFrom({ ...doc, ...change(doc) }, [], 3);
    if (result.ok) throw new Error("not refused");
    expect(result.error.cure.length).toBeGreaterThan(10);
    return `${result.error.where}: ${result.error.why}`;
  };

  it("no resistor at all, or none in hand", () => {
    expect(refusal({}, () => ({ parts: [] }))).toMatch(/^\/parts: No resistor to choose from/);
    expect(refusal({ policy: { partsInHandOnly: true } })).toMatch(
      /partsInHandOnly: No resistor to choose from.*none is in hand/,
    );
  });

  it("no voltage, no instrument, no input resistance, derating above 1, scale factor of 1", () => {
    expect(refusal({ waveform: { nominal_V: 0 } })).toMatch(/nominal_V/);
    expect(refusal({}, () => ({ principal: "other" }))).toMatch(/principal/);
    expect(refusal({}, (doc) => ({ instruments: [{ ...doc.instruments[0], resistance_ohm: 0 }] }))).toMatch(/positive/);
    expect(refusal({ policy: { voltageDerating: 60 } })).toMatch(/voltageDerating/);
    expect(refusal({ policy: { powerDerating: 0 } })).toMatch(/powerDerating/);
    expect(refusal({ brief: { scaleFactor: 1 } })).toMatch(/scaleFactor/);
  });
});
