import { formula } from "../standards/formula.ts";
import { computedHere, practice } from "../standards/source.ts";
import { type Judging, plainFinding, protectorOf } from "./judging.ts";
import type { Show } from "./show.ts";
import { wantedOf } from "./wanted.ts";

export const protectorFormulas = {
  leakageError: formula({
    id: "protectors.leakageError",
    title: "Error of the reading by the protectors' leakage",
    statement: "{=} = {G} · {R2p}",
    result: { symbol: "δ_p", unit: "1", meaning: "relative change of the scale factor by leakage" },
    inputs: {
      G: { symbol: "G_p", unit: "S", meaning: "leakage of the protectors over their least strike voltage" },
      R2p: { symbol: "R_2p", unit: "ohm", meaning: "LV arm with instrument and protectors" },
    },
    holds: "At the temperature the leakage is stated for; junction leakage doubles every 10 K.",
    source: computedHere("leakage current through the LV arm"),
    compute: ({ G, R2p }) => G * R2p,
  }),
};

/** A protector must not conduct in normal use, nor leak more than a fifth of the wanted uncertainty. */
export function judgeProtectors(j: Judging, show: Show): void {
  const { sheet, design, document } = j;
  const limiting = design.protectors.filter((fitted) => protectorOf(j, fitted.part).type !== "seriesResistor");
  if (limiting.length === 0) return;
  const greatest = Math.abs(sheet.number("reading.atGreatest_Vpeak") as number);
  for (const fitted of limiting) {
    const part = protectorOf(j, fitted.part);
    if (part.leastStrike_V === null) strikeNotStated(j, part.name);
    if (part.leastStrike_V === null || part.leastStrike_V >= 1.25 * greatest) continue;
    plainFinding(j, {
      id: "protector.strike",
      level: part.leastStrike_V < greatest ? "stop" : "caution",
      what: `${part.name} in normal use`,
      actual: part.leastStrike_V,
      limit: 1.25 * greatest,
      unit: "V",
      sense: "atLeast",
      margin: 1 - (1.25 * greatest) / part.leastStrike_V,
      reason: `It may conduct from ${show(part.leastStrike_V, "V")}, tolerance in; the tap reaches ${show(greatest, "V")} in normal use, and a quarter more is to be left free.`,
      source: practice("the lowest strike at least 1.25 times the greatest reading"),
    });
  }
  const error = sheet.derive("protector.leakageError", protectorFormulas.leakageError, {
    G: "/design/protectors:leakage_S",
    R2p: "lvArm.withInstrument_ohm",
  });
  const wanted = wantedOf(document.brief);
  if (error === null || wanted === null) return;
  const share = wanted / 5;
  if (error > share) {
    plainFinding(j, {
      id: "protector.leakage",
      level: error > wanted ? "stop" : "caution",
      what: "leakage of the protectors",
      actual: error,
      limit: share,
      unit: "1",
      sense: "atMost",
      margin: 1 - error / share,
      reason: `Their leakage through the LV arm shifts the scale factor by ${show(error, "1")}; a fifth of the wanted uncertainty is ${show(share, "1")}. Take a protector that leaks less, or a lower LV arm.`,
      source: protectorFormulas.leakageError.source,
      path: "protector.leakageError",
    });
  }
}

/** Without its strike voltage neither conduction in normal use nor leakage at the tap can be judged. */
function strikeNotStated(j: Judging, name: string): void {
  plainFinding(j, {
    id: "protector.strike.notStated",
    level: "caution",
    what: `${name}: strike voltage not stated`,
    reason:
      "Without the lowest voltage at which it may conduct, neither its conduction in normal use nor its leakage is judged. Type it from the data sheet.",
    source: practice("the lowest strike at least 1.25 times the greatest reading"),
  });
}
