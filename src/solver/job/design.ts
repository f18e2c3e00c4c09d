/** The chosen divider: parts by id, values, geometry. No arithmetic, no result. */
export interface HvElement {
  readonly part: string;
  readonly resistance_ohm: number;
  /** Part id of the capacitor across the element; null: only the body's own capacitance. */
  readonly capacitor: string | null;
  readonly capacitance_F: number;
}

export interface HvArm {
  /** Equal strings in parallel, 1 … 4. */
  readonly strings: number;
  /** Series positions; index 0 is next to the tap. */
  readonly elements: readonly HvElement[];
}

export interface Rheostat {
  readonly least_ohm: number;
  readonly greatest_ohm: number;
  /** 0 … 1 of the span. */
  readonly setting: number;
}

export type LvSeriesItem =
  | { readonly part: string; readonly resistance_ohm: number }
  | { readonly part: string; readonly rheostat: Rheostat };

/** Branches stand in parallel from the tap to earth; the kind is told by the key that is present. */
export type LvBranch =
  | { readonly name: string; readonly series: readonly LvSeriesItem[] }
  | { readonly name: string; readonly part: string; readonly capacitance_F: number }
  | {
      readonly name: string;
      readonly part: string;
      readonly link: true;
      readonly capacitance_F: number;
      readonly fitted: boolean;
    }
  | {
      readonly name: string;
      readonly part: string;
      readonly trimmer: { readonly least_F: number; readonly greatest_F: number; readonly setting: number };
    };

export type LvCapacitanceBy = "none" | "highFrequency" | "flattest" | "responseTime";

export interface LvArm {
  /** Whether unplugging the instrument takes the LV arm away with it. */
  readonly stays: "withDivider" | "withInstrument";
  readonly branches: readonly LvBranch[];
  /** Which of the three matches the LV capacitance was chosen by. */
  readonly capacitanceBy: LvCapacitanceBy;
  /** Of the LV capacitors and their connections together, in series with them; 0: left out. */
  readonly inductance_H: number;
}

/** The connection from source to top electrode. 0: left out, none. */
export interface Lead {
  readonly inductance_H: number;
  /** Damping resistor at the top electrode. */
  readonly damping_ohm: number;
}

export interface Electrode {
  readonly kind: "none" | "sphere" | "toroid" | "disc";
  readonly radius_m: number;
  readonly tubeRadius_m: number;
  readonly thickness_m: number;
  readonly offset_m: number;
}

export interface Geometry {
  /** Diameter of the column's envelope, over the bodies. */
  readonly columnDiameter_m: number;
  readonly columnLength_m: number;
  readonly footHeight_m: number;
  readonly bandFraction: number;
  /** Field case that clearances are judged by: A unless a field solve shows a homogeneous field. */
  readonly fieldCase: "inhomogeneous" | "homogeneous";
  /** Body to body along the column. */
  readonly pitch_m: number;
  readonly electrode: Electrode;
  readonly shield: { readonly radius_m: number; readonly from_m: number; readonly to_m: number } | null;
  readonly box: { readonly radius_m: number; readonly top_m: number } | null;
  readonly wallDistance_m: number | null;
  /** Compound cast round the string; null: air. */
  readonly potting: { readonly permittivity: number; readonly radius_m: number } | null;
}

export interface Strays {
  /** `typed` uses the numbers given; `formula` and `field` are computed from geometry every time and never saved. */
  readonly from: "formula" | "field" | "typed";
  readonly toEarth_F: readonly number[];
  readonly toElectrode_F: readonly number[];
  readonly electrodeToTap_F: number;
}

export interface FittedProtector {
  readonly part: string;
  readonly at: "divider" | "instrument";
}

export interface Design {
  /** true: the best candidate is chosen again as the brief changes. */
  readonly follows: boolean;
  readonly hvArm: HvArm;
  readonly lvArm: LvArm;
  readonly protectors: readonly FittedProtector[];
  readonly geometry: Geometry;
  readonly strays: Strays;
  readonly lead: Lead;
}
