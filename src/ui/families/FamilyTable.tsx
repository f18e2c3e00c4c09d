import type { CapacitorFamily, ResistorFamily } from "../../solver/index.ts";
import { withUnit } from "../charts/axisText.ts";
import { percentText } from "../size/candidateText.ts";

export type OwnFamily = ResistorFamily | CapacitorFamily;

interface Props {
  readonly families: readonly OwnFamily[];
  /** null: nothing can be taken out here. */
  readonly onRemove: ((family: OwnFamily) => void) | null;
}

/** Own families with the ratings that sizing uses and what is in hand of each. */
export function FamilyTable({ families, onRemove }: Props) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a scrolled region must be reachable by keyboard
    <section className="sheet-scroll" tabIndex={0} aria-label="table of own families">
      <table className="sheet-table">
        <thead>
          <tr>
            <th scope="col">family</th>
            <th scope="col" className="number">
              from
            </th>
            <th scope="col" className="number">
              to
            </th>
            <th scope="col" className="number">
              tolerance
            </th>
            <th scope="col" className="number">
              dissipation
            </th>
            <th scope="col" className="number">
              voltage
            </th>
            <th scope="col">in hand</th>
            {onRemove === null ? null : (
              <th scope="col">
                <span className="unseen">take out</span>
              </th>
            )}
          </tr>
        </thead>
        <tbody>
          {families.map((family) => (
            <tr key={family.id}>
              <th scope="row">{family.name}</th>
              <Ratings family={family} />
              <td>{inHandText(family)}</td>
              {onRemove === null ? null : (
                <td>
                  <button type="button" className="quiet-button" onClick={() => onRemove(family)}>
                    take out<span className="unseen"> {family.name}</span>
                  </button>
                </td>
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

function Ratings({ family }: { readonly family: OwnFamily }) {
  const resistor = family.kind === "resistor";
  const from = resistor ? withUnit(family.least_ohm, "ohm", 3) : withUnit(family.least_F, "F", 3);
  const to = resistor ? withUnit(family.greatest_ohm, "ohm", 3) : withUnit(family.greatest_F, "F", 3);
  const voltage = resistor ? family.limitingVoltage_V : family.ratedVoltage_V;
  return (
    <>
      <td className="number">{from}</td>
      <td className="number">{to}</td>
      <td className="number">{`±${percentText(family.tolerance)}`}</td>
      <td className="number">{resistor ? withUnit(family.ratedDissipation_W, "W", 3) : "–"}</td>
      <td className="number">{voltage === null || voltage === 0 ? "not stated" : withUnit(voltage, "V", 3)}</td>
    </>
  );
}

function inHandText(family: OwnFamily): string {
  const list = family.inHand ?? [];
  if (list.length === 0) return "–";
  return list
    .map(({ value, count }) => `${count}\u2009×\u2009${withUnit(value, family.kind === "resistor" ? "ohm" : "F", 3)}`)
    .join(", ");
}
