import { type Formula, type FormulaInput, formula } from "../standards/formula.ts";
import type { Source } from "../standards/source.ts";

type Names = "X" | "s" | "l" | "d" | "Φ";

const fitted: Source = {
  title: "Boundary-element solve of a graded column",
  edition: null,
  clause: "fit to the solve",
  status: "computed here",
};
const inputs: Readonly<Record<Names, FormulaInput>> = {
  X: { symbol: "X_0", unit: "F", meaning: "the bare column's" },
  s: { symbol: "s", unit: "1", meaning: "outer radius over the one that balances the string" },
  l: { symbol: "l", unit: "m", meaning: "column length" },
  d: { symbol: "d", unit: "m", meaning: "column diameter" },
  Φ: { symbol: "Φ", unit: "1", meaning: "what the floor does, by h/l" },
};

/** {X} times a polynomial in s, 1/L and Φ; L = ln(l/d). */
function record(
  id: string,
  title: string,
  result: FormulaInput,
  holds: string,
  c: readonly [number, number, number, number, number, number, number, number],
): Formula<Names> {
  return formula({
    id,
    title,
    statement: `{=} = {X} · (${c[0]} + ${c[1]} {s} + ${c[2]} {s}² + ${c[3]}/L + ${c[4]} {Φ} + ${c[5]} {s}/L + ${c[6]} {s} {Φ} + ${c[7]} {s}²/L), L = ln({l}/{d})`,
    result,
    inputs,
    holds,
    source: fitted,
    compute: ({ X, s, l, d, Φ }) => {
      if (!(s >= 0.25 && s <= 1.2)) return null;
      const L = Math.log(l / d);
      const share =
        c[0] + c[1] * s + c[2] * s * s + c[3] / L + c[4] * Φ + (c[5] * s) / L + c[6] * s * Φ + (c[7] * s * s) / L;
      return X * share;
    },
  });
}

const ce = { symbol: "C_e,eff", unit: "F", meaning: "effective stray to earth" };
const ch = { symbol: "C_h,eff", unit: "F", meaning: "effective stray to the electrode" };
const m = { symbol: "M", unit: "F", meaning: "response time over resistance" };
const where = "l/d 8 to 100, 0.25 to 1.2 of the balancing size; none outside.";
const ofSphere = `A graded film under a sphere, h/l 0.4 to 5, ${where}`;
const ofToroid = `A graded film under a toroid, tube a quarter of the ring radius, centre plane at the column's top, h/l 0.1 to 5, ${where}`;

/** Strays under an electrode as multiples of the bare column's: X is Ce_eff for Ce_eff and Ch_eff, M for M. */
export const underElectrode = {
  sphereEarth: record(
    "field.sphereEarth",
    "Stray to earth under a sphere",
    ce,
    `Within 3 %. ${ofSphere}`,
    [0.9657, -0.5398, 0.1775, 0.2901, -0.157, 0.1786, 0.0217, -0.1148],
  ),
  sphereElectrode: record(
    "field.sphereElectrode",
    "Stray to a sphere",
    ch,
    `Within 1 % of the bare column's C_e. ${ofSphere}`,
    [0.0024, 0.3923, -0.1049, -0.0918, 0.0779, -0.1307, -0.0743, 0.081],
  ),
  sphereM: record(
    "field.sphereM",
    "M under a sphere",
    m,
    `Within 4 % of the bare column's M. ${ofSphere}`,
    [0.9324, -1.346, 0.4079, 0.8464, -0.4278, -0.6655, 0.4256, -0.1713],
  ),
  toroidEarth: record(
    "field.toroidEarth",
    "Stray to earth under a toroid",
    ce,
    `Within 6 %. ${ofToroid}`,
    [0.9965, -0.5838, 0.1846, 0.345, -0.1224, 0.0851, 0.0039, -0.1107],
  ),
  toroidElectrode: record(
    "field.toroidElectrode",
    "Stray to a toroid",
    ch,
    `Within 2 % of the bare column's C_e. ${ofToroid}`,
    [-0.015, 0.3629, -0.0723, -0.1033, 0.0526, -0.044, -0.0538, 0.0599],
  ),
  toroidM: record(
    "field.toroidM",
    "M under a toroid",
    m,
    `Within 7 % of the bare column's M. ${ofToroid}`,
    [1.026, -1.4358, 0.4039, 0.8674, -0.3132, -0.3599, 0.3172, -0.4961],
  ),
};
