import { bandTop } from "./band.ts";
import { edgeFormulas } from "./edgeFormulas.ts";
import type { Judging } from "./judging.ts";

/** Path of the rise time that speed is judged by: as stated, else what the wanted band stands for. The figure is null for dc. */
export function edgeOnSheet(j: Judging): string {
  const { brief } = j.document;
  const { kind, riseTime_s } = brief.waveform;
  if ((kind === "pulse" || kind === "square") && riseTime_s !== null && riseTime_s > 0) {
    j.sheet.given("/brief/waveform/riseTime_s", riseTime_s);
    return "/brief/waveform/riseTime_s";
  }
  j.sheet.given("/brief/band_Hz/1", bandTop(brief));
  j.sheet.derive("edge.riseTime_s", edgeFormulas.riseTime, { f: "/brief/band_Hz/1" });
  return "edge.riseTime_s";
}
