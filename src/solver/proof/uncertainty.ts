import { type Judging, plainFinding } from "../checks/judging.ts";
import { scaleFactorFormulas } from "../checks/scaleFactorFormulas.ts";
import type { Show } from "../checks/show.ts";
import { wantedOf } from "../checks/wanted.ts";
import { formatShare } from "../quantities/format.ts";

/** The predicted scale factor and its uncertainty against what was wanted. A calibration replaces the parts' terms. */
export function judgeUncertainty(j: Judging, show: Show): void {
  const wantedUncertainty = wantedOf(j.document.brief);
  if (wantedUncertainty === null) return;
  const U = j.sheet.number("scaleFactor.uncertainty");
  const deviation = j.sheet.number("scaleFactor.deviation");
  if (U !== null) {
    plainFinding(j, {
      id: "scaleFactor.uncertainty",
      level: U <= wantedUncertainty ? "clear" : "caution",
      what: "scale-factor uncertainty from parts, k = 2",
      actual: U,
      limit: wantedUncertainty,
      unit: "1",
      sense: "atMost",
      margin: 1 - U / wantedUncertainty,
      reason:
        U <= wantedUncertainty
          ? `The parts alone leave ${show(U, "1")}; ${show(wantedUncertainty, "1")} is wanted.`
          : `The parts alone leave ${show(U, "1")}, ${show(wantedUncertainty, "1")} is wanted: measure the elements or calibrate before use.`,
      source: scaleFactorFormulas.uncertainty.source,
      path: "scaleFactor.uncertainty",
    });
  }
  if (deviation !== null && Math.abs(deviation) > wantedUncertainty) {
    plainFinding(j, {
      id: "scaleFactor.deviation",
      level: "stop",
      what: "scale factor against the one wanted",
      actual: Math.abs(deviation),
      limit: wantedUncertainty,
      unit: "1",
      sense: "atMost",
      margin: 1 - Math.abs(deviation) / wantedUncertainty,
      reason: `The fitted LV arm gives a scale factor ${formatShare(Math.abs(deviation))} off the one wanted. Trim it, or change the LV arm.`,
      source: scaleFactorFormulas.deviation.source,
      path: "scaleFactor.deviation",
      cure: { label: "size again", edits: [], sizeAgain: true },
    });
  }
}
