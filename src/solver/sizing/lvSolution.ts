import { formatQuantity } from "../quantities/format.ts";
import { ok, type Result, refuse } from "../quantities/result.ts";
import { formula } from "../standards/formula.ts";
import { computedHere } from "../standards/source.ts";

const ohm = (symbol: string, meaning: string) => ({ symbol, unit: "ohm", meaning });
const one = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });
const R1 = ohm("R_1", "HV arm resistance");
const Rm = ohm("R_m", "input resistance of the instrument");
const Rs = ohm("R_s", "series protector");
const G = { symbol: "G_p", unit: "S", meaning: "leakage of the protectors" };
const F = one("F", "wanted scale factor");

/** R2 for a scale factor: 1/R2 = (F/(1+Rs/Rm) − 1)/R1 − 1/(Rs+Rm) − G; null where none exists. */
const solve = (R1: number, F: number, Rm: number, Rs: number, G: number): number | null => {
  const conductance = (F / (1 + Rs / Rm) - 1) / R1 - 1 / (Rs + Rm) - G;
  return conductance > 0 ? 1 / conductance : null;
};

const needed = (edge: "least" | "greatest", sign: 1 | -1) =>
  formula({
    id: `sizing.lvArm.${edge}`,
    title: `LV arm resistance needed, ${edge}`,
    statement:
      sign < 0
        ? "1 / {=} = ({F} / (1 + {Rs}/{Rm}) − 1) / ({R1} (1 − {t})) − 1 / ({Rs} + {Rm} (1 + {s})) − {G}"
        : "1 / {=} = ({F} / (1 + {Rs}/{Rm}) − 1) / ({R1} (1 + {t})) − 1 / ({Rs} + {Rm} (1 − {s})) − {G}",
    result: ohm(`R_2,${edge === "least" ? "min" : "max"}`, "LV arm resistance needed with parts at their extremes"),
    inputs: {
      F,
      R1,
      Rm,
      Rs,
      G,
      t: one("t", "tolerance of the string, whole"),
      s: one("s_m", "half-width of the instrument's resistance"),
    },
    holds: "Every element at the same end of its tolerance.",
    source: computedHere("the scale factor solved for the LV arm at the extremes"),
    compute: ({ F, R1, Rm, Rs, G, t, s }) => solve(R1 * (1 + sign * t), F, Rm * (1 - sign * s), Rs, G),
  });

export const lvSolutionFormulas = {
  least: needed("least", -1),
  nominal: formula({
    id: "sizing.lvArm.nominal",
    title: "LV arm resistance for the wanted scale factor",
    statement: "1 / {=} = ({F} / (1 + {Rs} / {Rm}) − 1) / {R1} − 1 / ({Rs} + {Rm}) − {G}",
    result: ohm("R_2", "LV arm resistance wanted"),
    inputs: { F, R1, Rm, Rs, G },
    holds: "Exists only where the wanted scale factor exceeds 1 + R1/Rm.",
    source: computedHere("the scale factor solved for the LV arm"),
    compute: ({ F, R1, Rm, Rs, G }) => solve(R1, F, Rm, Rs, G),
  }),
  greatest: needed("greatest", 1),
};

/** What the LV arm must be: for nominal parts, and at the ends of string tolerance and instrument spread. */
export interface LvNeed {
  readonly nominal_ohm: number;
  readonly least_ohm: number;
  readonly greatest_ohm: number;
}

export interface LvGiven {
  readonly hvArm_ohm: number;
  readonly scaleFactor: number;
  readonly instrument_ohm: number;
  readonly seriesProtector_ohm: number;
  readonly leakage_S: number;
  /** Worst case of the whole string, relative. */
  readonly stringTolerance: number;
  readonly instrumentSpread: number;
}

/**
 * LV arm resistance needed, Ω. Exists only where the scale factor exceeds 1 + R1/Rm: else refused with both ways out.
 * @example 12 × 100 MΩ ±1 %, 10 MΩ ±1 %, 1000 → nominal 1.365188 MΩ, 1.347892 to 1.382653 MΩ
 */
export function lvNeed(given: LvGiven): Result<LvNeed> {
  const x = {
    F: given.scaleFactor,
    R1: given.hvArm_ohm,
    Rm: given.instrument_ohm,
    Rs: given.seriesProtector_ohm,
    G: given.leakage_S,
    t: given.stringTolerance,
    s: given.instrumentSpread,
  };
  const f = lvSolutionFormulas;
  const nominal_ohm = f.nominal.compute(x);
  const least_ohm = f.least.compute(x);
  const greatest_ohm = f.greatest.compute(x);
  if (nominal_ohm === null || least_ohm === null || greatest_ohm === null) return noLvArm(given, nominal_ohm === null);
  return ok({ nominal_ohm, least_ohm, greatest_ohm });
}

function noLvArm(given: LvGiven, nominal: boolean): Result<never> {
  const { scaleFactor, hvArm_ohm, instrument_ohm, seriesProtector_ohm, leakage_S } = given;
  const show = (value: number, unit: string) => formatQuantity(value, unit as never, { digits: 3 });
  const G = 1 / (seriesProtector_ohm + instrument_ohm) + leakage_S;
  const over = scaleFactor / (1 + seriesProtector_ohm / instrument_ohm) - 1;
  const alone = (1 + hvArm_ohm * G) * (1 + seriesProtector_ohm / instrument_ohm);
  const why = nominal
    ? `No LV arm gives ${show(scaleFactor, "1")}: the instrument alone already gives ${show(alone, "1")}.`
    : `With parts at the ends of their tolerances no LV arm gives ${show(scaleFactor, "1")}: the instrument alone gives ${show(alone, "1")} nominally.`;
  const cure = `Lower R1 below ${show(Math.max(over, 0) / G, "ohm")} or use a scale factor above ${show(alone, "1")}.`;
  return refuse("/brief/scaleFactor", why, cure);
}
