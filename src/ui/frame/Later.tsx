import { LevelMark } from "../prove/LevelMark.tsx";
import { CureButton } from "./Findings.tsx";
import { type ScreenName, useJudged } from "./session.ts";

const will: Partial<Record<ScreenName, string>> = {
  route: "Every way to measure this voltage, each with the number that rules it in or out, will stand here.",
  calibrate: "The values measured after building, the walk-up and the calibration points will stand here.",
  use: "Readings turned into volts with their uncertainty, the scale-factor card and the record will stand here.",
};

/** A screen whose work is not part of this release says so; what is already judged for it is shown. */
export function Later({ name }: { readonly name: ScreenName }) {
  const findings = useJudged((state) => state.proof?.findings ?? []);
  const mine = name === "route" ? findings.filter((each) => /^(source\.earth|voltage\.low)/.test(each.id)) : [];
  return (
    <section className="sheet" aria-labelledby="later-heading">
      <h2 id="later-heading">{name}</h2>
      <p className="quiet">Not in this release. {will[name]}</p>
      {mine.map((each) => (
        <p key={each.id}>
          <LevelMark level={each.level} /> <b>{each.what}</b>. {each.reason}{" "}
          {each.cure === null ? null : <CureButton cure={each.cure} what={each.what} />}
        </p>
      ))}
    </section>
  );
}
