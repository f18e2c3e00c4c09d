import { givenPerElement, type Judging, resistorOf } from "./judging.ts";
import { isResistive, leakageConductance, lvArmResistance, seriesResistance } from "./lvArm.ts";
import { scaleFactorFormulas } from "./scaleFactorFormulas.ts";

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
  const Rm = `/instruments/${at}/resistance_ohm`;
  sheet.given(Rm, instrument.resistance_ohm);
  sheet.given("/design/protectors:series_ohm", seriesResistance(j));
  sheet.given("/design/protectors:leakage_S", leakageConductance(j));
  const Rs = "/design/protectors:series_ohm";
  const G = "/design/protectors:leakage_S";
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
