/**
 * The electrical model as numbers alone: one string of n elements from the tap (index 0) to the electrode, its strays, the LV
 * arm, protectors, cable and instrument, and what stands ahead of the electrode. An absent resistance is Infinity, an absent
 * capacitance 0. Plain data.
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
  /** The inductance is in series with the capacitor alone. */
  readonly lv: Shunt & { readonly inductance_H: number };
  /** Leakage and capacitance of the limiting parts at the tap. */
  readonly protector: Shunt;
  /** Lumped capacitance, and a lossless line with the instrument at its far end; null: no line. */
  readonly cable: { readonly capacitance_F: number; readonly line: Line | null };
  readonly instrument: Shunt & { readonly protector: Shunt };
  /** Between tap and cable (`divider`) or between cable and instrument (`instrument`). 0: a wire. */
  readonly seriesProtector: { readonly resistance_ohm: number; readonly at: "divider" | "instrument" };
  /** Ahead of the electrode: an ideal voltage behind resistance, inductance and damping; the capacitance from electrode to earth. */
  readonly source: Source;
}

export interface Shunt {
  readonly resistance_ohm: number;
  readonly capacitance_F: number;
}

export interface Line {
  readonly impedance_ohm: number;
  readonly delay_s: number;
  /** 0: a wire. */
  readonly seriesAtTap_ohm: number;
  /** Infinity: open. */
  readonly terminationAtEnd_ohm: number;
}

export interface Source {
  readonly resistance_ohm: number;
  /** From the electrode to earth. */
  readonly capacitance_F: number;
  /**
   * Across the source's own terminals, between its resistance and the inductance; absent: none. Counted where the source is the
   * reference input, which is then the voltage that its terminals would have without the divider.
   */
  readonly atTerminals_F?: number;
  readonly inductance_H: number;
  readonly damping_ohm: number;
}

/** An ideal source at the electrode. */
export const idealSource: Source = { resistance_ohm: 0, capacitance_F: 0, inductance_H: 0, damping_ohm: 0 };

/** Whether a response counts what stands ahead of the electrode. */
export type Reference = "electrode" | "source";

/** The same network with another LV capacitance. */
export const withLvCapacitance = (network: LadderNetwork, capacitance_F: number): LadderNetwork => ({
  ...network,
  lv: { ...network.lv, capacitance_F },
});
