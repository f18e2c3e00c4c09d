import { type Celsius, type Metre, type Plain, plain } from "../quantities/quantity.ts";
import type { Source } from "./source.ts";

export const airDensitySource: Source = {
  title: "Standard atmosphere and IEC 60060-1 relative air density",
  edition: null,
  clause: "p(h) = 101.3 kPa (1 − 2.2558e-5 h)^5.256; δ = p/101.3 kPa · 293/(273 + t)",
  status: "from memory",
};

/** Pressure over that at sea level: (1 - 2.2558e-5·h)^5.256, h in m, to about 11 km; above that the isothermal layer. */
export function pressureShare(altitude: Metre): Plain {
  const troposphere = (h: number) => (1 - 2.2558e-5 * h) ** 5.256;
  return plain(altitude <= 11000 ? troposphere(altitude) : troposphere(11000) * Math.exp(-(altitude - 11000) / 6341.6));
}

/** Relative air density δ, 1 at 101.3 kPa and 20 °C. Relative to sea level: never mixed with factors relative to 2000 m. */
export function airDensity(altitude: Metre, temperature: Celsius): Plain {
  return plain((pressureShare(altitude) * 293) / (273 + temperature));
}

/** δ at 20 °C and this altitude. @example airDensityAtAltitude(metre(3500)) // 0.649 */
export const airDensityAtAltitude = (altitude: Metre): Plain => airDensity(altitude, 20 as Celsius);
