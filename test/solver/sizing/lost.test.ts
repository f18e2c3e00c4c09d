import { describe, expect, it } from "vitest";
import type { ResistorFamily } from "../../../src/solver/job/part.ts";
import type { LostFamily } from "../../../src/solver/sizing/outcome.ts";
import { sizeFrom } from "../../../src/solver/sizing/sizeFrom.ts";
import { expectRelative } from "../../support/relative.ts";
import { document, family, type Over, trim } from "./inventedBrief.ts";

const good = family("good", { bodyLength_m: 0.03, greatest_ohm: 68e6, tolerance: 0.01 });
function lostOf(over: Over, odd: ResistorFamily, top = 3): LostFamily {
  const result = sizeFrom(
    document({ ...over, policy: { leastCurrent_A: 1e-5, ...over.policy } }, [good, odd, trim]),
    [],
    top,
  );
  if (!result.ok) throw new Error(result.error.why);
  const lost = result.value.lost.find((each) => each.family === odd.id);
  if (lost === undefined) throw new Error(`${odd.id} was not lost`);
  return lost;
}
const odd = (over: Partial<ResistorFamily>) => family("odd", { bodyLength_m: 0.03, ...over });

describe("every family that lost says why, with its number", () => {
  it("never for a string: damping, wirewound, no limiting voltage", () => {
    expect(lostOf({}, odd({ use: "damping" })).reason).toMatch(/damping/);
    expect(lostOf({}, odd({ name: "wirewound, 5 W" })).reason).toMatch(/inductance/);
    expect(lostOf({}, odd({ limitingVoltage_V: null })).reason).toMatch(/limiting element voltage/);
  });

  it("more than 5000 in series", () => {
    const lost = lostOf({}, odd({ limitingVoltage_V: 4 }));
    expect(lost).toMatchObject({ actual: Math.ceil((15e3 * 0.999) / 2.4), limit: 5000, unit: "1" });
  });

  it("values too small for the window, or too large", () => {
    const low = lostOf(
      { policy: { greatestDissipation_W: 0.2, leastCurrent_A: 1e-6 } },
      odd({ least_ohm: 1, greatest_ohm: 1000 }),
    );
    expectRelative(low.actual, 5000 * 1000, 1e-12, "5000 of the largest value");
    expectRelative(low.limit, 15e3 ** 2 / 0.2, 1e-12, "V²/P");
    const high = lostOf(
      { policy: { leastCurrent_A: 15e3 / 1.2e9 } },
      odd({ least_ohm: 1e9, greatest_ohm: 1e9, limitingVoltage_V: 6000, bodyLength_m: 0.05 }),
    );
    expectRelative(high.actual, 5e9 / 4, 1e-12, "five in series by voltage, four strings");
    expectRelative(high.limit, 1.2e9, 1e-12, "V/I");
  });

  it("too long, too hot", () => {
    const long = lostOf({ policy: { greatestLength_m: 0.4 } }, odd({ bodyLength_m: 0.2 }));
    expect(long.reason).toMatch(/column of .* longest accepted/);
    expectRelative(long.actual, 8 * 0.204, 1e-12, "eight by voltage, body and lead space each");
    const hot = lostOf({ waveform: { kind: "dc" } }, odd({ ratedDissipation_W: 1e-9 }));
    expect(hot.unit).toBe("W");
    expect(hot.actual).toBeGreaterThan(hot.limit as number);
  });

  it("nothing left at the ambient temperature", () => {
    const lost = lostOf(
      { surroundings: { ambient_degC: 120 } },
      odd({ zeroDissipation_degC: 110, deratingFrom_degC: 40 }),
    );
    expect(lost).toMatchObject({ actual: 125, limit: 110, unit: "degC" });
  });

  it("too few in hand", () => {
    const hand = { inHand: [{ value: 47e6, count: 3 }] };
    const result = sizeFrom(
      document({ policy: { partsInHandOnly: true, leastCurrent_A: 1e-5 } }, [
        family("few", { bodyLength_m: 0.03, ...hand }),
        trim,
      ]),
      [],
      3,
    );
    if (!result.ok) throw new Error(result.error.why);
    expect(result.value.candidates).toEqual([]);
    expect(result.value.lost[0]).toMatchObject({ actual: 8, limit: 3 });
  });

  it("no better in anything than another, which is named with the differences", () => {
    const worse = lostOf({}, odd({ tolerance: 0.02, limitingVoltage_V: 2000, leadSpace_m: 0.01 }));
    expect(worse.reason).toMatch(/no better in anything than .* of good: .*uncertainty .* against/);
    expect(worse.actual).toBeGreaterThanOrEqual(worse.limit as number);
  });

  it("stands, but behind the number listed", () => {
    expect(lostOf({}, odd({ limitingVoltage_V: 350, bodyLength_m: 0.006, leadSpace_m: 0.001 }), 1).reason).toMatch(
      /stands, behind the 1 listed/,
    );
  });
});

describe("parts in hand only", () => {
  it("uses no more than there are, of no other value, and says where the LV arm is to be bought", () => {
    const hand = family("hand", {
      bodyLength_m: 0.03,
      inHand: [
        { value: 33e6, count: 20 },
        { value: 10e6, count: 9 },
      ],
    });
    const lv = family("lv", { bodyLength_m: 0.002, limitingVoltage_V: 350, greatest_ohm: 10e6 });
    const result = sizeFrom(
      document({ policy: { partsInHandOnly: true, leastCurrent_A: 1e-6 } }, [hand, lv, trim]),
      [],
      50,
    );
    if (!result.ok) throw new Error(result.error.why);
    expect(result.value.candidates.length).toBeGreaterThan(3);
    for (const each of result.value.candidates) {
      expect(each.family).toBe("hand");
      expect(each.elementCount).toBeLessThanOrEqual(each.resistance_ohm === 33e6 ? 20 : 9);
      expect([33e6, 10e6]).toContain(each.resistance_ohm);
      expect(each.findings.map((finding) => finding.id)).toContain("lvArm.notInHand");
    }
  });
});
