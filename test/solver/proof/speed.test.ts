import { describe, expect, it } from "vitest";
import { speed } from "../../../src/solver/proof/speed.ts";
import { bank, fault, figure, finding, fixed, invented, proven, type Sketch } from "../../support/builders.ts";
import { expectRelative } from "../../support/relative.ts";

// Invented scenario, computed independently: R1 = 36 MΩ, 9 pF, F = 1000 with the 1 MΩ of the instrument, C2p 6 % low.
const R2 = 1 / (999 / 36e6 - 1e-6);
const scope = {
  function: "scope 1 MΩ",
  resistance_ohm: 1e6,
  capacitance_F: 0,
  noise_Vrms: 3e-4,
  bandwidth_Hz: 1e8,
  cable: { length_m: 0.5, capacitance_F_per_m: 1e-10, impedance_ohm: 50 },
};
const square = (more: Partial<Sketch> = {}): Sketch => ({
  waveform: { kind: "pulse", nominal_V: 5000, statedAs: "peak", greatest_Vpeak: 5000, riseTime_s: 1e-7, width_s: 1e-4 },
  brief: { band_Hz: [10, 3.5e6] },
  elements: 1,
  resistance_ohm: 36e6,
  capacitance_F: 9e-12,
  family: { limitingVoltage_V: 20000 },
  strays: { from: "typed", toEarth_F: [], toElectrode_F: [] },
  branches: [fixed("R2", R2), bank("C2", 8.45154e-9 - 5e-11)],
  instrument: scope,
  ...more,
});
const answer = (sketch: Sketch) => {
  const found = speed(invented(sketch));
  if (!found.ok) throw new Error(found.error.why);
  return found.value;
};

describe("the slow/fast check of a design", () => {
  const proof = proven(square());
  const { slowFast: check } = answer(square());
  it("chooses its frequencies by the slowest decay: 522.5 Hz", () => {
    expectRelative(figure(proof, "slowFast.pole_Hz"), 522.5, 2e-4, "four digits given");
    expect([check?.slow_Hz, check?.fast_Hz]).toEqual([100, 20000]);
  });
  it("draws the 6 % that are missing too high, flat, and wrong", () => {
    expectRelative(check?.signal_Vpp, 0.02, 1e-6, "20 V over 1000");
    const fast = check!.rows.find((row) => row.of === "fast")!;
    const delta = 1 / (0.94 * (999 / 1000) + 1 / 1000) - 1;
    expectRelative(
      fast.onScreen_Vpp[0]! / 0.02 - 1,
      delta,
      0.02,
      "δ = 6.376 % less a half period's decay of 8 %",
      delta * 4,
    );
    const slow = check!.rows.find((row) => row.of === "slow")!;
    expectRelative(slow.end_V[0], 0.02, 1e-6, "settled");
  });
  it("has nothing left of it at the match, and turns its sign beyond", () => {
    const fast = check!.rows.find((row) => row.of === "fast")!;
    const [designed, good, under, over] = fast.onScreen_Vpp.map((v) => v / 0.02 - 1);
    expect(designed).toBeGreaterThan(under!);
    expect(Math.abs(good!)).toBeLessThan(1e-4);
    expectRelative(under, 1 / 0.95 - 1, 0.1, "a twentieth too small, first order");
    expectRelative(over, 1 / 1.05 - 1, 0.1, "a twentieth too large, first order");
  });
  it("draws the instrument's noise, the same each time", () => {
    const again = answer(square()).slowFast!;
    expect(again.pictures).toEqual(check!.pictures);
    const rms = check!.pictures.map(({ value_V, noisy_V }) =>
      Math.sqrt(value_V.reduce((sum, v, i) => sum + (noisy_V[i]! - v) ** 2, 0) / value_V.length),
    );
    for (const each of rms) expectRelative(each, 3e-4, 0.12, "480 draws: 3.2 % standard deviation");
  });
  it("says when the signal does not stand clear of the noise", () => {
    expect(finding(proof, "slowFast.signal")?.level).toBe("clear");
    const loud = proven(square({ instrument: { ...scope, noise_Vrms: 1e-3 } }));
    expect(finding(loud, "slowFast.signal")).toMatchObject({ level: "caution", actual: expect.any(Number) });
    expectRelative(finding(loud, "slowFast.signal")?.limit, 0.03, 1e-9, "five divisions of six times 1 mV");
    expect(finding(loud, "slowFast.signal")?.reason).toContain("3 sweeps");
  });
  it("is not there without an LV capacitance", () => {
    expect(answer(square({ branches: [fixed("R2", R2)] })).slowFast).toBeNull();
  });
});

describe("rings", () => {
  it("of a lead and the input: by formula, and the network's own beside it", () => {
    const { rings } = answer(square({ lead: { inductance_H: 1e-6, damping_ohm: 0 } }));
    const C = 9e-12;
    const lead = rings.find((each) => each.id === "lead")!;
    expectRelative(
      lead.frequency_Hz,
      1 / (2 * Math.PI * Math.sqrt(1e-6 * C)),
      2e-3,
      "the LV arm in series is a thousand times larger",
    );
    const own = rings.find((each) => each.id === "network.1")!;
    expectRelative(own.frequency_Hz, lead.frequency_Hz, 1e-2, "source of 1 nF in series with 9 pF");
    expect(own.damping).toBeLessThan(0.01);
  });
  it("are damped by what the formula says", () => {
    const least = Math.sqrt(1e-6 / 9e-12);
    const at = (damping_ohm: number) =>
      answer(square({ lead: { inductance_H: 1e-6, damping_ohm } })).rings.find((each) => each.id === "network.1");
    const told = answer(square({ lead: { inductance_H: 1e-6, damping_ohm: least } })).rings;
    expectRelative(told.find((each) => each.id === "lead")?.damping, 0.5, 2e-3, "R / 2√(L/C)");
    expectRelative(at(least)?.damping, 0.5, 1e-2, "half of critical damping");
    expect(at(2.1 * least)).toBeUndefined();
    expectRelative(
      figure(proven(square({ lead: { inductance_H: 1e-6 } })), "lead.dampingLeast_ohm"),
      least,
      2e-3,
      "√(L/C)",
    );
  });
  it("of the cable: a quarter wave, 100 MHz for half a metre", () => {
    const cable = answer(square()).rings.find((each) => each.id === "cable")!;
    expectRelative(cable.frequency_Hz, 100e6, 1e-9, "5 ns a metre");
    expect(cable).toMatchObject({ damping: 0, counted: false });
    const matched = { ...scope, cable: { ...scope.cable, end: "matchedAtTap" } };
    expect(answer(square({ instrument: matched })).rings.find((each) => each.id === "cable")).toMatchObject({
      damping: 1,
      counted: true,
    });
  });
  it("of the LV arm: a dip, and a ring with cable and instrument that the network has too", () => {
    const { rings } = answer(square({ lvInductance_H: 1e-8 }));
    const C2 = 8.45154e-9 - 5e-11;
    expectRelative(
      rings.find((each) => each.id === "lvResonance")?.frequency_Hz,
      1 / (2 * Math.PI * Math.sqrt(1e-8 * C2)),
      1e-9,
      "L2 with C2",
    );
    const both = (C2 * 5e-11) / (C2 + 5e-11);
    const loop = rings.find((each) => each.id === "lvLoop")!;
    expectRelative(loop.frequency_Hz, 1 / (2 * Math.PI * Math.sqrt(1e-8 * both)), 1e-9, "L2 with both in series");
    const nearest = rings
      .filter((each) => each.id.startsWith("network."))
      .map((each) => each.frequency_Hz / loop.frequency_Hz);
    expect(nearest.some((each) => Math.abs(each - 1) < 0.12)).toBe(true);
  });
});

describe("from the source", () => {
  it("an edge is what the electrode's is, less what the source's own capacitance and resistance take", () => {
    const { traces, fromSource } = answer(square({ source: { resistance_ohm: 1e4, capacitance_F: 1e-9 } }));
    const shared = 1e-9 / (1e-9 + 9e-12);
    const sag = 1 + 1e4 / 36.036e6;
    expectRelative(
      traces.stepFromSource.fast.value[0],
      (1 / (0.94 * 0.999 + 0.001)) * shared * sag,
      2e-3,
      "charge shared",
    );
    expectRelative(fromSource.magnitude_dB[0], 0, 1e-2, "its own dc", 1);
  });
  it("a lead of 1 µH takes the edge its quarter of a period", () => {
    const { fromSource } = answer(square({ lead: { inductance_H: 1e-6, damping_ohm: 600 } }));
    expect(fromSource.riseTime_s).toBeGreaterThan(3e-9);
    expect(fromSource.riseTime_s).toBeLessThan(20e-9);
  });
});

describe("the brief's own edge", () => {
  it("is a straight line of its rise time where the divider is right", () => {
    const right = square({ branches: [fixed("R2", R2), bank("C2", 9e-12 * 999 - 5e-11)] });
    const { edge, riseTime_s } = answer(right).traces;
    expect(riseTime_s).toBe(1e-7);
    edge!.fast.time_s.forEach((t, i) => {
      expectRelative(edge!.fast.value[i], Math.min(1, t / 1.25e-7), 1e-6, "10-90 % of a straight edge is 0.8 of it", 1);
    });
  });
  it("spreads by what parts, cable and instrument leave open", () => {
    const { spread } = answer(square()).traces;
    expectRelative(
      spread.halfWidth_F,
      0.02 * (8.45154e-9 - 5e-11) + 0.05 * 5e-11,
      1e-9,
      "2 % parts, 5 % cable, no spread of the instrument",
    );
    expect(spread.less.fast.value[0]).toBeGreaterThan(spread.more.fast.value[0]!);
  });
});

describe("instruments side by side", () => {
  const others = [
    { id: "m2", name: "long cable", ...scope, cable: { ...scope.cable, length_m: 5 } },
    {
      id: "m3",
      name: "meter",
      function: "meter dc",
      resistance_ohm: 1e7,
      capacitance_F: 1e-10,
      cable: { length_m: 1, capacitance_F_per_m: 0, impedance_ohm: 50 },
    },
  ];
  const rows = answer(square({ others })).instruments;
  it("each want an LV capacitance of their own, less by their cable's", () => {
    expect(rows.map((row) => row.principal)).toEqual([true, false, false]);
    expectRelative(rows[0]!.lvWanted_F! - rows[1]!.lvWanted_F!, 4.5e-10, 1e-3, "4.5 m more of 100 pF/m");
    const F = rows[2]!.scaleFactor;
    expectRelative(rows[2]!.lvWanted_F! + 1e-10, 9e-12 * (F - 1), 1e-4, "C1 (F − 1)");
  });
  it("have a scale factor each, and an error at the edge", () => {
    expectRelative(rows[0]!.scaleFactor, 1000, 1e-6, "fitted for it");
    expectRelative(rows[0]!.edgeError, 1 / (0.94 * 0.999 + 0.001) - 1, 1e-4, "6 % too small");
    expectRelative(rows[1]!.seenRise_s, Math.hypot(1e-7, 3.5e-9), 1e-6, "edge and 100 MHz");
  });
});

describe("a cable as a line", () => {
  it.each(["open", "matchedAtTap", "terminated"])(
    "%s: the scale factor has its resistors, exactly as the network has",
    (end) => {
      const proof = proven(square({ instrument: { ...scope, cable: { ...scope.cable, end } } }));
      const residuals = Object.values(proof.sheet.traces).map((trace) => trace.residual ?? 0);
      expect(Math.max(...residuals)).toBeLessThan(1e-9);
      const R = end === "terminated" ? (50 * 1e6) / (50 + 1e6) : 1e6 + (end === "matchedAtTap" ? 50 : 0);
      const G = 1 / R2 + 1 / R;
      const F = (1 + 36e6 * G) * (end === "matchedAtTap" ? 1 + 50 / 1e6 : 1);
      expectRelative(figure(proof, "scaleFactor.predicted"), F, 1e-12, "series and parallel sums");
      expectRelative(proof.instruments[0]!.scaleFactor, F, 1e-12, "the instrument's own row");
      const last = end === "matchedAtTap" ? 1 + 50 / 1e6 : 1;
      expectRelative(fault(proof, "elementShort").output_V, 5000 / last, 1e-12, "its only element a wire");
    },
  );
  it("is a caution where it is long against the edge, and offers to match it", () => {
    const long = { ...scope, cable: { ...scope.cable, length_m: 3 } };
    const found = finding(proven(square({ instrument: long })), "cable.lumped");
    expect(found).toMatchObject({ level: "caution", actual: 3 });
    expectRelative(found?.limit, 2, 1e-9, "a tenth of 100 ns at 5 ns a metre");
    expect(found?.cure?.edits).toEqual([{ pointer: "/instruments/0/cable/end", value: "matchedAtTap" }]);
    expect(finding(proven(square()), "cable.lumped")?.level).toBe("clear");
  });
  it("is said where its figures are not those of one cable", () => {
    const odd = { ...scope, cable: { ...scope.cable, capacitance_F_per_m: 3e-10, end: "open" } };
    expect(finding(proven(square({ instrument: odd })), "cable.figures")?.level).toBe("caution");
    expect(
      finding(proven(square({ instrument: { ...scope, cable: { ...scope.cable, end: "open" } } })), "cable.figures"),
    ).toBeUndefined();
  });
});

describe("an HV lead", () => {
  const fast = { riseTime_s: 1e-8 };
  const edge = { kind: "pulse", nominal_V: 5000, statedAs: "peak", greatest_Vpeak: 5000, width_s: 1e-4, ...fast };
  it("is asked for where a metre of it would ring near the band, never counted by itself", () => {
    const proof = proven(square({ waveform: edge, brief: { band_Hz: [10, 3.5e7] } }));
    expect(finding(proof, "lead.notCounted")?.cure?.edits).toEqual([
      { pointer: "/design/lead/inductance_H", value: 1e-6, origin: "assumed" },
    ]);
    expect(proof.sheet.values["lead.ring_Hz"]).toBeNull();
  });
  it("counted, wants its damping resistor, and has it then", () => {
    const bare = proven(square({ waveform: edge, brief: { band_Hz: [10, 3.5e7] }, lead: { inductance_H: 1e-6 } }));
    const found = finding(bare, "lead.damping");
    expect(found?.level).toBe("caution");
    const cured = found?.cure?.edits[0]?.value as number;
    const damped = proven(
      square({ waveform: edge, brief: { band_Hz: [10, 3.5e7] }, lead: { inductance_H: 1e-6, damping_ohm: cured } }),
    );
    expect(finding(damped, "lead.damping")?.level).toBe("clear");
  });
});
