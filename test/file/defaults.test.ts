import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { contentBand_Hz } from "../../src/file/contentBand.ts";
import { assumedPointers, startDocument } from "../../src/file/defaults.ts";
import { encodeDocument } from "../../src/file/encode.ts";
import { valueAt } from "../../src/file/pointer.ts";
import { restoreDocument } from "../../src/file/restore.ts";
import { scaleFactorFor } from "../../src/file/scaleFactorFor.ts";
import type { StatedAs, WaveformKind } from "../../src/solver/index.ts";
import { expectRelative } from "../support/relative.ts";
import { inventedMeter, inventedStart } from "./invented.ts";

describe("a new document", () => {
  it("has no design, the three answers as typed and every other figure of the brief assumed", () => {
    const document = inventedStart();
    expect(document.design).toBeNull();
    const assumed = assumedPointers(document);
    for (const typed of ["waveform/nominal_V", "waveform/kind", "waveform/statedAs", "wantedUncertainty"]) {
      expect(assumed).not.toContain(`/brief/${typed}`);
    }
    expect(assumed).toEqual(
      expect.arrayContaining(["/brief/scaleFactor", "/brief/waveform/greatest_Vpeak", "/brief/source/capacitance_F"]),
    );
    for (const pointer of assumed) expect(valueAt(document, pointer)).not.toBeUndefined();
    expect(document.origins["/instruments/0/resistance_ohm"]).toBe("catalogue");
    expect(assumed.some((pointer) => pointer.startsWith("/instruments"))).toBe(false);
  });

  it("leaves the greatest peak to the rule of the waveform, and takes what was given", () => {
    const document = startDocument({
      nominal_V: 230,
      kind: "sine",
      statedAs: "rms",
      instrument: inventedMeter,
      wantedUncertainty: 0.01,
      frequency_Hz: 60,
      scaleFactor: 50,
    });
    expect(document.brief.waveform).toMatchObject({ greatest_Vpeak: null, frequency_Hz: 60, riseTime_s: null });
    expect(document.brief.band_Hz).toEqual([60, 60]);
    expect(document.brief.scaleFactor).toBe(50);
    expect(assumedPointers(document)).not.toContain("/brief/scaleFactor");
  });

  it("opens again as it was saved, for every kind of voltage", () => {
    const kinds = fc.constantFrom<WaveformKind>("dc", "sine", "pulse", "square", "recorded");
    const stated = fc.constantFrom<StatedAs>("dc", "rms", "peak");
    const volts = fc.double({ min: -1e7, max: 1e7, noNaN: true });
    fc.assert(
      fc.property(kinds, stated, volts, (kind, statedAs, nominal_V) => {
        const document = startDocument({
          kind,
          statedAs,
          nominal_V,
          instrument: inventedMeter,
          wantedUncertainty: 0.03,
        });
        const restored = restoreDocument(encodeDocument(document));
        expect(restored).toEqual({ kind: "document", document, repairs: [], filled: [], readOnly: false });
      }),
    );
  });

  it("does not start from a number that is none", () => {
    const start = {
      kind: "dc",
      statedAs: "dc",
      nominal_V: Number.NaN,
      instrument: inventedMeter,
      wantedUncertainty: 0.03,
    } as const;
    expect(() => startDocument(start)).toThrow(RangeError);
  });
});

describe("the default scale factor", () => {
  const { waveform } = inventedStart().brief;

  it("takes a decade where one fits and 1-2-5 where none does", () => {
    expect(scaleFactorFor(waveform, inventedMeter)).toBe(1000);
    expect(scaleFactorFor({ ...waveform, nominal_V: 60_000 }, inventedMeter)).toBe(10_000);
    expect(scaleFactorFor({ ...waveform, nominal_V: 30_000 }, inventedMeter)).toBe(2000);
    expect(scaleFactorFor({ ...waveform, nominal_V: -6000 }, inventedMeter)).toBe(1000);
  });

  it("reads at 20 to 80 % of the range and stays at a third of the limit, the limit first", () => {
    const volts = fc.double({ min: 1000, max: 1e6, noNaN: true });
    const range = fc.constantFrom(2, 20, 200, 1000);
    fc.assert(
      fc.property(volts, range, fc.constantFrom(30, 300, 1000), (nominal_V, range_V, greatestInput_Vpeak) => {
        const scaleFactor = scaleFactorFor(
          { ...waveform, nominal_V },
          { ...inventedMeter, range_V, greatestInput_Vpeak },
        );
        expect((1.2 * nominal_V) / scaleFactor).toBeLessThanOrEqual((greatestInput_Vpeak / 3) * (1 + 1e-9));
        const share = nominal_V / scaleFactor / range_V;
        expect(share).toBeLessThanOrEqual(0.8 * (1 + 1e-9));
        const byLimit = (3 * 1.2 * nominal_V) / greatestInput_Vpeak > nominal_V / (0.8 * range_V);
        if (!byLimit) expect(share).toBeGreaterThanOrEqual(0.2);
      }),
    );
  });
});

it("takes the band from edge and width: 0.35 / rise time, 1/(2π·10·width)", () => {
  const [low, high] = contentBand_Hz({ kind: "pulse", riseTime_s: 1e-7, width_s: 1e-5 });
  expectRelative(low, 1600, 1e-12, "worked by hand: 1/(2π·10·10 µs) = 1591.5, to two figures");
  expectRelative(high, 3.5e6, 1e-12, "worked by hand: 0.35/100 ns");
});
