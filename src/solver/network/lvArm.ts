import type { LadderNetwork } from "./ladderNetwork.ts";

/** The shunt parts from tap to instrument, gathered: what stands at the tap, and what stands behind the series protector. */
export interface LvShunts {
  /** Conductance and capacitance at the tap itself. */
  readonly tapG: number;
  readonly tapC: number;
  /** Series protector; 0: the far side is the tap. */
  readonly Rs: number;
  readonly farG: number;
  readonly farC: number;
}

const conductance = (R: number) => (R === Number.POSITIVE_INFINITY ? 0 : 1 / R);

export function lvShunts(network: LadderNetwork): LvShunts {
  const { lv, protector, cable, instrument, seriesProtector } = network;
  const far = {
    G: conductance(instrument.resistance_ohm) + conductance(instrument.protector.resistance_ohm),
    C: instrument.capacitance_F + instrument.protector.capacitance_F,
  };
  const near = {
    G: conductance(lv.resistance_ohm) + conductance(protector.resistance_ohm),
    C: lv.capacitance_F + protector.capacitance_F,
  };
  if (seriesProtector.at === "divider") far.C += cable.capacitance_F;
  else near.C += cable.capacitance_F;
  const Rs = seriesProtector.resistance_ohm;
  if (Rs === 0) return { tapG: near.G + far.G, tapC: near.C + far.C, Rs, farG: 0, farC: 0 };
  return { tapG: near.G, tapC: near.C, Rs, farG: far.G, farC: far.C };
}
