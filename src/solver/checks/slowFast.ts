import type { LadderNetwork } from "../network/ladderNetwork.ts";
import { slowestDecay } from "../network/slowestMode.ts";
import { type Judging, plainFinding } from "./judging.ts";
import type { Show } from "./show.ts";
import { drivenPoleRecord, slowFastFormulas } from "./slowFastFormulas.ts";

/** Frequencies and signal of the slow/fast check, and whether the instrument's noise leaves it readable. Writes `slowFast.*`. */
export function judgeSlowFast(j: Judging, network: LadderNetwork, show: Show): void {
  const { sheet, document, instrument } = j;
  const f = slowFastFormulas;
  const decay = slowestDecay(network, true);
  const at = `/instruments/${document.instruments.indexOf(instrument)}`;
  sheet.solved(
    "slowFast.pole_Hz",
    drivenPoleRecord,
    decay === null ? null : decay / (2 * Math.PI),
    { R: "/design/hvArm/elements/*/resistance_ohm", C: "element.capacitance_F", C2: "lvArm.capacitanceTotal_F" },
    0,
  );
  sheet.derive("slowFast.slow_Hz", f.slow, { pole: "slowFast.pole_Hz" });
  sheet.derive("slowFast.fast_Hz", f.fast, { pole: "slowFast.pole_Hz" });
  sheet.given("/brief/generator_Vpp", document.brief.generator_Vpp);
  sheet.given(`${at}/noise_Vrms`, instrument.noise_Vrms);
  sheet.derive("slowFast.signal_Vpp", f.signal, { V: "/brief/generator_Vpp", F: "scaleFactor.predicted" });
  sheet.derive("slowFast.needed_Vpp", f.needed, { noise: `${at}/noise_Vrms` });
  if (!instrument.function.startsWith("scope") || sheet.number("lvArm.capacitanceFitted_F") === 0) return;
  readable(j, show);
}

function readable(j: Judging, show: Show): void {
  const { sheet, document, instrument } = j;
  const signal = sheet.number("slowFast.signal_Vpp") as number;
  const needed = sheet.number("slowFast.needed_Vpp") as number;
  const short = signal < needed;
  const sweeps = Math.ceil((needed / signal) ** 2);
  plainFinding(j, {
    id: "slowFast.signal",
    level: short ? "caution" : "clear",
    what: "signal of the slow/fast check",
    actual: signal,
    limit: needed,
    unit: "V",
    sense: "atLeast",
    margin: 1 - needed / signal,
    reason: `${show(document.brief.generator_Vpp, "V")} from the generator give ${show(signal, "V")} at ${instrument.name}, peak to peak; with ${show(instrument.noise_Vrms, "V")} rms of noise ${show(needed, "V")} fill five divisions and keep the noise within one${short ? `. Average at least ${sweeps} sweeps, or take a larger generator` : ""}.`,
    source: slowFastFormulas.needed.source,
    path: "slowFast.signal_Vpp",
  });
}
