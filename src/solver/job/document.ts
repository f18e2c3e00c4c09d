import type { Brief } from "./brief.ts";
import type { Design } from "./design.ts";
import type { Instrument } from "./instrument.ts";
import type { Origin, Part } from "./part.ts";

/** What was measured after building; records are frozen once issued. */
export interface AsBuilt {
  readonly readings: readonly unknown[];
  readonly records: readonly unknown[];
}

/** A whole saved job. Origins and the typed texts are kept by JSON pointer; a pointer not listed counts as typed. */
export interface DividerDocument {
  readonly format: "stringwright";
  readonly version: 1;
  readonly name: string;
  readonly brief: Brief;
  readonly parts: readonly Part[];
  readonly instruments: readonly Instrument[];
  readonly principal: string;
  readonly design: Design | null;
  readonly asBuilt: AsBuilt;
  readonly origins: Readonly<Record<string, Origin>>;
  readonly typed: Readonly<Record<string, string>>;
}
