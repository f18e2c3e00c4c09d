import { describe, it } from "vitest";
import type { NetworkAnswer } from "../../../src/solver/index.ts";
import { solveNetwork } from "../../../src/solver/index.ts";
import { expectRelative } from "../../support/relative.ts";

// Invented scenarios, computed independently; the raw network through the solver's door.
const solved = (form: object): NetworkAnswer => {
  const answer = solveNetwork({ format: "stringwright-network", version: 1, ...form });
  if (!answer.ok) throw new Error(`${answer.error.where}: ${answer.error.why}`);
  return answer.value;
};
const string = (n: number, resistance_ohm: number, capacitance_F = 0) =>
  Array.from({ length: n }, () => ({ resistance_ohm, capacitance_F }));

describe("6 kV touched on to 24 × 39 MΩ with 7 pF to earth, the tap held at earth", () => {
  const top = (capacitance_F: number) => {
    const answer = solved({
      elements: string(24, 39e6, capacitance_F),
      strays: { toEarth_F: new Array(23).fill(7e-12 / 24) },
      lvArm: { resistance_ohm: 39e3, capacitance_F: 1 },
      source: { voltage_V: 6000 },
      ask: { elementVoltageAt: { frequencies_Hz: [1e9], peak_V: 6000 } },
    });
    return answer.elementVoltageAt!.elementVoltage_V[0]![23]! / 6000;
  };
  it("leaves 58.68 % on the top element of bare bodies instead of 4.17 %", () =>
    expectRelative(top(0.35e-12), 0.5868, 1e-3, "ladder figures are given to 0.1 %"));
  it("and 6.125 % with 100 pF across each", () =>
    expectRelative(top(100.35e-12), 0.06125, 1e-3, "ladder figures are given to 0.1 %"));
});

describe("a cold check: 500 V through 12 × 100 MΩ into a meter of 10.0614 MΩ", () => {
  const shown = (elements: object[], more: object = {}) =>
    solved({ elements, instrument: { resistance_ohm: 10.0614e6 }, source: { voltage_V: 500 }, ...more }).dc
      .outputVoltage_V;
  const swapped = (resistance_ohm: number) => [...string(11, 100e6), { resistance_ohm }];
  it.each([
    ["all twelve", string(12, 100e6), 4.1574],
    ["one shorted", string(11, 100e6), 4.5319],
    ["one of 10 MΩ in a place of 100 MΩ", swapped(10e6), 4.4914],
    ["one of 120 MΩ", swapped(120e6), 4.0898],
    ["10 GΩ of leakage across the string", [{ resistance_ohm: 1 / (1 / 1.2e9 + 1 / 10e9) }], 4.6516],
  ])("%s", (_, elements, expected) => expectRelative(shown(elements as object[]), expected, 2e-5, "five digits given"));
});

describe("a square wave into 36 MΩ ‖ 9 pF with 6 % too little LV capacitance", () => {
  const R2 = 36e6 / 999;
  const answer = solved({
    elements: [{ resistance_ohm: 36e6, capacitance_F: 9e-12 }],
    lvArm: { resistance_ohm: R2, capacitance_F: 0.94 * 999 * 9e-12 },
    ask: { times_s: [5e-9, 1e-5, 304.6e-6, 0.025], frequencies_Hz: [1e7], compensation: { band_Hz: [1, 1e6] } },
  });
  it("jumps 6.376 % too high and comes down with 304.6 µs", () => {
    const { value, initial } = answer.step!;
    expectRelative(initial! - 1, 0.06376, 2e-4, "four digits given");
    expectRelative(1000 / initial!, 940.06, 1e-5, "early scale factor, five digits given");
    expectRelative(value[2]! - 1, 0.06376 * Math.exp(-1), 5e-4, "one time constant on, four digits given");
    expectRelative(value[3], 1, 1e-9, "settled");
  });
  it("shows 100 kHz flat and wrong: each half begins and ends far from a step of 20 mV", () => {
    // Steady square wave of half period h about its mean: a half begins at δ/(1 + e^(−h/τ)) above its end level.
    const { initial, value } = answer.step!;
    const tau = -304.6e-6 / Math.log((value[2]! - 1) / (initial! - 1));
    expectRelative(tau, 304.6e-6, 5e-4, "four digits given");
    const at = (frequency_Hz: number) => {
      const fall = Math.exp(-0.5 / frequency_Hz / tau);
      const start = (initial! - 1) / (1 + fall);
      return [20 * (1 + start), 20 * (1 + start * fall)];
    };
    for (const [f, start, end] of [
      [20, 21.275, 20],
      [1000, 21.068, 20.207],
      [10e3, 20.69, 20.585],
      [100e3, 20.643, 20.632],
    ] as const) {
      expectRelative(at(f)[0], start, 5e-5, "five digits given");
      expectRelative(at(f)[1], end, 5e-5, "five digits given");
    }
  });
  it("needs 8.991 nF", () =>
    expectRelative(answer.compensation!.lvCapacitance_F.highFrequency, 999 * 9e-12, 1e-9, "closed form"));
});

describe("30 kV through 10 GΩ: surface leakage of 1e12 Ω", () => {
  const leaky = (elements: object[]) =>
    solved({ elements, lvArm: { resistance_ohm: 1.111235e6 }, instrument: { resistance_ohm: 10e6 } }).dc.scaleFactor!;
  it("across the string shows 1.0 % more", () => {
    const across = leaky([{ resistance_ohm: 1 / (1 / 10e9 + 1 / 1e12) }]);
    expectRelative(leaky([{ resistance_ohm: 10e9 }]) / across - 1, 0.01, 1e-3, "1.0 %, closed form");
  });
  it("settles to 0.1 % in 69 ms with 9 pF to earth along it", () => {
    const { step } = solved({
      elements: string(60, 10e9 / 60),
      strays: { toEarth_F: new Array(59).fill(9e-12 / 60) },
      lvArm: { resistance_ohm: 1.0001e6 },
      ask: { times_s: [] },
    });
    expectRelative(step!.settlingTime_s["0.1%"], 69e-3, 1e-2, "two digits given");
  });
});
