import { type EdgeTraces, formatQuantity, type StepResponse, type TracePair } from "../../solver/index.ts";

/** What the step chart can show. */
export type StepShow = "step" | "edge" | "echoes" | "source" | "spread";

export interface ShownTrace {
  readonly id: string;
  /** End label; none where a trace is alone. */
  readonly name: string;
  readonly hue: 1 | 2 | 3 | 4 | 5 | 6;
  readonly pair: TracePair;
}

export interface Shown {
  readonly traces: readonly ShownTrace[];
  readonly sentence: string;
}

const time = (t: number) => formatQuantity(t, "s", { digits: 3, trailing: false });

/** The choices that there is an answer for. */
export function stepShows(given: EdgeTraces | null): readonly (readonly [StepShow, string])[] {
  const found: [StepShow, string][] = [["step", "ideal step"]];
  if (given === null) return found;
  if (given.edge !== null && given.riseTime_s !== null) found.push(["edge", `edge of ${time(given.riseTime_s)}`]);
  if (given.echoes !== null) found.push(["echoes", "with echoes"]);
  found.push(["source", "from the source"], ["spread", "spread of parts"]);
  return found;
}

export function shownOf(show: StepShow, step: StepResponse, given: EdgeTraces | null): Shown {
  const plain: Shown = { traces: [{ id: "output", name: "", hue: 1, pair: step }], sentence: step.sentence };
  if (given === null || show === "step") return plain;
  if (show === "edge" && given.edge !== null) return edge(given, given.edge);
  if (show === "echoes" && given.echoes !== null) return echoes(given, given.echoes);
  if (show === "spread") return spread(step, given);
  const atElectrode = given.edge ?? step;
  const atSource = given.edgeFromSource ?? given.stepFromSource;
  const of = given.riseTime_s === null ? "an ideal step" : `an edge of ${time(given.riseTime_s)}`;
  return {
    traces: [
      { id: "output", name: "electrode", hue: 1, pair: atElectrode },
      { id: "source", name: "source", hue: 3, pair: atSource },
    ],
    sentence: `What ${of} becomes: at the electrode, and at the source with its resistance, capacitance and lead counted; each against its own dc.`,
  };
}

function edge(given: EdgeTraces, pair: TracePair): Shown {
  const greatest = Math.max(...pair.fast.value, ...pair.slow.value);
  const over = greatest > 1.0005 ? `${Number((100 * (greatest - 1)).toPrecision(2))}\u2009% above` : "nowhere above";
  return {
    traces: [{ id: "output", name: "", hue: 1, pair }],
    sentence: `A straight edge of ${time(given.riseTime_s!)} (10–90\u2009%) at the electrode: the output goes ${over} its final value.`,
  };
}

function echoes(given: EdgeTraces, pair: TracePair): Shown {
  const of = given.riseTime_s === null ? "an ideal step" : `an edge of ${time(given.riseTime_s)}`;
  return {
    traces: [{ id: "output", name: "", hue: 1, pair }],
    sentence: `What the instrument at the cable's far end sees of ${of}: the line's own waves on the fast scale, without loss, its delay included.`,
  };
}

function spread(step: StepResponse, { spread: { halfWidth_F, less, more } }: EdgeTraces): Shown {
  return {
    traces: [
      { id: "output", name: "designed", hue: 1, pair: step },
      { id: "less", name: "C2 less", hue: 2, pair: less },
      { id: "more", name: "C2 more", hue: 4, pair: more },
    ],
    sentence: `LV capacitance off by ±${formatQuantity(halfWidth_F, "F", { digits: 2, trailing: false })}: what the tolerances of its parts, the cable and the instrument leave open before it is trimmed.`,
  };
}
