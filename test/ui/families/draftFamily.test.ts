import { describe, expect, it } from "vitest";
import {
  draftedPart,
  draftFields,
  emptyDraft,
  freeId,
  readField,
  readInHand,
} from "../../../src/ui/families/draftFamily.ts";
import { inventedResistor } from "../../support/inventedDocument.ts";

const field = (key: string) => draftFields.resistor.find((f) => f.key === key)!;
const value = (key: string, text: string) => {
  const reading = readField(field(key), text);
  return reading?.ok ? reading.value : reading?.why;
};
const typed = {
  least_ohm: "100k",
  greatest_ohm: "10M",
  tolerance: "1",
  ratedDissipation_W: "600m",
  limitingVoltage_V: "350",
  bodyLength_m: "6.5",
  bodyDiameter_m: "2.5",
};
const draft = { ...emptyDraft("resistor"), name: "metal film", texts: typed };

describe("a field of the form", () => {
  it("takes a bare number in the unit shown beside it, and a written unit as written", () => {
    expect(value("bodyLength_m", "6.5")).toBe(0.0065);
    expect(value("bodyLength_m", "2 m")).toBe(2);
    expect(value("tolerance", "0.1")).toBe(0.001);
    expect(value("temperatureCoefficient_per_K", "50")).toBe(5e-5);
    expect(value("voltageCoefficient_per_V", "-2")).toBe(-2e-6);
    expect(value("limitingVoltage_V", "3.5k")).toBe(3500);
  });

  it("refuses what it does not understand in whole, and a negative rating", () => {
    expect(readField(field("least_ohm"), "10 bananas")?.ok).toBe(false);
    expect(readField(field("ratedDissipation_W"), "-1")?.ok).toBe(false);
  });
});

describe("a family typed in", () => {
  it("becomes a part with every rating; what was left blank is named as assumed", () => {
    const { part, faults, assumed } = draftedPart(draft, "own-resistor-1");
    expect(faults).toEqual({});
    expect(part).toMatchObject({
      id: "own-resistor-1",
      kind: "resistor",
      origin: "typed",
      greatest_ohm: 10e6,
      tolerance: 0.01,
    });
    expect(assumed).toContain("temperatureCoefficient_per_K");
    for (const key of Object.keys(inventedResistor)) expect(part).toHaveProperty(key);
  });

  it("is no part without its limiting voltage: nothing is sized on a guess", () => {
    const { part, faults } = draftedPart({ ...draft, texts: { ...typed, limitingVoltage_V: "" } }, "x");
    expect(part).toBeNull();
    expect(faults).toHaveProperty("limitingVoltage_V");
  });

  it("is no part with its ends swapped", () => {
    expect(draftedPart({ ...draft, texts: { ...typed, least_ohm: "20M" } }, "x").faults).toHaveProperty("greatest_ohm");
  });

  it("gets an id that is free", () => {
    expect(freeId([{ ...inventedResistor, id: "own-resistor-1" }], "resistor")).toBe("own-resistor-2");
  });
});

describe("parts in hand", () => {
  it("are read as counts and values", () => {
    expect(readInHand("20 x 10M, 12 × 4M7", "ohm")).toEqual({
      ok: true,
      list: [
        { count: 20, value: 10e6 },
        { count: 12, value: 4.7e6 },
      ],
    });
  });

  it("without a count are refused with what to write", () => {
    expect(readInHand("10M", "ohm")).toMatchObject({ ok: false, why: expect.stringContaining("20 x 10M") });
  });
});
