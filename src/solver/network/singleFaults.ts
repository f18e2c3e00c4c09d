import { fastFaults } from "./fastFaults.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";
import { lvSide } from "./lvSide.ts";
import type { FaultAnswer } from "./networkForm.ts";

/**
 * The network as it is and with every single fault in it: each element open and short (resistor and capacitor), the LV resistor gone,
 * the tap shorted to earth, the instrument's resistance gone. Steady dc behind the source resistance in closed form, series sums
 * without a difference; beside it the first instant of a step of the same height at the electrode.
 * The greatest element voltage is a magnitude; the gap of an open element counts. Null where a group of nodes floats, and for a
 * comparison with nothing.
 * @param voltage_V of the ideal source
 */
export function singleFaults(network: LadderNetwork, voltage_V: number): FaultAnswer[] {
  const { source, lv, instrument } = network;
  const strings = stringSums(network);
  const ahead = source.resistance_ohm + source.damping_ohm;
  const absent = { resistance_ohm: Number.POSITIVE_INFINITY };
  const side = sideOf(network);
  const whole = (behind: Side) => steady(strings.whole, behind, ahead, voltage_V);
  const normal = whole(side);
  const fast = fastFaults(network);
  const row = (kind: FaultAnswer["kind"], element: number, state: Steady, share: number): FaultAnswer => ({
    kind,
    element,
    ...state,
    outputRatio: over(state.output_V, normal.output_V),
    greatestElementRatio: over(state.greatestElementVoltage_V, normal.greatestElementVoltage_V),
    fastOutput_V: share * voltage_V,
  });
  const each = (kind: "elementOpen" | "elementShort", list: readonly StringSum[]) =>
    list.map((string, i) => row(kind, i + 1, steady(string, side, ahead, voltage_V), fast[kind][i]!));
  const withoutLv = sideOf({ ...network, lv: { ...lv, ...absent } });
  const withoutInstrument = sideOf({ ...network, instrument: { ...instrument, ...absent } });
  return [
    row("normal", 0, normal, fast.normal),
    ...each("elementOpen", strings.open),
    ...each("elementShort", strings.short),
    row("lvOpen", 0, whole(withoutLv), fast.lvOpen),
    row("lvShort", 0, whole(toEarth), fast.lvShort),
    row("instrumentOpen", 0, whole(withoutInstrument), fast.instrumentOpen),
  ];
}

interface Steady {
  readonly output_V: number | null;
  readonly greatestElementVoltage_V: number | null;
}

const over = (value: number | null, normal: number | null): number | null =>
  value === null || normal === null || normal === 0 ? null : value / normal;

/** The LV side at dc: its resistance to earth and the output over the tap's voltage. */
interface Side {
  readonly resistance_ohm: number;
  readonly share: number;
}

const atDc = new Float64Array(1);
const toEarth: Side = { resistance_ohm: 0, share: 0 };

function sideOf(network: LadderNetwork): Side {
  const { Lre, Tre } = lvSide(network, atDc, atDc);
  return { resistance_ohm: 1 / Lre[0]!, share: Tre[0]! };
}

/** A string as dc sees it: its resistance, its greatest element and how many of its elements block. */
interface StringSum {
  readonly resistance_ohm: number;
  readonly greatest_ohm: number;
  readonly blocking: number;
}

const nothing: StringSum = { resistance_ohm: 0, greatest_ohm: 0, blocking: 0 };
const open: StringSum = { ...nothing, blocking: 1 };
const alone = (R: number): StringSum =>
  Number.isFinite(R) ? { resistance_ohm: R, greatest_ohm: R, blocking: 0 } : open;
const inSeries = (a: StringSum, b: StringSum): StringSum => ({
  resistance_ohm: a.resistance_ohm + b.resistance_ohm,
  greatest_ohm: Math.max(a.greatest_ohm, b.greatest_ohm),
  blocking: a.blocking + b.blocking,
});

/** The whole string, and it with each element open or short: sums from both ends meet in the fault. */
function stringSums({ n, resistance_ohm }: LadderNetwork) {
  const single = Array.from(resistance_ohm, alone);
  const below = [nothing];
  for (let i = 0; i < n; i++) below.push(inSeries(below[i]!, single[i]!));
  const above = new Array<StringSum>(n + 1).fill(nothing);
  for (let i = n - 1; i >= 0; i--) above[i] = inSeries(above[i + 1]!, single[i]!);
  const short = single.map((_, i) => inSeries(below[i]!, above[i + 1]!));
  return { whole: below[n]!, short, open: short.map((rest) => inSeries(rest, open)) };
}

/** With nothing from the tap to earth no current flows and the output follows the source; a blocked string leaves the tap at earth. */
function steady(string: StringSum, side: Side, ahead: number, voltage: number): Steady {
  const earthed = side.resistance_ohm < Number.POSITIVE_INFINITY;
  if (string.blocking > 0) {
    const alone = earthed && string.blocking === 1;
    return { output_V: earthed ? 0 : null, greatestElementVoltage_V: alone ? Math.abs(voltage) : null };
  }
  if (!earthed) return { output_V: voltage * side.share, greatestElementVoltage_V: 0 };
  const whole = string.resistance_ohm + ahead + side.resistance_ohm;
  if (whole === 0) return { output_V: 0, greatestElementVoltage_V: 0 };
  return {
    output_V: voltage * side.share * (side.resistance_ohm / whole),
    greatestElementVoltage_V: Math.abs(voltage) * (string.greatest_ohm / whole),
  };
}
