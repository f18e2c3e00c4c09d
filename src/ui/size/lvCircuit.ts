import type { Design, Instrument, LvBranch, Part } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";

export type SymbolKind = "resistor" | "rheostat" | "capacitor" | "trimmer" | "link" | "openLink" | "protector";

/** One thing drawn between tap and earth. */
export interface CircuitPart {
  readonly symbol: SymbolKind;
  readonly value: string;
}

/** One branch from tap to earth, drawn as a column of the circuit. */
export interface CircuitBranch {
  readonly name: string;
  readonly parts: readonly CircuitPart[];
  readonly owner: "lvArm" | "cable" | "instrument";
}

/** The LV arm with protectors, cable and instrument, left to right, as they stand between tap and earth. */
export function lvCircuit(
  design: Design,
  parts: readonly Part[],
  instrument: Instrument | null,
): readonly CircuitBranch[] {
  const named = new Map(parts.map((part) => [part.id, part.name]));
  const branches = design.lvArm.branches.map(
    (branch): CircuitBranch => ({ name: branch.name, parts: partsOf(branch), owner: "lvArm" }),
  );
  const protectors = design.protectors.map(
    (fitted, i): CircuitBranch => ({
      name: `P${i + 1}`,
      parts: [{ symbol: "protector", value: named.get(fitted.part) ?? fitted.part }],
      owner: fitted.at === "divider" ? "lvArm" : "instrument",
    }),
  );
  const own = protectors.filter((p) => p.owner === "lvArm");
  return [
    ...branches,
    ...own,
    ...(instrument === null ? [] : readerOf(instrument)),
    ...protectors.filter((p) => p.owner !== "lvArm"),
  ];
}

function partsOf(branch: LvBranch): readonly CircuitPart[] {
  if ("series" in branch) {
    return branch.series.map((item): CircuitPart => {
      if ("rheostat" in item)
        return { symbol: "rheostat", value: `to ${withUnit(item.rheostat.greatest_ohm, "ohm", 3)}` };
      return { symbol: "resistor", value: withUnit(item.resistance_ohm, "ohm", 4) };
    });
  }
  if ("trimmer" in branch) {
    const { least_F, greatest_F } = branch.trimmer;
    return [{ symbol: "trimmer", value: `${withUnit(least_F, "F", 2)} … ${withUnit(greatest_F, "F", 2)}` }];
  }
  const symbol = "link" in branch ? (branch.fitted ? "link" : "openLink") : "capacitor";
  return [{ symbol, value: withUnit(branch.capacitance_F, "F", 3) }];
}

function readerOf({ cable, resistance_ohm, capacitance_F }: Instrument): readonly CircuitBranch[] {
  const cable_F = cable.length_m * cable.capacitance_F_per_m;
  const one = (name: string, symbol: SymbolKind, value: string, owner: "cable" | "instrument"): CircuitBranch => ({
    name,
    parts: [{ symbol, value }],
    owner,
  });
  return [
    one("cable", "capacitor", withUnit(cable_F, "F", 3), "cable"),
    one("Rm", "resistor", withUnit(resistance_ohm, "ohm", 3), "instrument"),
    one("Cm", "capacitor", withUnit(capacitance_F, "F", 3), "instrument"),
  ];
}
