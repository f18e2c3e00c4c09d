import { givenPerElement, type Judging, resistorOf } from "./judging.ts";
import { isResistive, leakageConductance, lvArmResistance, seriesResistance } from "./lvArm.ts";
import { scaleFactorFormulas } from "./scaleFactorFormulas.ts";
import { tapLoad, tapLoadFormulas } from "./tapLoad.ts";

/** Scale factor for the principal instrument and its parts on the sheet. Writes `hvArm.resistance_ohm`, `lvArm.*`, `scaleFactor.*`. */
export function scaleFactor(j: Judging): void {
  const { sheet, design, instrument, document } = j;
  const f = scaleFactorFormulas;
  const Re = "/design/hvArm/elements/*/resistance_ohm";
  sheet.given(
    Re,
    design.hvArm.elements.map((element) => element.resistance_ohm),
  );
  sheet.given("/design/hvArm/strings", design.hvArm.strings);
  sheet.given("/brief/scaleFactor", document.brief.scaleFactor);
  const at = document.instruments.indexOf(instrument);
  const { Rm, Rs, G } = tapLoadOnSheet(j, at);
  sheet.derive("hvArm.resistance_ohm", f.hvArm, { Re, p: "/design/hvArm/strings" });
  const R1 = "hvArm.resistance_ohm";
  sheet.derive("lvArm.wanted_ohm", f.wantedLvArm, { F: "/brief/scaleFactor", R1, Rm, Rs, G });
  lvArmResistance(j);
  if (sheet.number("lvArm.fitted_ohm") === null) {
    sheet.derive("lvArm.withInstrument_ohm", f.instrumentAlone, { Rm, Rs, G });
  } else {
    sheet.derive("lvArm.withInstrument_ohm", f.withInstrument, { R2: "lvArm.fitted_ohm", Rm, Rs, G });
  }
  const R2p = "lvArm.withInstrument_ohm";
  sheet.derive("scaleFactor.predicted", f.predicted, { R1, R2p, Rs, Rm });
  sheet.derive("scaleFactor.deviation", f.deviation, { F: "scaleFactor.predicted", W: "/brief/scaleFactor" });
  sheet.derive("scaleFactor.instrumentShare", f.instrumentShare, { R2p, Rs, Rm });
}

/** Paths of the three things that the tap's dc meets; a cable that is a line adds its own resistors. */
function tapLoadOnSheet(j: Judging, at: number) {
  const { sheet, instrument } = j;
  const Rm = `/instruments/${at}/resistance_ohm`;
  const Rs = "/design/protectors:series_ohm";
  const G = "/design/protectors:leakage_S";
  sheet.given(Rm, instrument.resistance_ohm);
  sheet.given(Rs, seriesResistance(j));
  sheet.given(G, leakageConductance(j));
  const { end, impedance_ohm } = instrument.cable;
  if (end !== "matchedAtTap" && end !== "terminated") return { Rm, Rs, G };
  const Z0 = `/instruments/${at}/cable/impedance_ohm`;
  sheet.given(Z0, impedance_ohm);
  if (end === "matchedAtTap") {
    sheet.derive("cable.withSeries_ohm", tapLoadFormulas.series, { Rs, Z0 });
    return { Rm, Rs: "cable.withSeries_ohm", G };
  }
  if (tapLoad(j).input_ohm === instrument.resistance_ohm) {
    sheet.derive("cable.withTermination_S", tapLoadFormulas.shunt, { G, Z0 });
    return { Rm, Rs, G: "cable.withTermination_S" };
  }
  sheet.derive("cable.withTermination_ohm", tapLoadFormulas.input, { Rm, Z0 });
  return { Rm: "cable.withTermination_ohm", Rs, G };
}

/** Uncertainty from parts; needs the element voltages. */
export function scaleFactorUncertainty(j: Judging): void {
  const { sheet, instrument, document } = j;
  const f = scaleFactorFormulas;
  const Re = "/design/hvArm/elements/*/resistance_ohm";
  const t = givenPerElement(j, "tolerance", (part) => part.tolerance);
  const tc = givenPerElement(j, "temperatureCoefficient_per_K", (part) => part.temperatureCoefficient_per_K);
  const kv = givenPerElement(j, "voltageCoefficient_per_V", (part) => part.voltageCoefficient_per_V);
  sheet.derive("scaleFactor.voltageShift", f.voltageShift, {
    F: "scaleFactor.predicted",
    Re,
    kv,
    Ve: "element.voltage_Vpeak",
  });
  sheet.derive("hvArm.toleranceUncertainty", f.stringTolerance, { lots: "/design/hvArm/strings", Re, t });
  sheet.derive("hvArm.temperatureHalfWidth", f.temperatureHalfWidth, {
    s: "/brief/surroundings/ambientSpan_K",
    Re,
    tc,
  });
  lvArmTolerance(j);
  const spread = `/instruments/${document.instruments.indexOf(instrument)}/resistanceSpread`;
  sheet.given(spread, instrument.resistanceSpread);
  sheet.derive("scaleFactor.uncertainty", f.uncertainty, {
    F: "scaleFactor.predicted",
    u1: "hvArm.toleranceUncertainty",
    u2: "lvArm.toleranceUncertainty",
    uT: "hvArm.temperatureHalfWidth",
    kv: "scaleFactor.voltageShift",
    s: "scaleFactor.instrumentShare",
    um: spread,
  });
}

/** The LV arm's fixed resistors like the string's: independent rectangular parts and a lot term, over the branches. */
function lvArmTolerance(j: Judging): void {
  const branches = j.design.lvArm.branches.filter(isResistive);
  const tolerances = branches.map((branch) => {
    const first = branch.series.find((item) => "resistance_ohm" in item);
    return first === undefined ? 0 : resistorOf(j, first.part).tolerance;
  });
  j.sheet.given("/design/lvArm/branches/*/series/part/tolerance", tolerances);
  if (branches.length === 0) {
    j.sheet.given("lvArm.toleranceUncertainty", 0);
    return;
  }
  j.sheet.given("/design/lvArm:strings", 1);
  j.sheet.derive("lvArm.toleranceUncertainty", scaleFactorFormulas.stringTolerance, {
    lots: "/design/lvArm:strings",
    Re: "lvArm.branch_ohm",
    t: "/design/lvArm/branches/*/series/part/tolerance",
  });
}
