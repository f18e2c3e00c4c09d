/** The leading term c·sᵖ, c ≥ 0, of an admittance or a share as s grows without bound: the instant of an edge. c = 0: nothing there. */
export interface Leading {
  readonly c: number;
  readonly p: number;
}

export const none: Leading = { c: 0, p: 0 };
/** A capacitance, F. */
export const capacitive = (C: number): Leading => ({ c: C, p: 1 });
/** A conductance, S; or a share of a voltage. */
export const resistive = (G: number): Leading => ({ c: G, p: 0 });

/** A resistance and a capacitance side by side: the capacitance, if there is one. */
export const element = (G: number, C: number): Leading => (C > 0 ? capacitive(C) : resistive(G));

/** The sum: of two powers the greater remains. */
export function plus(a: Leading, b: Leading): Leading {
  if (a.c === 0) return b;
  if (b.c === 0) return a;
  if (a.p !== b.p) return a.p > b.p ? a : b;
  return { c: a.c + b.c, p: a.p };
}

/** Below this power nothing can come back to the first place: by a star-mesh step one neighbour always keeps the step's own power. */
const leastPower = -4;

/** a·b/S, with a not greater than S; nothing where S is nothing. */
export function passed(a: Leading, b: Leading, S: Leading): Leading {
  const p = a.p + b.p - S.p;
  if (S.c === 0 || p < leastPower) return none;
  return { c: b.c * (a.c / S.c), p };
}

/** H/(H + E): the voltage of a node between H to the full voltage and E to earth. Nothing on either side: 0. */
export const shared = (H: Leading, E: Leading): Leading => passed(H, resistive(1), plus(H, E));

/** What is left of a share at the instant itself. */
export const atEdge = (share: Leading): number => (share.p === 0 ? share.c : 0);
