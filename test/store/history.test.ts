import fc from "fast-check";
import { expect, it } from "vitest";
import { mostSteps, redoNames, undoNames } from "../../src/store/history.ts";
import { createDividerStore } from "../../src/store/store.ts";
import { inventedDesign } from "../file/invented.ts";

const around = { now: () => 0, takeCandidate: <T>(document: T) => document };
const fresh = (example = false) => createDividerStore(inventedDesign(), around, { example });
const nominal = "/brief/waveform/nominal_V";
const ambient = "/brief/surroundings/ambient_degC";

it("makes typing in one field one step until the field is left", () => {
  const store = fresh();
  const type = (pointer: string, ...values: number[]) => {
    for (const value of values) store.getState().editAt(pointer, value, { step: pointer, typed: String(value) });
  };
  type(nominal, 4, 48, 480);
  expect(undoNames(store.getState())).toEqual([nominal]);
  type(ambient, 2, 25);
  type(nominal, 5, 50);
  expect(undoNames(store.getState())).toEqual([nominal, ambient, nominal]);
  store.getState().leaveField();
  type(nominal, 51);
  expect(undoNames(store.getState())).toHaveLength(4);
  store.getState().undo();
  expect(store.getState().document.brief.waveform.nominal_V).toBe(50);
  type(nominal, 52);
  expect(undoNames(store.getState())).toHaveLength(4);
  expect(redoNames(store.getState())).toEqual([]);
});

it("keeps no step for an edit that changes nothing", () => {
  const store = fresh();
  store.getState().editAt(nominal, 6000, { step: "v", typed: "6k" });
  store.getState().leaveField();
  store.getState().editAt(nominal, 6000, { step: "v", typed: "6k" });
  expect(undoNames(store.getState())).toEqual(["v"]);
});

type Act = (store: ReturnType<typeof fresh>) => void;
const acts: fc.Arbitrary<Act> = fc.oneof(
  fc.tuple(fc.constantFrom(nominal, ambient, "/brief/scaleFactor"), fc.integer({ min: -5, max: 200 })).map(
    ([pointer, value]): Act =>
      (store) =>
        void store.getState().editAt(pointer, value, { step: "edit", typed: String(value) }),
  ),
  fc.constantFrom<Act>(
    (store) => store.getState().leaveField(),
    (store) => store.getState().undo(),
    (store) => store.getState().redo(),
    (store) => void store.getState().sizeAgain(),
    (store) => void store.getState().removeAt("/design/lvArm/branches/0", "remove"),
    (store) => void store.getState().editAt("/design/lvArm/branches/-", { name: "R", series: [] }, { step: "add" }),
    (store) => void store.getState().acceptAssumed(ambient),
    (store) => void store.getState().rename("renamed"),
    (store) =>
      void store.getState().applyCure({ label: "c", edits: [{ pointer: ambient, value: 24 }], sizeAgain: true }),
  ),
);

it("returns to the start by undoing all and to the end by redoing all", () => {
  fc.assert(
    fc.property(fc.array(acts, { maxLength: 60 }), fc.boolean(), (list, example) => {
      const store = fresh(example);
      const first = store.getState().document;
      for (const act of list) act(store);
      const end = store.getState();
      let steps = 0;
      while (store.getState().past.length > 0 && steps < 1000) {
        store.getState().undo();
        steps += 1;
      }
      expect(store.getState().document).toBe(first);
      expect(store.getState().file.example).toBe(example);
      while (store.getState().future.length > 0) store.getState().redo();
      while (store.getState().past.length > end.past.length) store.getState().undo();
      expect(store.getState().document).toBe(end.document);
      expect(undoNames(store.getState())).toEqual(undoNames(end));
    }),
    { numRuns: 200 },
  );
});

it("keeps the newest steps", () => {
  const store = fresh();
  for (let i = 0; i < mostSteps + 30; i += 1) {
    store.getState().editAt(ambient, i % 2 === 0 ? 20 : 21, { step: `step ${i}` });
    store.getState().leaveField();
  }
  expect(store.getState().past).toHaveLength(mostSteps);
  expect(undoNames(store.getState())[0]).toBe(`step ${mostSteps + 29}`);
});
