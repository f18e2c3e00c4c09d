import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { CapacitorFamily, ResistorFamily } from "../../../src/solver/job/part.ts";
import { catalogue, catalogued } from "../../../src/solver/parts/catalogue.ts";
import { familyFaults, sizingRefusal, validateFamily } from "../../../src/solver/parts/validateFamily.ts";

const film = catalogued("resistors", "film-06") as ResistorFamily;
const c0g = catalogued("capacitors", "c0g-1k") as CapacitorFamily;
const where = (candidate: unknown) => familyFaults(candidate).map((each) => each.where);

describe("a family", () => {
  it("of the catalogue passes as it stands", () => {
    for (const each of [...catalogue.resistors, ...catalogue.capacitors]) {
      expect(validateFamily(each)).toEqual({ ok: true, value: each });
      expect(sizingRefusal(each)).toBeNull();
    }
  });
  it("without its limiting voltage may be kept, and is not sized with", () => {
    const kept = { ...film, limitingVoltage_V: null };
    expect(validateFamily(kept).ok).toBe(true);
    expect(sizingRefusal(kept)?.why).toBe("Cannot size on it: the limiting element voltage is not stated.");
    expect(sizingRefusal({ ...c0g, ratedVoltage_V: 0 })?.where).toBe("ratedVoltage_V");
    expect(where({ ...film, limitingVoltage_V: undefined })).toEqual(["limitingVoltage_V"]);
    expect(where({ ...film, limitingVoltage_V: 0 })).toEqual(["limitingVoltage_V"]);
  });
  it.each([
    ["tolerance", 5, "1 % is 0.01."],
    ["tolerance", 0, "1 % is 0.01."],
    ["bodyLength_m", 6.5, "6.5 mm is 0.0065."],
    ["ratedDissipation_W", -1, "watts"],
    ["temperatureCoefficient_per_K", 50, "50 ppm is 0.00005."],
    ["voltageCoefficient_per_V", -2, "50 ppm is 0.00005."],
    ["zeroDissipation_degC", 900, "125 to 225"],
    ["selfCapacitance_F", 0.3, "3e-13"],
    ["least_ohm", Number.NaN, "ohms"],
    ["greatest_ohm", "10M", "ohms"],
  ])("with %s of %s is refused there, with what may have been meant", (key, value, cure) => {
    const result = validateFamily({ ...film, [key]: value });
    if (result.ok) throw new Error("it passed");
    expect(result.error.where).toBe(key);
    expect(result.error.cure).toContain(cure);
    expect(result.error.why).toMatch(/\.$/);
  });
  it("with two keys exchanged is refused", () => {
    expect(where({ ...film, least_ohm: 1e7, greatest_ohm: 10 })).toEqual(["greatest_ohm"]);
    expect(where({ ...film, deratingFrom_degC: 155 })).toEqual(["zeroDissipation_degC"]);
    expect(where({ ...c0g, least_F: 1e-7 })).toEqual(["greatest_F"]);
  });
  it("names all that is wrong, not the first alone", () => {
    expect(
      where({ ...film, name: " ", use: "x", series: "E7", tolerance: 7, inHand: [{ value: 0, count: 1 }] }),
    ).toEqual(["name", "use", "series", "tolerance", "inHand"]);
    expect(where({ ...film, seriesAbove: { from_ohm: -1, series: "E12" } })).toEqual(["seriesAbove"]);
    expect(where({ ...film, seriesAbove: { from_ohm: 1e6, series: "toString" } })).toEqual(["seriesAbove"]);
    expect(where({ ...c0g, dielectricClass: undefined, dielectric: "" })).toEqual(["dielectric", "dielectricClass"]);
    expect(where({ ...film, inHand: [{ value: 1e6, count: 1.5 }] })).toEqual(["inHand"]);
  });
  it("may be anything at all: it is judged, nothing is thrown", () => {
    const odd = fc.oneof(fc.double(), fc.jsonValue({ maxDepth: 2 }), fc.constant(undefined));
    const keys = fc.constantFrom(...Object.keys(film), ...Object.keys(c0g));
    fc.assert(
      fc.property(fc.constantFrom<object>(film, c0g), keys, odd, (family, key, value) => {
        const candidate = { ...family, [key]: value };
        const result = validateFamily(candidate);
        if (result.ok) expect(result.value).toBe(candidate);
        else for (const text of Object.values(result.error)) expect(text).not.toBe("");
      }),
    );
    for (const nothing of [null, undefined, 3, "x", [], {}]) expect(validateFamily(nothing).ok).toBe(false);
  });
});
