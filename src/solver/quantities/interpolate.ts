import { ok, type Result, refuse } from "./result.ts";

/** The first row whose key is not below `key`: between rows the next larger one. Refuses beyond the last row. */
export function stepUp<Row extends readonly (number | null)[]>(
  rows: readonly Row[],
  key: number,
  where: string,
): Result<Row> {
  const found = rows.find((row) => (row[0] as number) >= key * (1 - 1e-12));
  if (found !== undefined) return ok(found);
  const last = rows.at(-1)?.[0];
  return refuse(
    where,
    `${key} lies beyond the last row of the table, ${last}.`,
    "Take the value from a source that covers it.",
  );
}

/** Straight line between printed points; refuses to extrapolate. */
export function interpolate(points: readonly (readonly [number, number])[], x: number, where: string): Result<number> {
  const above = points.findIndex((point) => point[0] >= x);
  const first = points[0]!;
  if (x === first[0]) return ok(first[1]);
  if (above <= 0) {
    return refuse(
      where,
      `${x} lies outside the table, ${first[0]} to ${points.at(-1)![0]}.`,
      "Take the value from a source that covers it.",
    );
  }
  const [x0, y0] = points[above - 1]!;
  const [x1, y1] = points[above]!;
  return ok(y0 + ((y1 - y0) * (x - x0)) / (x1 - x0));
}
