/**
 * Branded quantities: plain numbers in SI base units that cannot be swapped by mistake.
 * One generic makes every brand; one maker per unit refuses NaN and infinity at a room's door.
 * Inside a function plain arithmetic is used and the result is branded once on return.
 */
declare const brand: unique symbol;
export type Quantity<U extends string> = number & { readonly [brand]: U };

export type Ohm = Quantity<"ohm">;
export type Farad = Quantity<"F">;
export type Henry = Quantity<"H">;
export type Volt = Quantity<"V">;
export type Ampere = Quantity<"A">;
export type Watt = Quantity<"W">;
export type Joule = Quantity<"J">;
export type Coulomb = Quantity<"C">;
export type Second = Quantity<"s">;
export type Hertz = Quantity<"Hz">;
export type Metre = Quantity<"m">;
export type Kelvin = Quantity<"K">;
export type Celsius = Quantity<"degC">;
/** A dimensionless number: scale factor, fraction, count. */
export type Plain = Quantity<"1">;

function maker<U extends string>(unit: U) {
  return (value: number): Quantity<U> => {
    if (!Number.isFinite(value)) throw new RangeError(`not a finite number of ${unit}: ${value}`);
    return value as Quantity<U>;
  };
}

export const ohm = maker("ohm");
export const farad = maker("F");
export const henry = maker("H");
export const volt = maker("V");
export const ampere = maker("A");
export const watt = maker("W");
export const joule = maker("J");
export const coulomb = maker("C");
export const second = maker("s");
export const hertz = maker("Hz");
export const metre = maker("m");
export const kelvin = maker("K");
export const celsius = maker("degC");
export const plain = maker("1");
