/**
 * The electrical model as numbers alone: one string of n elements from the tap (index 0) to the electrode, its strays, the LV
 * arm, protectors, cable and instrument. An absent resistance is Infinity, an absent capacitance 0. Plain data.
 */
export interface LadderNetwork {
  readonly n: number;
  /** n values, tap first; Infinity: absent. */
  readonly resistance_ohm: Float64Array;
  /** n values, tap first. */
  readonly capacitance_F: Float64Array;
  /** n-1 values, one an inner node, tap side first. */
  readonly toEarth_F: Float64Array;
  readonly toElectrode_F: Float64Array;
  readonly electrodeToTap_F: number;
  readonly lv: { readonly resistance_ohm: number; readonly capacitance_F: number };
  /** Leakage and capacitance of the limiting parts at the tap. */
  readonly protector: Shunt;
  readonly cable: { readonly capacitance_F: number };
  readonly instrument: Shunt & { readonly protector: Shunt };
  /** Between tap and cable (`divider`) or between cable and instrument (`instrument`). 0: a wire. */
  readonly seriesProtector: { readonly resistance_ohm: number; readonly at: "divider" | "instrument" };
}

export interface Shunt {
  readonly resistance_ohm: number;
  readonly capacitance_F: number;
}

/** The same network with another LV capacitance. */
export const withLvCapacitance = (network: LadderNetwork, capacitance_F: number): LadderNetwork => ({
  ...network,
  lv: { ...network.lv, capacitance_F },
});
