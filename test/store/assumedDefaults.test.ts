import { describe, expect, it } from "vitest";
import { startDocument } from "../../src/file/defaults.ts";
import { catalogue, takeCandidate } from "../../src/solver/index.ts";
import { createDividerStore } from "../../src/store/store.ts";

const scope = catalogue.instruments.find((each) => each.id === "scope")!;
const start = () =>
  createDividerStore(
    startDocument({ nominal_V: 48, kind: "pulse", statedAs: "peak", instrument: scope, wantedUncertainty: 0.03 }),
    { now: () => 0, takeCandidate },
  );

describe("what was assumed from the voltage", () => {
  it("is assumed anew when the voltage changes", () => {
    const store = start();
    const before = store.getState().document.brief.scaleFactor;
    store.getState().editAt("/brief/waveform/nominal_V", 48000, { step: "voltage" });
    expect(store.getState().document.brief.scaleFactor).toBe(1000);
    expect(before).toBeLessThan(10);
    store.getState().undo();
    expect(store.getState().document.brief.scaleFactor).toBe(before);
  });
  it("stays once it was stated", () => {
    const store = start();
    store.getState().editAt("/brief/scaleFactor", 500, { step: "scale factor" });
    store.getState().editAt("/brief/waveform/nominal_V", 48000, { step: "voltage" });
    expect(store.getState().document.brief.scaleFactor).toBe(500);
  });
  it("gives the band of an edge that was typed", () => {
    const store = start();
    store.getState().editAt("/brief/waveform/riseTime_s", 35e-9, { step: "rise time" });
    expect(store.getState().document.brief.band_Hz[1]).toBe(0.35 / 35e-9);
  });
});
