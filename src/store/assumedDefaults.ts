import { contentBand_Hz } from "../file/contentBand.ts";
import { isAtOrBelow } from "../file/pointer.ts";
import { scaleFactorFor } from "../file/scaleFactorFor.ts";
import type { DividerDocument } from "../solver/index.ts";

/** What was assumed from the waveform and the instrument is assumed anew when they change; what was stated stays. */
export function assumedAnew(document: DividerDocument, pointer: string): DividerDocument {
  if (!["/brief/waveform", "/instruments", "/principal"].some((root) => isAtOrBelow(pointer, root))) return document;
  const { brief, origins } = document;
  const instrument = document.instruments.find((each) => each.id === document.principal);
  const scaleFactor =
    origins["/brief/scaleFactor"] === "assumed" && instrument !== undefined && brief.waveform.nominal_V !== 0
      ? scaleFactorFor(brief.waveform, instrument)
      : brief.scaleFactor;
  const assumedBand = ["/brief/band_Hz", "/brief/band_Hz/0"].some((each) => origins[each] === "assumed");
  const band_Hz = assumedBand ? contentBand_Hz({ ...brief.waveform }) : brief.band_Hz;
  if (scaleFactor === brief.scaleFactor && band_Hz[0] === brief.band_Hz[0] && band_Hz[1] === brief.band_Hz[1])
    return document;
  return { ...document, brief: { ...brief, scaleFactor, band_Hz } };
}
