import type { LadderNetwork } from "./ladderNetwork.ts";
import { conductance } from "./lvSide.ts";

/**
 * The dc scale factor as a function of string, LV resistor and instrument (Infinity: absent), and its slopes:
 * F = v + R1 (i + (1/R2 + Gp) v), where v and i are the tap's voltage and the current into the instrument's branch for 1 V at the
 * instrument, both linear in its conductance. Sums of positive terms alone.
 */
export interface DcScaleFactor {
  at(R1: number, R2: number, instrument_ohm: number): number;
  /** dF/dR1. */
  perOhm(R2: number, instrument_ohm: number): number;
  /** dF/d(1/R2). */
  perLvConductance(R1: number, instrument_ohm: number): number;
  /** dF/d(1/Rm). */
  perInstrumentConductance(R1: number, R2: number): number;
}

export function dcScaleFactor(network: LadderNetwork): DcScaleFactor {
  const { v0, v1, i0, i1 } = instrumentBranch(network);
  const leakage = conductance(network.protector.resistance_ohm);
  const atTap = (R2: number) => conductance(R2) + leakage;
  const perOhm = (R2: number, Rm: number) => {
    const g = conductance(Rm);
    return i0 + i1 * g + atTap(R2) * (v0 + v1 * g);
  };
  return {
    at: (R1, R2, Rm) => v0 + v1 * conductance(Rm) + R1 * perOhm(R2, Rm),
    perOhm,
    perLvConductance: (R1, Rm) => R1 * (v0 + v1 * conductance(Rm)),
    perInstrumentConductance: (R1, R2) => v1 + R1 * (i1 + atTap(R2) * v1),
  };
}

/** For 1 V at the instrument of conductance g: v0 + v1 g at the tap, i0 + i1 g into the branch. */
function instrumentBranch({ instrument, seriesProtector, cable: { line } }: LadderNetwork) {
  const branch = { v0: 1, v1: 0, i0: conductance(instrument.protector.resistance_ohm), i1: 1 };
  const through = (R: number) => {
    branch.v0 += R * branch.i0;
    branch.v1 += R * branch.i1;
  };
  if (seriesProtector.at === "instrument") through(seriesProtector.resistance_ohm);
  if (line !== null) {
    const G = conductance(line.terminationAtEnd_ohm);
    branch.i0 += G * branch.v0;
    branch.i1 += G * branch.v1;
    through(line.seriesAtTap_ohm);
  }
  if (seriesProtector.at === "divider") through(seriesProtector.resistance_ohm);
  return branch;
}
