import { formula } from "../standards/formula.ts";
import { computedHere, practice } from "../standards/source.ts";

const time = (symbol: string, meaning: string) => ({ symbol, unit: "s", meaning });
const frequency = (symbol: string, meaning: string) => ({ symbol, unit: "Hz", meaning });
const henry = (symbol: string, meaning: string) => ({ symbol, unit: "H", meaning });
const farad = (symbol: string, meaning: string) => ({ symbol, unit: "F", meaning });
const ohm = (symbol: string, meaning: string) => ({ symbol, unit: "ohm", meaning });
const tr = time("t_r", "rise time of the edge, 10-90 %");
const delay = { symbol: "τ'", unit: "s/m", meaning: "delay of the cable a metre" };
const length = { symbol: "l_k", unit: "m", meaning: "cable length" };
const L = henry("L", "inductance of the HV lead's loop");
const Cin = farad("C_in", "input capacitance of the divider");
const L2 = henry("L_2", "inductance in series with the LV capacitors");
const C2 = farad("C_2", "LV capacitors");

/** 10-90 % of a raised cosine over its whole length: (arccos(−0.8) − arccos(0.8))/π. */
export const raisedCosineShare = (Math.acos(-0.8) - Math.acos(0.8)) / Math.PI;

/** Edges, the HV lead, the cable and the LV arm's inductance. */
export const edgeFormulas = {
  riseTime: formula({
    id: "edge.riseTime",
    title: "Rise time that the highest wanted frequency stands for",
    statement: "{=} = 0.35 / {f}",
    result: tr,
    inputs: { f: frequency("f_h", "highest frequency that must be right") },
    holds: "First order; where no rise time is stated.",
    source: practice("bandwidth times rise time about 0.35"),
    compute: ({ f }) => (f > 0 ? 0.35 / f : null),
  }),
  lumpedLength: formula({
    id: "cable.lumpedLength",
    title: "Longest cable that counts as a lump",
    statement: "{=} = {tr} / (10 · {delay})",
    result: { symbol: "l_0", unit: "m", meaning: "a tenth of the way that the edge covers while it rises" },
    inputs: { tr, delay },
    holds: "A rule for the first look: a line shows its echoes beyond it.",
    source: practice("a line shorter than a tenth of the edge is a lump"),
    compute: ({ tr: t, delay: d }) => t / (10 * d),
  }),
  quarterWave: formula({
    id: "cable.quarterWave",
    title: "Quarter wave of the cable",
    statement: "{=} = 1 / (4 · {delay} · {length})",
    result: frequency("f_λ/4", "lowest frequency at which the open cable rings by itself"),
    inputs: { delay, length },
    holds: "Open into the instrument, low impedance at the tap, instrument capacitance left out: the network decides.",
    source: computedHere("a line of a quarter wave"),
    compute: ({ delay: d, length: l }) => (l > 0 ? 1 / (4 * d * l) : null),
  }),
  leadRing: formula({
    id: "lead.ring",
    title: "Ring of the HV lead with the divider's input",
    statement: "{=} = 1 / (2π √({L} · {Cin}))",
    result: frequency("f_L", "ring of the lead loop"),
    inputs: { L, Cin },
    holds: "Two lumps, source stiff against the input capacitance: the network decides.",
    source: computedHere("series resonance"),
    compute: ({ L: l, Cin: c }) => (l > 0 && c > 0 ? 1 / (2 * Math.PI * Math.sqrt(l * c)) : null),
  }),
  dampingLeast: formula({
    id: "lead.dampingLeast",
    title: "Damping resistor at the top electrode, least",
    statement: "{=} = √({L} / {Cin})",
    result: ohm("R_d", "damping resistor"),
    inputs: { L, Cin },
    holds: "Two lumps. Overshoot of an ideal step 16 %; none for a slower edge.",
    source: computedHere("series resonance at half its critical damping"),
    compute: ({ L: l, Cin: c }) => (l > 0 && c > 0 ? Math.sqrt(l / c) : null),
  }),
  dampingGreatest: formula({
    id: "lead.dampingGreatest",
    title: "Damping resistor at the top electrode, critical",
    statement: "{=} = 2 · √({L} / {Cin})",
    result: ohm("R_d", "damping resistor"),
    inputs: { L, Cin },
    holds: "Two lumps. No overshoot; more only slows the edge.",
    source: computedHere("critical damping of a series resonance"),
    compute: ({ L: l, Cin: c }) => (l > 0 && c > 0 ? 2 * Math.sqrt(l / c) : null),
  }),
  lvResonance: formula({
    id: "lvArm.resonance",
    title: "Resonance of the LV capacitors with their inductance",
    statement: "{=} = 1 / (2π √({L2} · {C2}))",
    result: frequency("f_2", "zero of the response"),
    inputs: { L2, C2 },
    holds: "Lumped; the output falls to a small value there and rises beyond.",
    source: computedHere("series resonance"),
    compute: ({ L2: l, C2: c }) => (l > 0 && c > 0 ? 1 / (2 * Math.PI * Math.sqrt(l * c)) : null),
  }),
  spike: formula({
    id: "lvArm.spike",
    title: "Spike that the LV arm's inductance adds to an edge, as a share of its height",
    statement: "{=} = {F} · {L2} · {C1} · (π · 0.590 / {tr})² / 2",
    result: { symbol: "δ_L", unit: "1", meaning: "spike over the height of the edge" },
    inputs: {
      F: { symbol: "F", unit: "1", meaning: "scale factor" },
      L2,
      C1: farad("C_1eff", "HV arm capacitance with strays"),
      tr,
    },
    holds: "Raised-cosine edge, slow against the resonance of the LV arm; the network decides.",
    source: computedHere("voltage of an inductance that carries C1 · dV/dt"),
    compute: ({ F, L2: l, C1, tr: t }) => (F * l * C1 * ((Math.PI * raisedCosineShare) / t) ** 2) / 2,
  }),
};
