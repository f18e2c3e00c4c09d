import type { Design } from "../job/design.ts";
import type { DividerDocument } from "../job/document.ts";
import type { Part } from "../job/part.ts";
import { formatQuantity } from "../quantities/format.ts";
import { err, ok, type Result } from "../quantities/result.ts";

/** One line of the parts list: equal parts of one value. */
export interface PartsLine {
  readonly designators: readonly string[];
  /** In the divider. */
  readonly quantity: number;
  readonly spares: number;
  /** quantity + spares. */
  readonly buy: number;
  readonly part: string;
  readonly name: string;
  /** In the base unit; null for a part without a value. */
  readonly value: number | null;
  readonly unit: string;
  readonly valueText: string;
  /** Relative half-width; null where it has none. */
  readonly tolerance: number | null;
  readonly rating: string;
  /** Where it goes: HV arm, LV arm, protector, mechanics. */
  readonly place: string;
  readonly note: string;
}

export interface PartsList {
  readonly lines: readonly PartsLine[];
  /** Sum of what is in the divider, spares not counted. */
  readonly total: number;
  /** Sum of what to buy. */
  readonly buy: number;
}

interface Placed {
  readonly designator: string;
  readonly part: string;
  readonly value: number | null;
  readonly unit: string;
  readonly place: string;
  readonly note: string;
}

/** A tenth more, two at the least, of what the string is made of; one of each LV part; none of mechanics. */
function sparesFor(place: string, quantity: number): number {
  if (place === "HV arm") return Math.max(2, Math.ceil(quantity / 10));
  return place === "mechanics" ? 0 : 1;
}

/** Everything the design is made of, grouped by part and value, HV arm first. Needs a design. */
export function partsList(document: DividerDocument): Result<PartsList> {
  const { design } = document;
  if (design === null) {
    return err({ where: "/design", why: "There is no design yet.", cure: "Size it first: size FILE --take 1." });
  }
  const parts = new Map(document.parts.map((part) => [part.id, part]));
  const placed = [...hvParts(design), ...lvParts(design), ...protectorParts(design)];
  const missing = placed.find((each) => each.part !== "" && !parts.has(each.part));
  if (missing !== undefined) {
    return err({
      where: "/design",
      why: `${missing.designator} names the part "${missing.part}", which the document does not hold.`,
      cure: "Add the part to /parts, with every rating, or choose another.",
    });
  }
  const lines = [...group(placed, parts), ...mechanics(document, design)];
  const sum = (pick: (line: PartsLine) => number) => lines.reduce((total, line) => total + pick(line), 0);
  return ok({ lines, total: sum((line) => line.quantity), buy: sum((line) => line.buy) });
}

function hvParts(design: Design): Placed[] {
  const { elements, strings } = design.hvArm;
  const placed: Placed[] = [];
  for (let s = 0; s < strings; s++) {
    const suffix = strings > 1 ? String.fromCharCode(97 + s) : "";
    elements.forEach((element, i) => {
      const name = `${i + 1}${suffix}`;
      placed.push({
        designator: `R${name}`,
        part: element.part,
        value: element.resistance_ohm,
        unit: "ohm",
        place: "HV arm",
        note: "numbered from the tap",
      });
      if (element.capacitor !== null) {
        placed.push({
          designator: `C${name}`,
          part: element.capacitor,
          value: element.capacitance_F,
          unit: "F",
          place: "HV arm",
          note: "across the resistor of the same number",
        });
      }
    });
  }
  return placed;
}

function lvParts(design: Design): Placed[] {
  const lv = (designator: string, part: string, value: number, unit: string, note = ""): Placed => ({
    designator,
    part,
    value,
    unit,
    place: "LV arm",
    note,
  });
  return design.lvArm.branches.flatMap((branch): Placed[] => {
    if ("series" in branch) {
      return branch.series.map((item, i) => {
        const designator = branch.series.length > 1 ? `${branch.name}.${i + 1}` : branch.name;
        return "rheostat" in item
          ? lv(designator, item.part, item.rheostat.greatest_ohm, "ohm", "rheostat, wiper tied to the open end")
          : lv(designator, item.part, item.resistance_ohm, "ohm");
      });
    }
    if ("trimmer" in branch)
      return [lv(branch.name, branch.part, branch.trimmer.greatest_F, "F", "trimmer, greatest value")];
    const note =
      "link" in branch ? `link (select on test), ${branch.fitted ? "fitted" : "left open"} in the design` : "";
    return [lv(branch.name, branch.part, branch.capacitance_F, "F", note)];
  });
}

const protectorParts = (design: Design): Placed[] =>
  design.protectors.map((fitted, i) => ({
    designator: `P${i + 1}`,
    part: fitted.part,
    value: null,
    unit: "",
    place: "protector",
    note: `at the ${fitted.at}`,
  }));

function group(placed: readonly Placed[], parts: ReadonlyMap<string, Part>): PartsLine[] {
  const groups = new Map<string, Placed[]>();
  for (const each of placed) {
    const key = [each.place, each.part, each.value, each.note].join("|");
    const found = groups.get(key);
    if (found === undefined) groups.set(key, [each]);
    else found.push(each);
  }
  return [...groups.values()].map((members) => {
    const first = members[0]!;
    const part = parts.get(first.part);
    const spares = sparesFor(first.place, members.length);
    return {
      designators: members.map((each) => each.designator),
      quantity: members.length,
      spares,
      buy: members.length + spares,
      part: first.part,
      name: part?.name ?? "part not chosen yet",
      value: first.value,
      unit: first.unit,
      valueText: first.value === null ? "" : formatQuantity(first.value, first.unit as never, { digits: 3 }),
      tolerance: part !== undefined && part.tolerance > 0 ? part.tolerance : null,
      rating: part === undefined ? "" : ratingOf(part),
      place: first.place,
      note: first.note,
    };
  });
}

const q = (value: number, unit: string) => formatQuantity(value, unit as never, { digits: 3 });

function ratingOf(part: Part): string {
  switch (part.kind) {
    case "resistor": {
      const voltage = part.limitingVoltage_V === null ? "limiting voltage not stated" : q(part.limitingVoltage_V, "V");
      return `${q(part.ratedDissipation_W, "W")}, ${voltage}, ${Math.round(part.temperatureCoefficient_per_K * 1e6)} ppm/K`;
    }
    case "capacitor":
      return `${q(part.ratedVoltage_V, "V")}, ${part.dielectric}`;
    case "trimmer":
      return `${q(part.ratedVoltage_V, "V")}, ${part.turns} turns`;
    case "protector":
      return part.leastStrike_V === null ? part.type : `${q(part.leastStrike_V, "V")} at the least`;
  }
}

function mechanics(document: DividerDocument, design: Design): PartsLine[] {
  const line = (designator: string, name: string, valueText: string, note: string, quantity = 1): PartsLine => ({
    designators: [designator],
    quantity,
    spares: 0,
    buy: quantity,
    part: "",
    name,
    value: null,
    unit: "",
    valueText,
    tolerance: null,
    rating: "",
    place: "mechanics",
    note,
  });
  const { geometry } = design;
  const instrument = document.instruments.find((each) => each.id === document.principal);
  const lines = [
    line(
      "X1",
      "insulating carrier rod or tube",
      `${q(geometry.columnLength_m + geometry.footHeight_m, "m")}`,
      `material group ${document.brief.surroundings.materialGroup} or better`,
    ),
  ];
  if (geometry.electrode.kind !== "none") {
    lines.push(
      line(
        "X2",
        `top electrode, ${geometry.electrode.kind}`,
        `radius ${q(geometry.electrode.radius_m, "m")}`,
        "smooth, no edges",
      ),
    );
  }
  lines.push(line("X3", "LV box, metal, earthed", "", "holds the LV arm; stays on the divider"));
  if (instrument !== undefined) {
    const { cable } = instrument;
    lines.push(
      line(
        "W1",
        "screened cable to the instrument",
        q(cable.length_m, "m"),
        `${q(cable.capacitance_F_per_m, "F")}/m; part of the scale factor`,
      ),
    );
  }
  lines.push(line("W2", "earth bond", "", "two, independent, fitted first", 2));
  return lines;
}
