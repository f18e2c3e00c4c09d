import type { Cable, CableEnd, Instrument, InstrumentFunction } from "../solver/index.ts";
import { typicalInstruments, typicalNoise } from "./instrumentDefaults.ts";
import type { Raw } from "./shape.ts";
import { choice, namedAs, object, quantity, quantityOrNull, text } from "./shapes.ts";

const typicalOf = (parent: Raw) =>
  Object.hasOwn(typicalInstruments, String(parent.function))
    ? typicalInstruments[parent.function as InstrumentFunction]
    : typicalInstruments["meter dc"];

/** A pointer meter's resistance is 20 kΩ a volt of its range. */
function typicalResistance_ohm(parent: Raw): number {
  const range = parent.range_V;
  const known = typeof range === "number" && range > 0 && range <= 1e5;
  return parent.function === "pointer meter" && known ? 20e3 * range : typicalOf(parent).resistance_ohm;
}

/** Noise by kind, from memory; where none is known, one count. */
const typicalNoise_Vrms = (parent: Raw): number => {
  const known = typicalNoise[parent.function as InstrumentFunction];
  if (known !== undefined) return known;
  return typeof parent.resolution_V === "number" ? parent.resolution_V : typicalOf(parent).resolution_V;
};

const cableShape = object<Cable>("The cable between divider and instrument.", {
  length_m: quantity("m", "Length.", { fallback: 1 }),
  capacitance_F_per_m: quantity("F/m", "Capacitance a metre.", { fallback: 1e-10 }),
  impedance_ohm: quantity("ohm", "Characteristic impedance.", { aboveLeast: true, fallback: 50 }),
  delay_s_per_m: quantity("s/m", "Delay a metre.", { aboveLeast: true, fallback: 5e-9 }),
  end: choice<CableEnd>(
    "How the cable is counted.",
    {
      lumped: "as its capacitance at the tap",
      open: "as a line, open into the instrument",
      matchedAtTap: "as a line behind a resistor of its impedance at the tap",
      terminated: "as a line with its impedance across the far end",
    },
    "lumped",
  ),
});

export const instrumentFunctions: Readonly<Record<InstrumentFunction, string>> = {
  "meter dc": "hand-held meter, direct voltage",
  "meter dc high impedance": "meter on a direct-voltage range without its input divider",
  "meter ac": "hand-held meter, alternating voltage",
  "bench meter dc": "bench meter, direct voltage",
  "bench meter ac": "bench meter, alternating voltage",
  "pointer meter": "pointer meter, resistance in proportion to its range",
  "scope 1 MΩ": "oscilloscope, 1 MΩ input",
  "scope with 10:1 probe": "oscilloscope with its own 10:1 probe",
  "scope 50 Ω": "oscilloscope, 50 Ω input",
  "data logger": "data logger or multiplexed converter",
  microammeter: "microammeter in place of the LV arm",
};

export const instrumentShape = object<Instrument>("An instrument on one range and function, with its cable.", {
  id: text("Name within this file.", "", 100),
  name: text("Plain name.", namedAs("function", "id")),
  function: choice<InstrumentFunction>("What it is and how it is set.", instrumentFunctions, "meter dc", true),
  range_V: quantity("V", "Full scale of the range in use.", {
    aboveLeast: true,
    fallback: (p) => typicalOf(p).range_V,
  }),
  resistance_ohm: quantity("ohm", "Input resistance; must be positive.", {
    aboveLeast: true,
    fallback: typicalResistance_ohm,
  }),
  resistanceSpread: quantity("1", "Relative half-width of the input resistance.", {
    fallback: (p) => typicalOf(p).resistanceSpread,
  }),
  capacitance_F: quantity("F", "Input capacitance.", { fallback: (p) => typicalOf(p).capacitance_F }),
  capacitanceSpread_F: quantity("F", "Half-width of the input capacitance.", {
    fallback: (p) => typicalOf(p).capacitanceSpread_F,
  }),
  greatestInput_Vpeak: quantity("V", "Greatest peak that the input may see.", {
    aboveLeast: true,
    fallback: (p) => typicalOf(p).greatestInput_Vpeak,
  }),
  readingAccuracy: quantity("1", "Relative half-width of the reading.", {
    fallback: (p) => typicalOf(p).readingAccuracy,
  }),
  resolution_V: quantity("V", "One count.", { fallback: (p) => typicalOf(p).resolution_V }),
  noise_Vrms: quantity("V", "Noise on the most sensitive range, rms.", { fallback: typicalNoise_Vrms }),
  bandwidth_Hz: quantityOrNull("Hz", "Bandwidth; null: dc only.", { fallback: (p) => typicalOf(p).bandwidth_Hz }),
  cable: cableShape,
});
