import type { UnitName } from "../quantities/unit.ts";

/** What a rating of a family may be: wider than anything sold, narrow enough that a slipped prefix shows. */
export interface RatingRule {
  readonly unit: UnitName;
  readonly label: string;
  readonly least: number;
  readonly greatest: number;
  /** `least` itself cannot stand. */
  readonly above?: true;
  /** null stands for "not stated". */
  readonly orNull?: true;
  /** What may have been meant, for the cure. */
  readonly meant: string;
}

type Rules = Readonly<Record<string, RatingRule>>;
const above = true;
const millimetres = "Lengths are in metres: 6.5 mm is 0.0065.";
const perMillion = "50 ppm is 0.00005.";

const bodyRules: Rules = {
  tolerance: { unit: "1", label: "tolerance", least: 0, above, greatest: 0.5, meant: "1 % is 0.01." },
  bodyLength_m: { unit: "m", label: "body length", least: 0, above, greatest: 2, meant: millimetres },
  bodyDiameter_m: { unit: "m", label: "body diameter", least: 0, above, greatest: 0.5, meant: millimetres },
};

export const resistorRules: Rules = {
  ...bodyRules,
  least_ohm: { unit: "ohm", label: "least value", least: 0, above, greatest: 1e15, meant: "In ohms." },
  greatest_ohm: { unit: "ohm", label: "greatest value", least: 0, above, greatest: 1e15, meant: "In ohms." },
  ratedDissipation_W: {
    unit: "W",
    label: "rated dissipation",
    least: 0,
    above,
    greatest: 10e3,
    meant: "In watts at 70 °C.",
  },
  deratingFrom_degC: {
    unit: "degC",
    label: "full dissipation up to",
    least: -55,
    greatest: 300,
    meant: "Usually 70 °C.",
  },
  zeroDissipation_degC: {
    unit: "degC",
    label: "no dissipation left at",
    least: 0,
    greatest: 500,
    meant: "Usually 125 to 225 °C.",
  },
  limitingVoltage_V: {
    unit: "V",
    label: "limiting element voltage",
    least: 0,
    above,
    greatest: 1e6,
    orNull: true,
    meant: "Leave it blank where the data sheet does not state it.",
  },
  temperatureCoefficient_per_K: {
    unit: "1/K",
    label: "temperature coefficient",
    least: -0.02,
    greatest: 0.02,
    meant: perMillion,
  },
  voltageCoefficient_per_V: {
    unit: "1/V",
    label: "voltage coefficient",
    least: -0.01,
    greatest: 0.01,
    meant: perMillion,
  },
  thermalResistance_K_per_W: {
    unit: "K/W",
    label: "body to ambient",
    least: 0,
    above,
    greatest: 1e5,
    meant: "In kelvin by the watt.",
  },
  selfCapacitance_F: { unit: "F", label: "own capacitance", least: 0, greatest: 1e-9, meant: "0.3 pF is 3e-13." },
  leadSpace_m: { unit: "m", label: "space body to body", least: 0, greatest: 2, meant: millimetres },
};

export const capacitorRules: Rules = {
  ...bodyRules,
  least_F: { unit: "F", label: "least value", least: 0, above, greatest: 1, meant: "470 pF is 4.7e-10." },
  greatest_F: { unit: "F", label: "greatest value", least: 0, above, greatest: 1, meant: "4.7 nF is 4.7e-9." },
  ratedVoltage_V: { unit: "V", label: "rated voltage", least: 0, greatest: 1e6, meant: "0 where it is not stated." },
  temperatureCoefficient_per_K: {
    unit: "1/K",
    label: "temperature coefficient",
    least: -0.1,
    greatest: 0.1,
    meant: perMillion,
  },
  dissipationFactor: { unit: "1", label: "dissipation factor", least: 0, greatest: 1, meant: "0.1 % is 0.001." },
  leadInductance_H: { unit: "H", label: "lead inductance", least: 0, greatest: 1e-3, meant: "10 nH is 1e-8." },
};
