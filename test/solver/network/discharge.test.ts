/** Invented networks; the independent route is the sum of all natural modes of the dense nodal equations. */
import { describe, expect, it } from "vitest";
import { dcSolution } from "../../../src/solver/network/dcSolution.ts";
import { discharge } from "../../../src/solver/network/discharge.ts";
import type { LadderNetwork } from "../../../src/solver/network/ladderNetwork.ts";
import { conductance } from "../../../src/solver/network/lvSide.ts";
import { expectRelative } from "../../support/relative.ts";
import { randomNetwork, seeded, sketch } from "./invented.ts";

type Matrix = number[][];

/** Nodal equations of what is left: nodes 0 tap, 1 … n-1 inner, n electrode, then the instrument behind its series resistor. */
function nodal(network: LadderNetwork): { G: Matrix; C: Matrix } {
  const { n, lv, protector, cable, instrument, seriesProtector } = network;
  const Rs = seriesProtector.resistance_ohm;
  const size = n + (Rs > 0 ? 2 : 1);
  const far = Rs > 0 ? n + 1 : 0;
  const square = () => Array.from({ length: size }, () => new Array<number>(size).fill(0));
  const [G, C] = [square(), square()];
  const add = (M: Matrix, a: number, b: number, y: number) => {
    M[a]![a]! += y;
    if (b < 0) return;
    M[b]![b]! += y;
    M[a]![b]! -= y;
    M[b]![a]! -= y;
  };
  for (let i = 0; i < n; i++) {
    add(G, i, i + 1, conductance(network.resistance_ohm[i]!));
    add(C, i, i + 1, network.capacitance_F[i]!);
    if (i === 0) continue;
    add(C, i, -1, network.toEarth_F[i - 1]!);
    add(C, i, n, network.toElectrode_F[i - 1]!);
  }
  add(C, 0, n, network.electrodeToTap_F);
  add(C, n, -1, network.source.capacitance_F);
  for (const shunt of [lv, protector]) {
    add(G, 0, -1, conductance(shunt.resistance_ohm));
    add(C, 0, -1, shunt.capacitance_F);
  }
  for (const shunt of [instrument, instrument.protector]) {
    add(G, far, -1, conductance(shunt.resistance_ohm));
    add(C, far, -1, shunt.capacitance_F);
  }
  add(C, seriesProtector.at === "divider" ? far : 0, -1, cable.capacitance_F);
  if (Rs > 0) add(G, 0, far, 1 / Rs);
  return { G, C };
}

/** G = L Lᵀ. */
function cholesky(G: Matrix): Matrix {
  const L = G.map((row) => row.map(() => 0));
  G.forEach((row, i) => {
    for (let j = 0; j <= i; j++) {
      let sum = row[j]!;
      for (let k = 0; k < j; k++) sum -= L[i]![k]! * L[j]![k]!;
      L[i]![j] = i === j ? Math.sqrt(sum) : sum / L[j]![j]!;
    }
  });
  return L;
}

const forward = (L: Matrix, b: readonly number[]): number[] => {
  const x: number[] = [];
  b.forEach((each, i) => {
    x.push((each - x.reduce((sum, xj, j) => sum + L[i]![j]! * xj, 0)) / L[i]![i]!);
  });
  return x;
};
const transposed = (M: Matrix): Matrix => M[0]!.map((_, j) => M.map((row) => row[j]!));

/** Eigenvalues and vectors (columns of Q) of a symmetric matrix by Jacobi's rotations. */
function jacobi(M: Matrix): { values: number[]; Q: Matrix } {
  const n = M.length;
  const A = M.map((row) => [...row]);
  const Q = A.map((row, i) => row.map((_, j) => Number(i === j)));
  for (let sweep = 0; sweep < 60; sweep++) {
    for (let p = 0; p < n; p++) {
      for (let q = p + 1; q < n; q++) {
        if (A[p]![q] === 0) continue;
        const theta = (A[q]![q]! - A[p]![p]!) / (2 * A[p]![q]!);
        const t = (theta < 0 ? -1 : 1) / (Math.abs(theta) + Math.hypot(theta, 1));
        const c = 1 / Math.hypot(t, 1);
        const s = t * c;
        for (let k = 0; k < n; k++) {
          const [a, b] = [A[k]![p]!, A[k]![q]!];
          A[k]![p] = c * a - s * b;
          A[k]![q] = s * a + c * b;
          const [u, v] = [Q[k]![p]!, Q[k]![q]!];
          Q[k]![p] = c * u - s * v;
          Q[k]![q] = s * u + c * v;
        }
        for (let k = 0; k < n; k++) {
          const [a, b] = [A[p]![k]!, A[q]![k]!];
          A[p]![k] = c * a - s * b;
          A[q]![k] = s * a + c * b;
        }
      }
    }
  }
  return { values: A.map((row, i) => row[i]!), Q };
}

/** Electrode voltage at t for 1 V standing, and the slowest time constant: u = Lᵀ v, L⁻¹ C L⁻ᵀ u' = −u. */
function modes(network: LadderNetwork) {
  const { G, C } = nodal(network);
  const L = cholesky(G);
  const half = transposed(C.map((row) => forward(L, row)));
  const M = half.map((row) => forward(L, row));
  const { values, Q } = jacobi(M.map((row, i) => row.map((each, j) => (each + M[j]![i]!) / 2)));
  const top = forward(
    L,
    G.map((_, i) => Number(i === network.n)),
  );
  const weight = values.map((_, k) => Q.reduce((sum, row, i) => sum + row[k]! * top[i]!, 0) ** 2);
  const all = weight.reduce((sum, each) => sum + each, 0);
  return {
    slowest: Math.max(...values),
    at: (t: number) =>
      weight.reduce((sum, each, k) => sum + (values[k]! > 0 ? each * Math.exp(-t / values[k]!) : 0), 0) / all,
  };
}

function crossing(f: (t: number) => number, level: number): number {
  let [low, high] = [1e-20, 1e10];
  if (f(low) <= level) return 0;
  for (let step = 0; step < 200; step++) {
    const middle = Math.sqrt(low * high);
    if (f(middle) > level) low = middle;
    else high = middle;
  }
  return high;
}

const withSource = (network: LadderNetwork, capacitance_F: number, resistance_ohm = 0): LadderNetwork => ({
  ...network,
  source: { resistance_ohm, damping_ohm: 0, inductance_H: 0, capacitance_F },
});

describe("discharge of random networks", () => {
  it("agrees with the sum of all natural modes", () => {
    const random = seeded(21);
    for (let trial = 0; trial < 60; trial++) {
      const drawn = randomNetwork(random, 1 + Math.floor(random() * 8));
      const network = {
        ...withSource(drawn, random() < 0.4 ? 0 : 10 ** (-12 + 4 * random()), 1e5),
        electrodeToTap_F: random() < 0.5 ? 0 : 1e-13,
        protector: { resistance_ohm: random() < 0.5 ? 1e9 : Number.POSITIVE_INFINITY, capacitance_F: 1e-12 },
      };
      const V0 = dcSolution(network, 10_000)!.electrodeVoltage_V;
      const dense = modes(network);
      for (const share of [0.9, 0.3, 0.01, 1e-4]) {
        const { time_s, slowestTimeConstant_s } = discharge(network, trial % 2 === 0 ? 10_000 : -10_000, V0 * share);
        const what = `${trial}, ${share}`;
        expectRelative(slowestTimeConstant_s, dense.slowest, 1e-9, `greatest eigenvalue ${what}`);
        const t = crossing(dense.at, share);
        expectRelative(time_s, t, 1e-7, `sum of modes ${what}`, Math.max(t, 1e-300));
      }
    }
  });
  it("leaves no more than the capacitors hold: half of C v² over every node pair", () => {
    const random = seeded(22);
    for (let trial = 0; trial < 20; trial++) {
      const network = withSource(randomNetwork(random, 1 + Math.floor(random() * 8)), 1e-9, 1e5);
      const dc = dcSolution(network, 9000)!;
      const { C } = nodal(network);
      const v = [dc.tapVoltage_V];
      for (const V of dc.elementVoltage_V) v.push(v.at(-1)! + V);
      if (v.length < C.length) v.push(dc.outputVoltage_V);
      const energy = C.reduce((sum, row, i) => sum + row.reduce((part, c, j) => part + c * v[i]! * v[j]!, 0) / 2, 0);
      expectRelative(discharge(network, 9000, 60).energy_J, energy, 1e-12, "quadratic form of the nodal capacitances");
    }
  });
});

describe("discharge", () => {
  const bare = withSource(sketch({ n: 3, R: 3e8, R2: 1e8 }), 1e-9, 1e8);
  it("of the source's capacitance through the divider is one exponential, however late", () => {
    const V0 = (10_000 * 1e9) / 1.1e9;
    for (const threshold of [V0 / 2, 60, 1e-3, 1e-200]) {
      const found = discharge(bare, 10_000, threshold);
      expectRelative(found.time_s, Math.log(V0 / threshold), 1e-9, "R·C = 1 s");
      expectRelative(found.slowestTimeConstant_s, 1, 1e-12, "R·C = 1 s");
      expectRelative(found.energy_J, 0.5e-9 * V0 * V0, 1e-12, "half of C·V²");
    }
  });
  it("is over at once below the threshold, and without any capacitance", () => {
    expect(discharge(bare, 50, 60).time_s).toBe(0);
    expect(discharge(sketch({ n: 3, R: 3e8, R2: 1e8 }), 10_000, 60)).toEqual({
      time_s: 0,
      energy_J: 0,
      slowestTimeConstant_s: null,
    });
    expect(discharge(bare, 0, 60)).toMatchObject({ time_s: 0, energy_J: 0 });
  });
  it("of a top element without capacitance begins with a fall of the electrode", () => {
    // C2 alone, 9 MΩ over 1 MΩ: the electrode falls to a tenth at once, then with R2·C2.
    const network = sketch({ n: 1, R: 9e6, R2: 1e6, C2: 1e-6 });
    expect(discharge(network, 1000, 100.1).time_s).toBe(0);
    expectRelative(discharge(network, 1000, 50).time_s, Math.LN2, 1e-9, "R2·C2 = 1 s from a tenth");
  });
  it("never ends where nothing leads to earth", () => {
    const floating = withSource(sketch({ n: 2, R: 1e6, C2: 1e-9 }), 1e-9);
    expect(discharge(floating, 1000, 60)).toMatchObject({ time_s: null, slowestTimeConstant_s: null });
    expectRelative(discharge(floating, 1000, 60).energy_J, 1e-3, 1e-12, "both at 1 kV");
    expect(discharge(floating, 1000, 1000).time_s).toBe(0);
    const blocked = withSource(sketch({ n: 2, R: [1e6, Number.POSITIVE_INFINITY], C: 1e-9, R2: 1e3 }), 1e-9);
    expect(discharge(blocked, 1000, 60)).toMatchObject({ time_s: null, slowestTimeConstant_s: null });
    expectRelative(discharge(blocked, 1000, 60).energy_J, 1e-3, 1e-12, "element 2 and the source's at 1 kV");
  });
  it("keeps a small tail behind a fast fall", () => {
    // A slow instrument behind 10 GΩ: its mode leaves about 1e-7 of the electrode's voltage.
    const network = withSource(sketch({ n: 4, R: 1e7, C: 1e-11, R2: 1e5, Rm: 1e12, Cm: 1e-9, Rs: 1e10 }), 1e-10);
    const dense = modes(network);
    for (const share of [1e-3, 1e-6, 1e-7, 1e-8]) {
      const found = discharge(network, 1e4, share * 1e4);
      expectRelative(found.time_s, crossing(dense.at, share), 1e-6, `sum of modes ${share}`);
    }
  });
  it("a short line counts as its capacitance, an LV inductance hardly", () => {
    const network = withSource(sketch({ n: 3, R: 1e7, C: 1e-11, R2: 1e5, C2: 1e-8, Rm: 1e6, Cm: 2e-11 }), 1e-10);
    const lumped = discharge({ ...network, cable: { capacitance_F: 1e-10, line: null } }, 1e4, 60);
    const line = {
      impedance_ohm: 50,
      delay_s: 5e-9,
      seriesAtTap_ohm: 0,
      terminationAtEnd_ohm: Number.POSITIVE_INFINITY,
    };
    const lined = discharge({ ...network, cable: { capacitance_F: 0, line } }, 1e4, 60);
    expectRelative(lined.time_s, lumped.time_s!, 1e-7, "delay 1e-6 of the slowest time constant");
    expectRelative(lined.slowestTimeConstant_s, lumped.slowestTimeConstant_s!, 1e-7, "the same");
    expectRelative(lined.energy_J, lumped.energy_J!, 1e-12, "delay over impedance is the line's capacitance");
    const plain = discharge(network, 1e4, 60);
    const inductive = discharge({ ...network, lv: { ...network.lv, inductance_H: 1e-7 } }, 1e4, 60);
    expectRelative(inductive.time_s, plain.time_s!, 1e-7, "ringing long over");
    expectRelative(inductive.slowestTimeConstant_s, plain.slowestTimeConstant_s!, 1e-9, "ringing long over");
  });
  it("a line's series resistor and termination stand where a series protector and the instrument would", () => {
    const base = withSource(
      sketch({ n: 2, R: 1e7, C: 1e-11, R2: 1e5, C2: 1e-8, Rm: 1e6, Cm: 2e-11, Rs: 5e5, at: "divider" }),
      1e-10,
    );
    const lumped = { ...base, cable: { capacitance_F: 2e-9, line: null } };
    const line = { impedance_ohm: 0.5, delay_s: 1e-9, seriesAtTap_ohm: 5e5, terminationAtEnd_ohm: 2e6 };
    const lined = {
      ...base,
      instrument: { ...base.instrument, resistance_ohm: 2e6 },
      cable: { capacitance_F: 0, line },
      seriesProtector: { resistance_ohm: 0, at: "instrument" as const },
    };
    // The last threshold is reached within a delay: the line as its capacitance.
    for (const threshold of [1, 60, 5000, 9999.9999]) {
      const [a, b] = [lined, lumped].map((each) => discharge(each, 1e4, threshold));
      expectRelative(a!.time_s, b!.time_s!, 1e-6, `the same circuit, ${threshold} V`);
      expectRelative(a!.slowestTimeConstant_s, b!.slowestTimeConstant_s!, 1e-8, "the same circuit");
      expectRelative(a!.energy_J, b!.energy_J!, 1e-12, "the same circuit");
    }
  });
  it("of a series circuit that rings takes the envelope's time constant", () => {
    // 1 H, 1 µF at the tap, 100 Ω in parallel with both: s² + (1/(R C))… the LV resistor damps the branch as R/(2 L).
    const network = { ...sketch({ n: 1, R: 1e6, R2: 100, C2: 1e-6 }) };
    const ringing = discharge({ ...network, lv: { ...network.lv, inductance_H: 1 } }, 1000, 1);
    expectRelative(ringing.slowestTimeConstant_s, 2 / 100, 1e-9, "2 L/R; the string's end is open");
  });
  it("with an LV inductance begins with the capacitor out of the way, and comes back", () => {
    // For a tenth of a picosecond the inductance keeps C2 away and the electrode stands at 0; then it follows C2 from a half.
    const network = withSource(sketch({ n: 1, R: 1e4, R2: 1e4, C2: 1e-6 }), 0);
    const found = discharge({ ...network, lv: { ...network.lv, inductance_H: 1e-9 } }, 1000, 100);
    expectRelative(found.time_s, 1e-2 * Math.log(5), 1e-6, "R2·C2 = 10 ms from a half");
    expectRelative(found.slowestTimeConstant_s, 1e-2, 1e-9, "R2·C2");
  });
  it("an overdamped LV branch: L, R2 and C2 in series, both roots real", () => {
    const network = sketch({ n: 1, R: 1e6, R2: 1e3, C2: 1e-6 });
    const [R, L, C] = [1e3, 0.1, 1e-6];
    const root = (R - Math.sqrt(R * R - (4 * L) / C)) / (2 * L);
    const found = discharge({ ...network, lv: { ...network.lv, inductance_H: L } }, 1000, 1e-3);
    expectRelative(found.slowestTimeConstant_s, 1 / root, 1e-9, "slower root of L s² + R s + 1/C");
  });
  it("holds for 400 elements and an infinity of bare ones", () => {
    const network = withSource(
      sketch({ n: 400, R: 1e9, C: 1e-16, Ce: 1e-10, Ch: 1e-11, R2: 1e5, C2: 1e-6, Rm: 1e7 }),
      1e-9,
    );
    const found = discharge(network, 1e5, 60);
    expect(found.time_s).toBeGreaterThan(found.slowestTimeConstant_s!);
    // One exponential at late times: a tenth of the threshold comes ln 10 time constants later.
    const later = discharge(network, 1e5, 6).time_s!;
    expectRelative(later - found.time_s!, Math.LN10 * found.slowestTimeConstant_s!, 1e-4, "slowest mode alone");
  });
});
