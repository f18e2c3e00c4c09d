import type { LvArm } from "../job/design.ts";
import type { Edit } from "../standards/finding.ts";
import { fittedLinks } from "./lvLinks.ts";

/** How links and trimmers are set for a wanted LV capacitance, as edits of the document. */
export interface LvSetting {
  readonly edits: readonly Edit[];
  readonly reached_F: number;
  /** Wanted less reached; 0 within reach. */
  readonly missing_F: number;
}

/** Up to here every sum of links is tried. */
const mostTried = 12;

/**
 * The links to fit and the trimmer's setting that come nearest to a wanted LV capacitance, nominal values; of several that reach it
 * the one with the trimmer nearest its middle.
 */
export function lvSetting({ branches }: LvArm, wanted_F: number): LvSetting {
  const links: { readonly at: number; readonly value: number }[] = [];
  const trimmers: number[] = [];
  let [fixed, least, greatest] = [0, 0, 0];
  branches.forEach((branch, at) => {
    if ("series" in branch) return;
    if ("trimmer" in branch) {
      trimmers.push(at);
      least += branch.trimmer.least_F;
      greatest += branch.trimmer.greatest_F;
    } else if ("link" in branch) links.push({ at, value: branch.capacitance_F });
    else fixed += branch.capacitance_F;
  });
  const span = greatest - least;
  const chosen = bestSum(
    links.map((link) => link.value),
    wanted_F - fixed - least,
    span,
  );
  const rest = wanted_F - fixed - least - chosen.sum;
  const setting = span > 0 ? Math.min(1, Math.max(0, rest / span)) : 0;
  const reached_F = fixed + least + chosen.sum + setting * span;
  const missing = wanted_F - reached_F;
  const edits = [
    ...links.map(({ at }, i): Edit => ({ pointer: `${pointer(at)}/fitted`, value: chosen.fitted[i]! })),
    ...trimmers.map((at): Edit => ({ pointer: `${pointer(at)}/trimmer/setting`, value: setting })),
  ];
  return {
    edits: edits.filter((edit) => !stands(branches, edit)),
    reached_F,
    missing_F: Math.abs(missing) <= 1e-9 * Math.abs(wanted_F) ? 0 : missing,
  };
}

const pointer = (at: number): string => `/design/lvArm/branches/${at}`;

/** Whether an edit would change nothing. */
const stands = (branches: LvArm["branches"], edit: Edit): boolean =>
  branches.some(
    (branch, at) =>
      ("link" in branch && edit.pointer === `${pointer(at)}/fitted` && edit.value === branch.fitted) ||
      ("trimmer" in branch &&
        edit.pointer === `${pointer(at)}/trimmer/setting` &&
        edit.value === branch.trimmer.setting),
  );

/** Which links to fit so that what is left lies within the trimmer's span, or nearest to it. */
function bestSum(values: readonly number[], wanted: number, span: number): { fitted: boolean[]; sum: number } {
  if (values.length > mostTried) {
    const { fitted, rest_F } = fittedLinks(sorted(values), wanted);
    const order = sortedPlaces(values);
    return { fitted: values.map((_, i) => fitted[order.indexOf(i)] as boolean), sum: wanted - rest_F };
  }
  let best = { mask: 0, cost: Number.POSITIVE_INFINITY, sum: 0 };
  for (let mask = 0; mask < 2 ** values.length; mask++) {
    const sum = values.reduce((total, value, i) => ((mask >> i) & 1 ? total + value : total), 0);
    const rest = wanted - sum;
    const miss = Math.max(0, -rest, rest - span);
    // A miss outweighs any place within the span.
    const cost = miss * 1e6 + Math.abs(rest - span / 2);
    if (cost < best.cost) best = { mask, cost, sum };
  }
  return { fitted: values.map((_, i) => ((best.mask >> i) & 1) === 1), sum: best.sum };
}

const sortedPlaces = (values: readonly number[]): number[] =>
  values.map((_, i) => i).sort((a, b) => values[a]! - values[b]!);
const sorted = (values: readonly number[]): number[] => sortedPlaces(values).map((i) => values[i]!);
