import { wantedBand } from "../checks/band.ts";
import { capacitorOf, type Judging } from "../checks/judging.ts";
import { elementVoltages } from "../network/elementVoltages.ts";
import type { LadderNetwork } from "../network/ladderNetwork.ts";
import { sweep } from "../network/sweep.ts";
import { formatQuantity } from "../quantities/format.ts";
import type { Solution } from "../standards/formula.ts";
import { computedHere } from "../standards/source.ts";

/** What sets the greatest input at a frequency. */
export type Decider =
  | "element voltage"
  | "resistor dissipation"
  | "capacitor voltage"
  | "capacitor heat"
  | "instrument";

/** Greatest sine at the electrode against frequency, and the part that decides. Plain data. */
export interface GreatestInput {
  readonly frequency_Hz: readonly number[];
  /** Peak, V; null where nothing bounds it. */
  readonly greatest_Vpeak: readonly (number | null)[];
  readonly decidedBy: readonly (Decider | null)[];
  /** Element that decides, 1 next to the tap; null: the instrument. */
  readonly element: readonly (number | null)[];
  readonly sentence: string;
}

export const greatestInputRecord: Solution = {
  id: "proof.greatestInput",
  title: "Greatest input against frequency",
  statement:
    "The least of √2 V_lim/u_i, √(2 R_i P_i)/u_i, V_C/u_i, √(2 P_C/(ω C_i tan δ))/u_i over the elements, and V_in F/|g| at the instrument; u_i the element's voltage for 1 V",
  method: "Every element's voltage on the ladder at each frequency.",
  holds:
    "A steady sine. Ratings derated as the policy says; 0.1 W is allowed in a small element capacitor (common practice, no source). The instrument's rating is taken flat: many fall above about 100 kHz.",
  source: computedHere("ladder, each part against its own rating"),
  residualBound: 1e-9,
};

/** Dielectric heat that a small capacitor may take, W; common practice, no source. */
const capacitorHeat_W = 0.1;
const points = 61;

/** Judges a sine of every frequency against each part. Writes `greatestInput.low_V` and `greatestInput.high_V`, the ends of the range. */
export function greatestInput(j: Judging, network: LadderNetwork): GreatestInput {
  const high = Math.max(1e6, 10 * wantedBand(j.document.brief)[1]);
  const frequency_Hz = Array.from({ length: points }, (_, i) => 10 * (high / 10) ** (i / (points - 1)));
  const { elementVoltage_V } = elementVoltages(network, frequency_Hz, 1);
  const response = sweep(network, frequency_Hz)!;
  const bounds = partBounds(j);
  const F = j.sheet.number("scaleFactor.predicted") as number;
  const limit = j.instrument.greatestInput_Vpeak;
  const found = frequency_Hz.map((f, k) => {
    let least = limit === null ? open : instrumentAt(limit * F, response.real[k]!, response.imaginary[k]!);
    for (const [i, u] of elementVoltage_V[k]!.entries()) least = smaller(least, bounds(i, u, 2 * Math.PI * f));
    return least;
  });
  const inputs = {
    R: "/design/hvArm/elements/*/resistance_ohm",
    C: "element.capacitance_F",
    F: "scaleFactor.predicted",
  };
  const put = (path: string, k: number) =>
    j.sheet.solved(path, greatestInputRecord, finite(found[k]!.value), inputs, 0);
  put("greatestInput.low_V", 0);
  put("greatestInput.high_V", points - 1);
  return {
    frequency_Hz,
    greatest_Vpeak: found.map(({ value }) => finite(value)),
    decidedBy: found.map(({ by }) => by),
    element: found.map(({ element }) => element),
    sentence: sentenceOf(frequency_Hz, found),
  };
}

interface Bound {
  readonly value: number;
  readonly by: Decider | null;
  readonly element: number | null;
}
const open: Bound = { value: Number.POSITIVE_INFINITY, by: null, element: null };
const smaller = (a: Bound, b: Bound): Bound => (b.value < a.value ? b : a);
const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);

/** The instrument sees V·|g|/F. */
function instrumentAt(scaled: number, re: number, im: number): Bound {
  const g = Math.hypot(re, im);
  return g === 0 ? open : { value: scaled / g, by: "instrument", element: null };
}

/** The peak input at which element i, with voltage u for 1 V, meets its first limit. */
function partBounds(j: Judging): (i: number, u: number, omega: number) => Bound {
  const { sheet, design } = j;
  const { elements } = design.hvArm;
  const volts = sheet.array("element.voltageLimit_V");
  const watts = sheet.array("element.dissipationLimit_W");
  const derating = j.document.brief.policy.voltageDerating;
  return (i, u, omega) => {
    if (u === 0) return open;
    const element = elements[i]!;
    const at = (value: number | null, by: Decider): Bound =>
      value === null ? open : { value: value / u, by, element: i + 1 };
    const P = watts[i] ?? null;
    let least = smaller(
      at(volts[i] === null ? null : Math.SQRT2 * volts[i]!, "element voltage"),
      at(P === null ? null : Math.sqrt(2 * element.resistance_ohm * P), "resistor dissipation"),
    );
    if (element.capacitor !== null) {
      const family = capacitorOf(j, element.capacitor);
      const heat = omega * element.capacitance_F * family.dissipationFactor;
      least = smaller(least, at(derating * family.ratedVoltage_V, "capacitor voltage"));
      if (heat > 0) least = smaller(least, at(Math.sqrt((2 * capacitorHeat_W) / heat), "capacitor heat"));
    }
    return least;
  };
}

/** Where the deciding part changes, in words. */
function sentenceOf(frequency_Hz: readonly number[], found: readonly Bound[]): string {
  const first = found[0]!;
  if (first.by === null) return "Nothing bounds the input.";
  const parts = [
    `${formatQuantity(first.value, "V")} peak at ${formatQuantity(frequency_Hz[0]!, "Hz")}, set by ${first.by}`,
  ];
  found.forEach((bound, k) => {
    if (k > 0 && bound.by !== null && bound.by !== found[k - 1]!.by)
      parts.push(`from ${formatQuantity(frequency_Hz[k]!, "Hz")} by ${bound.by}`);
  });
  const last = found.at(-1)!;
  return `${parts.slice(0, 5).join("; ")}. ${formatQuantity(last.value, "V")} peak is left at ${formatQuantity(frequency_Hz.at(-1)!, "Hz")}.`;
}
