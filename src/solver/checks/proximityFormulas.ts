import { epsilon0 } from "../standards/constants.ts";
import { formula, type Solution } from "../standards/formula.ts";
import { computedHere, practice } from "../standards/source.ts";

const m = (symbol: string, meaning: string) => ({ symbol, unit: "m", meaning });
const F = (symbol: string, meaning: string) => ({ symbol, unit: "F", meaning });
const column = { l: m("l", "column length"), Ce: F("C_e", "stray of the column to earth") };
const image: ReturnType<typeof computedHere> = computedHere("line charge and its image in an earthed plane");

/** A hand and forearm, as an earthed sphere of this radius, m. */
export const handRadius_m = 0.1;

/**
 * Mean potential that a vertical line charge of length l makes on an equal one at s beside it and z above it, over λ/(2π ε0):
 * the second difference of z asinh(z/s) − √(z² + s²).
 */
function mean(l: number, s: number, z: number): number {
  const f = (x: number) => x * Math.asinh(x / s) - Math.hypot(x, s);
  return (f(z + l) - 2 * f(z) + f(z - l)) / (2 * l);
}

export const proximityFormulas = {
  wall: formula({
    id: "proximity.wall",
    title: "What a plane wall adds to the column's stray",
    statement:
      "{=} = W/(A − W), A = 2π ε_0 {l}/{Ce}, W = m(0) − m(2{h} + {l}), m(z) = [f(z + l) − 2 f(z) + f(z − l)]/2l, f(x) = x asinh(x/2{D}) − √(x² + 4{D}²)",
    result: { symbol: "ΔC_e/C_e", unit: "1", meaning: "relative change of the stray to earth" },
    inputs: { ...column, h: m("h", "height of its foot"), D: m("D", "distance of the wall from the column's axis") },
    holds:
      "One earthed plane wall, farther than half the column's length, with the floor: evenly charged lines and their images. A corner adds twice, walls all round about three times.",
    source: image,
    compute: ({ l, Ce, h, D }) => {
      const A = (2 * Math.PI * epsilon0 * l) / Ce;
      const W = mean(l, 2 * D, 0) - mean(l, 2 * D, 2 * h + l);
      return A > W ? W / (A - W) : null;
    },
  }),
  hand: formula({
    id: "proximity.hand",
    title: "What a hand adds to the column's stray",
    statement: "{=} = 4π ε_0 {r} · (asinh({l}/2{D})/A)² / {Ce}, A = 2π ε_0 {l}/{Ce}",
    result: { symbol: "ΔC_e/C_e", unit: "1", meaning: "relative change of the stray to earth" },
    inputs: {
      ...column,
      D: m("D", "distance of the hand from the column's axis"),
      r: m("r", "radius of the earthed sphere that stands for it"),
    },
    holds: "A hand and forearm as an earthed sphere beside the middle of the column, farther than three of its radii.",
    source: practice("a hand as an earthed sphere of 10 cm"),
    compute: ({ l, Ce, D, r }) => {
      const A = (2 * Math.PI * epsilon0 * l) / Ce;
      return (4 * Math.PI * epsilon0 * r * (Math.asinh(l / (2 * D)) / A) ** 2) / Ce;
    },
  }),
  keepOut: formula({
    id: "proximity.keepOut",
    title: "Keep-out distance",
    statement: "{=} = the larger of {approach} and {proximity}",
    result: m("D", "keep-out distance"),
    inputs: {
      approach: m("D_a", "approach distance that local rules set, typed"),
      proximity: m("D_p", "distance below which the reading is moved"),
    },
    holds: "Only with the approach distance of the rules that apply where it stands.",
    source: computedHere("larger of the two"),
    compute: ({ approach, proximity }) => Math.max(approach, proximity),
  }),
};

export const proximityRecord: Solution = {
  id: "proximity.edge",
  title: "What something near does to the reading of an edge",
  statement: "v/V = C_12/(C_tap + C_2p), with the strays changed against the strays as they are",
  method: "Tridiagonal elimination of the string's capacitances, twice.",
  holds: "The first instant of an ideal edge; at dc nothing changes. Strays grow evenly along the column.",
  source: computedHere("capacitive ladder"),
  residualBound: 1e-9,
};
