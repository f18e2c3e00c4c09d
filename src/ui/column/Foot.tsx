import type { Design, DividerDocument } from "../../solver/index.ts";
import type { ColumnScale } from "./columnScale.ts";

interface Props {
  readonly document: DividerDocument;
  readonly design: Design;
  readonly scale: ColumnScale;
  readonly axis: number;
  readonly width: number;
}

/** Widest that a box is drawn; a wider one is cut, its sides dashed. */
const widest = 26;

/** Tap, LV arm in its box, cable to the instrument, earth. A box with a stated size stands to scale; else it is a sign. */
export function Foot({ document: document_, design, scale, axis, width }: Props) {
  const tap = scale.y(scale.foot_m);
  const floor = scale.y(0);
  const sized = design.geometry.box;
  const tall = sized === null ? Math.max(8, Math.min(26, (floor - tap) * 0.5)) : sized.top_m * scale.pxPerMetre;
  const wanted = sized === null ? 14 : Math.max(3, sized.radius_m * scale.pxPerMetre);
  const half = Math.min(widest, wanted);
  const instrument = document_.instruments.find((each) => each.id === document_.principal);
  const height = Math.max(8, Math.min(26, tall));
  const cable = floor - height / 2;
  return (
    <g className="base">
      <line className="lead" x1={axis} x2={axis} y1={tap} y2={floor - tall} />
      <circle className="tap-dot" cx={axis} cy={tap} r={2.5} />
      <text x={axis + widest + 6} y={tap + 11} className="tap">
        tap
      </text>
      <path
        className={wanted > widest ? "box cut" : "box"}
        d={`M${axis - half} ${floor}V${floor - tall}M${axis + half} ${floor - tall}V${floor}`}
      />
      <path className="box" d={`M${axis - half} ${floor - tall}H${axis + half}`} />
      <path
        className="lead"
        d={`M${axis + half} ${cable - 1.5}H${width - 44}M${axis + half} ${cable + 1.5}H${width - 44}`}
      />
      <rect className="box" x={width - 44} y={floor - height} width={40} height={height} />
      <line className="earth" x1={30} x2={width - 4} y1={floor} y2={floor} />
      <path className="earth-sign" d={`M${axis} ${floor}v6m-8 0h16m-13 3h10m-7.5 3h5`} />
      {tall > 11 ? (
        <text className="in-box" x={axis} y={floor - Math.min(tall, 26) / 2 + 4}>
          LV
        </text>
      ) : null}
      {height > 11 ? (
        <text className="in-box" x={width - 24} y={cable + 4}>
          {instrument?.function.startsWith("scope") ? "scope" : "meter"}
        </text>
      ) : null}
    </g>
  );
}
