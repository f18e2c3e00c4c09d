/** The document that stands after three questions: how many volts of what kind, what will read it, how good. */
import type { DividerDocument, Instrument, Origin, StatedAs, WaveformKind } from "../solver/index.ts";
import { version } from "./documentShape.ts";
import { restoreValue } from "./restore.ts";

export interface Start {
  readonly name?: string;
  /** Signed volts, stated as `statedAs` says. */
  readonly nominal_V: number;
  readonly kind: WaveformKind;
  readonly statedAs: StatedAs;
  readonly instrument: Instrument;
  /** Where the instrument's figures came from. */
  readonly instrumentOrigin?: Origin;
  /** Relative, k = 2. */
  readonly wantedUncertainty: number;
  readonly scaleFactor?: number;
  readonly frequency_Hz?: number;
  readonly riseTime_s?: number;
  readonly width_s?: number;
}

/**
 * A whole document without a design. What was given is *typed*, the instrument's figures have the origin handed in (default
 * *catalogue*), all else is *assumed*. Throws on a number that the document cannot hold: the fields refuse it before.
 */
export function startDocument(start: Start): DividerDocument {
  const waveform = { kind: start.kind, nominal_V: start.nominal_V, statedAs: start.statedAs, ...optional(start) };
  const restored = restoreValue({
    format: "stringwright",
    version,
    name: start.name ?? "untitled",
    brief: {
      waveform,
      wantedUncertainty: start.wantedUncertainty,
      ...(start.scaleFactor === undefined ? {} : { scaleFactor: start.scaleFactor }),
    },
    instruments: [start.instrument],
    principal: start.instrument.id,
    origins: instrumentOrigins(start.instrument, start.instrumentOrigin ?? "catalogue"),
  });
  if (restored.kind === "refused" || restored.repairs.length > 0) {
    const why = restored.kind === "refused" ? restored.refusal.why : restored.repairs[0]!.why;
    throw new RangeError(`cannot start from that: ${why}`);
  }
  return restored.document;
}

function optional(start: Start): Record<string, number> {
  const found: Record<string, number> = {};
  for (const key of ["frequency_Hz", "riseTime_s", "width_s"] as const) {
    const value = start[key];
    if (value !== undefined) found[key] = value;
  }
  return found;
}

function instrumentOrigins(instrument: Instrument, origin: Origin): Record<string, Origin> {
  if (origin === "typed") return {};
  const figures = Object.entries(instrument).filter(([, value]) => typeof value === "number");
  const cable = Object.keys(instrument.cable).map((key) => [`cable/${key}`] as const);
  return Object.fromEntries([...figures, ...cable].map(([key]) => [`/instruments/0/${key}`, origin]));
}

/** Pointers of everything that is assumed in a document, in the order of the document. */
export const assumedPointers = (document: DividerDocument): readonly string[] =>
  Object.keys(document.origins).filter((pointer) => document.origins[pointer] === "assumed");
