import { formatQuantity } from "../quantities/format.ts";

/** A number with its unit, three digits, for the text of a finding. */
export type Show = (value: number, unit: string) => string;

export const show: Show = (value, unit) => formatQuantity(value, unit as never, { digits: 3 });
