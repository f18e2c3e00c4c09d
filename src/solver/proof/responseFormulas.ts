import { formula, type Solution } from "../standards/formula.ts";
import { computedHere, type Source } from "../standards/source.ts";

const iec60060: Source = {
  title: "IEC 60060-2",
  edition: "ed. 3 (2010)",
  clause: "annex C, step response and its figures",
  status: "from memory",
};
const ladder = "Ladder of n elements with strays, LV arm, cable and instrument: current balance at every node";

export const responseRecords: Record<"frequency" | "step" | "lvCapacitance", Solution> = {
  frequency: {
    id: "response.frequency",
    title: "Frequency response",
    statement: "Y(jω) v = i at every node of the ladder; |F · v_out / V| = 1/√2 at the bandwidth",
    method: `${ladder}; exact complex elimination from the tap to the electrode at each frequency.`,
    holds: "Linear parts; an ideal source at the electrode; the cable as it is set, as a lump or as a line.",
    source: computedHere("ladder elimination"),
    residualBound: 1e-9,
  },
  step: {
    id: "response.step",
    title: "Step response",
    statement: "g(t) = F · v_out(t) / V for an ideal step; T = ∫(1 − g) dt",
    method: `${ladder}; inverse Laplace transform on one contour per decade of time.`,
    holds:
      "Linear parts; an ideal source at the electrode; the cable as its capacitance with its resistors, without its echoes.",
    source: iec60060,
    residualBound: 1e-6,
  },
  lvCapacitance: {
    id: "response.lvCapacitance",
    title: "LV capacitance that matches the two arms",
    statement: "T(C) = 0; F(∞, C) = F(0); min over C of the greatest |deviation| over the band",
    method: `${ladder}; the LV capacitance solved for, all else held.`,
    holds: "Strays as computed or typed; cable and instrument counted, so it is what must be fitted.",
    source: computedHere("three matches of the same ladder"),
    residualBound: 1e-6,
  },
};

export const responseFormulas = {
  lvPole: formula({
    id: "response.lvPole",
    title: "Pole of the LV arm",
    statement: "{=} = ({R1} + {R2p}) / (2π {R1} {R2p} ({C1} + {C2p}))",
    result: { symbol: "f_p", unit: "Hz", meaning: "pole where the resistors hand over to the capacitors" },
    inputs: {
      R1: { symbol: "R_1", unit: "ohm", meaning: "HV arm resistance" },
      R2p: { symbol: "R_2p", unit: "ohm", meaning: "LV arm with instrument" },
      C1: { symbol: "C_1eff", unit: "F", meaning: "HV arm capacitance with strays" },
      C2p: { symbol: "C_2p", unit: "F", meaning: "LV capacitance, cable and instrument counted" },
    },
    holds: "Two lumps; the ladder decides.",
    source: computedHere("time constant (R1‖R2p)(C1 + C2p)"),
    compute: ({ R1, R2p, C1, C2p }) => (R1 + R2p) / (2 * Math.PI * R1 * R2p * (C1 + C2p)),
  }),
  fitted: formula<never, "C">({
    id: "response.lvCapacitanceFitted",
    title: "LV capacitance fitted",
    statement: "{=} = Σ {C}",
    result: { symbol: "C_2", unit: "F", meaning: "capacitors, fitted links and trimmer" },
    inputs: { C: { symbol: "C_b", unit: "F", meaning: "branch capacitances" } },
    arrays: ["C"],
    holds: "Cable and instrument not counted.",
    source: computedHere("parallel sum"),
    compute: ({ C }) => C.reduce((sum, each) => sum + each, 0),
  }),
  sum: formula({
    id: "response.lvCapacitanceSum",
    title: "LV capacitance, cable and instrument counted",
    statement: "{=} = {fitted} + {cable} + {instrument} + {protectors}",
    result: { symbol: "C_2p", unit: "F", meaning: "all that stands from tap to earth" },
    inputs: {
      fitted: { symbol: "C_2", unit: "F", meaning: "fitted" },
      cable: { symbol: "C_k", unit: "F", meaning: "cable" },
      instrument: { symbol: "C_m", unit: "F", meaning: "instrument" },
      protectors: { symbol: "C_p", unit: "F", meaning: "protectors" },
    },
    holds: "Lumped cable.",
    source: computedHere("parallel sum"),
    compute: ({ fitted, cable, instrument, protectors }) => fitted + cable + instrument + protectors,
  }),
  cable: formula({
    id: "response.cableCapacitance",
    title: "Capacitance of the cable",
    statement: "{=} = {length} · {perMetre}",
    result: { symbol: "C_k", unit: "F", meaning: "cable" },
    inputs: {
      length: { symbol: "l_k", unit: "m", meaning: "cable length" },
      perMetre: { symbol: "C_k'", unit: "F/m", meaning: "cable capacitance a metre" },
    },
    holds: "A cable short against the edge.",
    source: computedHere("capacitance a metre times length"),
    compute: ({ length, perMetre }) => length * perMetre,
  }),
};
