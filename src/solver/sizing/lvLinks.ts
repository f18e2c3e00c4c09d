/**
 * Links are capacitors that are soldered in or left out on test; a trimmer covers what lies between their sums. A link leaves a
 * hole where its value at its largest exceeds all smaller links at their least plus the trimmer's span.
 */
export interface Hole {
  /** Place of the link among the links sorted upwards. */
  readonly link: number;
  /** What is missing, F. */
  readonly missing_F: number;
}

/**
 * Holes of a set of links, F. @example 39, 82, 150, 330, 680 pF ±5 % with a span of 55 pF: holes at 330 and 680;
 * 39, 75, 150, 270, 470, 820 pF: none
 */
export function linkHoles(links_F: readonly number[], tolerance: number, span_F: number): Hole[] {
  let below = 0;
  return [...links_F]
    .sort((a, b) => a - b)
    .flatMap((link, i) => {
      const missing_F = link * (1 + tolerance) - (below * (1 - tolerance) + span_F);
      below += link;
      return missing_F > span_F * 1e-9 ? [{ link: i, missing_F }] : [];
    });
}

/** Fewest links without a hole whose least sum reaches `reach_F`; null where the values do not. */
export function linkSet(
  values_F: readonly number[],
  tolerance: number,
  span_F: number,
  reach_F: number,
): readonly number[] | null {
  const links: number[] = [];
  let sum = 0;
  while (sum * (1 - tolerance) < reach_F) {
    const most = (sum * (1 - tolerance) + span_F) / (1 + tolerance);
    const allowed = values_F.filter((value) => value <= most * (1 + 1e-12));
    const rest = reach_F / (1 - tolerance) - sum;
    const next = allowed.find((value) => value >= rest) ?? allowed.at(-1);
    if (next === undefined || links.length === 16) return null;
    links.push(next);
    sum += next;
  }
  return links;
}

/** Which links are fitted to come within the trimmer's span of a value: from the largest down, each that still fits. */
export function fittedLinks(links_F: readonly number[], value_F: number): { fitted: boolean[]; rest_F: number } {
  let rest_F = value_F;
  const fitted = links_F.map(() => false);
  for (let i = links_F.length - 1; i >= 0; i--) {
    if (links_F[i]! > rest_F) continue;
    fitted[i] = true;
    rest_F -= links_F[i]!;
  }
  return { fitted, rest_F };
}
