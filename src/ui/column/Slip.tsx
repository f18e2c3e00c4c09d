import { formatQuantity, formatShare } from "../../solver/index.ts";
import { Figure } from "../frame/Figure.tsx";
import { useDocument, useJudged, useLooking, useSession } from "../frame/session.ts";
import { QuantityField } from "../inputs/QuantityField.tsx";
import { LevelMark } from "../prove/LevelMark.tsx";

/** Every basis that one element is judged on: what stands, and what may stand after derating. */
const bases = [
  ["dc", "element.voltage_Vdc", "element.voltageLimit_V"],
  ["rms", "element.voltage_Vrms", "element.voltageLimit_V"],
  ["peak", "element.voltage_Vpeak", "element.voltageLimit_Vpeak"],
  ["greatest dc or rms", "element.greatestRms_V", "element.voltageLimit_V"],
  ["greatest peak", "element.greatest_Vpeak", "element.voltageLimit_Vpeak"],
  ["step sharing", "element.voltage_Vstep", "element.voltageLimit_Vpeak"],
  ["hot contact", "element.voltage_VhotContact", "element.voltageLimit_Vpeak"],
  ["dissipation", "element.dissipation_W", "element.dissipationLimit_W"],
] as const;

/** The selected element's slip, beside it: what it is, its value to change, what it stands on each basis. */
export function Slip({ at }: { readonly at: number }) {
  const session = useSession();
  const element = useLooking((state) => state.element);
  const { design, parts } = useDocument();
  const chosen = element === null ? undefined : design?.hvArm.elements[element - 1];
  if (element === null || chosen === undefined) return null;
  const part = parts.find((each) => each.id === chosen.part);
  const close = () => session.looking.setState({ element: null });
  return (
    <section
      className="slip"
      aria-label={`element ${element}`}
      style={{ top: `clamp(0px, ${(at * 100).toFixed(2)}% - 24px, 100% - 400px)` }}
      onKeyDown={(event) => {
        if (event.key !== "Escape" || event.target instanceof HTMLInputElement) return;
        close();
        document.querySelector<HTMLElement>(".column-picture")?.focus();
      }}
    >
      <h3>
        element {element}
        <button type="button" className="figure-button" onClick={close}>
          close
        </button>
      </h3>
      <p className="quiet">
        {part?.name ?? "part not in the document"}
        {chosen.capacitor === null ? "" : `, ${formatQuantity(chosen.capacitance_F, "F")} across it`}
      </p>
      <QuantityField
        label="resistance"
        pointer={`/design/hvArm/elements/${element - 1}/resistance_ohm`}
        unit="ohm"
        value={chosen.resistance_ohm}
        least={1}
        greatest={1e15}
        series="E12"
      />
      <Bases i={element - 1} />
    </section>
  );
}

function used(value: number | null, most: number | null): string {
  if (value === null || most === null || most === 0) return "–";
  const share = Math.abs(value) / most;
  return share < 1e-4 ? "< 0.01\u2009%" : formatShare(share, 2);
}

function Bases({ i }: { readonly i: number }) {
  const values = useJudged((state) => state.proof?.sheet.values);
  const number = (path: string): number | null => {
    const found = values?.[path];
    const one = Array.isArray(found) ? found[i] : found;
    return typeof one === "number" ? one : null;
  };
  const rows = bases
    .map(([name, path, limit]) => ({ name, path, limit, value: number(path), most: number(limit) }))
    .filter(({ value }) => value !== null && value !== 0);
  return (
    <table>
      <thead>
        <tr>
          <th scope="col">basis</th>
          <th scope="col">stands</th>
          <th scope="col">may stand</th>
          <th scope="col">used</th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ name, path, limit, value, most }) => (
          <tr key={path}>
            <th scope="row">{name}</th>
            <td>
              <Figure path={path} index={i} label={name} />
            </td>
            <td>
              <Figure path={limit} index={i} label={`${name}, may stand`} />
            </td>
            <td>
              {used(value, most)}
              {value !== null && most !== null && Math.abs(value) > most ? (
                <LevelMark level="stop" word={false} />
              ) : null}
            </td>
          </tr>
        ))}
        <tr>
          <th scope="row">creepage needed</th>
          <td>
            <Figure path="insulation.elementCreepage_m" index={i} label="creepage needed" />
          </td>
          <td colSpan={2} />
        </tr>
      </tbody>
    </table>
  );
}
