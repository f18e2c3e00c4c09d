import type { Brief } from "../../solver/index.ts";
import { ChoiceField } from "../inputs/ChoiceField.tsx";
import { QuantityField } from "../inputs/QuantityField.tsx";
import { AskSection } from "./AskSection.tsx";

const follows = [
  { label: "an element may stand, dc or rms", path: "element.voltageLimit_V", index: 0 },
  { label: "an element may dissipate", path: "element.dissipationLimit_W", index: 0 },
  { label: "critical resistance, derated", path: "element.criticalResistance_ohm", index: 0 },
] as const;

const series = (["E3", "E6", "E12", "E24", "E48", "E96", "E192"] as const).map((name) => [name, name] as const);
const compensations = [
  ["whenNeeded", "when the band asks for it"],
  ["always", "always"],
  ["never", "never"],
] as const;

/** How far the ratings are used, and what is accepted. */
export function Policy({ brief }: { readonly brief: Brief }) {
  const at = "/brief/policy";
  const p = brief.policy;
  return (
    <AskSection heading="how cautious" follows={follows}>
      <div className="fields">
        <QuantityField
          label="use of the limiting voltage"
          pointer={`${at}/voltageDerating`}
          unit="1"
          value={p.voltageDerating}
          share
          least={0.1}
          greatest={1}
        />
        <QuantityField
          label="use of the dissipation"
          pointer={`${at}/powerDerating`}
          unit="1"
          value={p.powerDerating}
          share
          least={0.1}
          greatest={1}
        />
        <ChoiceField label="LV arm series" pointer={`${at}/series`} value={p.series} options={series} />
        <ChoiceField
          label="capacitors across the elements"
          pointer={`${at}/compensation`}
          value={p.compensation}
          options={compensations}
        />
        <QuantityField
          label="accepted sag"
          pointer={`${at}/allowedSag`}
          unit="1"
          value={p.allowedSag}
          share
          blank="as wanted"
          greatest={1}
        />
        <QuantityField
          label="insulation across the string"
          pointer={`${at}/leakageResistance_ohm`}
          unit="ohm"
          value={p.leakageResistance_ohm}
          least={1e6}
          greatest={1e18}
        />
        <QuantityField
          label="least string current"
          pointer={`${at}/leastCurrent_A`}
          unit="A"
          value={p.leastCurrent_A}
          least={1e-12}
          greatest={1}
        />
        <QuantityField
          label="greatest dissipation"
          pointer={`${at}/greatestDissipation_W`}
          unit="W"
          value={p.greatestDissipation_W}
          blank="no bound"
        />
        <QuantityField
          label="longest column"
          pointer={`${at}/greatestLength_m`}
          unit="m"
          value={p.greatestLength_m}
          blank="no bound"
        />
      </div>
    </AskSection>
  );
}
