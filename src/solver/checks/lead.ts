import { preferredAbove } from "../standards/preferred.ts";
import { bandTop } from "./band.ts";
import { edgeFormulas } from "./edgeFormulas.ts";
import { type Judging, plainFinding } from "./judging.ts";
import type { Show } from "./show.ts";

/** Of a straight wire, from memory: the guess that a cure offers, never counted by itself. */
const wire_H_per_m = 1e-6;
/** A ring above this many times the highest wanted frequency is hardly excited. */
const clearOf = 5;

/** The HV lead with the divider's input: where it rings and what damps it. Writes `lead.*`; needs `input.capacitance_F`. */
export function judgeLead(j: Judging, show: Show): void {
  const { sheet, design } = j;
  const { lead } = design;
  const L = "/design/lead/inductance_H";
  const Cin = "input.capacitance_F";
  sheet.given(L, lead.inductance_H);
  sheet.derive("lead.ring_Hz", edgeFormulas.leadRing, { L, Cin });
  sheet.derive("lead.dampingLeast_ohm", edgeFormulas.dampingLeast, { L, Cin });
  sheet.derive("lead.dampingGreatest_ohm", edgeFormulas.dampingGreatest, { L, Cin });
  const top = bandTop(j.document.brief);
  if (!(top > 0)) return;
  const ring = sheet.number("lead.ring_Hz");
  if (ring === null) notCounted(j, top, show);
  else if (ring < clearOf * top) damped(j, ring, top, show);
}

function notCounted(j: Judging, top: number, show: Show): void {
  const C = j.sheet.number("input.capacitance_F") ?? 0;
  const ring = edgeFormulas.leadRing.compute({ L: wire_H_per_m, Cin: C });
  if (ring === null || ring >= clearOf * top) return;
  plainFinding(j, {
    id: "lead.notCounted",
    level: "caution",
    what: "HV lead not counted",
    actual: ring,
    limit: clearOf * top,
    unit: "Hz",
    sense: "atLeast",
    margin: 1 - (clearOf * top) / ring,
    reason: `No inductance of the HV lead is stated. A metre of straight wire has about 1\u2009µH (from memory) and would ring with the divider's ${show(C, "F")} at ${show(ring, "Hz")}; up to ${show(top, "Hz")} is wanted. Type the inductance of the loop.`,
    source: edgeFormulas.leadRing.source,
    cure: {
      label: "count a metre, 1\u2009µH",
      edits: [{ pointer: "/design/lead/inductance_H", value: wire_H_per_m, origin: "assumed" }],
    },
  });
}

/** Source resistance damps too, as long as no capacitance at the source's terminals shunts it. */
function damped(j: Judging, ring: number, top: number, show: Show): void {
  const least = j.sheet.number("lead.dampingLeast_ohm") as number;
  const greatest = j.sheet.number("lead.dampingGreatest_ohm") as number;
  const { source } = j.document.brief;
  const stands = j.design.lead.damping_ohm + (source.capacitance_F === 0 ? source.resistance_ohm : 0);
  const enough = stands >= least * (1 - 1e-9);
  const fit = preferredAbove("E12", least * 1.05);
  plainFinding(j, {
    id: "lead.damping",
    level: enough ? "clear" : "caution",
    what: "damping of the HV lead",
    actual: stands,
    limit: least,
    unit: "ohm",
    sense: "atLeast",
    margin: stands === 0 ? -1 : 1 - least / stands,
    reason: `The HV lead rings with the divider's input at ${show(ring, "Hz")}; up to ${show(top, "Hz")} is wanted. ${show(least, "ohm")} to ${show(greatest, "ohm")} at the top electrode damp it${enough ? `; ${show(stands, "ohm")} stand there` : ""}.`,
    source: edgeFormulas.dampingLeast.source,
    path: "lead.dampingLeast_ohm",
    cure: enough
      ? null
      : { label: `${show(fit, "ohm")} at the top`, edits: [{ pointer: "/design/lead/damping_ohm", value: fit }] },
  });
}
