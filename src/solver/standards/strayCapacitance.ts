import { type Farad, farad, type Metre } from "../quantities/quantity.ts";
import { epsilon0 } from "./constants.ts";

/**
 * Stray capacitance of a vertical cylinder to the floor, F: 2π ε0 l / ln((2l/d) √((4h+l)/(4h+3l))).
 * l length, d diameter, h height of the foot, all m, l > d. As a bare graded column within -2 … +3 % for l/d 10-30.
 * Source: Kuffel, Zaengl, Kuffel, High Voltage Engineering, 2nd ed. (2000), ch. 3, from memory.
 * @example verticalCylinderCapacitance(metre(0.66), metre(0.04), metre(0.12)) // 11.8 pF
 */
export function verticalCylinderCapacitance(length: Metre, diameter: Metre, footHeight: Metre): Farad {
  const logarithm = Math.log(
    ((2 * length) / diameter) * Math.sqrt((4 * footHeight + length) / (4 * footHeight + 3 * length)),
  );
  if (!(logarithm > 0)) throw new RangeError("the formula needs a column longer than it is wide");
  return farad((2 * Math.PI * epsilon0 * length) / logarithm);
}

/** Isolated sphere, F: 4π ε0 a. Exact. @example sphereCapacitance(metre(0.05)) // 5.563 pF */
export const sphereCapacitance = (radius: Metre): Farad => farad(4 * Math.PI * epsilon0 * radius);
