import { useMemo } from "react";
import { type Cure, type LvArm, lvSetting, type Match, type SheetData } from "../../solver/index.ts";
import { signed, withUnit } from "../charts/axisText.ts";
import { SheetFigure } from "./Exactness.tsx";
import { MatchSketch, sketchScale } from "./MatchSketch.tsx";

interface Props {
  readonly matches: readonly Match[];
  readonly sheet: SheetData;
  readonly lvArm: LvArm;
  /** Wanted relative uncertainty, the shaded band. */
  readonly wanted: number;
  readonly onWhy: (path: string) => void;
  readonly onCure: (cure: Cure) => void;
}

const words: Readonly<Record<Match["by"], { readonly name: string; readonly path: string; readonly gives: string }>> = {
  highFrequency: {
    name: "edge equal to dc",
    path: "lvArm.capacitanceHighFrequency_F",
    gives: "The edge is right; a while after it the reading may lie off.",
  },
  flattest: {
    name: "flattest over the band",
    path: "lvArm.capacitanceFlattest_F",
    gives: "The smallest greatest deviation over the band; edge and middle share it.",
  },
  responseTime: {
    name: "zero response time",
    path: "lvArm.capacitanceResponseTime_F",
    gives: "What is missing after the edge is made up later: the mean is right, the edge is not.",
  },
};

/** The three matches of the LV capacitance side by side: the step that each gives, what it costs, which is chosen. */
export function Matches({ matches, sheet, lvArm, wanted, onWhy, onCure }: Props) {
  const scale = useMemo(() => sketchScale(matches, wanted), [matches, wanted]);
  if (matches.length === 0) return null;
  return (
    <>
      <p className="finding-sentence">{sentence(matches)}</p>
      <div className="match-row">
        {matches.map((match) => {
          const { name, path, gives } = words[match.by];
          return (
            <section key={match.by} className={match.chosen ? "match chosen" : "match"} aria-label={name}>
              <h4>
                {name}
                {match.chosen ? <span className="quiet"> · chosen</span> : null}
              </h4>
              <MatchSketch step={match.step} scale={scale} />
              <Costs by={match.by} path={path} sheet={sheet} onWhy={onWhy} />
              <p className="reason">{gives}</p>
              {match.chosen || match.capacitance_F === null ? null : (
                <Choose match={match} name={name} wanted_F={match.capacitance_F} lvArm={lvArm} onCure={onCure} />
              )}
            </section>
          );
        })}
      </div>
      <p className="quiet small">
        Each drawn about the time where the capacitors hand over to the resistors, to one scale; shaded: ±
        {withUnit(100 * wanted, "1", 3)}
        {"\u2009"}% wanted.
      </p>
    </>
  );
}

interface CostProps {
  readonly by: Match["by"];
  readonly path: string;
  readonly sheet: SheetData;
  readonly onWhy: (path: string) => void;
}

function Costs({ by, path, sheet, onWhy }: CostProps) {
  return (
    <dl className="match-costs">
      <dt>to fit</dt>
      <dd>
        <SheetFigure sheet={sheet} path={path} unit="F" onWhy={onWhy} digits={5} />
      </dd>
      <dt>at the edge</dt>
      <dd>
        <SheetFigure sheet={sheet} path={`match.${by}.edgeError`} unit="%" digits={3} onWhy={onWhy} />
      </dd>
      <dt>over the band</dt>
      <dd>
        <SheetFigure sheet={sheet} path={`match.${by}.bandDeviation_dB`} unit="dB" digits={2} onWhy={onWhy} />
      </dd>
      <dt>response time</dt>
      <dd>
        <SheetFigure sheet={sheet} path={`match.${by}.responseTime_s`} unit="s" digits={3} onWhy={onWhy} />
      </dd>
    </dl>
  );
}

interface ChooseProps {
  readonly match: Match;
  readonly name: string;
  readonly wanted_F: number;
  readonly lvArm: LvArm;
  readonly onCure: (cure: Cure) => void;
}

/** Chooses a match: notes it, and sets links and trimmer for it as far as they reach. */
function Choose({ match, name, wanted_F, lvArm, onCure }: ChooseProps) {
  const setting = useMemo(() => lvSetting(lvArm, wanted_F), [lvArm, wanted_F]);
  const short = setting.missing_F;
  return (
    <>
      <button
        type="button"
        className="cure-button"
        aria-label={`choose ${name}`}
        onClick={() =>
          onCure({
            label: `LV capacitance: ${name}`,
            edits: [{ pointer: "/design/lvArm/capacitanceBy", value: match.by }, ...setting.edits],
          })
        }
      >
        choose
      </button>
      {short === 0 ? null : (
        <p className="warns small">
          Links and trimmer end {withUnit(Math.abs(short), "F", 3)} {short > 0 ? "below" : "above"} it.
        </p>
      )}
    </>
  );
}

function sentence(matches: readonly Match[]): string {
  const found = matches.flatMap((match) => (match.capacitance_F === null ? [] : [match.capacitance_F]));
  if (found.length < 2)
    return "One LV capacitance cannot be right at every time; what exists of the three ways is below.";
  const spread = Math.max(...found) / Math.min(...found) - 1;
  if (spread < 1e-6)
    return "All three ways ask for the same LV capacitance: the string shares an edge as it shares dc.";
  return `One LV capacitance cannot be right at every time; the three ways to choose it lie ${signed(100 * spread).replace("+", "")}\u2009% apart.`;
}
