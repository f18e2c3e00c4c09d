import { practice } from "../standards/source.ts";
import { accessible, type FaultRow, faultRecord, seen } from "./faultRow.ts";
import { type Judging, plainFinding } from "./judging.ts";
import { isResistive } from "./lvArm.ts";
import type { Show } from "./show.ts";

/** A finding for each single fault that stops; else one clear line with the worst. Also the single LV resistor. */
export function faultFindings(j: Judging, rows: readonly FaultRow[], worst: FaultRow | null, show: Show): void {
  const limit = j.instrument.greatestInput_Vpeak;
  for (const row of rows.filter((each) => each.level === "stop")) {
    const plug = row.id === "unplugged";
    plainFinding(j, {
      id: `fault.${row.id}`,
      level: "stop",
      what: row.name,
      actual: seen(row),
      limit: plug ? accessible.dc_V : limit,
      unit: "V",
      sense: "atMost",
      margin: 1 - seen(row) / (plug ? accessible.dc_V : limit),
      reason: `${row.sentence} Split the LV arm so that no single part carries it alone, and limit it at the divider.`,
      source: plug ? accessible.source : faultRecord.source,
      cure: { label: "size again", edits: [], sizeAgain: true },
      path: "fault.worstOutput_V",
    });
  }
  const alone = j.design.lvArm.branches.filter(isResistive).length === 1;
  if (alone && !rows.some((row) => row.id === "lvOpen" && row.level === "stop")) {
    const open = rows.find((row) => row.id === "lvOpen");
    plainFinding(j, {
      id: "lvArm.single",
      level: "caution",
      what: "one LV resistor alone",
      actual: open === undefined ? null : seen(open),
      limit,
      unit: "V",
      sense: "atMost",
      margin: open === undefined ? null : 1 - seen(open) / limit,
      reason: `With this one resistor open the instrument sees ${show(open === undefined ? 0 : seen(open), "V")}. Fit two or three in parallel.`,
      source: practice("no single part may carry the LV arm alone"),
      cure: { label: "size again", edits: [], sizeAgain: true },
    });
  }
  if (j.design.lvArm.branches.filter(isResistive).length === 0) {
    plainFinding(j, {
      id: "lvArm.none",
      level: "stop",
      what: "no LV resistor",
      reason:
        "The instrument alone is the LV arm: unplugged, the full voltage stands at the plug. Fit LV resistors on the divider.",
      source: practice("the LV arm stays with the divider"),
      cure: { label: "size again", edits: [], sizeAgain: true },
    });
  }
  if (worst !== null && seen(worst) <= limit) {
    plainFinding(j, {
      id: "fault.worst",
      level: "clear",
      what: "worst single fault",
      actual: seen(worst),
      limit,
      unit: "V",
      sense: "atMost",
      margin: 1 - seen(worst) / limit,
      reason: worst.sentence,
      source: faultRecord.source,
      path: "fault.worstOutput_V",
    });
  }
}
