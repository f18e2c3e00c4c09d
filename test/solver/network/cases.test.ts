/**
 * Invented networks, each with the answer of an independent program, compared to the accuracy the raw network promises.
 *
 * How the answers were computed: a general nodal analysis in multi-precision ball arithmetic, written from the description
 * of the input alone; it eliminates the whole nodal matrix and knows no ladder. dc, faults, limits: exact fractions.
 * Frequency: elimination at 300 bits or more. Time, lumped: the transfer function as an exact fraction of polynomials,
 * its certified roots, the modal sum. Time, lines: travelling waves, each arrival inverted at its own shifted time.
 *
 * What agreed with what:
 * - every frequency and input impedance up to 60 elements with a second, separately written dense analysis with branch
 *   currents (40 digits): 2e-16 relative;
 * - modal sums with the fixed Talbot inversion of the nodal solve: 1e-15 of full scale, all waveforms, but for eight moments
 *   more than a hundred swings after the edge, which the modal sum alone gives; square waves with direct sums: 1e-11;
 * - 400 elements: Talbot inversion with two contours of unlike size, 5e-23;
 * - lines: two contours for every arrival, 1e-10 with inductance in the LV arm and 1e-24 without; the sum of arrivals
 *   with the inversion of the chain matrix as a whole, 3e-15 where the line has rung out;
 * - figures with brute force over dense samples: 360 and 70 figures, to the spacing of the samples;
 * - closed forms: first order; the uniform R-C line (omega3dB R C -> 9.18056, response time (1 - 1/N^2)/6); second-order
 *   steps of damping 0.4 to 0.8 (overshoot 25.38 ... 1.516 %, response time 2 zeta, residual settling 3.937 ... 2.646);
 *   a matched resistive line as a pure delay; thermal runaway at a quarter of the feedback.
 * Where the description leaves something open, the case says how it was read.
 */
import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { solveNetwork } from "../../../src/solver/index.ts";

type Json = null | boolean | number | string | readonly Json[] | { readonly [key: string]: Json };
type Table = { readonly [key: string]: Json };
interface Case {
  readonly about: string;
  readonly form: Table;
  readonly expected: Table;
  readonly method: string;
  /** Slowest time constant of the transfer function; response times are compared within 1e-9 of it. */
  readonly slowestTimeConstant_s?: number;
}

const folder = new URL("./cases/", import.meta.url);
const names = readdirSync(folder).filter((name) => name.endsWith(".json"));

/** Long lists are given by a rule: value i is base·(1 + spread·((i·step) mod modulus)/modulus), i from 0. */
function byRule(rule: Table): number[] {
  const { count, base, spread, step, modulus } = rule as Record<string, number>;
  return Array.from({ length: count! }, (_, i) => base! * (1 + (spread! * ((i * step!) % modulus!)) / modulus!));
}

function expand(form: Table): Table {
  const { elements, strays } = form;
  const expanded: Record<string, Json> = { ...form };
  if (!Array.isArray(elements)) {
    const columns = Object.entries(elements as Table).map(([key, rule]) => [key, byRule(rule as Table)] as const);
    expanded.elements = columns[0]![1].map((_, i) =>
      Object.fromEntries(columns.map(([key, values]) => [key, values[i]!])),
    );
  }
  if (strays !== undefined)
    expanded.strays = Object.fromEntries(
      Object.entries(strays as Table).map(([key, value]) => [
        key,
        typeof value === "object" && !Array.isArray(value) ? byRule(value as Table) : value,
      ]),
    );
  return expanded;
}

/** How far a number may be from the reference, by its path. */
interface Allowance {
  readonly absolute: number;
  readonly relative: number;
}

const within = (relative: number, absolute = 0): Allowance => ({ relative, absolute });

function greatest(values: Json | undefined): number {
  return Math.max(0, ...((values ?? []) as readonly (number | null)[]).map((value) => Math.abs(value ?? 0)));
}

/** Full scale of a response over time: the input's own height, or the greatest expected value if that is more. */
function timeScale(path: readonly string[], { form, expected }: Case): number {
  const [ask] = path;
  const answer = expected[ask!] as Table;
  const input = (form.ask as Table)[ask!] as Table | undefined;
  const values = greatest(answer.value);
  if (ask === "doubleExponential") return Math.max(values, Math.abs(answer.peak as number));
  if (ask === "samples") return Math.max(values, greatest(input!.value));
  return Math.max(1, values);
}

function frequencyAllowance(path: readonly string[], { expected }: Case): Allowance {
  const table = expected.frequency as Record<string, readonly number[]>;
  const size = (i: number) => Math.hypot(table.real![i]!, table.imaginary![i]!);
  const scale = Math.max(1, ...table.real!.map((_, i) => size(i)));
  const here = size(Number(path[2]));
  if (path[1] === "magnitude_dB") return within(1e-13, (20 / Math.LN10) * ((1e-8 * scale) / here));
  if (path[1] === "phase_deg") return within(1e-13, (180 / Math.PI) * ((1e-8 * scale) / here));
  return within(0, 1e-8 * scale);
}

function impedanceAllowance(path: readonly string[], { expected }: Case): Allowance {
  const table = expected.inputImpedance_ohm as Record<string, readonly number[]>;
  const i = Number(path[2]);
  return within(0, 1e-7 * Math.hypot(table.real![i]!, table.imaginary![i]!));
}

const figures: Record<string, number> = {
  t10_s: 1e-4,
  t90_s: 1e-4,
  riseTime_s: 1e-4,
  settlingTime_s: 1e-3,
  residualSettlingTime_s: 1e-3,
  peakTime_s: 1e-2, // no accuracy is promised for it; cases with a top flatter than 2e-6 within 1 % leave it out
};

function stepAllowance(path: readonly string[], one: Case): Allowance {
  const key = path[1]!;
  if (key === "value") return within(0, 1e-6 * timeScale(path, one));
  if (key === "initial") return within(1e-7, 1e-7);
  if (key === "overshoot") return within(1e-5, 1e-5);
  if (key === "responseTime_s" || key === "partialResponseTime_s")
    return within(1e-6, 1e-9 * (one.slowestTimeConstant_s ?? 0));
  return within(figures[key]!, 1e-20);
}

/** Differences of dc voltages, powers and the like are held relative to themselves, with room for a true zero only. */
function allowance(path: readonly string[], one: Case): Allowance {
  switch (path[0]) {
    case "dc":
    case "faults":
    case "grading":
    case "tolerance":
      return within(1e-9);
    case "frequency":
      return frequencyAllowance(path, one);
    case "inputImpedance_ohm":
      return impedanceAllowance(path, one);
    case "bandwidth_Hz":
      return within(1e-6);
    case "elementVoltageAt":
      return within(1e-7);
    case "step":
      return stepAllowance(path, one);
    case "ramp":
    case "doubleExponential":
    case "halfSine":
    case "square":
    case "samples":
      return within(0, 1e-6 * timeScale(path, one));
    case "compensation":
      return within(path.at(-1)!.startsWith("flattest") ? 2e-3 : 1e-6);
    case "heat":
      return within(1e-8, path[1] === "relativeShift" ? 1e-10 : 0);
    case "discharge":
      return within(1e-6);
    default:
      throw new Error(`no accuracy is stated for ${path.join("/")}`);
  }
}

/** Every difference, said with its place. A phase is compared around the circle. */
function differences(expected: Json, got: unknown, path: readonly string[], one: Case): string[] {
  const say = (more = "") => [
    `${path.join("/")}: expected ${JSON.stringify(expected)}, got ${JSON.stringify(got)}${more}`,
  ];
  if (typeof expected === "number") {
    if (typeof got !== "number" || !Number.isFinite(got)) return say();
    const plain = Math.abs(got - expected);
    const error = path[1] === "phase_deg" ? Math.min(plain, Math.abs(360 - plain)) : plain;
    const { relative, absolute } = allowance(path, one);
    const allowed = relative * Math.abs(expected) + absolute;
    return error <= allowed ? [] : say(`, off by ${error}, allowed ${allowed}`);
  }
  if (typeof expected !== "object" || expected === null) return got === expected ? [] : say();
  if (typeof got !== "object" || got === null) return say();
  if (path[0] === "faults" && path.length === 1 && Array.isArray(expected) && Array.isArray(got))
    return expected.flatMap((fault) => {
      const { kind, element } = fault as Table;
      const same = (got as Table[]).find((each) => each.kind === kind && each.element === element);
      return differences(fault, same, ["faults", `${kind} ${element}`], one);
    });
  if (Array.isArray(expected) && (!Array.isArray(got) || got.length !== expected.length))
    return say(", another length");
  return Object.entries(expected).flatMap(([key, value]) =>
    differences(value, (got as Record<string, unknown>)[key], [...path, key], one),
  );
}

describe("the raw network against an independent reference", () => {
  it("has cases to read", () => expect(names.length).toBeGreaterThan(30));
  it.each(names)("%s", (name) => {
    const one = JSON.parse(readFileSync(new URL(name, folder), "utf8")) as Case;
    const answer = solveNetwork(expand(one.form));
    if (!answer.ok) throw new Error(`${name}: refused at ${answer.error.where}: ${answer.error.why}`);
    const wrong = differences(one.expected, answer.value, [], one);
    expect(wrong, `${name} (${one.about})\n${wrong.slice(0, 12).join("\n")}`).toEqual([]);
  });
});
