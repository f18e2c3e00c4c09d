/** Input that is wrong, odd or dangerous, through the shell: each ends in a stop, a refusal or a repair that is told. */
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { run } from "../../src/cli/run.ts";

// biome-ignore lint/suspicious/noExplicitAny: a document as anybody may have written it
type Raw = any;
const demo: Raw = JSON.parse(readFileSync(new URL("../../demo/dc-supply-into-meter.json", import.meta.url), "utf8"));
const meter = (raw: Raw) => raw.instruments.find((each: Raw) => each.id === raw.principal);

async function shell(verb: string, text: string) {
  let out = "";
  let said = "";
  const outside = {
    read: () => text,
    print: (each: string) => {
      out += each;
    },
    say: (each: string) => {
      said += `${each}\n`;
    },
  };
  const code = await run([verb, "file"], outside);
  expect(out).not.toMatch(/NaN|Infinity/);
  return { code, out, said };
}
const spoilt = (change: (raw: Raw) => void) => {
  const raw = structuredClone(demo);
  change(raw);
  return JSON.stringify(raw);
};
const found = (out: string, id: string) => JSON.parse(out).findings.find((each: Raw) => each.id === id);

describe("prove exits 1 and names the stop, and so does parts", () => {
  it.each<[string, (raw: Raw) => void, string, RegExp]>([
    ["no voltage", (r) => Object.assign(r.brief.waveform, { nominal_V: 0 }), "voltage.none", /Type the voltage/],
    ["a voltage as text", (r) => Object.assign(r.brief.waveform, { nominal_V: "6k" }), "voltage.none", /Type the volt/],
    [
      "a scale factor below the meter's own",
      (r) => Object.assign(r.brief, { scaleFactor: 100 }),
      "scaleFactor.existence",
      /already divides by/,
    ],
    ["a scope at 50 Ω", (r) => Object.assign(meter(r), { resistance_ohm: 50 }), "instrument.fiftyOhm", /1 MΩ/],
    [
      "a floating source",
      (r) => Object.assign(r.brief.source, { earth: "floating" }),
      "source.earth",
      /two matched dividers/,
    ],
    [
      "a source that gives less than is drawn",
      (r) => Object.assign(r.brief.source, { resistance_ohm: 1e10 }),
      "source.sag",
      /cannot be read\. Raise R1/,
    ],
    [
      "a greatest below the nominal",
      (r) => Object.assign(r.brief.waveform, { greatest_Vpeak: 10 }),
      "voltage.greatest",
      /swapped/,
    ],
    [
      "an altitude outside the table",
      (r) => Object.assign(r.brief.surroundings, { altitude_m: 30000 }),
      "surroundings.altitude",
      /20 000 m/,
    ],
    ["an open LV arm", (r) => Object.assign(r.design.lvArm, { branches: [] }), "lvArm.none", /./],
    [
      "parts without a limiting voltage",
      (r) => {
        for (const part of r.parts) part.limitingVoltage_V = null;
      },
      "element.voltage.notStated",
      /data sheet/,
    ],
  ])("%s", async (_, change, id, reason) => {
    const text = spoilt(change);
    const { code, out } = await shell("prove", text);
    expect(code).toBe(1);
    expect(found(out, id)).toMatchObject({ level: "stop" });
    expect(found(out, id).reason).toMatch(reason);
    const parts = await shell("parts", text);
    expect(parts.code).toBe(1);
    expect(parts.out).toMatch(/HV arm/);
    expect(parts.said).toContain(`stop: ${found(out, id).what}`);
  });
});

describe("what is odd but can be judged is kept, and said", () => {
  it("48 V where kilovolts may be meant", async () => {
    const { code, out } = await shell(
      "prove",
      spoilt((r) => Object.assign(r.brief.waveform, { nominal_V: 48, greatest_Vpeak: null })),
    );
    expect(code).toBe(0);
    expect(found(out, "voltage.low").reason).toMatch(/Did you mean 48\.0\skV\?/);
    expect(JSON.parse(out).working.peak_V).toBe(48);
  });
  it("a negative voltage", async () => {
    const { code, out } = await shell(
      "prove",
      spoilt((r) => Object.assign(r.brief.waveform, { nominal_V: -6000 })),
    );
    expect(code).toBe(0);
    expect(JSON.parse(out).reading.atWorking_V).toBeLessThan(0);
  });
  it("an altitude below the sea", async () => {
    expect(
      (
        await shell(
          "prove",
          spoilt((r) => Object.assign(r.brief.surroundings, { altitude_m: -50 })),
        )
      ).code,
    ).toBe(0);
  });
  it("a wanted uncertainty of 0: not stated, never a claim of perfection", async () => {
    const { code, out } = await shell(
      "prove",
      spoilt((r) => Object.assign(r.brief, { wantedUncertainty: 0 })),
    );
    expect(code).toBe(0);
    expect(found(out, "uncertainty.notStated")).toMatchObject({ level: "caution" });
    expect(JSON.parse(out).job).not.toMatch(/within/);
  });
  it("temperature, humidity and input resistance left out: assumed, and counted", async () => {
    const { out, said } = await shell(
      "prove",
      spoilt((r) => {
        delete r.brief.surroundings.ambient_degC;
        delete r.brief.surroundings.relativeHumidity;
        delete meter(r).resistance_ohm;
      }),
    );
    expect(said).toBe("");
    expect(JSON.parse(out).assumed).toEqual(
      expect.arrayContaining(["/brief/surroundings/ambient_degC", "/brief/surroundings/relativeHumidity"]),
    );
  });
});

describe("what cannot stay is replaced, and standard error says what stood there and why not", () => {
  it.each<[string, (raw: Raw) => void, RegExp]>([
    ["derating of 0", (r) => Object.assign(r.brief.policy, { voltageDerating: 0 }), /voltageDerating: .*0\.6/],
    ["derating of 80", (r) => Object.assign(r.brief.policy, { voltageDerating: 80 }), /80 % is 0\.8/],
    [
      "an input resistance of 0",
      (r) => Object.assign(meter(r), { resistance_ohm: 0 }),
      /instruments\/0\/resistance_ohm: ./,
    ],
    ["a negative input resistance", (r) => Object.assign(meter(r), { resistance_ohm: -1e6 }), /resistance_ohm: ./],
    ["an instrument that is not there", (r) => Object.assign(r, { principal: "nobody" }), /principal: ./],
  ])("%s", async (_, change, message) => {
    const { code, said } = await shell("prove", spoilt(change));
    expect(code).toBe(0);
    expect(said).toMatch(message);
    expect(said).not.toMatch(/undefined|: replaced$/m);
  });
});

describe("what no search can start from is exit 2; what no candidate escapes is exit 1", () => {
  it.each<[string, (raw: Raw) => void, 1 | 2, RegExp]>([
    ["no voltage", (r) => Object.assign(r.brief.waveform, { nominal_V: 0 }), 2, /No voltage is given/],
    [
      "nothing in hand",
      (r) =>
        Object.assign(r, {
          parts: [],
          design: null,
          brief: { ...r.brief, policy: { ...r.brief.policy, partsInHandOnly: true } },
        }),
      2,
      /No resistor to choose from/,
    ],
    ["a scale factor below 1", (r) => Object.assign(r.brief, { scaleFactor: 0.5 }), 2, /above 1/],
    ["a floating source", (r) => Object.assign(r.brief.source, { earth: "floating" }), 1, /source\.earth/],
    [
      "an altitude outside the table",
      (r) => Object.assign(r.brief.surroundings, { altitude_m: 30000 }),
      1,
      /surroundings\.altitude/,
    ],
    ["a scope at 50 Ω", (r) => Object.assign(meter(r), { resistance_ohm: 50 }), 1, /collision/],
    ["100 MV", (r) => Object.assign(r.brief.waveform, { nominal_V: 1e8, greatest_Vpeak: null }), 1, /reason/],
  ])("size of %s", async (_, change, exit, message) => {
    const { code, out, said } = await shell("size", spoilt(change));
    expect(code).toBe(exit);
    expect(exit === 2 ? said : out).toMatch(message);
  });
  it.each<[string, (raw: Raw) => void, RegExp]>([
    [
      "6000 elements",
      (r) =>
        Object.assign(r.design.hvArm, { elements: Array.from({ length: 6000 }, () => r.design.hvArm.elements[0]) }),
      /5000|no design yet/,
    ],
    ["no element", (r) => Object.assign(r.design.hvArm, { elements: [] }), /no element/],
    [
      "a part that is not there",
      (r) => Object.assign(r.design.hvArm.elements[0], { part: "nothing" }),
      /no part "nothing"/,
    ],
    ["another program's file", (r) => Object.assign(r, { format: "other" }), /not "stringwright"/],
  ])("prove of %s is exit 2", async (_, change, message) => {
    const { code, out, said } = await shell("prove", spoilt(change));
    expect(code).toBe(2);
    expect(out).toBe("");
    expect(said).toMatch(message);
  });
});
