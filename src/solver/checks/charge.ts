import { formula } from "../standards/formula.ts";
import { computedHere, practice } from "../standards/source.ts";
import { type Judging, plainFinding } from "./judging.ts";
import type { Show } from "./show.ts";

const F = (symbol: string, meaning: string) => ({ symbol, unit: "F", meaning });
const V = (symbol: string, meaning: string) => ({ symbol, unit: "V", meaning });

export const chargeFormulas = {
  waitTime: formula({
    id: "charge.waitTime",
    title: "Time to fall to 60 V through the divider alone",
    statement: "{=} = {Rin} · ({Cs} + {Cin}) · ln({V} / {Vl}), 0 below {Vl}",
    result: { symbol: "t", unit: "s", meaning: "time after switching off" },
    inputs: {
      Rin: { symbol: "R_in", unit: "ohm", meaning: "input resistance" },
      Cs: F("C_src", "capacitance of the source"),
      Cin: F("C_in", "input capacitance"),
      V: V("V_max", "greatest peak"),
      Vl: V("V_l", "60 V"),
    },
    holds:
      "An intact divider and no other load. It is never permission to touch: charge comes back by dielectric absorption.",
    source: computedHere("exponential discharge"),
    compute: ({ Rin, Cs, Cin, V, Vl }) => (V <= Vl ? 0 : Rin * (Cs + Cin) * Math.log(V / Vl)),
  }),
};

/** Time to fall to an accessible voltage through the divider alone, from the source's capacitance and its own. */
export function charge(j: Judging, show: Show): void {
  const { sheet } = j;
  sheet.given("/brief/source/capacitance_F", j.document.brief.source.capacitance_F);
  sheet.given("/brief/source:accessible_V", 60);
  const time = sheet.derive("charge.waitTime_s", chargeFormulas.waitTime, {
    Rin: "input.resistance_ohm",
    Cs: "/brief/source/capacitance_F",
    Cin: "input.capacitance_F",
    V: "working.greatest_Vpeak",
    Vl: "/brief/source:accessible_V",
  });
  if (time !== null && time > 10) {
    plainFinding(j, {
      id: "charge.waitTime",
      level: "caution",
      what: "the divider is not a bleeder",
      actual: time,
      limit: 10,
      unit: "s",
      sense: "atMost",
      margin: 1 - time / 10,
      reason:
        `Through the divider alone the source takes ${show(time, "s")} to fall to 60 V, and never with one element open. ` +
        "Fit a separate bleeder and use an earthing stick.",
      source: practice("a separate bleeder where the wait exceeds 10 s"),
      path: "charge.waitTime_s",
    });
  }
}
