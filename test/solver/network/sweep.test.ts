import { describe, expect, it } from "vitest";
import { dcSolution } from "../../../src/solver/network/dcSolution.ts";
import { elementVoltages } from "../../../src/solver/network/elementVoltages.ts";
import type { LadderNetwork } from "../../../src/solver/network/ladderNetwork.ts";
import { bandwidth, sweep } from "../../../src/solver/network/sweep.ts";
import { plus as plusExact, rational, solveExactly, toNumber } from "../../support/rational.ts";
import { expectRelative } from "../../support/relative.ts";
import { randomNetwork, seeded, sketch } from "./invented.ts";

/**
 * Independent route: every node in one dense nodal matrix [[G, −B], [B, G]], solved in exact fractions.
 * (In double precision the dense solve itself is out by up to 1e-6 of full scale on such networks.) Nodes: tap, inner, output.
 */
function dense(network: LadderNetwork, f: number) {
  const { n } = network;
  const w = 2 * Math.PI * f;
  const Rs = network.seriesProtector.resistance_ohm;
  const out = Rs > 0 ? n : 0;
  const size = Rs > 0 ? n + 1 : n;
  const zero = () => Array.from({ length: 2 * size }, () => rational(0));
  const Y = Array.from({ length: 2 * size }, zero);
  const I = zero();
  const plus = (row: number, column: number, G: number, B: number, sign = 1) => {
    const add = (r: number, c: number, x: number) => {
      Y[r]![c] = plusExact(Y[r]![c]!, rational(sign * x));
    };
    add(row, column, G);
    add(row + size, column + size, G);
    add(row, column + size, -B);
    add(row + size, column, B);
  };
  const shunt = (node: number, R: number, C: number) => plus(node, node, Number.isFinite(R) ? 1 / R : 0, w * C);
  const branch = (a: number, b: number, G: number, B: number) => {
    plus(a, a, G, B);
    plus(b, b, G, B);
    plus(a, b, G, B, -1);
    plus(b, a, G, B, -1);
  };
  const drive = (node: number, G: number, B: number) => {
    plus(node, node, G, B);
    I[node] = plusExact(I[node]!, rational(G));
    I[node + size] = plusExact(I[node + size]!, rational(B));
  };
  for (let i = 0; i < n; i++) {
    const [G, B] = [1 / network.resistance_ohm[i]!, w * network.capacitance_F[i]!];
    if (i === n - 1) drive(i, G, B);
    else branch(i, i + 1, G, B);
  }
  for (let i = 1; i < n; i++) {
    shunt(i, Number.POSITIVE_INFINITY, network.toEarth_F[i - 1]!);
    drive(i, 0, w * network.toElectrode_F[i - 1]!);
  }
  shunt(0, network.lv.resistance_ohm, network.lv.capacitance_F);
  shunt(network.seriesProtector.at === "divider" ? out : 0, Number.POSITIVE_INFINITY, network.cable.capacitance_F);
  shunt(out, network.instrument.resistance_ohm, network.instrument.capacitance_F);
  if (Rs > 0) branch(0, out, 1 / Rs, 0);
  const flat = solveExactly(Y, I).map(toNumber);
  const node = (i: number) => (i === n ? { re: 1, im: 0 } : { re: flat[i]!, im: flat[i + size]! });
  return { out: { re: flat[out]!, im: flat[out + size]! }, nodes: Array.from({ length: n + 1 }, (_, i) => node(i)) };
}

describe("frequency sweep of the ladder", () => {
  it("agrees with a dense nodal solve on random networks of 1 to 10 elements to 1e-12 of full scale", () => {
    const random = seeded(7);
    for (let round = 0; round < 12; round++) {
      const network = randomNetwork(random, 1 + Math.floor(random() * 10));
      const F = dcSolution(network, 1)!.scaleFactor;
      for (const f of [1e-2, 1e3, 1e8]) {
        const solved = sweep(network, [f])!;
        const { out } = dense(network, f);
        const full = Math.max(1, F * Math.hypot(out.re, out.im));
        expectRelative(solved.real[0], F * out.re, 1e-12, "dense solve in exact fractions", full);
        expectRelative(solved.imaginary[0], F * out.im, 1e-12, "dense solve in exact fractions", full);
      }
    }
  });

  it("gives each element's voltage as the dense solve does", () => {
    const random = seeded(11);
    for (let round = 0; round < 6; round++) {
      const network = randomNetwork(random, 2 + Math.floor(random() * 7));
      for (const f of [1, 5e4]) {
        const { elementVoltage_V } = elementVoltages(network, [f], 1);
        const { nodes } = dense(network, f);
        nodes.slice(1).forEach((above, i) => {
          const below = nodes[i]!;
          const expected = Math.hypot(above.re - below.re, above.im - below.im);
          expectRelative(
            elementVoltage_V[0]![i],
            expected,
            1e-7,
            "difference of dense node voltages",
            Math.max(expected, 1e-6),
          );
        });
      }
    }
  });

  // Kuffel, Zaengl, Kuffel, High Voltage Engineering, 2nd ed. (2000), ch. 3, recomputed: f3dB·R·Ce = 1.46113 for the uniform line.
  it.each([
    [10, 9.044071360095657],
    [50, 9.174846121976907],
    [200, 9.180206037232903],
  ])("has the bandwidth of the uniform ladder of %i cells", (N, omega) => {
    // N equal cells with a node of full stray between them and a tap held at earth by a tiny LV arm.
    const network = sketch({ n: N, R: 1e6 / N, Ce: 1e-9, R2: 1e-6 });
    expectRelative(
      bandwidth(network),
      omega / (2 * Math.PI * 1e6 * 1e-9),
      2e-6,
      "figure computed for N cells to 7 digits",
    );
  });

  it("sees the input impedance of the compensated 9 MΩ / 1 MΩ attenuator as 10 MΩ ‖ 2 pF", () => {
    const network = sketch({ n: 1, R: 9e6, C: 20e-12 / 9, R2: 1e6, C2: 20e-12 });
    const f = 1e4;
    const { real, impedanceReal_ohm, impedanceImaginary_ohm } = sweep(network, [f])!;
    expectRelative(real[0], 1, 1e-12, "matched arms are flat at every frequency");
    const w = 2 * Math.PI * f;
    const d = 1 + (w * 10e6 * 2e-12) ** 2;
    expectRelative(impedanceReal_ohm[0], 10e6 / d, 1e-9, "parallel R-C");
    expectRelative(impedanceImaginary_ohm[0], (-w * 1e14 * 2e-12) / d, 1e-9, "parallel R-C");
    expect(bandwidth(network)).toBeNull();
  });
});
