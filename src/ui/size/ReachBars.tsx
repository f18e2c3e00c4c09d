import type { InstrumentReach, NeededRange } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";
import { type Axis, linearAxis, shareOf } from "../charts/logAxis.ts";

interface Props {
  readonly reach: InstrumentReach;
  /** What is fitted now. */
  readonly fitted_F: number | null;
}

/** What links and trimmer are sure to reach, holes hatched, and under it what each instrument with its cable may need. */
export function ReachBars({ reach, fitted_F }: Props) {
  const { sure, holes, needs } = reach;
  const axis = linearAxis(
    [
      sure.from_F,
      sure.to_F,
      ...needs.flatMap((n) => [n.least_F, n.greatest_F]),
      ...(fitted_F === null ? [] : [fitted_F]),
    ],
    5,
  );
  if (axis === null || needs.length === 0) return null;
  const at = (value: number) => `${(100 * shareOf(axis, value)).toFixed(3)}%`;
  return (
    <>
      <p className="finding-sentence">{sentence(reach)}</p>
      <div className="reach-grid">
        <span className="reach-name">sure to be reached</span>
        <span className="number">{sure.to_F > sure.from_F ? span(sure.from_F, sure.to_F) : "nothing"}</span>
        <svg className="reach-row" width="100%" height={22} aria-hidden="true">
          <Bar axis={axis} from={sure.from_F} to={sure.to_F} kind="covered" />
          {holes.map((hole) => (
            <Bar key={hole.link_F} axis={axis} from={hole.from_F} to={hole.to_F} kind="hole" />
          ))}
          {fitted_F === null ? null : <line className="fitted" x1={at(fitted_F)} x2={at(fitted_F)} y1={1} y2={21} />}
        </svg>
        {needs.map((need) => (
          <NeedRow key={need.id} need={need} axis={axis} />
        ))}
        <span />
        <span className="quiet small">to be fitted</span>
        <svg className="reach-row" width="100%" height={20} aria-hidden="true">
          <line className="axis" x1="0" x2="100%" y1={1} y2={1} />
          {axis.ticks.map((tick, i) => (
            <text
              key={tick}
              className="tick"
              x={at(tick)}
              y={16}
              textAnchor={i === 0 ? "start" : i === axis.ticks.length - 1 ? "end" : "middle"}
            >
              {withUnit(tick, "F")}
            </text>
          ))}
        </svg>
      </div>
    </>
  );
}

function NeedRow({ need, axis }: { readonly need: NeededRange; readonly axis: Axis }) {
  const at = `${(100 * shareOf(axis, need.nominal_F)).toFixed(3)}%`;
  return (
    <>
      <span className="reach-name">
        {need.name}
        {need.principal ? <span className="quiet"> · principal</span> : null}
        {need.within ? null : <span className="warns"> · not sure</span>}
      </span>
      <span className="number">{span(need.least_F, need.greatest_F)}</span>
      <svg className="reach-row" width="100%" height={22} aria-hidden="true">
        <Bar axis={axis} from={need.least_F} to={need.greatest_F} kind={need.within ? "needed" : "needed missed"} />
        <line className="needle" x1={at} x2={at} y1={3} y2={19} />
      </svg>
    </>
  );
}

interface BarProps {
  readonly axis: Axis;
  readonly from: number;
  readonly to: number;
  readonly kind: string;
}

function Bar({ axis, from, to, kind }: BarProps) {
  const [low, high] = axis.domain;
  const start = shareOf(axis, Math.max(low, from));
  const width = shareOf(axis, Math.min(high, to)) - start;
  if (!(width > 0)) return null;
  return (
    <rect
      className={kind}
      x={`${(100 * start).toFixed(3)}%`}
      width={`${(100 * width).toFixed(3)}%`}
      y={6}
      height={10}
    />
  );
}

/** "17.1 … 18.2 nF" */
function span(from: number, to: number): string {
  const [a, b] = [withUnit(from, "F", 4), withUnit(to, "F", 4)];
  const unit = b.slice(b.indexOf("\u2009"));
  return a.endsWith(unit) ? `${a.slice(0, -unit.length)} … ${b}` : `${a} … ${b}`;
}

function sentence({ sure, holes, needs }: InstrumentReach): string {
  const missed = needs.filter((need) => !need.within);
  const hole =
    holes.length === 0
      ? "no hole between links"
      : `${holes.length} hole${holes.length > 1 ? "s" : ""} between links: ${holes.map((each) => `before ${withUnit(each.link_F, "F", 3)}, ${withUnit(each.to_F - each.from_F, "F", 3)} wide`).join("; ")}`;
  const parts = "with string, strays, links, cable and instrument at the ends of their tolerances";
  if (sure.to_F <= sure.from_F)
    return `Without links, the trimmer is too narrow to make up for the parts themselves, ${parts}.`;
  if (missed.length === 0)
    return `Links (select-on-test capacitors) and trimmer reach what ${needs.length === 1 ? "the instrument needs" : `each of ${needs.length} instruments needs`}, ${parts}; ${hole}.`;
  return `${missed.map((need) => need.name).join(", ")}: may need what links (select-on-test capacitors) and trimmer are not sure to reach, ${parts}; ${hole}.`;
}
