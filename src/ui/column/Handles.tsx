import { type KeyboardEvent, type PointerEvent, useRef } from "react";
import type { Design } from "../../solver/index.ts";
import { useInputs, useSession } from "../frame/session.ts";
import { type ColumnScale, columnScale } from "./columnScale.ts";
import { axis, height, width } from "./Drawing.tsx";

interface Handle {
  readonly name: string;
  readonly pointer: string;
  readonly value_m: number;
  readonly least_m: number;
  /** Where it stands on the drawing. */
  readonly x: number;
  readonly y: number;
  readonly along: "x" | "y";
  /** The length after a drag of so many pixels of the drawing from a start. */
  readonly dragged: (start_m: number, px: number) => number;
}

/** What may be pulled on the drawing: the column's length, the electrode's radius, the distance of the wall. */
export function Handles({ design }: { readonly design: Design }) {
  const locked = useInputs((state) => state.file.readOnly !== null);
  const scale = columnScale(design, height);
  if (locked) return null;
  return (
    <svg className="column-handles" viewBox={`0 0 ${width} ${height}`}>
      <title>handles of the drawing</title>
      {handlesOf(design, scale).map((handle) => (
        <Pull key={handle.pointer} handle={handle} />
      ))}
    </svg>
  );
}

const at = "/design/geometry";

function handlesOf({ geometry }: Design, scale: ColumnScale): Handle[] {
  const { columnLength_m, electrode, wallDistance_m } = geometry;
  const top = scale.y(scale.top_m);
  const straight = (sign: 1 | -1) => (start: number, px: number) => start + (sign * px) / scale.pxPerMetre;
  const handles: Handle[] = [
    {
      name: "length of the column",
      pointer: `${at}/columnLength_m`,
      value_m: columnLength_m,
      least_m: 0.01,
      x: axis - 20,
      y: top,
      along: "y",
      dragged: straight(-1),
    },
  ];
  if (electrode.kind !== "none")
    handles.push({
      name: "radius of the top electrode",
      pointer: `${at}/electrode/radius_m`,
      value_m: electrode.radius_m,
      least_m: geometry.columnDiameter_m / 2,
      x: Math.min(width - 8, axis + electrode.radius_m * scale.pxPerMetre + 6),
      y: Math.max(8, top - (electrode.kind === "sphere" ? electrode.radius_m * scale.pxPerMetre : 4)),
      along: "x",
      dragged: straight(1),
    });
  if (wallDistance_m !== null)
    handles.push({
      name: "distance of the nearest wall",
      pointer: `${at}/wallDistance_m`,
      value_m: wallDistance_m,
      least_m: geometry.columnDiameter_m,
      x: width - 14,
      y: height - 60,
      along: "x",
      // The wall is mostly farther than the drawing is wide: a pull multiplies.
      dragged: (start, px) => start * Math.exp(px / 60),
    });
  return handles;
}

/** One handle: a slider for the keyboard, pulled by mouse, pen or finger; one drag is one step of undo. */
function Pull({ handle }: { readonly handle: Handle }) {
  const { store } = useSession();
  const drag = useRef<{ readonly value_m: number; readonly from: number; readonly px: number } | null>(null);
  const asked = useRef(0);
  const { name, pointer, value_m, least_m, x, y, along } = handle;
  const put = (next: number) => {
    const rounded = Number(Math.max(least_m, next).toPrecision(4));
    store.getState().editAt(pointer, rounded, { step: name, typed: `${Number((rounded * 1000).toPrecision(4))} mm` });
  };
  const place = (event: PointerEvent) => (along === "x" ? event.clientX : event.clientY);
  const onPointerDown = (event: PointerEvent<SVGGElement>) => {
    const box = event.currentTarget.ownerSVGElement?.getBoundingClientRect();
    const px = box === undefined || box.height === 0 ? 1 : height / box.height;
    event.currentTarget.setPointerCapture?.(event.pointerId);
    drag.current = { value_m, from: place(event), px };
  };
  const onPointerMove = (event: PointerEvent) => {
    const start = drag.current;
    if (start === null) return;
    const next = handle.dragged(start.value_m, (place(event) - start.from) * start.px);
    cancelAnimationFrame(asked.current);
    asked.current = requestAnimationFrame(() => put(next));
  };
  const onPointerUp = () => {
    drag.current = null;
    requestAnimationFrame(() => store.getState().leaveField());
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const more = event.key === "ArrowUp" || event.key === "ArrowRight";
    if (!more && event.key !== "ArrowDown" && event.key !== "ArrowLeft") return;
    event.preventDefault();
    const step = value_m * (event.shiftKey ? 0.1 : 0.01);
    put(value_m + (more ? step : -step));
  };
  return (
    <g
      className="pull"
      role="slider"
      tabIndex={0}
      aria-label={name}
      aria-valuenow={Math.round(value_m * 1000)}
      aria-valuemin={Math.round(least_m * 1000)}
      aria-valuemax={100000}
      aria-valuetext={`${Number((value_m * 1000).toPrecision(4))} mm`}
      onPointerDown={onPointerDown}
      onPointerMove={onPointerMove}
      onPointerUp={onPointerUp}
      onPointerCancel={onPointerUp}
      onKeyDown={onKeyDown}
      onBlur={() => store.getState().leaveField()}
    >
      <circle className="reach" cx={x} cy={y} r={13} />
      <path className="grip" d={gripAt(x, y, along)} />
      {pointer.endsWith("wallDistance_m") ? (
        <text x={x - 12} y={y + 4}>
          wall
        </text>
      ) : null}
    </g>
  );
}

/** Two arrow heads back to back. */
const gripAt = (x: number, y: number, along: "x" | "y"): string =>
  along === "y"
    ? `M${x - 4} ${y - 2}l4 -6l4 6zM${x - 4} ${y + 2}l4 6l4 -6z`
    : `M${x - 2} ${y - 4}l-6 4l6 4zM${x + 2} ${y - 4}l6 4l-6 4z`;
