import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { edited } from "../../../src/solver/sizing/edits.ts";
import type { Bound, Sizing } from "../../../src/solver/sizing/outcome.ts";
import { sizeFrom } from "../../../src/solver/sizing/sizeFrom.ts";
import { expectRelative } from "../../support/relative.ts";
import { document, family, lvResistor, meter, type Over, trim } from "./inventedBrief.ts";

const parts = [family("hv", {}), lvResistor, trim];
function sized(
  over: Over,
  change: (doc: ReturnType<typeof document>) => ReturnType<typeof document> = (doc) => doc,
): Sizing {
  const result = sizeFrom(change(document(over, parts)), [], 1);
  if (!result.ok) throw new Error(result.error.why);
  return result.value;
}
const boundOf = (sizing: Sizing, id: Bound["id"]) => sizing.window.bounds.find((each) => each.id === id) as Bound;
const exact = "the bound's own formula, by hand";

describe("bounds of the resistance window", () => {
  const sizing = sized({
    brief: { wantedUncertainty: 0.01 },
    waveform: { nominal_V: 30e3, greatest_Vpeak: 36e3 },
    source: { resistance_ohm: 80e6, currentLimit_A: 1e-3 },
    policy: { greatestDissipation_W: 2, leastCurrent_A: 5e-7, allowedSag: 0.02 },
  });

  it("each has its number", () => {
    const bounds = Object.fromEntries(sizing.window.bounds.map((each) => [each.id, each.resistance_ohm]));
    expectRelative(bounds.sourceSag, 80e6 * 49, 1e-12, exact);
    expectRelative(bounds.dissipation, 36e3 ** 2 / 2, 1e-12, exact);
    expectRelative(bounds.currentLimit, 30e3 / 0.2e-3, 1e-12, exact);
    expectRelative(bounds.leakage, 0.002 * 1e12, 1e-12, exact);
    expectRelative(bounds.leastCurrent, 30e3 / 5e-7, 1e-12, exact);
    expectRelative(bounds.existence, 999 * 10e6, 1e-12, exact);
    expectRelative(bounds.instrumentShare, (999 * 10e6 * 0.01) / 0.02, 1e-12, exact);
    expect(bounds.band).toBeNull();
    for (const each of sizing.window.bounds) expect(sizing.sheet.values[each.path]).toBe(each.resistance_ohm);
  });

  it("one that does not apply is null and says why", () => {
    const plain = sized({});
    for (const id of ["sourceSag", "dissipation", "currentLimit", "band"] as const) {
      expect(boundOf(plain, id).resistance_ohm).toBeNull();
      expect(boundOf(plain, id).reason.length).toBeGreaterThan(10);
    }
  });

  it("a bare string is bounded by the band, one with capacitors is not", () => {
    const sine = { kind: "sine" as const, statedAs: "rms" as const, frequency_Hz: 50 };
    const bare = sized({ waveform: sine, policy: { compensation: "never" } });
    const x2 =
      (2 *
        Math.PI *
        50 *
        (boundOf(bare, "band").resistance_ohm as number) *
        (bare.sheet.values["window.bandStray_F"] as number)) **
      2;
    expectRelative(x2 / 180, 0.0125, 1e-9, "a fifth of 10 % is past the first-order rule, which ends at x = 1.5");
    expect(boundOf(sized({ waveform: sine }), "band").resistance_ohm).toBeNull();
    const [candidate] = bare.candidates;
    expect(candidate?.hvArmResistance_ohm).toBeLessThan(boundOf(bare, "band").resistance_ohm as number);
  });
});

describe("two bounds that collide", () => {
  const over: Over = {
    brief: { wantedUncertainty: 0.01 },
    waveform: { nominal_V: 30e3, greatest_Vpeak: 36e3 },
    source: { resistance_ohm: 80e6 },
  };

  it("are named, no candidate is shown, every family says so", () => {
    const sizing = sized(over);
    expect(sizing.window.open).toBe(false);
    expect([sizing.window.leastBy, sizing.window.greatestBy]).toEqual(["sourceSag", "leakage"]);
    expect(sizing.window.collision).toMatch(
      /Source sag asks for at least 7.92\sGΩ; leakage across the string allows at most 2.00\sGΩ/,
    );
    expect(sizing.candidates).toEqual([]);
    expect(sizing.lost.map((each) => each.family).sort()).toEqual(["hv", "lv"]);
  });

  it("a scale factor that the meter alone exceeds is told with the figure", () => {
    const sizing = sized({ brief: { scaleFactor: 100 }, source: { resistance_ohm: 111.2e6 } });
    expect(sizing.window.greatestBy).toMatch(/existence|lvArmValue/);
    expect(sizing.window.open).toBe(false);
    expect(sizing.window.cures.map((each) => each.label).join()).toMatch(/scale factor 200/);
  });

  it("every cure opens the window", () => {
    const closed: Over[] = [
      over,
      { brief: { scaleFactor: 100 }, source: { resistance_ohm: 200e6 } },
      { policy: { leastCurrent_A: 1e-3, greatestDissipation_W: 0.1 } },
      { policy: { leakageResistance_ohm: 1e9, greatestDissipation_W: 0.1 } },
      {
        waveform: { kind: "sine", statedAs: "rms", frequency_Hz: 1000 },
        policy: { compensation: "never", greatestDissipation_W: 0.01 },
      },
      {
        brief: { wantedUncertainty: 0.001, scaleFactor: 100 },
        policy: { greatestDissipation_W: 0.5, leakageResistance_ohm: 1e15 },
      },
    ];
    const bounds = new Set<string | null>();
    for (const each of closed) {
      const { window } = sized(each);
      expect(window.open).toBe(false);
      expect(window.cures.length).toBeGreaterThan(0);
      bounds.add(window.greatestBy);
      for (const { edits } of window.cures) expect(sized(each, (doc) => edited(doc, edits)).window.open).toBe(true);
    }
    expect(bounds.size).toBeGreaterThanOrEqual(4);
  });

  it("an input of 50 Ω is told to become 1 MΩ", () => {
    const scope = { ...meter, function: "scope 50 Ω" as const, resistance_ohm: 50 };
    const { window } = sized({ policy: { greatestDissipation_W: 10 } }, (doc) => ({ ...doc, instruments: [scope] }));
    expect(window.open).toBe(false);
    expect(window.cures[0]?.label).toBe("set the input to 1 MΩ");
  });
});

describe("bounds move the way they must", () => {
  const free = { min: 0.001, max: 0.2, noNaN: true };
  it("with wanted uncertainty, source, scale factor and instrument", () => {
    fc.assert(
      fc.property(
        fc.double(free),
        fc.double({ min: 1.01, max: 4, noNaN: true }),
        fc.integer({ min: 1e3, max: 5e7 }),
        (U, more, Rs) => {
          const at = (u: number, rs: number, f: number) =>
            sized({ brief: { wantedUncertainty: Math.min(u, 0.9), scaleFactor: f }, source: { resistance_ohm: rs } });
          const base = at(U, Rs, 1000);
          const R = (sizing: Sizing, id: Bound["id"]) => boundOf(sizing, id).resistance_ohm as number;
          expect(R(at(U * more, Rs, 1000), "sourceSag")).toBeLessThan(R(base, "sourceSag"));
          expect(R(at(U * more, Rs, 1000), "leakage")).toBeGreaterThan(R(base, "leakage"));
          expect(R(at(U, Rs * more, 1000), "sourceSag")).toBeGreaterThan(R(base, "sourceSag"));
          for (const id of ["existence", "instrumentShare", "lvArmValue"] as const)
            expect(R(at(U, Rs, 1000 * more), id)).toBeGreaterThan(R(base, id));
          expect(R(base, "lvArmValue")).toBeLessThan(R(base, "existence"));
        },
      ),
      { numRuns: 30 },
    );
  });
});
