import { describe, expect, it } from "vitest";
import type {
  Candidate,
  ColumnField,
  Design,
  DividerDocument,
  FieldGeometry,
  Proof,
  Sizing,
  Through,
} from "../../src/solver/index.ts";
import { answer } from "../../src/work/answer.ts";
import { Cache, cachedSize, canonical, sizingKey } from "../../src/work/cache.ts";
import { inlineWorker } from "../../src/work/inline.ts";
import type { OutcomeMessage } from "../../src/work/job.ts";
import { Lane } from "../../src/work/lane.ts";
import { jobsOf } from "../../src/work/outcomeOf.ts";
import { inventedDesign, inventedStart } from "../file/invented.ts";

const candidate = { rank: 1, design: inventedDesign().design!, parts: [] } as unknown as Candidate;
const sizingWith = (candidates: Candidate[]) => ({ candidates, lost: [] }) as unknown as Sizing;
function door(candidates: Candidate[] = [candidate]) {
  const calls: string[] = [];
  const run = jobsOf({
    size: (_, { top }) => {
      calls.push(`size ${top}`);
      return { ok: true, value: sizingWith(candidates) };
    },
    prove: (document, field) => {
      calls.push(
        `prove ${document.design === null ? "nothing" : document.design.follows}${field ? " with field" : ""}`,
      );
      return { ok: true, value: { level: "clear" } as Proof };
    },
    fieldAsked: ({ design }) => ({ ok: true, value: design?.strays.from === "field" ? geometryOf(design) : null }),
    isFieldOf: (field, geometry) => field.geometry.columnLength_m === geometry.columnLength_m,
    speed: () => ({ ok: false, error: { where: "", why: "not asked here", cure: "" } }),
    solveField: (geometry) => {
      calls.push("field");
      return { geometry, strays: {} as ColumnField["strays"] };
    },
    through: (_, record) => ({ sentence: `${record.time_s.length} points` }) as Through,
    takeCandidate: (document, { design }) => ({ ...document, design: { ...design, follows: false } }),
  });
  return { calls, run };
}
const geometryOf = ({ geometry }: Design) => ({ ...geometry, elements: 3 }) as unknown as FieldGeometry;
const standing = (): DividerDocument => {
  const document = inventedDesign();
  return { ...document, design: { ...document.design!, follows: false } };
};

describe("a job that follows the brief", () => {
  it("chooses the best candidate where there is no design yet, and proves it", () => {
    const { calls, run } = door();
    const outcome = run({ kind: "follow", document: inventedStart(), top: 3 });
    expect(calls).toEqual(["size 3", "prove true"]);
    expect(outcome.ok && outcome.value.document.design?.follows).toBe(true);
    expect(outcome.ok && outcome.value.sizing?.candidates).toHaveLength(1);
  });

  it("leaves a design that stands as it is, without a search", () => {
    const { calls, run } = door();
    const document = standing();
    const outcome = run({ kind: "follow", document, top: 3 });
    expect(calls).toEqual(["prove false"]);
    expect(outcome.ok && outcome.value.document).toBe(document);
  });

  it("judges the old design when no candidate is left, and nothing when there is none", () => {
    const { calls, run } = door([]);
    run({ kind: "follow", document: inventedDesign(), top: 1 });
    const none = run({ kind: "follow", document: inventedStart(), top: 1 });
    expect(calls).toEqual(["size 1", "prove true", "size 1"]);
    expect(none.ok && none.value.proof).toBeNull();
    expect(none.ok && none.value.sizing).not.toBeNull();
  });
});

describe("a design whose strays come from the field of its drawing", () => {
  const asking = (length = 1): DividerDocument => {
    const document = standing();
    const design = document.design!;
    return {
      ...document,
      design: {
        ...design,
        strays: { ...design.strays, from: "field" },
        geometry: { ...design.geometry, columnLength_m: length },
      },
    };
  };
  it("is proved without it at once, and says that it waits", () => {
    const { calls, run } = door();
    const outcome = run({ kind: "prove", document: asking() });
    expect(calls).toEqual(["prove false"]);
    expect(outcome.ok && outcome.value.awaitsField).toBe(true);
  });
  it("is proved with a field of the same drawing, never with one of another", () => {
    const { calls, run } = door();
    const solved = run({ kind: "field", document: asking() });
    const field = solved.ok ? solved.value.field : null;
    const same = run({ kind: "prove", document: asking(), field });
    const other = run({ kind: "prove", document: asking(2), field });
    expect(calls).toEqual(["field", "prove false with field", "prove false"]);
    expect(same.ok && same.value.awaitsField).toBe(false);
    expect(other.ok && other.value.awaitsField).toBe(true);
  });
  it("is solved within the job where that is asked, as the shell does", () => {
    const { calls, run } = door();
    run({ kind: "prove", document: asking(), field: "solve" });
    expect(calls).toEqual(["field", "prove false with field"]);
  });
});

it("a recorded waveform is sent through the design that stands, after its proof", () => {
  const { calls, run } = door();
  const record = { time_s: [0, 1], value: [0, 1] };
  const outcome = run({ kind: "through", document: standing(), field: null, record, reference: "electrode" });
  expect(calls).toEqual(["prove false"]);
  expect(outcome.ok && outcome.value.through?.sentence).toBe("2 points");
});

describe("an answer", () => {
  it("says a fault of the program instead of throwing it", () => {
    const said: OutcomeMessage[] = [];
    const run = () => {
      throw new TypeError("broken");
    };
    answer(
      { number: 7, job: { kind: "prove", document: standing() } },
      run,
      (m) => said.push(m),
      () => 0,
    );
    expect(said).toHaveLength(1);
    expect(said[0]).toMatchObject({ number: 7, kind: "refused" });
    expect(JSON.stringify(said[0])).toContain("broken");
  });

  it("comes from a stand-in on the same thread as from a worker, and survives a structured clone", async () => {
    const lane = new Lane({ startWorker: () => inlineWorker(door().run), now: () => 0, patience_ms: 0 });
    const kinds: string[] = [];
    const outcome = await new Promise((resolve) => {
      lane.ask({ kind: "follow", document: inventedStart(), top: 1 }, (heard) => {
        kinds.push(heard.kind);
        if (heard.kind === "done") resolve(structuredClone(heard.outcome));
      });
    });
    expect(kinds).toEqual(["progress", "done"]);
    expect(outcome).toMatchObject({ proof: { level: "clear" } });
  });
});

describe("the memory of searches", () => {
  it("answers again without a search until something that a search depends on changes", () => {
    let searches = 0;
    const size = cachedSize(() => {
      searches += 1;
      return { ok: true, value: sizingWith([]) };
    });
    const document = inventedDesign();
    size(document, { top: 3 });
    size({ ...document, name: "other", design: null, typed: { "/brief/scaleFactor": "1k" } }, { top: 3 });
    expect(searches).toBe(1);
    size(document, { top: 4 });
    size({ ...document, brief: { ...document.brief, scaleFactor: 999 } }, { top: 3 });
    size({ ...document, origins: {} }, { top: 3 });
    expect(searches).toBe(4);
  });

  it("does not depend on the order of keys", () => {
    expect(canonical({ b: [1, { d: 1, c: 2 }], a: null })).toBe(canonical({ a: null, b: [1, { c: 2, d: 1 }] }));
    expect(sizingKey(inventedDesign(), 1)).not.toBe(sizingKey(inventedDesign(), 2));
  });

  it("keeps the results last used", () => {
    const cache = new Cache<number>(2);
    let made = 0;
    const get = (key: string) => cache.get(key, () => (made += 1));
    for (const key of ["a", "b", "a", "c", "a"]) get(key);
    expect(made).toBe(3);
    expect(cache.size).toBe(2);
    expect(get("b")).toBe(4);
  });
});
