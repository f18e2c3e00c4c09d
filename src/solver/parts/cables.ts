import type { Cable } from "../job/instrument.ts";

export type CableName = "coax50" | "coax75" | "leads";

/** Generic cables: capacitance, impedance and delay by the metre, typical, from memory. */
export const cables: Readonly<Record<CableName, Omit<Cable, "length_m">>> = {
  coax50: { capacitance_F_per_m: 100e-12, impedance_ohm: 50, delay_s_per_m: 5e-9, end: "lumped" },
  coax75: { capacitance_F_per_m: 67e-12, impedance_ohm: 75, delay_s_per_m: 5e-9, end: "lumped" },
  leads: { capacitance_F_per_m: 40e-12, impedance_ohm: 150, delay_s_per_m: 6e-9, end: "lumped" },
};
