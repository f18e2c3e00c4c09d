import { expect, it } from "vitest";
import { encodeDocument } from "../../src/file/encode.ts";
import { restoreDocument } from "../../src/file/restore.ts";
import { takeCandidate } from "../../src/solver/index.ts";
import { createDividerStore } from "../../src/store/store.ts";
import { runJob } from "../../src/work/runJob.ts";
import { inventedStart } from "../file/invented.ts";

it("takes a new document from three answers to a design that saves, opens and is proved the same again", () => {
  const document = inventedStart();
  const followed = runJob({ kind: "follow", document, top: 3 });
  if (!followed.ok) throw new Error(followed.error.why);
  expect(structuredClone(followed.value)).toEqual(followed.value);
  const store = createDividerStore(document, { now: () => 0, takeCandidate });
  store.getState().adopt(document, followed.value.document);
  const restored = restoreDocument(encodeDocument(store.getState().document));
  if (restored.kind === "refused") throw new Error(restored.refusal.why);
  expect([restored.repairs, restored.filled]).toEqual([[], []]);
  expect(restored.document).toEqual(store.getState().document);
  const again = runJob({ kind: "prove", document: restored.document });
  expect(followed.value.proof).not.toBeNull();
  expect(again.ok && again.value.proof).toEqual(followed.value.proof);
});
