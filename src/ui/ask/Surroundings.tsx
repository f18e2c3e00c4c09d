import type { Brief } from "../../solver/index.ts";
import { ChoiceField } from "../inputs/ChoiceField.tsx";
import { QuantityField } from "../inputs/QuantityField.tsx";
import { AskSection } from "./AskSection.tsx";

const follows = [
  { label: "creepage along the column", path: "insulation.creepage_m" },
  { label: "clearance along the column", path: "insulation.clearance_m" },
] as const;

const degrees = [
  [1, "1, clean and dry"],
  [2, "2, dust, dew at times"],
  [3, "3, conductive dust or damp"],
] as const;
const groups = [
  ["I", "I, CTI 600 and above"],
  ["II", "II, CTI 400 to 600"],
  ["IIIa", "IIIa, CTI 175 to 400"],
  ["IIIb", "IIIb, CTI 100 to 175"],
] as const;

/** Where the divider will stand. */
export function Surroundings({ brief }: { readonly brief: Brief }) {
  const at = "/brief/surroundings";
  const s = brief.surroundings;
  return (
    <AskSection heading="surroundings" follows={follows}>
      <div className="fields">
        <QuantityField
          label="altitude"
          pointer={`${at}/altitude_m`}
          unit="m"
          value={s.altitude_m}
          signed
          least={-500}
          greatest={20000}
        />
        <QuantityField
          label="ambient"
          pointer={`${at}/ambient_degC`}
          unit="degC"
          value={s.ambient_degC}
          signed
          least={-60}
          greatest={125}
        />
        <QuantityField
          label="ambient, ±"
          pointer={`${at}/ambientSpan_K`}
          unit="K"
          value={s.ambientSpan_K}
          greatest={100}
        />
        <QuantityField
          label="relative humidity"
          pointer={`${at}/relativeHumidity`}
          unit="1"
          value={s.relativeHumidity}
          share
          greatest={1}
        />
        <ChoiceField
          label="pollution degree"
          pointer={`${at}/pollutionDegree`}
          value={s.pollutionDegree}
          options={degrees}
        />
        <ChoiceField label="material group" pointer={`${at}/materialGroup`} value={s.materialGroup} options={groups} />
        <QuantityField
          label="nearest wall"
          pointer={`${at}/wallDistance_m`}
          unit="m"
          value={s.wallDistance_m}
          least={0.001}
          greatest={1000}
        />
        <QuantityField
          label="approach distance by local rules"
          pointer={`${at}/approachDistance_m`}
          unit="m"
          value={s.approachDistance_m}
          least={0.001}
          greatest={1000}
          blank="not stated"
        />
      </div>
    </AskSection>
  );
}
