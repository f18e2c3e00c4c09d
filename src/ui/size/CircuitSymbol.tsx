import type { SymbolKind } from "./lvCircuit.ts";

interface Props {
  readonly symbol: SymbolKind;
  readonly x: number;
  /** Middle of the symbol. */
  readonly y: number;
}

/** Half heights that the leads must leave free. */
export const halfHeight: Readonly<Record<SymbolKind, number>> = {
  resistor: 16,
  rheostat: 16,
  capacitor: 3,
  trimmer: 3,
  link: 14,
  openLink: 14,
  protector: 10,
};

/** IEC 60617 style symbols, drawn upright on a vertical lead. */
export function CircuitSymbol({ symbol, x, y }: Props) {
  switch (symbol) {
    case "resistor":
      return <rect className="part" x={x - 6} y={y - 16} width={12} height={32} />;
    case "rheostat":
      return (
        <>
          <rect className="part" x={x - 6} y={y - 16} width={12} height={32} />
          <Arrow x={x} y={y} reach={17} />
        </>
      );
    case "capacitor":
      return <Plates x={x} y={y} />;
    case "trimmer":
      return (
        <>
          <Plates x={x} y={y} />
          <Arrow x={x} y={y} reach={13} />
        </>
      );
    case "link":
    case "openLink":
      return <Link x={x} y={y} open={symbol === "openLink"} />;
    case "protector":
      return <path className="part" d={`M${x - 8} ${y - 10}h16l-16 20h16z`} />;
  }
}

function Plates({ x, y }: { readonly x: number; readonly y: number }) {
  return (
    <>
      <line className="plate" x1={x - 11} x2={x + 11} y1={y - 3} y2={y - 3} />
      <line className="plate" x1={x - 11} x2={x + 11} y1={y + 3} y2={y + 3} />
    </>
  );
}

function Arrow({ x, y, reach }: { readonly x: number; readonly y: number; readonly reach: number }) {
  const [tipX, tipY] = [x + reach, y - reach];
  return <path className="lead" d={`M${x - reach} ${y + reach}L${tipX} ${tipY}m-7 1l7 -1l-1 7`} />;
}

/** A capacitor in series with a wire link: closed when fitted, lifted when left open. */
function Link({ x, y, open }: { readonly x: number; readonly y: number; readonly open: boolean }) {
  return (
    <>
      <line className="plate" x1={x - 11} x2={x + 11} y1={y + 8} y2={y + 8} />
      <line className="plate" x1={x - 11} x2={x + 11} y1={y + 14} y2={y + 14} />
      <circle className="part" cx={x} cy={y - 14} r={2} />
      <circle className="part" cx={x} cy={y + 2} r={2} />
      <line className="lead" x1={x} y1={y} x2={open ? x + 10 : x} y2={open ? y - 11 : y - 12} />
      <line className="lead" x1={x} x2={x} y1={y + 4} y2={y + 8} />
    </>
  );
}
