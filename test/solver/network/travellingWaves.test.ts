import { describe, expect, it } from "vitest";
import { scaleFactorOf } from "../../../src/solver/network/dcSolution.ts";
import type { LadderNetwork, Line } from "../../../src/solver/network/ladderNetwork.ts";
import { lineModes } from "../../../src/solver/network/lineModes.ts";
import { LumpedResponse } from "../../../src/solver/network/lumpedResponse.ts";
import { responseTime } from "../../../src/solver/network/stepFigures.ts";
import { timeResponse } from "../../../src/solver/network/timeResponse.ts";
import { expectRelative } from "../../support/relative.ts";
import { sketch } from "./invented.ts";

// Invented: a pulse divider, its cable a line of 5 ns.
const T = 5e-9;
const base = sketch({ n: 8, R: 36e6, C: 160e-12, Ce: 11e-12, Ch: 3e-12, R2: 4e5, C2: 1.7e-8, Rm: 1e6, Cm: 18e-12 });
const withLine = (line: Partial<Line>, more: Partial<LadderNetwork> = {}): LadderNetwork => ({
  ...base,
  cable: {
    capacitance_F: 0,
    line: {
      impedance_ohm: 50,
      delay_s: T,
      seriesAtTap_ohm: 0,
      terminationAtEnd_ohm: Number.POSITIVE_INFINITY,
      ...line,
    },
  },
  ...more,
});
const lead = { resistance_ohm: 5, capacitance_F: 2e-12, inductance_H: 1.2e-6, damping_ohm: 100 };

describe("a line: its waves and its modes are one response", () => {
  it.each<[string, LadderNetwork, number]>([
    ["matched at the tap", withLine({ seriesAtTap_ohm: 50 }), 1e-9],
    ["mismatched at both ends", withLine({ seriesAtTap_ohm: 20, terminationAtEnd_ohm: 300 }), 1e-7],
    ["open, with a capacitance at its end", withLine({}), 1e-6],
    ["behind a lead", withLine({ seriesAtTap_ohm: 50 }, { source: lead }), 1e-9],
    [
      "behind an LV arm with inductance",
      withLine({ seriesAtTap_ohm: 50 }, { lv: { ...base.lv, inductance_H: 1e-8 } }),
      1e-7,
    ],
    ["behind a series protector", withLine({}, { seriesProtector: { resistance_ohm: 1e3, at: "divider" } }), 1e-7],
    [
      "before a series protector",
      withLine({ seriesAtTap_ohm: 50 }, { seriesProtector: { resistance_ohm: 1e3, at: "instrument" } }),
      1e-9,
    ],
  ])("%s", (_, network, tolerance) => {
    const reference = network.source.inductance_H > 0 ? "source" : "electrode";
    const { line } = network.cable;
    const F = scaleFactorOf(network, reference)!;
    const modes = lineModes(network, line!, reference, F, 12);
    const later = new LumpedResponse(network, reference, F, modes.poles, modes.from_s);
    const waves = timeResponse(network, reference)!;
    // Between 12 and 24 delays both hold; away from the arrivals, where modes left out would show.
    for (const x of [12.3, 14.6, 17.5, 20.2, 23.4]) {
      expect(Math.abs(waves.at(x * T) - later.at(x * T))).toBeLessThan(
        tolerance * Math.max(1, Math.abs(waves.at(x * T))),
      );
    }
  });
  it("answers nothing before its delay, and its response time counts the delay", () => {
    const network = withLine({ seriesAtTap_ohm: 50 });
    const g = timeResponse(network)!;
    expect(g.at(0.999 * T)).toBe(0);
    expect(g.at(1.001 * T)).not.toBe(0);
    expectRelative(g.deficit(1), responseTime(network)!, 1e-5, "∫(1 − g) to the end, of a delay", T);
  });
  it("long after its delay it is a capacitance T/Z0 (any line text)", () => {
    const line = timeResponse(withLine({ seriesAtTap_ohm: 50 }))!;
    const lumped = timeResponse({ ...base, cable: { capacitance_F: T / 50, line: null } })!;
    for (const t of [1e-4, 1e-3, 1e-2]) expectRelative(line.at(t), lumped.at(t), 3e-5, "a few nanoseconds in time");
  });
});
