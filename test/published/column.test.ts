/** Resistor column with stray capacitance to earth: E. Kuffel, W. S. Zaengl, J. Kuffel, High Voltage Engineering, 2nd ed. (2000), ch. 3, from memory; figures computed here. */
import { describe, it } from "vitest";
import { solveNetwork } from "../../src/solver/index.ts";
import { expectRelative } from "../support/relative.ts";

const R = 1e8;
const Ce = 20e-12;
const RC = R * Ce;

interface Answer {
  bandwidth_Hz: number;
  step: { value: number[]; initial: number; responseTime_s: number; riseTime_s: number };
}

/** A column of n equal elements; the LV arm is small enough to count as earth. */
function column(n: number, Cp: number, times_s: readonly number[] = []): Answer {
  const solved = solveNetwork({
    format: "stringwright-network",
    version: 1,
    elements: Array.from({ length: n }, () => ({ resistance_ohm: R / n, capacitance_F: Cp * n })),
    strays: { toEarth_F: new Array(n - 1).fill(Ce / n) },
    lvArm: { resistance_ohm: R / 1e9, capacitance_F: Cp * 1e9 },
    ask: { times_s, frequencies_Hz: [1] },
  });
  if (!solved.ok) throw new Error(`${solved.error.where}: ${solved.error.why}`);
  return solved.value as unknown as Answer;
}

describe("a resistor column with stray capacitance", () => {
  it("has a response time of R·Ce·(1 − 1/n²)/6, whatever the capacitance along it", () => {
    for (const n of [2, 10, 50]) {
      for (const Cp of [0, 1e-12, 2e-11])
        expectRelative(column(n, Cp).step.responseTime_s, (RC * (1 - n ** -2)) / 6, 1e-6, "exact; LV arm of 1e-9 R");
    }
  });
  it.each([
    [10, 9.0441],
    [50, 9.17485],
    [200, 9.18021],
  ])("of %i elements is 3 dB down at ω·R·Ce = %f", (n, x) => {
    expectRelative(2 * Math.PI * column(n, 0).bandwidth_Hz * RC, x, 2e-5, "five digits given; 3 dB is half the power");
  });
  it("steps as the continuous column does: 1 + 2·Σ(−1)^k·exp(−k²π²t/RCe)", () => {
    const given = [
      [0.05, 0.034],
      [0.1, 0.2929],
      [1 / 6, 0.61673],
      [0.2, 0.72292],
      [0.3, 0.89647],
      [0.5, 0.98562],
    ] as const;
    const { step } = column(
      400,
      0,
      given.map(([t]) => t * RC),
    );
    given.forEach(([t, g], i) => {
      expectRelative(step.value[i], g, 5e-5, `at t/RCe = ${t}: 400 elements stand for the continuous column`, 1);
    });
    expectRelative(step.riseTime_s, 0.23741 * RC, 1e-4, "10 to 90 %, five digits given");
  });
  it.each([
    [0.1, 0.26819],
    [1, 0.85092],
  ])("with Cp/Ce = %f starts at x/sinh x = %f, x = √(Ce/Cp)", (share, start) => {
    expectRelative(column(400, share * Ce).step.initial, start, 5e-5, "400 elements stand for the continuous column");
  });
});
