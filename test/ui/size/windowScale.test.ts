import { describe, expect, it } from "vitest";
import { windowDrawing } from "../../../src/ui/size/windowScale.ts";
import { windowSentence } from "../../../src/ui/size/windowSentence.ts";
import { closedWindow, inventedWindow } from "../../support/inventedSizing.ts";

describe("resistance window", () => {
  it("forbids below an at-least bound and above an at-most bound, and leaves the slot between the two inner ones", () => {
    const drawing = windowDrawing(inventedWindow, 120e6, [])!;
    const of = (id: string) => drawing.bounds.find((each) => each.bound.id === id)!;
    expect(of("currentLimit").from).toBe(0);
    expect(of("existence").to).toBe(1);
    expect(drawing.slot).toEqual({ from: of("currentLimit").at, to: of("existence").at, open: true });
    expect(drawing.current).toBeGreaterThan(drawing.slot!.from);
    expect(drawing.current).toBeLessThan(drawing.slot!.to);
  });

  it("leaves out bounds that do not apply", () => {
    expect(windowDrawing(inventedWindow, null, [])!.bounds.map((each) => each.bound.id)).not.toContain("dissipation");
  });

  it("says where the design stands, also outside", () => {
    expect(windowSentence(inventedWindow, 120e6)).toBe(
      "R1 may lie from 2.4\u2009MΩ (current limit) to 999\u2009MΩ (LV arm exists); the design has 120\u2009MΩ.",
    );
    expect(windowSentence(inventedWindow, 1.2e6)).toContain("below it by a factor of 2");
    expect(windowSentence(closedWindow, null)).toBe(closedWindow.collision);
  });
});
