import { eigs, matrix } from "mathjs";
import { describe, expect, it } from "vitest";
import { lvCapacitance } from "../../../src/solver/network/lvCapacitance.ts";
import { responseTime, stepFigures } from "../../../src/solver/network/stepFigures.ts";
import { stepResponse } from "../../../src/solver/network/timeResponse.ts";
import { expectRelative } from "../../support/relative.ts";
import { sketch } from "./invented.ts";

describe("step response", () => {
  // Textbook two-arm attenuator (R. Boylestad, Introductory Circuit Analysis, from memory), recomputed: initial C1/(C1+C2),
  // final R2/(R1+R2), τ = (R1‖R2)(C1+C2).
  it.each([
    [2.2222222222e-12, 20e-12, 0.1, 20e-6],
    [2e-12, 20e-12, 0.090909090909, 19.8e-6],
    [2.5e-12, 20e-12, 0.111111111111, 20.25e-6],
    [1e-12, 20e-12, 0.047619047619, 18.9e-6],
    [4e-12, 20e-12, 0.166666666667, 21.6e-6],
    [0, 30e-12, 0, 27e-6],
  ])("is the exponential of the 9 MΩ / 1 MΩ attenuator, C1 = %f F", (C1, C2, initial, tau) => {
    const network = sketch({ n: 1, R: 9e6, C: C1, R2: 1e6, C2 });
    const times = [1e-12, 1e-9, 1e-6, tau, 5 * tau, 1];
    const g = stepResponse(network, times)!;
    times.forEach((t, i) => {
      expectRelative(g[i], 1 + (initial * 10 - 1) * Math.exp(-t / tau), 1e-9, "closed form", 1);
    });
    expectRelative(stepFigures(network)!.initial, initial * 10, 1e-9, "capacitor share at the edge", 1);
    expectRelative(responseTime(network), (1 - initial * 10) * tau, 1e-9, "area of the exponential", tau);
  });

  // Uniform R-C line: T = R·Ce/6, with N equal cells (1 − 1/N²)/6 (computed here); g by its series.
  it("follows the uniform line", () => {
    const RC = 1e-3;
    const network = sketch({ n: 400, R: 1e6 / 400, Ce: 1e-9, R2: 1e-6 });
    expectRelative(
      responseTime(network),
      ((1 - 1 / 400 ** 2) / 6) * RC,
      1e-6,
      "exact for N cells; the tap's 1 µΩ is 1e-12",
    );
    const series = (x: number) => {
      let sum = 1;
      for (let k = 1; k < 60; k++) sum += 2 * (k % 2 ? -1 : 1) * Math.exp(-k * k * Math.PI ** 2 * x);
      return sum;
    };
    for (const x of [0.05, 0.1, 0.2, 0.5]) {
      expectRelative(stepResponse(network, [x * RC])![0], series(x), 2e-5, "400 cells against the line: 1/N²", 1);
    }
    const figures = stepFigures(network)!;
    expectRelative(figures.riseTime_s, 0.23740864639586506 * RC, 1e-4, "t10-90 of the line");
    expect(figures.overshoot).toBe(0);
    expect(figures.peakTime_s).toBeNull();
  });

  it("agrees with the eigenvalues of the state matrix of a small ladder", () => {
    // C dv/dt = −G v + i: three inner nodes and the tap, modes by mathjs.
    const R = [1e6, 2e6, 0.5e6, 3e6];
    const C = [3e-12, 2e-12, 1e-12, 4e-12];
    const [R2, C2] = [1e4, 5e-10];
    const network = { ...sketch({ n: 4, R, R2, C2 }), toEarth_F: Float64Array.of(4e-12, 1e-12, 2e-12) };
    const network2 = { ...network, capacitance_F: Float64Array.from([0, 0, 0, 0]) };
    const shunt = [C2, 4e-12, 1e-12, 2e-12];
    const A = [0, 1, 2, 3].map((i) =>
      [0, 1, 2, 3].map((k) => {
        const G = (a: number) => 1 / R[a]!;
        const below = i === 0 ? 1 / R2 : G(i - 1);
        const value = i === k ? below + G(i) : k === i + 1 ? -G(i) : k === i - 1 ? -G(i - 1) : 0;
        return value / Math.sqrt(shunt[i]! * shunt[k]!);
      }),
    );
    const { eigenvectors } = eigs(matrix(A)) as unknown as {
      eigenvectors: { value: number; vector: { toArray(): number[] } }[];
    };
    const drive = [0, 0, 0, 1 / R[3]! / Math.sqrt(shunt[3]!)];
    const F = 1 + R.reduce((a, b) => a + b) / R2;
    for (const t of [1e-7, 1e-6, 1e-5, 1e-4]) {
      let out = 0;
      for (const { value, vector } of eigenvectors) {
        const u = vector.toArray();
        const norm = u.reduce((sum, x) => sum + x * x, 0);
        const b = u.reduce((sum, x, i) => sum + x * drive[i]!, 0) / norm;
        out += (b / value) * (1 - Math.exp(-value * t)) * u[0]!;
      }
      expectRelative(stepResponse(network2, [t])![0], (F * out) / Math.sqrt(shunt[0]!), 1e-8, "modal sum", 1);
    }
    expect(C).toHaveLength(4);
  });
});

describe("LV capacitance by three matches", () => {
  // Invented scenario, computed independently: 24 × (12 MΩ ‖ 470 pF), Ce 11.799 pF, scope 1 MΩ ‖ 18 pF, cable 114 pF, F = 1000.
  it("reproduces a pulse divider's three capacitances", () => {
    const network = sketch({
      n: 24,
      R: 12e6,
      C: 470e-12,
      Ce: 11.799e-12,
      R2: 405063,
      Rm: 1e6,
      Cm: 18e-12,
      cable: 114e-12,
    });
    const C = lvCapacitance(network, [1, 1e7]);
    const parallel = 132e-12;
    expectRelative(C.highFrequency_F! + parallel, 17.727e-9, 1e-3, "with the real tap, to five digits");
    expectRelative(C.responseTime_F! + parallel, 17.597e-9, 1e-3, "zero response time");
    expectRelative(C.flattest_F! + parallel, 17.685e-9, 2e-3, "flattest, 'about'");
    expectRelative(
      responseTime({ ...network, lv: { ...network.lv, capacitance_F: C.responseTime_F! } }),
      0,
      1e-9,
      "zero",
      5e-3,
    );
  });
});
