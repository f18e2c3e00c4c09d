import type {
  Design,
  Electrode,
  FittedProtector,
  Geometry,
  HvArm,
  HvElement,
  Lead,
  LvArm,
  LvBranch,
  LvSeriesItem,
  Rheostat,
  Strays,
} from "../solver/index.ts";
import type { Raw } from "./shape.ts";
import {
  choice,
  flag,
  list,
  literal,
  object,
  orNull,
  quantity,
  quantityOrNull,
  text,
  textOrNull,
  variant,
} from "./shapes.ts";

type Branch<K extends string> = Extract<LvBranch, Record<K, unknown>>;

const part = text("Id of the part or family; empty: not chosen yet.", "", 100);
const share = { least: 0, greatest: 1, fallback: 0.5, assumable: false };

const elementShape = object<HvElement>("One series position of the HV arm.", {
  part,
  resistance_ohm: quantity("ohm", "Value."),
  capacitor: textOrNull("Id of the capacitor across it; null: none.", 100),
  capacitance_F: quantity("F", "Capacitance across it.", { fallback: 0, assumable: false }),
});

const hvArmShape = object<HvArm>("The arm between top electrode and tap.", {
  strings: quantity("1", "Equal strings in parallel.", {
    least: 1,
    greatest: 16,
    whole: true,
    fallback: 1,
    assumable: false,
  }),
  elements: list<HvElement>("Series positions; the first is next to the tap.", elementShape, 5000),
});

const rheostatShape = object<Rheostat>(
  "A variable resistor in series.",
  {
    least_ohm: quantity("ohm", "Least value.", { fallback: 0, assumable: false }),
    greatest_ohm: quantity("ohm", "Greatest value."),
    setting: quantity("1", "Setting, 0 … 1 of the span.", share),
  },
  { least: "least_ohm", greatest: "greatest_ohm" },
);

const seriesItemShape = variant<LvSeriesItem>(
  "A fixed or a variable resistor.",
  '"resistance_ohm" or "rheostat"',
  (raw) => ("rheostat" in raw ? "rheostat" : "resistance_ohm" in raw ? "fixed" : null),
  {
    fixed: object<Extract<LvSeriesItem, { resistance_ohm: number }>>("A fixed resistor.", {
      part,
      resistance_ohm: quantity("ohm", "Value."),
    }),
    rheostat: object<Extract<LvSeriesItem, { rheostat: Rheostat }>>("A variable resistor.", {
      part,
      rheostat: rheostatShape,
    }),
  },
  { fixed: "resistance_ohm", rheostat: "rheostat" },
);

const name = text("Reference designator, e.g. R2a.", "", 100);

const branchShape = variant<LvBranch>(
  "A branch from the tap to earth.",
  '"series", "trimmer", "link" or "capacitance_F"',
  (raw) => {
    if ("series" in raw) return "series";
    if ("trimmer" in raw) return "trimmer";
    if (raw.link === true) return "link";
    return "capacitance_F" in raw ? "capacitor" : null;
  },
  {
    series: object<Branch<"series">>("Resistors in series.", {
      name,
      series: list<LvSeriesItem>("From the tap down.", seriesItemShape, 100),
    }),
    capacitor: object<Exclude<Branch<"capacitance_F">, { link: true }>>("A capacitor.", {
      name,
      part,
      capacitance_F: quantity("F", "Value."),
    }),
    link: object<Branch<"link">>("A select-on-test capacitor.", {
      name,
      part,
      link: literal("Marks a link.", true),
      capacitance_F: quantity("F", "Value."),
      fitted: flag("Whether it is fitted.", false),
    }),
    trimmer: object<Branch<"trimmer">>("A variable capacitor.", {
      name,
      part,
      trimmer: object<Branch<"trimmer">["trimmer"]>(
        "Its span and setting.",
        {
          least_F: quantity("F", "Least value.", { fallback: 0, assumable: false }),
          greatest_F: quantity("F", "Greatest value."),
          setting: quantity("1", "Setting, 0 … 1 of the span.", share),
        },
        { least: "least_F", greatest: "greatest_F" },
      ),
    }),
  },
  { series: "series", capacitor: "capacitance_F", link: "link", trimmer: "trimmer" },
);

const lvArmShape = object<LvArm>("The arm between tap and earth.", {
  stays: choice<LvArm["stays"]>(
    "Where the LV arm stays when the instrument is unplugged.",
    { withDivider: "at the divider", withInstrument: "goes away with the instrument" },
    "withDivider",
  ),
  branches: list<LvBranch>("In parallel from tap to earth.", branchShape, 100),
  capacitanceBy: choice<LvArm["capacitanceBy"]>(
    "Which match the LV capacitance was chosen by.",
    {
      none: "none",
      highFrequency: "scale factor at the edge equal to dc",
      flattest: "smallest greatest deviation over the band",
      responseTime: "zero response time",
    },
    "none",
  ),
  inductance_H: quantity("H", "Of the LV capacitors and their connections together; 0: left out.", {
    fallback: 0,
    assumable: false,
  }),
});

const leadShape = object<Lead>("The connection from source to top electrode.", {
  inductance_H: quantity("H", "Inductance of the loop; 0: left out.", { fallback: 0, assumable: false }),
  damping_ohm: quantity("ohm", "Damping resistor at the top electrode; 0: none.", { fallback: 0, assumable: false }),
});

const electrodeShape = object<Electrode>("The top electrode.", {
  kind: choice<Electrode["kind"]>(
    "Form.",
    { none: "none", sphere: "sphere", toroid: "toroid", disc: "disc" },
    "none",
    true,
  ),
  radius_m: quantity("m", "Radius; of a toroid to the tube's centre.", { fallback: 0, assumable: false }),
  tubeRadius_m: quantity("m", "Radius of a toroid's tube.", { fallback: 0, assumable: false }),
  thickness_m: quantity("m", "Thickness of a disc.", { fallback: 0, assumable: false }),
  offset_m: quantity("m", "Height above its resting place.", { least: -1e4, fallback: 0, assumable: false }),
});

const pitchOf = (raw: Raw): number => (typeof raw.pitch_m === "number" && raw.pitch_m > 0 ? raw.pitch_m : 0.015);

function columnLength_m(parent: Raw, root: Raw): number {
  const elements = ((root.design as Raw | undefined)?.hvArm as Raw | undefined)?.elements;
  return Math.min(1e4, pitchOf(parent) * Math.max(1, Array.isArray(elements) ? elements.length : 1));
}

const geometryShape = object<Geometry>("Lengths in metres.", {
  columnDiameter_m: quantity("m", "Diameter of the column.", { aboveLeast: true, fallback: 0.02 }),
  columnLength_m: quantity("m", "Length of the column.", { aboveLeast: true, fallback: columnLength_m }),
  footHeight_m: quantity("m", "Foot of the column above the floor.", { fallback: 0.1 }),
  bandFraction: quantity("1", "Conducting band of each node as a share of the pitch.", {
    aboveLeast: true,
    fallback: 0.4,
  }),
  fieldCase: choice<Geometry["fieldCase"]>(
    "Field case that clearances are judged by.",
    { inhomogeneous: "case A, unless a field solve shows otherwise", homogeneous: "case B, claimed" },
    "inhomogeneous",
  ),
  pitch_m: quantity("m", "Body to body along the column.", { aboveLeast: true, fallback: 0.015 }),
  electrode: electrodeShape,
  shield: orNull(
    object<NonNullable<Geometry["shield"]>>("An earthed shield; null: none.", {
      radius_m: quantity("m", "Radius."),
      from_m: quantity("m", "Lower edge above the floor."),
      to_m: quantity("m", "Upper edge above the floor."),
    }),
  ),
  box: orNull(
    object<NonNullable<Geometry["box"]>>("An earthed box around everything; null: none.", {
      radius_m: quantity("m", "Radius."),
      top_m: quantity("m", "Height of the top above the floor."),
    }),
  ),
  wallDistance_m: quantityOrNull("m", "Nearest earthed wall; null: as the surroundings say."),
  potting: orNull(
    object<NonNullable<Geometry["potting"]>>("Compound cast round the string; null: air.", {
      permittivity: quantity("1", "Relative permittivity.", { least: 1, greatest: 100, fallback: 3.5 }),
      radius_m: quantity("m", "Outer radius."),
    }),
  ),
});

const straysShape = object<Strays>("Stray capacitances.", {
  from: choice<Strays["from"]>(
    "Where they come from.",
    {
      formula: "closed formula, computed every time",
      field: "field solution, computed every time",
      typed: "the numbers given",
    },
    "formula",
  ),
  toEarth_F: list("Each inner node to earth, tap side first.", quantity("F", "Value.", { fallback: 0 }), 5000),
  toElectrode_F: list("Each inner node to the top electrode.", quantity("F", "Value.", { fallback: 0 }), 5000),
  electrodeToTap_F: quantity("F", "Top electrode straight to the tap.", { fallback: 0, assumable: false }),
});

export const designShape = object<Design>("The chosen divider.", {
  follows: flag("Whether the best candidate is chosen again as the brief changes.", false),
  hvArm: hvArmShape,
  lvArm: lvArmShape,
  protectors: list<FittedProtector>(
    "Parts that limit the LV voltage.",
    object<FittedProtector>("One protector.", {
      part,
      at: choice<FittedProtector["at"]>(
        "Where it is.",
        { divider: "at the divider", instrument: "at the instrument" },
        "divider",
      ),
    }),
    20,
  ),
  geometry: geometryShape,
  strays: straysShape,
  lead: leadShape,
});
