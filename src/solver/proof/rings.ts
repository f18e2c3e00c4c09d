import { edgeFormulas } from "../checks/edgeFormulas.ts";
import type { Judging } from "../checks/judging.ts";
import { show } from "../checks/show.ts";
import type { LadderNetwork } from "../network/ladderNetwork.ts";
import { lumpedCable } from "../network/lumpedCable.ts";
import { ringingPoles } from "../network/ringing.ts";
import { modulus } from "../quantities/complex.ts";

/** One frequency at which this divider could ring. */
export interface Ring {
  readonly id: string;
  readonly name: string;
  readonly frequency_Hz: number;
  /** Share of critical damping; null: not told by the formula. 1 and more does not ring. */
  readonly damping: number | null;
  /** The formula with its numbers, or how it was found. */
  readonly how: string;
  /** What quiets it. */
  readonly cure: string;
  /** Whether it is in the network that stands, or only what it would be. */
  readonly counted: boolean;
}

/** A straight wire, from memory. */
const wire_H_per_m = 1e-6;

/** By formula one loop at a time, and beside them the natural frequencies of the whole network; lowest first. */
export function rings(j: Judging, network: LadderNetwork): Ring[] {
  const found = [lead(j, network), ...lvArm(j), cable(j), ...exact(network)].filter((each) => each !== null);
  return found.sort((a, b) => a.frequency_Hz - b.frequency_Hz);
}

function lead(j: Judging, network: LadderNetwork): Ring | null {
  const C = j.sheet.number("input.capacitance_F") ?? 0;
  const { source } = network;
  const counted = source.inductance_H > 0;
  const L = counted ? source.inductance_H : wire_H_per_m;
  const frequency_Hz = edgeFormulas.leadRing.compute({ L, Cin: C });
  if (frequency_Hz === null) return null;
  const least = Math.sqrt(L / C);
  const R = source.damping_ohm + ((source.atTerminals_F ?? 0) === 0 ? source.resistance_ohm : 0);
  return {
    id: "lead",
    name: counted ? "HV lead with the divider's input" : "a metre of HV lead with the divider's input",
    frequency_Hz,
    damping: R / (2 * least),
    how: `1/(2π√(${show(L, "H")} · ${show(C, "F")}))${counted ? "" : ", 1 µH a metre from memory"}`,
    cure: `${show(least, "ohm")} to ${show(2 * least, "ohm")} at the top electrode, or a shorter loop`,
    counted,
  };
}

function lvArm(j: Judging): Ring[] {
  const L2 = j.design.lvArm.inductance_H;
  const C2 = j.sheet.number("lvArm.capacitanceFitted_F") as number;
  const beside = (j.sheet.number("lvArm.capacitanceTotal_F") as number) - C2;
  if (L2 === 0 || C2 === 0) return [];
  const at = (C: number) => 1 / (2 * Math.PI * Math.sqrt(L2 * C));
  const dip: Ring = {
    id: "lvResonance",
    name: "LV capacitors with their own inductance: a dip",
    frequency_Hz: at(C2),
    damping: null,
    how: `1/(2π√(${show(L2, "H")} · ${show(C2, "F")}))`,
    cure: "many small capacitors in a ring about the tap, no leads",
    counted: true,
  };
  if (beside === 0) return [dip];
  const both = (C2 * beside) / (C2 + beside);
  return [
    dip,
    {
      id: "lvLoop",
      name: "LV capacitors' inductance with cable and instrument",
      frequency_Hz: at(both),
      damping: null,
      how: `1/(2π√(${show(L2, "H")} · ${show(both, "F")})), both capacitances in series`,
      cure: "less inductance; a resistor of the cable's impedance at the tap damps it",
      counted: true,
    },
  ];
}

function cable(j: Judging): Ring | null {
  const frequency_Hz = j.sheet.number("cable.quarterWave_Hz");
  if (frequency_Hz === null) return null;
  const { length_m, delay_s_per_m, impedance_ohm, end } = j.instrument.cable;
  const quiet = end === "matchedAtTap" || end === "terminated";
  return {
    id: "cable",
    name: quiet ? "quarter wave of the cable, matched" : "quarter wave of the cable, open",
    frequency_Hz,
    damping: quiet ? 1 : 0,
    how: `1/(4 · ${show(length_m, "m")} · ${show(delay_s_per_m, "s")}/m)`,
    cure: quiet ? `${show(impedance_ohm, "ohm")} stand there` : `${show(impedance_ohm, "ohm")} in series at the tap`,
    counted: end !== "lumped",
  };
}

function exact(network: LadderNetwork): Ring[] {
  return ringingPoles(lumpedCable(network), "source").map((pole, i) => ({
    id: `network.${i + 1}`,
    name: `natural frequency ${i + 1} of the whole network`,
    frequency_Hz: pole.im / (2 * Math.PI),
    damping: -pole.re / modulus(pole),
    how: "zero of the network's determinant, source and lead counted, the cable as its capacitance",
    cure: `dies to a tenth in ${show(Math.LN10 / -pole.re, "s")}`,
    counted: true,
  }));
}
