import { formula, type Solution } from "../standards/formula.ts";
import { computedHere, practice } from "../standards/source.ts";

const F = (symbol: string, meaning: string) => ({ symbol, unit: "F", meaning });
const one = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });
const n = one("n", "elements in series");
const p = one("p", "strings in parallel");

/** C1 at least this many times the column's stray: its ±30 % doubt then costs 1 %. */
export const strayRule = 5;
/** Element capacitor at least this many times the resistor's own. */
export const bodyRule = 20;

export const compensationFormulas = {
  elementCapacitor: formula({
    id: "sizing.elementCapacitor",
    title: "Capacitor across one element, least",
    statement: "{=} = max({ks} · {Ce} · {n} / {p} − {Cb}, {kb} · {Cb})",
    result: F("C_f", "capacitor across one element"),
    inputs: {
      ks: one("k_s", "C1 over the column's stray, 5"),
      Ce: F("C_e", "stray capacitance of the column to earth"),
      n,
      p,
      kb: one("k_b", "capacitor over the resistor's own, 20"),
      Cb: F("C_b", "the resistor's own capacitance"),
    },
    holds: "A uniform string; the stray then takes at most C_e/(6 C_1) = 3.3 % from C1.",
    source: practice("C1 at least five times the stray, the capacitor at least twenty times the body's own"),
    compute: ({ ks, Ce, n, p, kb, Cb }) => Math.max((ks * Ce * n) / p - Cb, kb * Cb),
  }),
  sourceCapacitor: formula({
    id: "sizing.sourceCapacitor",
    title: "Capacitor across one element, greatest by the source",
    statement: "{=} = {Cs} · {e} / (1 − {e}) · {n} / {p} − {Cb}",
    result: F("C_f,max", "capacitor across one element"),
    inputs: {
      Cs: F("C_src", "capacitance of the source"),
      e: one("ε", "sag that is accepted"),
      n,
      p,
      Cb: F("C_b", "the resistor's own capacitance"),
    },
    holds: "The source's capacitance alone feeds an edge.",
    source: computedHere("charge shared between source and divider"),
    compute: ({ Cs, e, n, p, Cb }) => (((Cs * e) / (1 - e)) * n) / p - Cb,
  }),
};

export const lvCapacitanceRecord: Solution = {
  id: "sizing.lvCapacitance",
  title: "LV capacitance to be fitted",
  statement: "smallest greatest |20 log |F · H(f)|| over the band, by the LV capacitance alone",
  method: "241 frequencies over the band on the whole ladder with strays, cable and instrument; golden section.",
  holds: "Linear network; strays by the closed formula.",
  source: computedHere("ladder solved at each frequency"),
  residualBound: 1e-6,
};
