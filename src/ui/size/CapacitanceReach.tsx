import { useMemo } from "react";
import type { LvArm, SheetData } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";
import { type Axis, linearAxis, shareOf } from "../charts/logAxis.ts";
import { linkReach, outOfReach, type Stretch } from "./linkReach.ts";
import { sheetNumber } from "./sheetNumber.ts";

interface Props {
  readonly sheet: SheetData;
  readonly lvArm: LvArm;
}

interface Target {
  readonly name: string;
  readonly value_F: number;
  readonly chosen: boolean;
}

const named = [
  ["highFrequency", "edge equal to dc", "lvArm.capacitanceHighFrequency_F"],
  ["flattest", "flattest", "lvArm.capacitanceFlattest_F"],
  ["responseTime", "zero response time", "lvArm.capacitanceResponseTime_F"],
] as const;

/** Whether links and trimmer reach the three matches: the stretches they cover, the holes between, what is fitted. */
export function CapacitanceReach({ sheet, lvArm }: Props) {
  const reach = useMemo(() => linkReach(lvArm), [lvArm]);
  const targets = named.flatMap(([by, name, path]): Target[] => {
    const value_F = sheetNumber(sheet, path);
    return value_F === null ? [] : [{ name, value_F, chosen: lvArm.capacitanceBy === by }];
  });
  const fitted_F = sheetNumber(sheet, "lvArm.capacitanceFitted_F");
  if (reach.length === 0 || targets.length === 0) return null;
  const all = [...reach.flatMap((s) => [s.from_F, s.to_F]), ...targets.map((t) => t.value_F)];
  const axis = linearAxis(fitted_F === null ? all : [...all, fitted_F], 6);
  if (axis === null) return null;
  return (
    <>
      <p className="finding-sentence">{sentence(reach, targets)}</p>
      <ReachDrawing axis={axis} reach={reach} targets={targets} fitted_F={fitted_F} />
    </>
  );
}

interface DrawingProps {
  readonly axis: Axis;
  readonly reach: readonly Stretch[];
  readonly targets: readonly Target[];
  readonly fitted_F: number | null;
}

const row = 18;

function ReachDrawing({ axis, reach, targets, fitted_F }: DrawingProps) {
  const at = (value: number) => `${(100 * shareOf(axis, value)).toFixed(3)}%`;
  const base = row * targets.length + 4;
  return (
    <svg className="reach" width="100%" height={base + 46} aria-hidden="true">
      {targets.map((target, i) => {
        const right = shareOf(axis, target.value_F) > 0.6;
        return (
          <g key={target.name} className={target.chosen ? "target chosen" : "target"}>
            <line x1={at(target.value_F)} x2={at(target.value_F)} y1={i * row + 3} y2={base + 16} />
            <text x={at(target.value_F)} y={i * row + 13} dx={right ? -5 : 5} textAnchor={right ? "end" : "start"}>
              {target.name}
            </text>
          </g>
        );
      })}
      {reach.map((s) => (
        <rect
          key={s.from_F}
          className="covered"
          x={at(s.from_F)}
          width={`${Math.max(0.3, 100 * (shareOf(axis, s.to_F) - shareOf(axis, s.from_F))).toFixed(3)}%`}
          y={base + 3}
          height={10}
        />
      ))}
      {fitted_F === null ? null : (
        <line className="fitted" x1={at(fitted_F)} x2={at(fitted_F)} y1={base} y2={base + 16} />
      )}
      <line className="axis" x1="0" x2="100%" y1={base + 16} y2={base + 16} />
      {axis.ticks.map((tick, i) => (
        <text
          key={tick}
          className="tick"
          x={at(tick)}
          y={base + 31}
          textAnchor={i === 0 ? "start" : i === axis.ticks.length - 1 ? "end" : "middle"}
        >
          {withUnit(tick, "F")}
        </text>
      ))}
    </svg>
  );
}

function sentence(reach: readonly Stretch[], targets: readonly Target[]): string {
  const least = withUnit(reach[0]!.from_F, "F", 3);
  const greatest = withUnit(reach[reach.length - 1]!.to_F, "F", 3);
  const holes = reach.length === 1 ? "without a hole" : `with ${reach.length - 1} hole${reach.length > 2 ? "s" : ""}`;
  const span = `Links (select-on-test capacitors) and trimmer reach ${least} to ${greatest} ${holes}, nominal values.`;
  const chosen = targets.find((t) => t.chosen);
  if (chosen === undefined) return span;
  const away = outOfReach(reach, chosen.value_F);
  const verdict = away === 0 ? "is within reach" : `is missed by ${withUnit(away, "F", 3)}`;
  return `${span} The chosen match, ${withUnit(chosen.value_F, "F", 4)}, ${verdict}.`;
}
