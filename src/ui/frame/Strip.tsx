import type { Finding, Level } from "../../solver/index.ts";
import { LevelMark } from "../prove/LevelMark.tsx";
import { type ScreenName, useJudged, useLooking, useSession } from "./session.ts";

export const screens: readonly (readonly [ScreenName, string, string])[] = [
  ["ask", "Ask", "what to measure"],
  ["route", "Route", "which way"],
  ["size", "Size", "which parts"],
  ["prove", "Prove", "will it work"],
  ["build", "Build", "what to buy and make"],
  ["calibrate", "Calibrate", "what it really is"],
  ["use", "Use", "what a reading means"],
];

/** Which screen a finding belongs to. */
const home = (finding: Finding): ScreenName => {
  if (/^(voltage|surroundings|instrument\.(accuracy|function))/.test(finding.id)) return "ask";
  if (/^source\.earth/.test(finding.id)) return "route";
  if (/^(scaleFactor|lvArm|dielectric|source\.(sag|current))/.test(finding.id)) return "size";
  return "prove";
};

/** The seven screens in the order of the job, each with its state. */
export function Strip() {
  const session = useSession();
  const current = useLooking((state) => state.screen);
  const findings = useJudged((state) => state.proof?.findings);
  return (
    <nav className="strip" aria-label="screens">
      {screens.map(([name, title, line]) => (
        <button
          key={name}
          type="button"
          aria-current={current === name ? "page" : undefined}
          onClick={() => session.looking.setState({ screen: name })}
        >
          <span className="top">
            <span className="name">{title}</span>
            <State state={stateOf(name, findings)} />
          </span>
          <span className="line">{line}</span>
        </button>
      ))}
    </nav>
  );
}

function stateOf(name: ScreenName, findings: readonly Finding[] | undefined): Level | "empty" {
  if (findings === undefined || name === "calibrate" || name === "use") return "empty";
  if (name === "route" && !findings.some((each) => home(each) === "route")) return "empty";
  const mine = name === "build" ? findings : findings.filter((each) => home(each) === name);
  if (mine.some((each) => each.level === "stop")) return "stop";
  return mine.some((each) => each.level === "caution") ? "caution" : "clear";
}

function State({ state }: { readonly state: Level | "empty" }) {
  return <span className="state">{state === "empty" ? "empty" : <LevelMark level={state} />}</span>;
}
