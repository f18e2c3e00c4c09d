import type { Waveform } from "../job/brief.ts";
import { computedHere } from "../standards/source.ts";
import { type Judging, plainFinding } from "./judging.ts";
import { dutyOf } from "./workingVoltage.ts";

/** Whether the share of the time that a pulse stands is known: single shots, or width and repetition both stated. */
export const dutyStated = ({ kind, width_s, repetition_Hz }: Waveform): boolean =>
  kind !== "pulse" || repetition_Hz === 0 || (repetition_Hz !== null && width_s !== null);

/** A pulse whose duty is not stated: its heat is not judged, and an rms value tells nothing of its peak. */
export function pulseTrain(j: Judging): void {
  const { waveform } = j.document.brief;
  if (waveform.kind !== "pulse") return;
  if (waveform.statedAs === "rms" && dutyOf(waveform) === 0) {
    plainFinding(j, {
      id: "voltage.pulseRms",
      level: "stop",
      what: "rms of a pulse without its duty",
      reason:
        "The peak of a pulse train is its rms over the root of its duty; without width and repetition there is none. State the peak, or both.",
      source: computedHere("rms of a pulse train"),
    });
  }
  if (dutyStated(waveform)) return;
  plainFinding(j, {
    id: "element.dissipation.notStated",
    level: "caution",
    what: "duty of the pulse not stated",
    reason:
      "Without its width and repetition the heat of a pulse is not judged. Type both; a repetition of 0 means single shots.",
    source: computedHere("duty of a pulse train"),
    cure: { label: "single shots", edits: [{ pointer: "/brief/waveform/repetition_Hz", value: 0 }] },
  });
}
