import type { CapacitorFamily, InHand, Part, ResistorFamily, SeriesName, UnitName } from "../../solver/index.ts";
import { type Parsed, parseQuantity } from "../../solver/index.ts";

export type FamilyKind = "resistor" | "capacitor";

/** One field of the form for an own family. */
export interface DraftField {
  readonly key: string;
  readonly label: string;
  /** Unit that a bare number is read in, after scaling. */
  readonly unit: UnitName;
  /** What stands beside the field: "%", "ppm/K". */
  readonly shown: string;
  /** From what is typed to the base unit. */
  readonly scale: number;
  /** null: must be typed. */
  readonly assumed: number | null;
  readonly signed?: boolean;
}

const field = (
  key: string,
  label: string,
  unit: UnitName,
  assumed: number | null = null,
  shown: string = unit === "ohm" ? "Ω" : unit === "degC" ? "°C" : unit,
  scale = 1,
): DraftField => ({ key, label, unit, shown, scale, assumed });

const body = [
  field("bodyLength_m", "body length", "m", null, "mm", 1e-3),
  field("bodyDiameter_m", "body diameter", "m", null, "mm", 1e-3),
];

/** What a resistor or capacitor family must state; the rest has a stand-in that counts as assumed. */
export const draftFields: Readonly<Record<FamilyKind, readonly DraftField[]>> = {
  resistor: [
    field("least_ohm", "least value", "ohm"),
    field("greatest_ohm", "greatest value", "ohm"),
    field("tolerance", "tolerance", "1", null, "%", 0.01),
    field("ratedDissipation_W", "rated dissipation at 70 °C", "W"),
    field("limitingVoltage_V", "limiting element voltage", "V"),
    ...body,
    field("leadSpace_m", "space body to body", "m", 0.005, "mm", 1e-3),
    field("temperatureCoefficient_per_K", "temperature coefficient", "1", 2e-4, "ppm/K", 1e-6),
    { ...field("voltageCoefficient_per_V", "voltage coefficient", "1", -5e-6, "ppm/V", 1e-6), signed: true },
    field("zeroDissipation_degC", "no dissipation left at", "degC", 125),
    field("thermalResistance_K_per_W", "body to ambient", "1", 250, "K/W"),
    field("selfCapacitance_F", "own capacitance", "F", 3e-13, "pF", 1e-12),
  ],
  capacitor: [
    field("least_F", "least value", "F"),
    field("greatest_F", "greatest value", "F"),
    field("tolerance", "tolerance", "1", null, "%", 0.01),
    field("ratedVoltage_V", "rated voltage", "V"),
    ...body,
    field("temperatureCoefficient_per_K", "temperature coefficient", "1", 2e-4, "ppm/K", 1e-6),
    field("dissipationFactor", "dissipation factor", "1", 0.01, ""),
    field("leadInductance_H", "lead inductance", "H", 1e-8, "nH", 1e-9),
  ],
};

export interface Draft {
  readonly kind: FamilyKind;
  readonly name: string;
  readonly series: SeriesName;
  readonly dielectricClass: CapacitorFamily["dielectricClass"];
  /** Texts as typed, by the field's key. */
  readonly texts: Readonly<Record<string, string>>;
  /** "20 x 10M, 12 x 4M7": what lies in the drawer. */
  readonly inHand: string;
}

export const emptyDraft = (kind: FamilyKind): Draft => ({
  kind,
  name: "",
  series: "E24",
  dielectricClass: "class1",
  texts: {},
  inHand: "",
});

/** A field's text read: its value in the base unit, or what is wrong with it; null where nothing is typed. */
export type FieldReading =
  | { readonly ok: true; readonly value: number; readonly understood: string }
  | { readonly ok: false; readonly why: string };

export function readField(f: DraftField, text: string): FieldReading | null {
  if (text.trim() === "") return null;
  const bare = f.scale !== 1 && /^[+\-\u2212]?\d*[.,]?\d+(e[+-]?\d+)?$/i.test(text.trim());
  const parsed = parseQuantity(text, bare ? "1" : f.unit, { signed: f.signed ?? false });
  const value = numberOf(parsed);
  if (typeof value === "string") return { ok: false, why: value };
  const scaled = bare || (f.unit === "1" && f.scale !== 1) ? value * f.scale : value;
  return {
    ok: true,
    value: Number(scaled.toPrecision(15)),
    understood: parsed.kind === "value" ? parsed.understood : "",
  };
}

function numberOf(parsed: Parsed): number | string {
  switch (parsed.kind) {
    case "value":
      return parsed.value;
    case "ambiguous":
      return parsed.why;
    case "arithmetic":
      return "Write the value out.";
    case "refused":
      return `${parsed.why} ${parsed.cure}`;
  }
}

/** A family to be added, with the keys of its ratings that are stand-ins. */
export interface AddedFamily {
  readonly part: Part;
  readonly assumed: readonly string[];
}

export interface Drafted {
  /** null as long as something is missing or wrong. */
  readonly part: Part | null;
  /** By field key: what is wrong or missing. */
  readonly faults: Readonly<Record<string, string>>;
  /** Keys that were filled with a stand-in. */
  readonly assumed: readonly string[];
}

/** A draft as a part with the id given, every field checked. */
export function draftedPart(draft: Draft, id: string): Drafted {
  const faults: Record<string, string> = {};
  const assumed: string[] = [];
  const values: Record<string, number> = {};
  for (const f of draftFields[draft.kind]) {
    const reading = readField(f, draft.texts[f.key] ?? "");
    if (reading?.ok) values[f.key] = reading.value;
    else if (reading !== null) faults[f.key] = reading.why;
    else if (f.assumed === null) faults[f.key] = "Needed: it is used for sizing.";
    else {
      values[f.key] = f.assumed;
      assumed.push(f.key);
    }
  }
  if (draft.name.trim() === "") faults.name = "A plain name is needed, for the parts list.";
  const inHand = readInHand(draft.inHand, draft.kind === "resistor" ? "ohm" : "F");
  if (!inHand.ok) faults.inHand = inHand.why;
  const [low, high] = draft.kind === "resistor" ? ["least_ohm", "greatest_ohm"] : ["least_F", "greatest_F"];
  if (values[low!]! > values[high!]!) faults[high!] = "Must not be below the least value.";
  const whole = Object.keys(faults).length === 0 && inHand.ok;
  return { part: whole ? partOf(draft, id, values, inHand.list) : null, faults, assumed };
}

function partOf(draft: Draft, id: string, values: Record<string, number>, inHand: readonly InHand[]): Part {
  const common = { id, name: draft.name.trim(), origin: "typed", series: draft.series, ...values } as const;
  const drawer = inHand.length === 0 ? {} : { inHand };
  if (draft.kind === "resistor") {
    const fixed = { kind: "resistor", seriesAbove: null, deratingFrom_degC: 70, use: "divider" } as const;
    return { ...fixed, ...common, ...drawer } as ResistorFamily;
  }
  const { dielectricClass } = draft;
  return { kind: "capacitor", dielectric: dielectricClass, dielectricClass, ...common, ...drawer } as CapacitorFamily;
}

/** "20 x 10M, 12 x 4M7" as counts and values. */
export function readInHand(
  text: string,
  unit: "ohm" | "F",
): { readonly ok: true; readonly list: readonly InHand[] } | { readonly ok: false; readonly why: string } {
  const list: InHand[] = [];
  for (const item of text.split(/[,;\n]\s+|[;\n]/).filter((one) => one.trim() !== "")) {
    const split = /^\s*(\d+)\s*[x×*]\s*(.+)$/.exec(item);
    if (split === null) return { ok: false, why: `"${item.trim()}" is not a count and a value: write 20 x 10M.` };
    const value = numberOf(parseQuantity(split[2]!, unit));
    if (typeof value === "string") return { ok: false, why: value };
    list.push({ value, count: Number(split[1]) });
  }
  return { ok: true, list };
}

/** An id that no part has yet. */
export function freeId(parts: readonly Part[], kind: FamilyKind): string {
  const taken = new Set(parts.map((part) => part.id));
  let i = 1;
  while (taken.has(`own-${kind}-${i}`)) i += 1;
  return `own-${kind}-${i}`;
}
