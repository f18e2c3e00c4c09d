/** Invented networks; the independent route is a dense nodal solve in exact fractions. */
import { describe, expect, it } from "vitest";
import { dcSolution } from "../../../src/solver/network/dcSolution.ts";
import type { LadderNetwork } from "../../../src/solver/network/ladderNetwork.ts";
import { LumpedResponse } from "../../../src/solver/network/lumpedResponse.ts";
import { singleFaults } from "../../../src/solver/network/singleFaults.ts";
import { over, plus, type Rational, rational, solveExactly, times, toNumber } from "../../support/rational.ts";
import { expectRelative } from "../../support/relative.ts";
import { randomNetwork, seeded, sketch } from "./invented.ts";

const V = 16_000;
const one = rational(1);
const nought = rational(0);
const short = rational(0);

/**
 * Node voltages by exact elimination. Nodes: 0 earth, 1 tap, 2 … n inner, n+1 electrode, n+2 cable end, n+3 instrument, n+4 source.
 * Shorts join nodes instead of weighing them with a great conductance.
 */
function nodal(
  network: LadderNetwork,
  admittance: (R: number, C: number) => Rational,
  fault: { open?: number; short?: number; lvShort?: boolean },
  driven: "source" | "electrode",
): number[] {
  const { n, lv, protector, cable, instrument, seriesProtector, source } = network;
  const branches: [number, number, Rational][] = [];
  const joins: [number, number][] = [];
  const inf = Number.POSITIVE_INFINITY;
  const add = (a: number, b: number, R: number, C: number) => branches.push([a, b, admittance(R, C)]);
  const wire = (a: number, b: number, R: number) => (R === 0 ? joins.push([a, b]) : add(a, b, R, 0));
  for (let i = 1; i <= n; i++) {
    if (i === fault.short) joins.push([i, i + 1]);
    else if (i !== fault.open) add(i, i + 1, network.resistance_ohm[i - 1]!, network.capacitance_F[i - 1]!);
  }
  for (let i = 1; i < n; i++) {
    add(i + 1, 0, inf, network.toEarth_F[i - 1]!);
    add(i + 1, n + 1, inf, network.toElectrode_F[i - 1]!);
  }
  add(1, n + 1, inf, network.electrodeToTap_F);
  add(1, 0, lv.resistance_ohm, lv.capacitance_F);
  add(1, 0, protector.resistance_ohm, protector.capacitance_F);
  const atDivider = seriesProtector.at === "divider";
  wire(1, n + 2, atDivider ? seriesProtector.resistance_ohm : 0);
  add(n + 2, 0, inf, cable.capacitance_F);
  wire(n + 2, n + 3, atDivider ? 0 : seriesProtector.resistance_ohm);
  add(n + 3, 0, instrument.resistance_ohm, instrument.capacitance_F);
  add(n + 3, 0, instrument.protector.resistance_ohm, instrument.protector.capacitance_F);
  if (fault.lvShort) joins.push([0, 1]);
  wire(n + 1, n + 4, driven === "electrode" ? 0 : source.resistance_ohm + source.damping_ohm);
  const root = Array.from({ length: n + 5 }, (_, i) => i);
  for (const [a, b] of joins) {
    const [from, to] = [root[a]!, root[b]!];
    root.forEach((r, i) => {
      if (r === from) root[i] = to;
    });
  }
  const held = new Map([
    [root[0]!, nought],
    [root[n + 4]!, one],
  ]);
  const free = [...new Set(root)].filter((r) => !held.has(r));
  const index = new Map(free.map((r, i) => [r, i]));
  const A = free.map(() => free.map(() => nought));
  const b = free.map(() => nought);
  for (const [p, q, y] of branches) {
    for (const [from, to] of [
      [root[p]!, root[q]!],
      [root[q]!, root[p]!],
    ] as const) {
      const row = index.get(from);
      if (row === undefined || from === to) continue;
      A[row]![row] = plus(A[row]![row]!, y);
      const column = index.get(to);
      if (column === undefined) b[row] = plus(b[row]!, times(y, held.get(to)!));
      else A[row]![column] = plus(A[row]![column]!, { n: -y.n, d: y.d });
    }
  }
  const x = solveExactly(A, b);
  return root.map((r) => toNumber(held.get(r) ?? x[index.get(r)!]!));
}

const conductance = (R: number) => (Number.isFinite(R) ? over(one, rational(R)) : short);
const steady = (R: number) => conductance(R);
/** A capacitance outweighs a conductance by sixty decades: the instant of the edge, exact to the last digit of a double. */
const great = { n: 10n ** 60n, d: 1n };
const edge = (R: number, C: number) => plus(conductance(R), times(great, rational(C)));

const without = (network: LadderNetwork, kind: string, fast: boolean): LadderNetwork => {
  const gone = { resistance_ohm: Number.POSITIVE_INFINITY, ...(fast ? { capacitance_F: 0 } : {}) };
  if (kind === "lvOpen") return { ...network, lv: { ...network.lv, ...gone } };
  if (kind === "instrumentOpen") return { ...network, instrument: { ...network.instrument, ...gone } };
  return network;
};

/** Values of 24 bits, so that the fractions stay short. */
function shortNumbers(network: LadderNetwork): LadderNetwork {
  const each = <T extends object>(part: T): T =>
    Object.fromEntries(
      Object.entries(part).map(([key, x]) => [
        key,
        typeof x === "number" ? Math.fround(x) : x instanceof Float64Array ? x.map(Math.fround) : x,
      ]),
    ) as T;
  const { lv, instrument, cable, seriesProtector, source } = network;
  return {
    ...each(network),
    lv: each(lv),
    instrument: each(instrument),
    cable: each(cable),
    seriesProtector: each(seriesProtector),
    source: each(source),
  };
}

describe("single faults of random networks", () => {
  it("agree with exact nodal solves, steady and at the instant of the edge", () => {
    const random = seeded(11);
    for (let trial = 0; trial < 25; trial++) {
      const drawn = randomNetwork(random, 1 + Math.floor(random() * 5));
      const network = shortNumbers({
        ...drawn,
        electrodeToTap_F: random() < 0.5 ? 0 : 1e-13,
        protector: { resistance_ohm: random() < 0.5 ? 1e9 : Number.POSITIVE_INFINITY, capacitance_F: 1e-12 },
        source: { resistance_ohm: random() < 0.5 ? 0 : 1e6, damping_ohm: 100, capacitance_F: 1e-12, inductance_H: 0 },
      });
      const rows = singleFaults(network, V);
      expect(rows.length).toBe(2 * network.n + 4);
      for (const { kind, element, output_V, greatestElementVoltage_V, fastOutput_V } of rows) {
        const fault = {
          ...(kind === "elementOpen" ? { open: element } : {}),
          ...(kind === "elementShort" ? { short: element } : {}),
          lvShort: kind === "lvShort",
        };
        const what = `${trial} ${kind} ${element}`;
        const v = nodal(without(network, kind, false), (R) => steady(R), fault, "source");
        const { n } = network;
        expectRelative(output_V, V * v[n + 3]!, 1e-12, `output ${what}`, Math.max(V * v[n + 3]!, 1e-300));
        const across = Array.from({ length: n }, (_, i) => Math.abs(v[i + 2]! - v[i + 1]!));
        expectRelative(greatestElementVoltage_V, V * Math.max(...across), 1e-12, `element ${what}`);
        const w = nodal(without(network, kind, true), edge, fault, "electrode")[n + 3]!;
        expectRelative(fastOutput_V, V * (w < 1e-25 ? 0 : w), 1e-12, `fast ${what}`, Math.max(V * w, 1e-300));
      }
    }
  });
  it("normal is the dc answer, and at the edge the step response's first value", () => {
    const random = seeded(5);
    for (let trial = 0; trial < 20; trial++) {
      const network = randomNetwork(random, 1 + Math.floor(random() * 60));
      const [normal] = singleFaults(network, V);
      const dc = dcSolution(network, V)!;
      expectRelative(normal!.output_V, dc.outputVoltage_V, 1e-13, "series sums");
      expectRelative(normal!.greatestElementVoltage_V, Math.max(...dc.elementVoltage_V), 1e-13, "series sums");
      const initial = new LumpedResponse(network, "electrode", dc.scaleFactor).initial;
      expectRelative(normal!.fastOutput_V, (V * initial) / dc.scaleFactor, 1e-10, "step at t = 0+", V / dc.scaleFactor);
    }
  });
});

const pick = (network: LadderNetwork, kind: string, element = 0, voltage = V) =>
  singleFaults(network, voltage).find((row) => row.kind === kind && row.element === element)!;

describe("what a fault leaves", () => {
  it("the only element shorted: the LV arm behind the source resistance", () => {
    const network = {
      ...sketch({ n: 1, R: 9e6, R2: 1e6, C2: 1e-9 }),
      source: { resistance_ohm: 1e6, damping_ohm: 0, capacitance_F: 0, inductance_H: 0 },
    };
    const row = pick(network, "elementShort", 1);
    expectRelative(row.output_V, V / 2, 1e-12, "two equal resistances");
    expect(row.greatestElementVoltage_V).toBe(0);
    expect(row.fastOutput_V).toBe(V);
    expectRelative(
      pick(sketch({ n: 1, R: 9e6, R2: 1e6 }), "elementShort", 1).output_V,
      V,
      1e-15,
      "no source resistance",
    );
  });
  it("an open element takes the whole voltage and leaves no output", () => {
    const row = pick(sketch({ n: 3, R: 9e6, R2: 1e4 }), "elementOpen", 2);
    expect(row).toMatchObject({ output_V: 0, greatestElementVoltage_V: V, outputRatio: 0, fastOutput_V: 0 });
    expectRelative(row.greatestElementRatio, 2.701e7 / 9e6, 1e-4, "27.01 MΩ over 9 MΩ");
    const negative = pick(sketch({ n: 3, R: 9e6, R2: 1e4 }), "normal", 0, -V);
    expect(negative.output_V).toBeLessThan(0);
    expect(negative.greatestElementVoltage_V).toBeGreaterThan(0);
  });
  it("the LV arm shorted, or gone with nothing else at the tap", () => {
    const network = sketch({ n: 2, R: 9e6, C: 1e-11, R2: 1e4, C2: 1e-8, Rs: 1000 });
    expect(pick(network, "lvShort")).toMatchObject({ output_V: 0, greatestElementVoltage_V: V / 2, fastOutput_V: 0 });
    expect(pick(network, "lvOpen")).toMatchObject({
      output_V: V,
      greatestElementVoltage_V: 0,
      greatestElementRatio: 0,
      fastOutput_V: V,
    });
  });
  it("a string that blocks dc: what floats does not exist", () => {
    const blocked = sketch({ n: 3, R: [1e6, Number.POSITIVE_INFINITY, 1e6], C: 1e-11, R2: 1e4, C2: 1e-9 });
    expect(pick(blocked, "normal")).toMatchObject({ output_V: 0, greatestElementVoltage_V: V, outputRatio: null });
    expect(pick(blocked, "elementOpen", 1)).toMatchObject({ output_V: 0, greatestElementVoltage_V: null });
    expectRelative(pick(blocked, "elementShort", 2).output_V, (V * 1e4) / 2.01e6, 1e-12, "the others in series");
    expect(pick(blocked, "lvOpen")).toMatchObject({ output_V: null, greatestElementVoltage_V: null });
    expect(pick(blocked, "lvShort")).toMatchObject({ output_V: 0, greatestElementVoltage_V: V });
  });
  it("a line keeps the edge from the instrument, an LV inductance keeps it from the capacitor", () => {
    const network = sketch({ n: 2, R: 9e6, C: 1e-11, R2: 1e4, C2: 1e-8 });
    const line = { impedance_ohm: 50, delay_s: 5e-9, seriesAtTap_ohm: 50, terminationAtEnd_ohm: 50 };
    const lined = singleFaults({ ...network, cable: { capacitance_F: 0, line } }, V);
    expect(lined.every(({ fastOutput_V }) => fastOutput_V === 0)).toBe(true);
    const G = 1e-4 + 1 / 100;
    expectRelative(lined[0]!.output_V, (V / (1 + 18e6 * G)) * 0.5, 1e-12, "half of the tap's voltage arrives");
    expect(pick({ ...network, lv: { ...network.lv, inductance_H: 1e-7 } }, "normal").fastOutput_V).toBe(V);
  });
  it("no capacitance anywhere: the edge shares as dc does; 5000 bare elements stay finite", () => {
    const row = pick(sketch({ n: 4, R: 1e6, R2: 1e4 }), "elementShort", 3);
    expectRelative(row.fastOutput_V, row.output_V!, 1e-12, "resistances alone");
    const rows = singleFaults(sketch({ n: 5000, R: 1e13, Ce: 1e-9, Ch: 1e-10, R2: 1, C2: 1e-9 }), V);
    for (const { output_V, fastOutput_V } of rows) expect(Number.isFinite(output_V! + fastOutput_V)).toBe(true);
  });
  it("0 V compares with nothing", () => {
    expect(pick(sketch({ n: 2, R: 1e6, R2: 1e4 }), "elementShort", 1, 0)).toMatchObject({
      output_V: 0,
      outputRatio: null,
    });
  });
});
