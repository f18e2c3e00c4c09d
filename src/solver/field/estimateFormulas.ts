import { epsilon0 } from "../standards/constants.ts";
import { formula } from "../standards/formula.ts";
import type { Source } from "../standards/source.ts";

const fitted: Source = {
  title: "Boundary-element solve of a graded column",
  edition: null,
  clause: "fit to the solve",
  status: "computed here",
};
const m = (symbol: string, meaning: string) => ({ symbol, unit: "m", meaning });
const column = { l: m("l", "column length"), d: m("d", "column diameter"), h: m("h", "height of its foot") };
const one = (symbol: string, meaning: string) => ({ symbol, unit: "1", meaning });
const phi = one("Φ", "what the floor does, by h/l");

/** Whether the fits were made there: l/d from `slender` to 100, h/l from `lowest` to 5. */
const fits = (l: number, d: number, h: number, lowest = 0.02, slender = 4): boolean =>
  l / d >= slender * (1 - 1e-9) && l / d <= 100 * (1 + 1e-9) && h / l >= lowest && h / l <= 5;

export const estimateFormulas = {
  floor: formula({
    id: "field.floor",
    title: "What the floor does to a column",
    statement: "{=} = (2t+2) ln(2t+2) − 2(2t+1) ln(2t+1) + 2t ln 2t, t = {h}/{l}",
    result: phi,
    inputs: { l: column.l, h: column.h },
    holds: "The mean potential of the image of a uniform line charge; none where the foot stands on the floor.",
    source: { ...fitted, title: "Potential of a line charge", clause: "mean over its image" },
    compute: ({ l, h }) => {
      const t = h / l;
      if (!(t > 0)) return null;
      return (2 * t + 2) * Math.log(2 * t + 2) - 2 * (2 * t + 1) * Math.log(2 * t + 1) + 2 * t * Math.log(2 * t);
    },
  }),
  bareEarth: formula({
    id: "field.bareEarth",
    title: "Effective stray to earth of a bare graded column",
    statement: "{=} = 2π ε_0 {l} / (ln(4{l}/{d}) − 1 − 0.571 {Φ} + 0.194 + 0.511/ln({l}/{d})), h = {h}",
    result: { symbol: "C_e,eff", unit: "F", meaning: "6 Σ C_i x_i (1 − x_i)" },
    inputs: { ...column, Φ: phi },
    holds:
      "Within 1.1 % of the solve for l/d 4 to 100, h/l 0.02 to 5; none outside. A graded film; bands of 0.4 pitch lie 2 to 20 % lower at 20 elements. Under a top electrode it is too high.",
    source: fitted,
    compute: ({ l, d, h, Φ }) =>
      fits(l, d, h)
        ? (2 * Math.PI * epsilon0 * l) / (Math.log((4 * l) / d) - 1 - 0.571 * Φ + 0.194 + 0.511 / Math.log(l / d))
        : null,
  }),
  bareM: formula({
    id: "field.bareM",
    title: "M of a bare graded column",
    statement:
      "{=} = {Ce}/6 − (0.0812 − 0.0535 {Φ} + 0.0142 {Φ}² + 0.1048/L − 0.1404/L²) · 2π ε_0 {l}/L², L = ln({l}/{d}), h = {h}",
    result: { symbol: "M", unit: "F", meaning: "response time over resistance" },
    inputs: { ...column, Φ: phi, Ce: { symbol: "C_e,eff", unit: "F", meaning: "effective stray to earth" } },
    holds:
      "Within 1.8 % of the solve of a graded film for l/d 4 to 100, h/l 0.02 to 5; none outside or under an electrode.",
    source: fitted,
    compute: ({ l, d, h, Φ, Ce }) => {
      if (!fits(l, d, h)) return null;
      const L = Math.log(l / d);
      const rest = 0.0812 - 0.0535 * Φ + 0.0142 * Φ * Φ + 0.1048 / L - 0.1404 / (L * L);
      return Ce / 6 - (rest * 2 * Math.PI * epsilon0 * l) / (L * L);
    },
  }),
  balancingSphere: formula({
    id: "field.balancingSphere",
    title: "Sphere that balances the string",
    statement:
      "{=} = {l} · exp(−1.1867 + 0.8716 {Φ} + 0.5994 {Φ}² − 0.6809/L + 0.2538 {Φ}/L), L = ln({l}/{d}), h = {h}",
    result: m("a", "radius with which M = 0"),
    inputs: { ...column, Φ: phi },
    holds: "A graded film, l/d 8 to 100, h/l 0.4 to 5, within 0.8 %; none outside. Near walls a larger one is needed.",
    source: fitted,
    compute: ({ l, d, h, Φ }) => {
      const L = Math.log(l / d);
      return fits(l, d, h, 0.4, 8)
        ? l * Math.exp(-1.1867 + 0.8716 * Φ + 0.5994 * Φ * Φ - 0.6809 / L + (0.2538 * Φ) / L)
        : null;
    },
  }),
  balancingToroid: formula({
    id: "field.balancingToroid",
    title: "Toroid that balances the string",
    statement:
      "{=} = {l} · exp(−1.2589 + 0.5081 {Φ} + 0.3198 {Φ}² − 0.3325/L + 0.0112 {Φ}/L), L = ln({l}/{d}), h = {h}",
    result: m(
      "R",
      "outer radius with which M = 0, tube a quarter of the ring radius, centre plane at the column's top",
    ),
    inputs: { ...column, Φ: phi },
    holds: "A graded film, l/d 8 to 100, h/l 0.05 to 5, within 1.7 %; none outside. Near walls a larger one is needed.",
    source: fitted,
    compute: ({ l, d, h, Φ }) => {
      const L = Math.log(l / d);
      return fits(l, d, h, 0.05, 8)
        ? l * Math.exp(-1.2589 + 0.5081 * Φ + 0.3198 * Φ * Φ - 0.3325 / L + (0.0112 * Φ) / L)
        : null;
    },
  }),
};
