import { describe, it } from "vitest";
import type { LadderNetwork } from "../../../src/solver/network/ladderNetwork.ts";
import { ringingPoles } from "../../../src/solver/network/ringing.ts";
import { responseTime } from "../../../src/solver/network/stepFigures.ts";
import { timeResponse } from "../../../src/solver/network/timeResponse.ts";
import { expectRelative } from "../../support/relative.ts";
import { sketch } from "./invented.ts";

/** One element of 100 MΩ and 20 pF over an LV arm that matches it: the input is 100.1 MΩ beside 19.98 pF. */
const [R1, C1, F] = [1e8, 20e-12, 1000];
const divider = sketch({ n: 1, R: R1, C: C1, R2: R1 / (F - 1), C2: C1 * (F - 1) });
const input_F = (C1 * (C1 * (F - 1))) / (C1 * F);
const with_ = (source: Partial<LadderNetwork["source"]>): LadderNetwork => ({
  ...divider,
  source: { ...divider.source, ...source },
});

describe("a source with a capacitance across its terminals", () => {
  it("shares its charge with the divider at the edge, and sags by its resistance in the end", () => {
    const network = with_({ resistance_ohm: 1e6, atTerminals_F: 1e-9 });
    const g = timeResponse(network, "source")!;
    const Rin = R1 * (F / (F - 1));
    const sagged = 1 + 1e6 / Rin;
    expectRelative(g.initial, (1e-9 / (1e-9 + input_F)) * sagged, 1e-9, "charge sharing over the dc share");
    expectRelative(g.at(1), 1, 1e-9, "normalised by dc");
    // Two resistances and two capacitances beside each other: one time constant.
    const tau = ((1e6 * Rin) / (1e6 + Rin)) * (1e-9 + input_F);
    expectRelative(g.at(tau) - 1, (g.initial - 1) * Math.exp(-1), 1e-7, "one exponential");
    expectRelative(responseTime(network, "source"), -(g.initial - 1) * tau, 1e-7, "its area");
  });
  it("leaves the lead to ring with the divider's input, not with the source's capacitance", () => {
    const lead = { resistance_ohm: 1e6, inductance_H: 1e-6, damping_ohm: 10 };
    const [pole] = ringingPoles(with_({ ...lead, atTerminals_F: 1e-7 }), "source");
    const across = (1e-7 * input_F) / (1e-7 + input_F);
    const omega = Math.sqrt(1 / (1e-6 * across) - (10 / 2e-6) ** 2);
    expectRelative(pole?.im, omega, 1e-7, "series resonance with loss; the resistances are large");
    expectRelative(pole?.re, -10 / 2e-6, 1e-3, "R/2L and what the source's resistance leaks");
  });
});
