import type {
  CapacitorFamily,
  DielectricClass,
  InHand,
  Origin,
  Part,
  ProtectorFamily,
  ResistorFamily,
  SeriesName,
  TrimmerFamily,
} from "../solver/index.ts";
import { seriesNames } from "./briefShape.ts";
import {
  choice,
  list,
  literal,
  namedAs,
  object,
  optionalList,
  orNull,
  quantity,
  quantityOrNull,
  text,
  variant,
} from "./shapes.ts";

export const origins: Readonly<Record<Origin, string>> = {
  typed: "typed by the engineer",
  measured: "measured",
  catalogue: "from a catalogue",
  assumed: "assumed until typed or measured",
};

/** Cautious stand-ins for a rating that a file does not give; marked *assumed*. */
const base = {
  id: text("Name within this file.", "", 100),
  name: text("Plain generic name.", namedAs("id")),
  origin: choice<Origin>("Where the ratings came from.", origins, "typed"),
  tolerance: quantity("1", "Relative half-width of the value.", {
    fallback: 0.1,
    question: "was a percentage meant? 1 % is 0.01",
  }),
  bodyLength_m: quantity("m", "Length of the body.", { fallback: 0.0065 }),
  bodyDiameter_m: quantity("m", "Diameter of the body.", { fallback: 0.0025 }),
  inHand: optionalList<InHand>(
    "Values in the drawer.",
    object<InHand>("A value and how many there are.", {
      value: quantity("1", "Value in the family's base unit.", { greatest: 1e18 }),
      count: quantity("1", "How many.", { greatest: 1e6, whole: true }),
    }),
  ),
};

const resistorShape = object<ResistorFamily>("A resistor family.", {
  kind: literal("Kind of part.", "resistor"),
  ...base,
  least_ohm: quantity("ohm", "Least value sold.", { fallback: 1 }),
  greatest_ohm: quantity("ohm", "Greatest value sold.", { fallback: 1e10 }),
  series: choice<SeriesName>("Preferred values it is sold in.", seriesNames, "E24"),
  seriesAbove: orNull(
    object<NonNullable<ResistorFamily["seriesAbove"]>>("A coarser series above a value; null: the same throughout.", {
      from_ohm: quantity("ohm", "From this value up."),
      series: choice<SeriesName>("Preferred values there.", seriesNames, "E12"),
    }),
  ),
  ratedDissipation_W: quantity("W", "Rated dissipation at 70 °C, IEC 60115-1.", { aboveLeast: true, fallback: 0.25 }),
  deratingFrom_degC: quantity("degC", "Full dissipation up to here.", { fallback: 70 }),
  zeroDissipation_degC: quantity("degC", "No dissipation left from here.", { fallback: 125 }),
  limitingVoltage_V: quantityOrNull("V", "Limiting element voltage, IEC 60115-1; null: not stated.", {
    aboveLeast: true,
    zeroIsNull: true,
  }),
  temperatureCoefficient_per_K: quantity("1/K", "Bound of the temperature coefficient.", { fallback: 2e-4 }),
  voltageCoefficient_per_V: quantity("1/V", "Signed typical voltage coefficient.", { fallback: -5e-6 }),
  thermalResistance_K_per_W: quantity("K/W", "Body to ambient.", { fallback: 250 }),
  selfCapacitance_F: quantity("F", "Capacitance of the body.", { fallback: 3e-13 }),
  leadSpace_m: quantity("m", "Space from body to body along the column.", { fallback: 0.005 }),
  use: choice<ResistorFamily["use"]>(
    "What it is for.",
    { divider: "dividing", damping: "damping and surges only" },
    "divider",
  ),
});

const capacitorShape = object<CapacitorFamily>("A capacitor family.", {
  kind: literal("Kind of part.", "capacitor"),
  ...base,
  least_F: quantity("F", "Least value sold.", { fallback: 1e-12 }),
  greatest_F: quantity("F", "Greatest value sold.", { fallback: 1e-5 }),
  series: choice<SeriesName>("Preferred values it is sold in.", seriesNames, "E12"),
  dielectric: text("Dielectric, plain name.", "not stated"),
  dielectricClass: choice<DielectricClass>(
    "Class of the dielectric.",
    {
      class1: "ceramic, class 1",
      class2: "ceramic, class 2",
      film: "plastic film",
      mica: "mica",
      air: "air",
      electrolytic: "electrolytic",
    },
    "class2",
    true,
  ),
  ratedVoltage_V: quantity("V", "Rated voltage; 0: not stated.", { fallback: 0 }),
  temperatureCoefficient_per_K: quantity("1/K", "Bound of the temperature coefficient.", { fallback: 2e-4 }),
  dissipationFactor: quantity("1", "Dissipation factor.", { fallback: 0.01 }),
  leadInductance_H: quantity("H", "Lead inductance.", { fallback: 1e-8 }),
});

const trimmerShape = object<TrimmerFamily>("A variable resistor or capacitor.", {
  kind: literal("Kind of part.", "trimmer"),
  ...base,
  quantity: choice<TrimmerFamily["quantity"]>("What it varies.", { ohm: "resistance", F: "capacitance" }),
  spans: list("End values sold.", quantity("1", "End value.", { greatest: 1e18 })),
  leastShare: quantity("1", "Least value as a share of the span.", { fallback: 0.1 }),
  turns: quantity("1", "Turns over the whole span.", { greatest: 1000, fallback: 1 }),
  ratedVoltage_V: quantity("V", "Rated voltage; 0: not stated.", { fallback: 0 }),
});

const protectorShape = object<ProtectorFamily>("A part that limits the LV voltage.", {
  kind: literal("Kind of part.", "protector"),
  ...base,
  type: choice<ProtectorFamily["type"]>("What it is.", {
    gasTube: "gas discharge tube",
    surgeDiode: "surge suppressor diode",
    clampDiodes: "diodes to rails",
    neon: "neon lamp",
    varistor: "varistor",
    sparkGap: "spark gap",
    seriesResistor: "resistor in series with the instrument",
  }),
  leastStrike_V: quantityOrNull("V", "Lowest voltage at which it may conduct; null: not stated.", { zeroIsNull: true }),
  letThrough_V: quantityOrNull("V", "Highest voltage it lets through at a fast rise; null: not stated.", {
    zeroIsNull: true,
  }),
  leakage_A: quantity("A", "Leakage.", { fallback: 1e-6 }),
  capacitance_F: quantity("F", "Capacitance.", { fallback: 1e-11 }),
  resistance_ohm: quantityOrNull("ohm", "A series resistor's value; null: none."),
});

export const partShape = variant<Part>(
  "A part or family of parts with every rating used.",
  '"kind" (resistor, capacitor, trimmer or protector)',
  (raw) => (typeof raw.kind === "string" ? raw.kind : null),
  { resistor: resistorShape, capacitor: capacitorShape, trimmer: trimmerShape, protector: protectorShape },
);
