import type { ResistanceWindow } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";

/** The window in words: from, to, by which rules, and where the design stands in it. */
export function windowSentence(window: ResistanceWindow, current_ohm: number | null): string {
  if (!window.open) return window.collision ?? "The bounds leave no R1 open.";
  const { least_ohm, greatest_ohm } = window;
  const by = (id: string | null) => window.bounds.find((b) => b.id === id)?.name ?? "no rule";
  const from = least_ohm === null ? "" : `from ${withUnit(least_ohm, "ohm", 3)} (${by(window.leastBy)})`;
  const to = greatest_ohm === null ? "" : `to ${withUnit(greatest_ohm, "ohm", 3)} (${by(window.greatestBy)})`;
  if (from === "" && to === "") return "No rule bounds R1.";
  const open = `R1 may lie ${[from, to].filter((part) => part !== "").join(" ")}`;
  if (current_ohm === null) return `${open}.`;
  return `${open}; the design has ${withUnit(current_ohm, "ohm", 3)}${stands(current_ohm, least_ohm, greatest_ohm)}.`;
}

function stands(current: number, least: number | null, greatest: number | null): string {
  if (least !== null && current < least) return `, below it by a factor of ${factor(least / current)}`;
  if (greatest !== null && current > greatest) return `, above it by a factor of ${factor(current / greatest)}`;
  return "";
}

const factor = (value: number): string => String(Number(value.toPrecision(3)));
