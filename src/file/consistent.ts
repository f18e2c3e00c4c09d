import type { DividerDocument, Refusal } from "../solver/index.ts";

/** What no single key can tell: ids that clash, a principal instrument that is not there. Null when nothing is wrong. */
export function inconsistency(document: DividerDocument): Refusal | null {
  const { instruments, parts, principal } = document;
  const [lowest, highest] = document.brief.band_Hz;
  if (lowest > highest) {
    const why = `The lowest frequency, ${lowest} Hz, would stand above the highest, ${highest} Hz.`;
    return { where: "/brief/band_Hz", why, cure: "Change the other one first." };
  }
  if (instruments.length === 0) {
    return { where: "/instruments", why: "No instrument would be left.", cure: "Add another instrument first." };
  }
  for (const [pointer, items] of [
    ["/instruments", instruments],
    ["/parts", parts],
  ] as const) {
    const clash = clashingId(items);
    if (clash !== null) {
      const why = clash === "" ? "An id is needed." : `The id ${clash} would stand twice.`;
      return { where: pointer, why, cure: "Choose an id that is not taken." };
    }
  }
  if (instruments.some((instrument) => instrument.id === principal)) return null;
  return {
    where: "/principal",
    why: `There would be no instrument ${principal}, and it is the principal one.`,
    cure: "Make another instrument the principal one first.",
  };
}

function clashingId(items: readonly { readonly id: string }[]): string | null {
  const seen = new Set<string>();
  for (const { id } of items) {
    if (id === "" || seen.has(id)) return id;
    seen.add(id);
  }
  return null;
}
