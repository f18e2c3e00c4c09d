import type { AsBuilt, DividerDocument, Instrument, Origin, Part } from "../solver/index.ts";
import { briefShape } from "./briefShape.ts";
import { designShape } from "./designShape.ts";
import { instrumentShape } from "./instrumentShape.ts";
import { origins, partShape } from "./partShape.ts";
import { choice, list, literal, map, object, orNull, text, verbatim } from "./shapes.ts";

/** Version of the document that this program writes. */
export const version = 1;

export const documentShape = object<DividerDocument>(
  "A high-voltage divider: what is asked, what was chosen, what was built.",
  {
    format: literal("Marks the file.", "stringwright"),
    version: literal("Version of the document's shape.", version),
    name: text("Name of the job.", "untitled"),
    brief: briefShape,
    parts: list<Part>("Every part used, ratings copied in.", partShape),
    instruments: list<Instrument>("What reads the divider.", instrumentShape, 100),
    principal: text("Id of the principal instrument.", "", 100),
    design: orNull(designShape),
    asBuilt: object<AsBuilt>("What was measured after building.", {
      readings: list("Measured values, kept as they are.", verbatim("A reading."), 20_000),
      records: list("Records, frozen once issued.", verbatim("A record."), 2000),
    }),
    origins: map<Origin>(
      "Origin of a value by JSON pointer; one not listed counts as typed.",
      choice("Origin.", origins),
    ),
    typed: map<string>("The text as it was typed, by JSON pointer.", text("Text.", undefined, 200)),
  },
);
