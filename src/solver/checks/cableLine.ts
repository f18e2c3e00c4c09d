import { edgeFormulas } from "./edgeFormulas.ts";
import { type Judging, plainFinding } from "./judging.ts";
import type { Show } from "./show.ts";

/** Half-width within which impedance times capacitance a metre and the delay a metre must agree: one cable has one of each. */
const agreement = 0.25;

/** The cable against the edge: whether it may count as a lump, and what its resistors do. Needs the path of the edge's rise time. */
export function judgeCable(j: Judging, edge: string, show: Show): void {
  const { sheet, instrument } = j;
  const at = `/instruments/${j.document.instruments.indexOf(instrument)}`;
  const { cable } = instrument;
  const delay = `${at}/cable/delay_s_per_m`;
  const length = `${at}/cable/length_m`;
  sheet.given(delay, cable.delay_s_per_m);
  sheet.given(length, cable.length_m);
  sheet.derive("cable.quarterWave_Hz", edgeFormulas.quarterWave, { delay, length });
  if (cable.end === "terminated") terminated(j, at, show);
  if (cable.end !== "lumped") figuresAgree(j, show);
  const longest = sheet.derive("cable.lumpedLength_m", edgeFormulas.lumpedLength, { tr: edge, delay });
  if (cable.end !== "lumped" || longest === null) return;
  const over = cable.length_m > longest;
  plainFinding(j, {
    id: "cable.lumped",
    level: over ? "caution" : "clear",
    what: "cable against the edge",
    actual: cable.length_m,
    limit: longest,
    unit: "m",
    sense: "atMost",
    margin: longest > 0 ? 1 - cable.length_m / longest : -1,
    reason: over
      ? `The cable is counted as its capacitance, but an edge of ${show(sheet.number(edge) as number, "s")} sees ${show(cable.length_m, "m")} of it as a line: echoes come back for ${show(2 * cable.delay_s_per_m * cable.length_m, "s")} and more. Count it as a line, with a resistor of its impedance at the tap.`
      : `An edge of ${show(sheet.number(edge) as number, "s")} is slow against the cable: up to ${show(longest, "m")} it counts as its capacitance.`,
    source: edgeFormulas.lumpedLength.source,
    path: "cable.lumpedLength_m",
    cure: over
      ? {
          label: `${show(cable.impedance_ohm, "ohm")} at the tap`,
          edits: [{ pointer: `${at}/cable/end`, value: "matchedAtTap" }],
          sizeAgain: j.design.follows,
        }
      : null,
  });
}

function terminated(j: Judging, at: string, show: Show): void {
  const { impedance_ohm } = j.instrument.cable;
  const fitted = j.sheet.number("lvArm.fitted_ohm");
  if (fitted !== null && impedance_ohm > 20 * fitted) return;
  plainFinding(j, {
    id: "cable.terminated",
    level: "caution",
    what: "termination of the cable",
    actual: impedance_ohm,
    unit: "ohm",
    reason: `${show(impedance_ohm, "ohm")} across the far end become part of the LV arm${fitted === null ? "" : `, which is fitted with ${show(fitted, "ohm")}`}: at dc they carry most of its current. For a cable into a high resistance put them in series at the tap instead.`,
    source: edgeFormulas.quarterWave.source,
    cure: { label: "match at the tap", edits: [{ pointer: `${at}/cable/end`, value: "matchedAtTap" }] },
  });
}

function figuresAgree(j: Judging, show: Show): void {
  const { capacitance_F_per_m, impedance_ohm, delay_s_per_m } = j.instrument.cable;
  const told = capacitance_F_per_m * impedance_ohm;
  if (capacitance_F_per_m === 0 || Math.abs(told / delay_s_per_m - 1) <= agreement) return;
  plainFinding(j, {
    id: "cable.figures",
    level: "caution",
    what: "figures of the cable",
    actual: told,
    limit: delay_s_per_m,
    unit: "s/m",
    reason: `Impedance times capacitance a metre is ${show(told, "s")} a metre, the delay is stated as ${show(delay_s_per_m, "s")}: in one cable they are the same. As a line it has ${show(delay_s_per_m / impedance_ohm, "F")} a metre.`,
    source: edgeFormulas.quarterWave.source,
  });
}
