/** The whole judgement of a design: every figure with its trace, the responses, the findings and the cautions. Plain data. */
import type { FaultRow } from "../checks/faultRow.ts";
import type { InstrumentRow } from "../checks/instruments.ts";
import type { ProximityRow } from "../checks/proximity.ts";
import type { Origin } from "../job/part.ts";
import type { Finding, Level } from "../standards/finding.ts";
import type { SheetData } from "../standards/sheet.ts";
import type { Caution } from "./cautions.ts";
import type { Graded } from "./graded.ts";
import type { GreatestInput } from "./greatestInput.ts";
import type { InstrumentReach } from "./instrumentReach.ts";
import type { Match } from "./matches.ts";

export interface FrequencyResponse {
  readonly frequency_Hz: readonly number[];
  /** Relative to the dc scale factor: 0 dB at dc. */
  readonly magnitude_dB: readonly number[];
  readonly phase_deg: readonly number[];
  readonly inputImpedance_ohm: readonly number[];
  /** The finding sentence, computed from the data. */
  readonly sentence: string;
}

export interface StepTrace {
  readonly time_s: readonly number[];
  /** Scale factor × output over step height: 1 is right. */
  readonly value: readonly number[];
}

export interface StepResponse {
  /** Nanoseconds to microseconds. */
  readonly fast: StepTrace;
  /** Microseconds to seconds. */
  readonly slow: StepTrace;
  readonly sentence: string;
}

export interface Proof {
  /** The job as one sentence. */
  readonly job: string;
  readonly sheet: SheetData;
  /** Origin of every given by JSON pointer. */
  readonly origins: Readonly<Record<string, Origin>>;
  /** How many inputs are assumed, and which. */
  readonly assumed: readonly string[];
  readonly frequency: FrequencyResponse;
  readonly step: StepResponse;
  /** The three matches of the LV capacitance; empty where neither arm holds a capacitor. */
  readonly matches: readonly Match[];
  /** Links and trimmer against every instrument; null where neither arm holds a capacitor. */
  readonly reach: InstrumentReach | null;
  readonly instruments: readonly InstrumentRow[];
  readonly faults: readonly FaultRow[];
  /** What stands near the column, and what it does to an edge. */
  readonly proximity: readonly ProximityRow[];
  readonly greatestInput: GreatestInput;
  /** Element capacitors graded against the strays; null where an element has none. */
  readonly graded: Graded | null;
  readonly worstFault: FaultRow | null;
  readonly findings: readonly Finding[];
  readonly cautions: readonly Caution[];
  readonly level: Level;
}

/** The kinds of figure that a proof's sheet holds: path, plain name, unit. Arrays hold one number per element, tap first. */
export const figures = {
  "working.dc_V": "working voltage, dc part",
  "working.rms_V": "working voltage, rms",
  "working.peak_V": "working voltage, peak",
  "working.greatest_Vpeak": "greatest peak",
  "hvArm.resistance_ohm": "HV arm resistance R1",
  "hvArm.capacitance_F": "HV arm capacitance C1, string alone",
  "hvArm.effectiveCapacitance_F": "HV arm capacitance with strays",
  "strays.toEarth_F": "stray capacitance of the column to earth",
  "strays.toElectrode_F": "stray capacitance of the column to the top electrode",
  "element.voltage_Vdc": "element voltage, dc",
  "element.voltage_Vrms": "element voltage, rms",
  "element.voltage_Vpeak": "element voltage, peak",
  "element.voltageLimit_V": "element voltage limit, derated",
  "element.edgeShare": "share of the element in a sudden edge",
  "element.dissipation_W": "element dissipation",
  "element.dissipationLimit_W": "element dissipation limit, derated",
  "element.criticalResistance_ohm": "critical resistance, derated",
  "element.nodePotential_V": "potential of the element's upper end",
  "lvArm.wanted_ohm": "LV arm resistance wanted",
  "lvArm.fitted_ohm": "LV arm resistance fitted",
  "lvArm.withInstrument_ohm": "LV arm with the instrument in parallel",
  "lvArm.dissipation_W": "LV arm dissipation",
  "lvArm.capacitanceResponseTime_F": "LV capacitance, zero response time",
  "lvArm.capacitanceHighFrequency_F": "LV capacitance, edge equal to dc",
  "lvArm.capacitanceFlattest_F": "LV capacitance, flattest over the band",
  "match.highFrequency.bandDeviation_dB": "edge equal to dc: greatest deviation over the band",
  "match.highFrequency.responseTime_s": "edge equal to dc: response time",
  "match.flattest.edgeError": "flattest: error at the edge",
  "match.flattest.bandDeviation_dB": "flattest: greatest deviation over the band",
  "match.flattest.responseTime_s": "flattest: response time",
  "match.responseTime.edgeError": "zero response time: error at the edge",
  "match.responseTime.bandDeviation_dB": "zero response time: greatest deviation over the band",
  "lvArm.share.fixed_F": "fixed LV capacitors",
  "lvArm.share.links_F": "links fitted",
  "lvArm.share.trimmer_F": "trimmer at its setting",
  "lvArm.share.cable_F": "cable capacitance",
  "lvArm.share.instrument_F": "instrument capacitance",
  "lvArm.share.protectors_F": "protector capacitance",
  "lvArm.capacitanceTotal_F": "LV capacitance, cable and instrument counted",
  "lvArm.capacitanceFitted_F": "LV capacitance fitted, cable and instrument not counted",
  "scaleFactor.predicted": "scale factor, predicted",
  "scaleFactor.deviation": "deviation from the wanted scale factor",
  "scaleFactor.uncertainty": "relative uncertainty of the scale factor, k = 2, from parts",
  "scaleFactor.instrumentShare": "share of the scale factor that belongs to the instrument",
  "scaleFactor.voltageShift": "shift of the scale factor by voltage coefficient at working voltage",
  "input.resistance_ohm": "input resistance",
  "input.capacitance_F": "input capacitance",
  "input.current_A": "input current",
  "input.dissipation_W": "dissipation of the whole divider",
  "source.sag": "sag of the source under the divider",
  "reading.atWorking_V": "reading at working voltage",
  "reading.atGreatest_Vpeak": "reading at the greatest peak",
  "response.bandwidth_Hz": "bandwidth, −3 dB",
  "response.riseTime_s": "rise time, 10-90 %",
  "response.responseTime_s": "response time",
  "response.partialResponseTime_s": "partial response time",
  "response.residualSettlingTime_s": "settling time, IEC 60060-2",
  "response.droop": "droop over the pulse",
  "response.overshoot": "overshoot",
  "response.settlingTime_s": "settling time to 1 %",
  "response.lvPole_Hz": "pole of the LV arm",
  "response.bandDeviation_dB": "greatest deviation over the wanted band",
  "cable.lumpedLength_m": "longest cable that counts as a lump",
  "cable.quarterWave_Hz": "quarter wave of the cable",
  "lead.ring_Hz": "ring of the HV lead",
  "lead.dampingLeast_ohm": "damping resistor, least",
  "lead.dampingGreatest_ohm": "damping resistor, critical",
  "lvArm.resonance_Hz": "resonance of the LV capacitors",
  "lvArm.spikeShare": "spike of the LV arm's inductance over the edge's height",
  "slowFast.pole_Hz": "slowest decay of the divider",
  "slowFast.slow_Hz": "slow/fast check: slow frequency",
  "slowFast.fast_Hz": "slow/fast check: fast frequency",
  "slowFast.signal_Vpp": "slow/fast check: signal at the instrument, peak to peak",
  "slowFast.needed_Vpp": "slow/fast check: signal that stands clear of the noise",
  "insulation.clearance_m": "clearance required along the column",
  "insulation.creepage_m": "creepage required along the column",
  "insulation.elementCreepage_m": "creepage required along one element",
  "insulation.elementClearance_m": "clearance required along one element",
  "fault.worstOutput_V": "worst single fault at the instrument",
  "mismatch.edge": "scale factor at the edge over the ambient span, from the capacitors' coefficients",
  "mismatch.dc": "scale factor at dc over the ambient span, from the resistors' coefficients",
  "greatestInput.low_V": "greatest sine at 10 Hz, peak",
  "greatestInput.high_V": "greatest sine at the upper end of the frequencies looked at, peak",
  "keepOut.proximity_m": "distance below which a wall moves the reading of an edge",
  "keepOut.distance_m": "keep-out distance",
  "charge.waitTime_s": "time to fall to 60 V through the divider alone",
} as const;
export type FigurePath = keyof typeof figures;
