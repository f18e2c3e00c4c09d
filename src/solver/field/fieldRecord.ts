import type { Solution } from "../standards/formula.ts";

/** The record behind every figure of a field solve. */
export const fieldRecord: Solution = {
  id: "field.solve",
  title: "Strays and fields of the drawn column",
  statement:
    "∮ σ(r′)/(4π ε_0 |r − r′|) dA′ = φ(r) on every conductor, the floor by images; q = C·x, M = Σ q_i (1 − x_i)",
  method:
    "boundary elements on the meridian, charge as polynomials that crowd at edges and rims, elimination; couplings beyond the neighbour are folded into the ladder",
  holds:
    "An axisymmetric drawing in vacuum: leads, boards, supports and bodies off the axis are not in it; a single wall is approximated. Bands of 0.3 or 0.5 of the pitch in place of 0.4 move it by 5 %.",
  source: {
    title: "Boundary-element solve of the drawn column",
    edition: null,
    clause: "checked against exact spheres, tori, discs and cylinders",
    status: "computed here",
  },
  residualBound: 1e-3,
};
