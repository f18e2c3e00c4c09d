import { idealSource, type LadderNetwork } from "../../../src/solver/network/ladderNetwork.ts";

export interface Sketch {
  n: number;
  R: number | readonly number[];
  C?: number | readonly number[];
  Ce?: number;
  Ch?: number;
  R2?: number;
  C2?: number;
  cable?: number;
  Rm?: number;
  Cm?: number;
  Rs?: number;
  at?: "divider" | "instrument";
}

/** A network from a few numbers: uniform strays, everything else absent. */
export function sketch(s: Sketch): LadderNetwork {
  const each = (value: number | readonly number[] | undefined) =>
    typeof value === "object" ? Float64Array.from(value) : new Float64Array(s.n).fill(value ?? 0);
  const shunt = (R = Number.POSITIVE_INFINITY, C = 0) => ({ resistance_ohm: R, capacitance_F: C });
  return {
    n: s.n,
    resistance_ohm: each(s.R),
    capacitance_F: each(s.C),
    toEarth_F: new Float64Array(s.n - 1).fill((s.Ce ?? 0) / s.n),
    toElectrode_F: new Float64Array(s.n - 1).fill((s.Ch ?? 0) / s.n),
    electrodeToTap_F: 0,
    lv: { ...shunt(s.R2, s.C2), inductance_H: 0 },
    protector: shunt(),
    cable: { capacitance_F: s.cable ?? 0, line: null },
    instrument: { ...shunt(s.Rm, s.Cm), protector: shunt() },
    seriesProtector: { resistance_ohm: s.Rs ?? 0, at: s.at ?? "instrument" },
    source: idealSource,
  };
}

/** Seeded numbers in [0, 1): a linear congruential generator is enough to draw test networks. */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}

/** A random network: resistances and capacitances over decades, some strays and capacitors zero. */
export function randomNetwork(random: () => number, n: number): LadderNetwork {
  const decades = (from: number, to: number) => 10 ** (from + (to - from) * random());
  const maybe = (value: number) => (random() < 0.2 ? 0 : value);
  const base = sketch({
    n,
    R: 1,
    R2: decades(3, 7),
    C2: maybe(decades(-12, -7)),
    Rm: decades(5, 10),
    Cm: decades(-12, -9),
  });
  return {
    ...base,
    resistance_ohm: Float64Array.from({ length: n }, () => decades(4, 10)),
    capacitance_F: Float64Array.from({ length: n }, () => maybe(decades(-14, -9))),
    toEarth_F: Float64Array.from({ length: n - 1 }, () => maybe(decades(-15, -11))),
    toElectrode_F: Float64Array.from({ length: n - 1 }, () => maybe(decades(-15, -11))),
    cable: { capacitance_F: maybe(decades(-11, -9)), line: null },
    seriesProtector: {
      resistance_ohm: random() < 0.5 ? 0 : decades(2, 6),
      at: random() < 0.5 ? "divider" : "instrument",
    },
  };
}
