/** Responses in time against closed forms and published figures. */
import { describe, expect, it } from "vitest";
import { solveNetwork } from "../../src/solver/index.ts";
import { expectRelative } from "../support/relative.ts";

interface Answer {
  step: {
    value: number[];
    initial: number;
    responseTime_s: number;
    partialResponseTime_s: number;
    overshoot: number;
    residualSettlingTime_s: number;
    riseTime_s: number;
  };
  doubleExponential: { value: number[]; peak: number };
  ramp: { value: number[] };
}

function solve(form: object): Answer {
  const solved = solveNetwork({ format: "stringwright-network", version: 1, ...form });
  if (!solved.ok) throw new Error(`${solved.error.where}: ${solved.error.why}`);
  return solved.value as unknown as Answer;
}

/** Two equal arms, matched: a scale factor of 2 and an input of 2 GΩ ‖ 1 nF. */
const arms = {
  elements: [{ resistance_ohm: 1e9, capacitance_F: 2e-9 }],
  lvArm: { resistance_ohm: 1e9, capacitance_F: 2e-9 },
};

describe("second order: a lead of 1 mH and its damping before 1 nF, ω = 1e6 /s", () => {
  // IEC 60060-2:2010 annex C, parameters of the step response, from memory; figures of the second-order system computed independently.
  const omega = 1e6;
  it.each([
    [0.4, 0.8, 1.221, 25.38, 3.937],
    [0.5, 1.0, 1.2984, 16.3, 4.139],
    [0.6, 1.2, 1.39, 9.478, 4.237],
    [0.7, 1.4, 1.5003, 4.599, 4.035],
    [0.8, 1.6, 1.6358, 1.516, 2.646],
  ])(
    "damping ratio %f: response time, partial response time, overshoot, settling time",
    (zeta, T, partial, beta, ts) => {
      const { step } = solve({
        ...arms,
        source: { inductance_H: 1e-3, damping_ohm: 2 * zeta * 1e3 },
        ask: { reference: "source", times_s: [1e-6] },
      });
      expectRelative(step.responseTime_s * omega, T, 1e-5, "2ζ; the 2 GΩ input takes a millionth");
      expectRelative(step.partialResponseTime_s * omega, partial, 1e-4, "five digits given");
      expectRelative(step.overshoot * 100, beta, 4e-4, "four digits given");
      expectRelative(step.residualSettlingTime_s * omega, ts, 3e-4, "four digits given");
      expectRelative(
        step.overshoot,
        Math.exp((-Math.PI * zeta) / Math.sqrt(1 - zeta * zeta)),
        1e-5,
        "closed form (any control text)",
      );
    },
  );
  it("with the damping resistor of 2·√(L/C) at the tip the lead does not overshoot, with √(L/C) by 16 %", () => {
    const at = (damping_ohm: number) =>
      solve({ ...arms, source: { inductance_H: 1e-3, damping_ohm }, ask: { reference: "source", times_s: [1e-6] } })
        .step;
    expect(at(2e3).overshoot).toBe(0);
    expectRelative(at(1e3).overshoot, 0.163, 1e-3, "ζ = 0.5 (common practice for the two resistors, no source)");
  });
});

describe("first order", () => {
  /** 1 MΩ into an LV arm small against it: time constant R2·C2. */
  const first = (tau: number) => ({
    elements: [{ resistance_ohm: 1e6 }],
    lvArm: { resistance_ohm: 1e3, capacitance_F: (tau * 1.001) / 1e3 },
  });
  it("settles in the sense of IEC 60060-2 at 2.861 τ (computed independently)", () => {
    const { step } = solve({ ...first(1e-6), ask: { times_s: [1e-6, 3e-6] } });
    expectRelative(step.residualSettlingTime_s, 2.861e-6, 2e-4, "four digits given");
    expectRelative(step.responseTime_s, 1e-6, 1e-9, "T = τ");
    expectRelative(step.partialResponseTime_s, 1e-6, 1e-6, "no overshoot: the same");
    expectRelative(step.riseTime_s, Math.log(9) * 1e-6, 1e-4, "ln 9 · τ");
    step.value.forEach((g, i) => {
      expectRelative(g, 1 - Math.exp(-[1, 3][i]!), 1e-9, "closed form");
    });
  });
  // IEC 60060-1:2010 lightning impulse 1.2/50 through a first-order divider: computed independently.
  it.each([
    [100e-9, 0.9998],
    [200e-9, 0.9989],
    [300e-9, 0.9969],
    [500e-9, 0.9896],
  ])("a 1.2/50 impulse through %f s has its peak at %f", (tau, peak) => {
    const alpha_per_s = 14659.10868047198;
    const beta_per_s = 2468926.653245929;
    const wave = { amplitude: 1.0372522006137619, alpha_per_s, beta_per_s };
    const times_s = [1e-7, 1e-6, 3e-6, 5e-5];
    const { doubleExponential } = solve({ ...first(tau), ask: { doubleExponential: { ...wave, times_s } } });
    expectRelative(doubleExponential.peak, peak, 6e-5, "four digits given");
    // One real pole: 1/(1 + sτ) against exp(−αt).
    const through = (a: number, t: number) => (Math.exp(-a * t) - Math.exp(-t / tau)) / (1 - a * tau);
    doubleExponential.value.forEach((value, i) => {
      const t = times_s[i]!;
      const exact = wave.amplitude * (through(alpha_per_s, t) - through(beta_per_s, t));
      expectRelative(value, exact, 1e-8, "closed form", 1);
    });
  });
  it("follows a ramp by τ: v(t) = (t − τ(1 − exp(−t/τ)))/T", () => {
    const times_s = [1e-9, 1e-7, 1e-6, 4e-6];
    const { ramp } = solve({ ...first(1e-6), ask: { ramp: { riseTime_s: 5e-6, times_s } } });
    ramp.value.forEach((value, i) => {
      const t = times_s[i]!;
      expectRelative(value, (t + 1e-6 * Math.expm1(-t / 1e-6)) / 5e-6, 1e-8, "closed form", 1);
    });
  });
});

describe("the compensated attenuator", () => {
  it("is flat in time where both arms have one time constant, and starts at the capacitive share where not (closed form)", () => {
    const attenuator = (C2: number) =>
      solve({
        elements: [{ resistance_ohm: 9e6, capacitance_F: 2e-12 }],
        lvArm: { resistance_ohm: 1e6, capacitance_F: C2 },
        ask: { times_s: [1e-9, 1e-6, 1e-5, 1e-3] },
      }).step;
    for (const g of attenuator(18e-12).value) expectRelative(g, 1, 1e-9, "R1·C1 = R2·C2");
    const off = attenuator(27e-12);
    expectRelative(off.initial, (10 * 2) / 29, 1e-9, "F·C1/(C1 + C2)");
    const tau = 0.9e6 * 29e-12;
    [1e-9, 1e-6, 1e-5, 1e-3].forEach((t, i) => {
      expectRelative(
        off.value[i]!,
        1 + (20 / 29 - 1) * Math.exp(-t / tau),
        1e-9,
        "one time constant, R1‖R2 · (C1 + C2)",
      );
    });
  });
});

describe("a matched line", () => {
  it("delays and does nothing else, whatever its length (closed form)", () => {
    for (const delay_s of [1e-9, 1e-7]) {
      const { step } = solve({
        elements: [{ resistance_ohm: 1e6 }],
        lvArm: { resistance_ohm: 50 },
        cable: { impedance_ohm: 50, delay_s, terminationAtEnd_ohm: 50 },
        ask: { times_s: [0.5, 0.999, 1.001, 2.5, 1e3].map((x) => x * delay_s) },
      });
      expect(step.value.slice(0, 2)).toEqual([0, 0]);
      for (const g of step.value.slice(2))
        expectRelative(g, 1, 1e-9, "both ends matched to 50 Ω beside 1 MΩ: 25 ppm", 1);
    }
  });
});
