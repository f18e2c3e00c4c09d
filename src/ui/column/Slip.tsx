import { formatQuantity } from "../../solver/index.ts";
import { Figure } from "../frame/Figure.tsx";
import { useDocument, useLooking, useSession } from "../frame/session.ts";
import { QuantityField } from "../inputs/QuantityField.tsx";

/** The selected element's slip: what it is, what it stands on each basis, and its value to change. */
export function Slip() {
  const session = useSession();
  const element = useLooking((state) => state.element);
  const { design, parts } = useDocument();
  const chosen = element === null ? undefined : design?.hvArm.elements[element - 1];
  if (element === null || chosen === undefined) return <p className="quiet slip-hint">Select an element to read it.</p>;
  const part = parts.find((each) => each.id === chosen.part);
  const i = element - 1;
  const rows = [
    ["dc", "element.voltage_Vdc"],
    ["rms", "element.voltage_Vrms"],
    ["peak", "element.voltage_Vpeak"],
    ["at the greatest peak", "element.greatest_Vpeak"],
    ["may stand, derated", "element.voltageLimit_V"],
    ["dissipates", "element.dissipation_W"],
    ["may dissipate, derated", "element.dissipationLimit_W"],
    ["creepage needed", "insulation.elementCreepage_m"],
  ] as const;
  return (
    <section className="slip" aria-label={`element ${element}`}>
      <h3>
        element {element}{" "}
        <button type="button" className="figure-button" onClick={() => session.looking.setState({ element: null })}>
          close
        </button>
      </h3>
      <p className="quiet">
        {part?.name ?? "part not in the document"}
        {chosen.capacitor === null ? "" : `, ${formatQuantity(chosen.capacitance_F, "F")} across it`}
      </p>
      <QuantityField
        label="resistance"
        pointer={`/design/hvArm/elements/${i}/resistance_ohm`}
        unit="ohm"
        value={chosen.resistance_ohm}
        least={1}
        greatest={1e15}
        series="E12"
      />
      <table>
        <tbody>
          {rows.map(([name, path]) => (
            <tr key={path}>
              <td className="quiet">{name}</td>
              <td>
                <Figure path={path} index={i} label={name} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
