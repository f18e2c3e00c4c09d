import type { Judging } from "../checks/judging.ts";
import { type LadderNetwork, withLvCapacitance } from "../network/ladderNetwork.ts";
import { lumpedCable } from "../network/lumpedCable.ts";
import { steadySquare } from "../network/steadySquare.ts";
import { stepFigures } from "../network/stepFigures.ts";
import { timeResponse } from "../network/timeResponse.ts";
import { formatQuantity, formatShare } from "../quantities/format.ts";
import { type MersenneTwister, seededBy } from "../quantities/random.ts";

/** An LV capacitance that the check is drawn for: as designed, matched, and too small or too large by so much of the whole. */
export interface SquareState {
  readonly id: "asDesigned" | "good" | "under" | "over";
  readonly name: string;
  /** All that stands from tap to earth, cable and instrument counted. */
  readonly lvCapacitance_F: number;
}

/** Start and end of the settled half period, counted from the settled level of the opposite half, at the instrument. */
export interface SquareRow {
  readonly frequency_Hz: number;
  readonly of: "slow" | "habitual" | "fast";
  readonly start_V: readonly number[];
  readonly end_V: readonly number[];
  /** Right after one edge to right after the next. */
  readonly onScreen_Vpp: readonly number[];
}

/** Two periods as the instrument would draw them. */
export interface SquarePicture {
  readonly speed: "slow" | "fast";
  readonly frequency_Hz: number;
  readonly state: SquareState["id"];
  readonly time_s: readonly number[];
  readonly value_V: readonly number[];
  readonly noisy_V: readonly number[];
}

export interface SlowFast {
  readonly slow_Hz: number;
  readonly fast_Hz: number;
  readonly signal_Vpp: number;
  readonly noise_Vrms: number;
  /** As designed, good match, too small, too large: the order of the values in each row. */
  readonly states: readonly SquareState[];
  readonly rows: readonly SquareRow[];
  readonly pictures: readonly SquarePicture[];
  /** Why it takes two frequencies, in numbers of this design. */
  readonly sentence: string;
}

const offBy = 0.05;
const habitual_Hz = 1000;
const perHalf = 120;
const seed = 20;

/** The slow/fast check as it will be seen, from the exact settled response; null where there is nothing to match. Needs `slowFast.*`. */
export function slowFast(j: Judging, network: LadderNetwork): SlowFast | null {
  const { sheet } = j;
  const slow_Hz = sheet.number("slowFast.slow_Hz");
  const fast_Hz = sheet.number("slowFast.fast_Hz");
  const signal_Vpp = sheet.number("slowFast.signal_Vpp") as number;
  if (slow_Hz === null || fast_Hz === null || !(network.lv.capacitance_F > 0)) return null;
  const noise_Vrms = j.instrument.noise_Vrms;
  // Inductances act in nanoseconds, far above both frequencies: left out, so that a ring without loss does not stay on the picture.
  const calm = lumpedCable(network);
  const lump: LadderNetwork = { ...calm, lv: { ...calm.lv, inductance_H: 0 } };
  const whole_F = sheet.number("lvArm.capacitanceTotal_F") as number;
  const states = statesOf(j, whole_F);
  const waves = states.map(({ lvCapacitance_F }) => waveOf(lump, lvCapacitance_F - (whole_F - lump.lv.capacitance_F)));
  const asked = [
    { of: "slow", frequency_Hz: slow_Hz },
    { of: "habitual", frequency_Hz: habitual_Hz },
    { of: "fast", frequency_Hz: fast_Hz },
  ] as const;
  const rows = asked
    .filter((each, i) => i !== 1 || (each.frequency_Hz !== slow_Hz && each.frequency_Hz !== fast_Hz))
    .sort((a, b) => a.frequency_Hz - b.frequency_Hz)
    .map(({ of, frequency_Hz }): SquareRow => {
      const ends = waves.map((wave) => wave.ends(0.5 / frequency_Hz));
      return {
        frequency_Hz,
        of,
        start_V: ends.map(([start]) => signal_Vpp * start),
        end_V: ends.map(([, end]) => signal_Vpp * end),
        onScreen_Vpp: ends.map(([start]) => signal_Vpp * (2 * start - 1)),
      };
    });
  const random = seededBy(seed);
  const pictures = (["slow", "fast"] as const).flatMap((speed) =>
    states.map(({ id }, i): SquarePicture => {
      const frequency_Hz = speed === "slow" ? slow_Hz : fast_Hz;
      const { time_s, value } = waves[i]!.twoPeriods(0.5 / frequency_Hz);
      const value_V = value.map((each) => signal_Vpp * each);
      const noisy_V = value_V.map((each) => each + noise_Vrms * gaussian(random));
      return { speed, frequency_Hz, state: id, time_s, value_V, noisy_V };
    }),
  );
  return { slow_Hz, fast_Hz, signal_Vpp, noise_Vrms, states, rows, pictures, sentence: sentence(rows, signal_Vpp) };
}

/** The match is that which the LV capacitance was chosen by; where it has none, what is fitted stands for it. */
function statesOf(j: Judging, whole_F: number): SquareState[] {
  const paths = {
    none: "lvArm.capacitanceHighFrequency_F",
    highFrequency: "lvArm.capacitanceHighFrequency_F",
    flattest: "lvArm.capacitanceFlattest_F",
    responseTime: "lvArm.capacitanceResponseTime_F",
  } as const;
  const fitted_F = j.sheet.number("lvArm.capacitanceFitted_F") as number;
  const found = j.sheet.number(paths[j.design.lvArm.capacitanceBy]);
  const beside_F = whole_F - fitted_F;
  const good_F = (found === null || found === 0 ? fitted_F : found) + beside_F;
  const least_F = beside_F;
  const percent = formatShare(offBy, 1);
  return [
    { id: "asDesigned", name: "as designed", lvCapacitance_F: whole_F },
    { id: "good", name: "good match", lvCapacitance_F: good_F },
    { id: "under", name: `${percent} too small`, lvCapacitance_F: Math.max(least_F, good_F * (1 - offBy)) },
    { id: "over", name: `${percent} too large`, lvCapacitance_F: good_F * (1 + offBy) },
  ];
}

function waveOf(network: LadderNetwork, lvCapacitance_F: number) {
  const trial = withLvCapacitance(network, Math.max(0, lvCapacitance_F));
  const g = timeResponse(trial)!;
  // Where the edge itself takes time its start is read once it is over.
  const over_s = g.initial >= 0.5 ? 0 : 3 * (stepFigures(trial, "electrode", g)?.riseTime_s ?? 0);
  return {
    /** From the settled level of the opposite half, for a step of 1. */
    ends(half_s: number): readonly [number, number] {
      const at = steadySquare(g, half_s);
      return [at(Math.min(over_s, half_s / 2)) + 0.5, at(half_s * (1 - 1e-12)) + 0.5];
    },
    twoPeriods(half_s: number) {
      const at = steadySquare(g, half_s);
      const half = Array.from({ length: perHalf }, (_, i) => at((i / perHalf) * half_s));
      const value = [1, -1, 1, -1].flatMap((sign) => half.map((each) => sign * each));
      return { value, time_s: value.map((_, i) => (i / perHalf) * half_s) };
    },
  };
}

/** Box-Muller on the seeded numbers. */
function gaussian(random: MersenneTwister): number {
  const u = (random.next() + 0.5) / 2 ** 32;
  const v = (random.next() + 0.5) / 2 ** 32;
  return Math.sqrt(-2 * Math.log(u)) * Math.cos(2 * Math.PI * v);
}

function sentence(rows: readonly SquareRow[], signal_Vpp: number): string {
  const slow = rows.find((row) => row.of === "slow")!;
  const fast = rows.find((row) => row.of === "fast")!;
  const under = 2;
  const droop = (fast.start_V[under]! - fast.end_V[under]!) / signal_Vpp;
  const wrong = fast.onScreen_Vpp[under]! / signal_Vpp - 1;
  const settled = slow.end_V[under]! / signal_Vpp - 1;
  return (
    `With the LV capacitance ${formatShare(offBy, 1)} too small the fast wave alone is flat within ${formatShare(Math.abs(droop), 2)} and looks right, ` +
    `${formatShare(Math.abs(wrong), 2)} too ${wrong > 0 ? "high" : "low"}; at ${formatQuantity(slow.frequency_Hz, "Hz", { trailing: false })} the half settles within ${formatShare(Math.max(1e-6, Math.abs(settled)), 2)}. ` +
    "The two amplitudes must agree: neither frequency shows it alone."
  );
}
