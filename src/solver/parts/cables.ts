import type { Cable } from "../job/instrument.ts";

export type CableName = "coax50" | "coax75" | "leads";

/** Generic cables: capacitance and impedance by the metre, typical, from memory. Delay of the coaxial ones about 5 ns/m. */
export const cables: Readonly<Record<CableName, Omit<Cable, "length_m">>> = {
  coax50: { capacitance_F_per_m: 100e-12, impedance_ohm: 50 },
  coax75: { capacitance_F_per_m: 67e-12, impedance_ohm: 75 },
  leads: { capacitance_F_per_m: 40e-12, impedance_ohm: 150 },
};
