import type { ColumnField } from "../checks/columnField.ts";
import { type Judging, judging } from "../checks/judging.ts";
import { networkOf } from "../checks/networkOf.ts";
import { stringCapacitance } from "../checks/stringCapacitance.ts";
import type { DividerDocument } from "../job/document.ts";
import type { LadderNetwork } from "../network/ladderNetwork.ts";
import { ok, type Result } from "../quantities/result.ts";
import type { SheetData } from "../standards/sheet.ts";
import { type EdgeTraces, edgeTraces } from "./edgeTraces.ts";
import { type FromSource, fromSource } from "./fromSource.ts";
import { type InstrumentSpeed, instrumentSpeeds } from "./instrumentSpeed.ts";
import { prove } from "./prove.ts";
import { type Ring, rings } from "./rings.ts";
import { type SlowFast, slowFast } from "./slowFast.ts";

/** What speed comes to beyond the proof: computed when it is looked at. Plain data. */
export interface Speed {
  readonly traces: EdgeTraces;
  readonly fromSource: FromSource;
  readonly slowFast: SlowFast | null;
  readonly rings: readonly Ring[];
  readonly instruments: readonly InstrumentSpeed[];
}

/** A judged design with its network: what every part of the answer starts from. */
export interface Speeding {
  readonly j: Judging;
  readonly network: LadderNetwork;
}

/** Responses to the brief's own edge and from the source, the slow/fast check, the rings, each instrument's speed. Refuses as `prove`. */
export function speed(document: DividerDocument, field: ColumnField | null = null): Result<Speed> {
  const proof = prove(document, field);
  if (!proof.ok) return proof;
  const { j, network } = speeding(document, field, proof.value.sheet);
  return ok({
    traces: edgeTraces(j, network),
    fromSource: fromSource(network, proof.value.frequency.frequency_Hz),
    slowFast: slowFast(j, network),
    rings: rings(j, network),
    instruments: instrumentSpeeds(j),
  });
}

/** The judgement taken up again where the proof left it: its sheet is read on. */
function speeding(document: DividerDocument, field: ColumnField | null, { values, traces }: SheetData): Speeding {
  const j = judging(document, field);
  Object.assign(j.sheet.values, values);
  Object.assign(j.sheet.traces, traces);
  return { j, network: networkOf(j, stringCapacitance(j)) };
}
