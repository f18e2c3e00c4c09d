/** Units that a field, a file or a finding may name, the ways they are written, and the SI prefixes they take. */
export type UnitName =
  | "ohm"
  | "F"
  | "H"
  | "V"
  | "A"
  | "W"
  | "J"
  | "C"
  | "S"
  | "s"
  | "Hz"
  | "m"
  | "K"
  | "degC"
  | "1"
  | "1/K"
  | "1/V"
  | "K/W"
  | "F/m"
  | "s/m"
  | "dB"
  | "deg";

interface UnitRecord {
  /** How it is shown. */
  readonly symbol: string;
  /** Accepted spellings, compared after normalising Ω, µ and spaces. */
  readonly spellings: readonly string[];
  readonly prefixes: boolean;
}

export const units: Readonly<Record<UnitName, UnitRecord>> = {
  ohm: { symbol: "Ω", spellings: ["Ω", "ohm", "ohms", "Ohm", "Ohms", "OHM"], prefixes: true },
  F: { symbol: "F", spellings: ["F", "farad"], prefixes: true },
  H: { symbol: "H", spellings: ["H", "henry"], prefixes: true },
  V: { symbol: "V", spellings: ["V", "v", "volt", "volts"], prefixes: true },
  A: { symbol: "A", spellings: ["A", "amp", "ampere"], prefixes: true },
  W: { symbol: "W", spellings: ["W", "watt", "watts"], prefixes: true },
  J: { symbol: "J", spellings: ["J", "joule"], prefixes: true },
  C: { symbol: "C", spellings: ["C", "coulomb"], prefixes: true },
  S: { symbol: "S", spellings: ["S", "siemens"], prefixes: true },
  s: { symbol: "s", spellings: ["s", "sec", "second", "seconds"], prefixes: true },
  Hz: { symbol: "Hz", spellings: ["Hz", "hz", "HZ", "hertz"], prefixes: true },
  m: { symbol: "m", spellings: ["m", "metre", "metres"], prefixes: true },
  K: { symbol: "K", spellings: ["K", "kelvin"], prefixes: false },
  degC: { symbol: "°C", spellings: ["°C", "degC", "C"], prefixes: false },
  "1": { symbol: "", spellings: [], prefixes: false },
  "1/K": { symbol: "/K", spellings: ["/K", "1/K"], prefixes: false },
  "1/V": { symbol: "/V", spellings: ["/V", "1/V"], prefixes: false },
  "K/W": { symbol: "K/W", spellings: ["K/W"], prefixes: false },
  "F/m": { symbol: "F/m", spellings: ["F/m"], prefixes: true },
  "s/m": { symbol: "s/m", spellings: ["s/m"], prefixes: true },
  dB: { symbol: "dB", spellings: ["dB"], prefixes: false },
  deg: { symbol: "°", spellings: ["°", "deg"], prefixes: false },
};

/** SI prefixes as written after normalising (µ is U+00B5), with their power of ten. `K` as kilo: IEC 60062 and usage. */
export const prefixes: Readonly<Record<string, number>> = {
  f: -15,
  p: -12,
  n: -9,
  µ: -6,
  u: -6,
  m: -3,
  "": 0,
  k: 3,
  K: 3,
  M: 6,
  G: 9,
  T: 12,
};

/** One spelling for signs that look alike: Ω, µ, minus, multiplication and all kinds of space. */
export function normalise(text: string): string {
  return text
    .replace(/[\u2126]/g, "Ω")
    .replace(/[\u03bc]/g, "µ")
    .replace(/[\u2212\u2013]/g, "-")
    .replace(/[\u00d7\u00b7\u22c5]/g, "*")
    .replace(/[\u00a0\u2009\u202f\u2007]/g, " ");
}
