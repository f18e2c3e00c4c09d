import type { Brief } from "../../solver/index.ts";
import { ChoiceField } from "../inputs/ChoiceField.tsx";
import { QuantityField } from "../inputs/QuantityField.tsx";
import { AskSection } from "./AskSection.tsx";

const follows = [
  { label: "divider draws", path: "input.current_A" },
  { label: "source sags by", path: "source.sag" },
  { label: "falls to 60 V through the divider in", path: "charge.waitTime_s" },
] as const;

const earths = [
  ["oneSide", "one side is earthed"],
  ["floating", "floating"],
  ["none", "no earth at all"],
] as const;

/** The source: which point is earth, what it can bear. */
export function SourceAsked({ brief }: { readonly brief: Brief }) {
  const at = "/brief/source";
  const { source } = brief;
  return (
    <AskSection heading="source" follows={follows}>
      <div className="fields">
        <ChoiceField label="which point is earth" pointer={`${at}/earth`} value={source.earth} options={earths} />
        <QuantityField
          label="source resistance"
          pointer={`${at}/resistance_ohm`}
          unit="ohm"
          value={source.resistance_ohm}
          greatest={1e15}
        />
        <QuantityField
          label="source capacitance"
          pointer={`${at}/capacitance_F`}
          unit="F"
          value={source.capacitance_F}
          greatest={1}
        />
        <QuantityField
          label="current limit"
          pointer={`${at}/currentLimit_A`}
          unit="A"
          value={source.currentLimit_A}
          blank="not stated"
          greatest={1e6}
        />
        <ChoiceField
          label="fed from the mains"
          pointer={`${at}/mainsConnected`}
          value={source.mainsConnected}
          options={yesNo}
        />
      </div>
    </AskSection>
  );
}

const yesNo = [
  [false, "no, isolated"],
  [true, "yes, connected"],
] as const;
