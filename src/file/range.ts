/** Physical range of every unit that a document uses: wider than any divider, narrow enough to catch nonsense. */
export type Unit =
  | "ohm"
  | "F"
  | "H"
  | "V"
  | "A"
  | "W"
  | "m"
  | "s"
  | "Hz"
  | "K"
  | "degC"
  | "K/W"
  | "1/K"
  | "1/V"
  | "F/m"
  | "s/m"
  | "1";

export const ranges: Readonly<Record<Unit, readonly [least: number, greatest: number]>> = {
  ohm: [0, 1e18],
  F: [0, 1],
  H: [0, 1],
  V: [0, 1e8],
  A: [0, 1e6],
  W: [0, 1e9],
  m: [0, 1e4],
  s: [0, 1e7],
  Hz: [0, 1e13],
  K: [0, 1000],
  degC: [-273.15, 1500],
  "K/W": [0, 1e6],
  "1/K": [-1, 1],
  "1/V": [-1, 1],
  "F/m": [0, 1e-6],
  "s/m": [0, 1e-6],
  "1": [0, 1],
};
