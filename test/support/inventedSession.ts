import { takeCandidate } from "../../src/solver/index.ts";
import { createDividerStore } from "../../src/store/store.ts";
import { newJudged, newLooking, type Session } from "../../src/ui/frame/session.ts";
import { inventedDocument } from "./inventedDocument.ts";
import { inventedProof } from "./inventedProof.ts";
import { inventedSizing } from "./inventedSizing.ts";

/** A session on the invented job with its invented answers; nothing is asked of a worker. */
export function inventedSession(): Session {
  const store = createDividerStore(inventedDocument, { now: () => 0, takeCandidate });
  const judged = newJudged();
  judged.setState({ document: inventedDocument, sizing: inventedSizing, proof: inventedProof, stale: false });
  const asked = () => {
    throw new Error("no worker in this session");
  };
  const runner = { check: { ask: asked }, long: { ask: asked } } as unknown as Session["runner"];
  return { store, judged, looking: newLooking(), runner, keeper: null, handle: null };
}
