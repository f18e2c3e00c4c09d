import { practice } from "../standards/source.ts";
import { type Judging, plainFinding } from "./judging.ts";

/** A source that hangs on the mains without isolation: which side is earth depends on how it is plugged in. */
export function mains(j: Judging): void {
  if (!j.document.brief.source.mainsConnected) return;
  plainFinding(j, {
    id: "source.mainsConnected",
    level: "caution",
    what: "source connected to the mains without isolation",
    reason:
      "The divider's base and the instrument's protective earth join one side of the source to earth: a side that is live by the plug, a rectifier or a fault is shorted through them. " +
      "Feed the source from an isolating transformer, or show by measurement that the earthed side is neutral in every position of the plug.",
    source: practice("isolate a mains-connected source before one side of it is earthed"),
  });
}
