import { readFileSync } from "node:fs";
import { restoreDocument } from "../../src/file/restore.ts";
import { type DividerDocument, prove, takeCandidate } from "../../src/solver/index.ts";
import { createDividerStore } from "../../src/store/store.ts";
import { newJudged, newLooking, type Session } from "../../src/ui/frame/session.ts";

/** A session on a shipped demo (or a change of it) with its true proof; nothing is asked of a worker. */
export function solvedSession(name: string, change = (document: DividerDocument) => document): Session {
  const restored = restoreDocument(readFileSync(`demo/${name}.json`, "utf8"));
  if (restored.kind === "refused") throw new Error(restored.refusal.why);
  const document_ = change(restored.document);
  const proof = prove(document_);
  if (!proof.ok) throw new Error(proof.error.why);
  const store = createDividerStore(document_, { now: () => 0, takeCandidate });
  const judged = newJudged();
  judged.setState({ document: document_, proof: proof.value, stale: false });
  const asked = () => {
    throw new Error("no worker in this session");
  };
  const runner = { check: { ask: asked }, long: { ask: asked } } as unknown as Session["runner"];
  return { store, judged, looking: newLooking(), runner, keeper: null, handle: null };
}
