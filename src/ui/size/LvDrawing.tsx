import { useMemo } from "react";
import type { Design, Instrument, Part } from "../../solver/index.ts";
import { CircuitSymbol, halfHeight } from "./CircuitSymbol.tsx";
import { type CircuitBranch, lvCircuit } from "./lvCircuit.ts";

interface Props {
  readonly design: Design;
  readonly parts: readonly Part[];
  readonly instrument: Instrument | null;
}

const step = 78;
const rail = 26;
const floor = 176;

/** The LV arm as a small circuit: everything that stands in parallel between tap and earth, instrument and cable included. */
export function LvDrawing({ design, parts, instrument }: Props) {
  const branches = useMemo(() => lvCircuit(design, parts, instrument), [design, parts, instrument]);
  const width = 46 + branches.length * step;
  const at = (i: number) => 40 + i * step;
  const groups = owners(branches);
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolled drawing must be reachable by keyboard
    <section className="circuit" tabIndex={0} aria-label="drawing of the LV arm; the table below has its parts">
      <svg
        width={width}
        height={floor + 46}
        viewBox={`0 0 ${width} ${floor + 46}`}
        aria-hidden="true"
        style={{ minWidth: 0.9 * width }}
      >
        <line className="lead" x1={14} x2={at(branches.length - 1)} y1={rail} y2={rail} />
        <line className="lead" x1={at(0)} x2={at(branches.length - 1)} y1={floor} y2={floor} />
        <circle className="node" cx={14} cy={rail} r={3} />
        <text x={8} y={rail - 10}>
          tap
        </text>
        <path className="lead" d={`M${at(0)} ${floor}v12m-11 0h22m-18 4h14m-10 4h6`} />
        {branches.map((branch, i) => (
          <Branch key={`${branch.owner} ${branch.name}`} branch={branch} x={at(i)} />
        ))}
        {groups.map(({ owner, from, to }) => (
          <g key={owner}>
            <path className="brace" d={`M${at(from) - 14} ${floor + 24}H${at(to) + 44}`} />
            <text className="quiet" x={at(from) - 14} y={floor + 38}>
              {owner}
            </text>
          </g>
        ))}
      </svg>
    </section>
  );
}

function Branch({ branch, x }: { readonly branch: CircuitBranch; readonly x: number }) {
  const each = (floor - rail) / branch.parts.length;
  const middles = branch.parts.map((_, i) => rail + each * (i + 0.5));
  const edges = [
    rail,
    ...branch.parts.flatMap((part, i) => [
      middles[i]! - halfHeight[part.symbol],
      middles[i]! + halfHeight[part.symbol],
    ]),
    floor,
  ];
  return (
    <g>
      {edges.map((from, i) => {
        if (i % 2 !== 0) return null;
        return <line key={from} className="lead" x1={x} x2={x} y1={from} y2={edges[i + 1]} />;
      })}
      <circle className="node" cx={x} cy={rail} r={2} />
      {branch.parts.map((part, i) => (
        <g key={middles[i]}>
          <CircuitSymbol symbol={part.symbol} x={x} y={middles[i]!} />
          <text
            x={x + 15}
            y={middles[i]! + (part.symbol === "link" || part.symbol === "openLink" ? -4 : -5)}
            className="name"
          >
            {i === 0 ? branch.name : ""}
          </text>
          <Value text={part.value} x={x + 15} y={middles[i]! + (i === 0 ? 9 : 4)} />
        </g>
      ))}
    </g>
  );
}

/** A value on one line, or on two where it is long. */
function Value({ text, x, y }: { readonly text: string; readonly x: number; readonly y: number }) {
  const cut = text.length > 11 ? text.lastIndexOf(" ", 12) : -1;
  const lines = cut > 0 ? [text.slice(0, cut), text.slice(cut + 1)] : [text];
  return (
    <text x={x} y={y}>
      {lines.map((line, i) => (
        <tspan key={line} x={x} dy={i === 0 ? 0 : 14}>
          {line}
        </tspan>
      ))}
    </text>
  );
}

interface Group {
  readonly owner: string;
  readonly from: number;
  readonly to: number;
}

const ownerNames = { lvArm: "on the divider", cable: "cable", instrument: "in the instrument" } as const;

function owners(branches: readonly CircuitBranch[]): readonly Group[] {
  const kinds = ["lvArm", "cable", "instrument"] as const;
  return kinds.flatMap((kind): Group[] => {
    const from = branches.findIndex((b) => b.owner === kind);
    if (from < 0) return [];
    return [{ owner: ownerNames[kind], from, to: branches.findLastIndex((b) => b.owner === kind) }];
  });
}
