import { beforeEach, describe, expect, it } from "vitest";
import { encodeDocument } from "../../src/file/encode.ts";
import { restoreDocument } from "../../src/file/restore.ts";
import type { Candidate, DividerDocument } from "../../src/solver/index.ts";
import { redoNames, undoNames } from "../../src/store/history.ts";
import { createDividerStore, type DividerStore } from "../../src/store/store.ts";
import { inventedDesign, inventedPart, inventedStart } from "../file/invented.ts";

let time = 0;
const takeCandidate = (document: DividerDocument, candidate: Candidate): DividerDocument => ({
  ...document,
  typed: {},
  parts: candidate.parts,
  design: candidate.design,
});
const around = { now: () => time, takeCandidate };
let store: DividerStore;
const now = () => store.getState();
const nominal = "/brief/waveform/nominal_V";
const ambient = "/brief/surroundings/ambient_degC";

beforeEach(() => {
  time = 1000;
  store = createDividerStore(inventedDesign(), around);
});

describe("an edit", () => {
  it("sets the value, its origin and the text typed, and leaves all else untouched", () => {
    const before = now().document;
    expect(now().editAt(nominal, 6500, { step: "nominal voltage", typed: "6k5" }).ok).toBe(true);
    const { document } = now();
    expect(document.brief.waveform.nominal_V).toBe(6500);
    expect(document.typed[nominal]).toBe("6k5");
    expect(document.origins[nominal]).toBe("typed");
    expect(document.design).toBe(before.design);
    expect(document.brief.source).toBe(before.brief.source);
    expect(before.brief.waveform.nominal_V).toBe(6000);
  });

  it.each([
    [nominal, Number.NaN],
    [nominal, Number.POSITIVE_INFINITY],
    [nominal, "6 kV"],
    [nominal, null],
    ["/brief/policy/voltageDerating", 80],
    ["/brief/waveform/kind", "triangle"],
    ["/brief/nowhere/x", 1],
    ["/design/hvArm/elements/99/resistance_ohm", 1],
    ["/design/geometry", { columnLength_m: Number.NaN }],
    ["/principal", "nobody"],
    ["/brief/band_Hz/0", 3],
    ["/instruments/0/id", ""],
    ["/version", 2],
    ["/origins", {}],
    ["", {}],
    ["no pointer", 1],
    ["/__proto__/x", 1],
  ])("is refused with a reason and changes nothing: %s %s", (pointer, value) => {
    const before = now();
    const done = now().editAt(pointer, value, { step: "x" });
    expect(done.ok).toBe(false);
    if (!done.ok) expect(done.error.why).not.toBe("");
    expect(now().document).toBe(before.document);
    expect(now().past).toEqual([]);
  });

  it("never leaves a document that would be repaired on opening", () => {
    now().editAt("/design/lvArm/branches/-", { name: "K1", link: true, capacitance_F: 1e-10 }, { step: "add a link" });
    now().editAt("/parts/-", { ...inventedPart, id: "r2" }, { step: "add a part" });
    now().removeAt("/design/lvArm/branches/0", "remove R2a");
    const restored = restoreDocument(encodeDocument(now().document));
    if (restored.kind === "refused") throw new Error(restored.refusal.why);
    expect(restored.repairs).toEqual([]);
    expect(restored.document).toEqual(now().document);
  });

  it("puts the default back, marked as assumed, when a field is left blank", () => {
    now().editAt(ambient, 40, { step: "t", typed: "40" });
    now().clearAt(ambient, "t");
    expect(now().document.brief.surroundings.ambient_degC).toBe(23);
    expect(now().document.origins[ambient]).toBe("assumed");
    expect(now().document.typed[ambient]).toBeUndefined();
    now().editAt("/brief/waveform/greatest_Vpeak", 8000, { step: "g" });
    now().clearAt("/brief/waveform/greatest_Vpeak", "g");
    expect(now().document.brief.waveform.greatest_Vpeak).toBeNull();
    expect(now().document.origins["/brief/waveform/greatest_Vpeak"]).toBe("assumed");
    expect(now().clearAt("/design/hvArm/elements/0/resistance_ohm", "r").ok).toBe(false);
  });

  it("moves origins and typed texts up with the items of a list", () => {
    const value = (i: number) => `/design/lvArm/branches/${i}/series/0/resistance_ohm`;
    now().editAt(value(0), 1e6, { step: "a", typed: "1M" });
    now().editAt(value(1), 2e6, { step: "b", typed: "2M" });
    now().removeAt("/design/lvArm/branches/0", "remove R2a");
    expect(now().document.typed).toEqual({ [value(0)]: "2M" });
    expect(now().document.design?.lvArm.branches.map((b) => b.name)).toEqual(["R2b", "T1"]);
  });
});

describe("whether the design follows the brief", () => {
  const follows = () => now().document.design?.follows;
  const candidate = { rank: 2, parts: inventedDesign().parts, design: inventedDesign().design } as unknown as Candidate;

  it("goes on over an edit of the brief and ends with an edit of the design or a candidate taken", () => {
    now().editAt(nominal, 7000, { step: "v" });
    expect(follows()).toBe(true);
    now().editAt("/design/lvArm/stays", "withInstrument", { step: "s" });
    expect(follows()).toBe(false);
    now().sizeAgain();
    expect(follows()).toBe(true);
    now().takeCandidate(candidate);
    expect(follows()).toBe(false);
    expect(undoNames(now())).toEqual(["take candidate 2", "size again", "s", "v"]);
    now().undo();
    expect(follows()).toBe(true);
  });

  it("takes a cure as one step, all of it or nothing", () => {
    const cure = {
      label: "lower the scale factor",
      edits: [{ pointer: "/brief/scaleFactor", value: 500 }],
      sizeAgain: true,
    };
    now().editAt("/design/lvArm/stays", "withInstrument", { step: "s" });
    now().applyCure(cure);
    expect(follows()).toBe(true);
    expect(undoNames(now())[0]).toBe("lower the scale factor");
    const before = now().document;
    const broken = { label: "x", edits: [...cure.edits, { pointer: "/brief/scaleFactor", value: -1 }] };
    expect(
      now().applyCure({ ...broken, edits: [{ pointer: "/brief/scaleFactor", value: 3 }, broken.edits[1]!] }).ok,
    ).toBe(false);
    expect(now().document).toBe(before);
  });

  it("adopts the design a search chose without a step, only while it is the answer to what stands", () => {
    store = createDividerStore(inventedStart(), around);
    const judged = now().document;
    const chosen = takeCandidate(judged, candidate);
    now().adopt(judged, chosen);
    expect(now().document.design?.follows).toBe(true);
    expect(now().document.parts).toHaveLength(1);
    expect([now().past, now().file.dirtySince]).toEqual([[], null]);
    now().editAt(nominal, 1, { step: "v" });
    const newer = now().document;
    now().adopt(judged, { ...chosen, design: { ...chosen.design!, protectors: [{ part: "g", at: "divider" }] } });
    expect(now().document).toBe(newer);
  });

  it("takes the origins of the chosen design over, and those of parts along with the parts", () => {
    now().editAt("/parts/0/tolerance", 0.02, { step: "t", typed: "2 %" });
    const first = { ...inventedDesign().parts[0]!, id: "new" };
    const around2 = {
      ...around,
      takeCandidate: (document: DividerDocument): DividerDocument => ({
        ...document,
        parts: [first, ...document.parts],
        origins: { ...document.origins, "/design": "catalogue" },
      }),
    };
    store = createDividerStore(now().document, around2);
    now().takeCandidate(candidate);
    expect(now().document.origins).toMatchObject({ "/design": "catalogue", "/parts/1/tolerance": "typed" });
    expect(now().document.origins["/parts/0/tolerance"]).toBeUndefined();
    expect(now().document.typed).toEqual({ "/parts/1/tolerance": "2 %" });
  });

  it("keeps what a person noted in the design beside ours, and drops origins that spoke of the old one", () => {
    const document = inventedDesign();
    const noted = { ...document, design: { ...document.design!, note: "keep me" }, typed: { "/design/follows": "x" } };
    store = createDividerStore(noted, around);
    now().takeCandidate(candidate);
    expect(now().document.design).toHaveProperty("note", "keep me");
    expect(now().document.typed).toEqual({});
  });
});

describe("the file", () => {
  it("is dirty since the first change it does not hold, and clean again after undo or saving", () => {
    time = 2000;
    now().editAt(nominal, 1, { step: "v" });
    time = 3000;
    now().editAt(ambient, 30, { step: "t" });
    expect(now().file.dirtySince).toBe(2000);
    now().undo();
    now().undo();
    expect(now().file.dirtySince).toBeNull();
    now().redo();
    now().fileSaved(now().document, "a.stringwright.json");
    expect(now().file).toMatchObject({ name: "a.stringwright.json", savedAt: 3000, dirtySince: null });
  });

  it("stays dirty when something was typed while it was being written", () => {
    const written = now().document;
    now().editAt(nominal, 1, { step: "v" });
    now().fileSaved(written, "a");
    expect(now().file.dirtySince).not.toBeNull();
    now().undo();
    expect(now().file.dirtySince).toBeNull();
  });

  it("makes a copy of an example at the first edit, in one step", () => {
    store = createDividerStore(inventedDesign(), around, { example: true });
    now().editAt(nominal, 1, { step: "nominal voltage" });
    expect(now().document.name).toBe("copy of 6 kV supply");
    expect(now().file).toMatchObject({ example: false, name: null, dirtySince: 1000 });
    now().undo();
    expect(now().document.name).toBe("6 kV supply");
    expect(now().file).toMatchObject({ example: true, dirtySince: null });
  });

  it("refuses every change while it is read-only, until a copy is worked on", () => {
    now().openDocument(inventedDesign(), { name: "b", readOnly: "newer version" });
    expect(now().editAt(nominal, 1, { step: "v" }).ok).toBe(false);
    expect(now().applyCure({ label: "c", edits: [] }).ok).toBe(false);
    now().workOnACopy();
    expect(now().editAt(nominal, 1, { step: "v" }).ok).toBe(true);
    expect(now().file).toMatchObject({ name: null, readOnly: null });
  });

  it("starts its history anew when another is opened", () => {
    now().editAt(nominal, 1, { step: "v" });
    now().newDocument(inventedStart());
    expect([undoNames(now()), redoNames(now())]).toEqual([[], []]);
    expect(now().file).toMatchObject({ name: null, dirtySince: null });
  });

  it("takes an accepted assumption as typed", () => {
    expect(now().document.origins[ambient]).toBe("assumed");
    now().acceptAssumed(ambient);
    expect(now().document.origins[ambient]).toBe("typed");
    now().undo();
    expect(now().document.origins[ambient]).toBe("assumed");
  });
});
