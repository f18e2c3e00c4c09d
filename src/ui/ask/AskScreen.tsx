import { useMemo } from "react";
import type { Brief } from "../../solver/index.ts";
import { useDocument } from "../frame/session.ts";
import { ChoiceField } from "../inputs/ChoiceField.tsx";
import { QuantityField } from "../inputs/QuantityField.tsx";
import { Assumed } from "./Assumed.tsx";
import { Instruments } from "./Instruments.tsx";
import { WaveformSketch } from "./WaveformSketch.tsx";
import "./ask.css";

/** What to measure: waveform, source, who reads it, surroundings, and the engineer's policy. Every field answers at once. */
export function AskScreen() {
  const { brief } = useDocument();
  return (
    <>
      <Assumed />
      <Waveform brief={brief} />
      <Wanted brief={brief} />
      <Instruments />
      <Source brief={brief} />
      <Surroundings brief={brief} />
      <Policy brief={brief} />
    </>
  );
}

interface Part {
  readonly brief: Brief;
}

const kinds = [
  ["dc", "dc"],
  ["sine", "sine"],
  ["pulse", "pulse"],
  ["square", "square wave"],
  ["recorded", "recorded"],
] as const;

function Waveform({ brief }: Part) {
  const { waveform: w } = brief;
  const at = "/brief/waveform";
  const stated = useMemo(
    () =>
      w.kind === "dc"
        ? ([["dc", "dc"]] as const)
        : ([
            ["rms", "rms"],
            ["peak", "peak"],
          ] as const),
    [w.kind],
  );
  return (
    <section className="sheet" aria-labelledby="waveform-heading">
      <h2 id="waveform-heading">waveform</h2>
      <div className="beside">
        <div className="fields">
          <ChoiceField label="kind" pointer={`${at}/kind`} value={w.kind} options={kinds} />
          <QuantityField
            label="working voltage"
            pointer={`${at}/nominal_V`}
            unit="V"
            value={w.nominal_V}
            signed
            least={-1e7}
            greatest={1e7}
          />
          <ChoiceField label="stated as" pointer={`${at}/statedAs`} value={w.statedAs} options={stated} />
          <QuantityField
            label="greatest peak"
            pointer={`${at}/greatest_Vpeak`}
            unit="V"
            value={w.greatest_Vpeak}
            signed
            blank="by default rule"
            greatest={1e7}
          />
          {w.kind === "sine" || w.kind === "square" ? (
            <QuantityField
              label="frequency"
              pointer={`${at}/frequency_Hz`}
              unit="Hz"
              value={w.frequency_Hz}
              blank="not stated"
              greatest={1e10}
            />
          ) : null}
          {w.kind === "pulse" || w.kind === "square" || w.kind === "recorded" ? (
            <QuantityField
              label="rise time, 10-90 %"
              pointer={`${at}/riseTime_s`}
              unit="s"
              value={w.riseTime_s}
              blank="not stated"
            />
          ) : null}
          {w.kind === "pulse" ? (
            <>
              <QuantityField
                label="pulse width"
                pointer={`${at}/width_s`}
                unit="s"
                value={w.width_s}
                blank="not stated"
              />
              <QuantityField
                label="repetition"
                pointer={`${at}/repetition_Hz`}
                unit="Hz"
                value={w.repetition_Hz}
                blank="single shots"
              />
            </>
          ) : null}
        </div>
        <WaveformSketch waveform={w} />
      </div>
    </section>
  );
}

function Wanted({ brief }: Part) {
  return (
    <section className="sheet" aria-labelledby="wanted-heading">
      <h2 id="wanted-heading">what is wanted</h2>
      <div className="fields">
        <QuantityField
          label="scale factor"
          pointer="/brief/scaleFactor"
          unit="1"
          value={brief.scaleFactor}
          least={1.0001}
          greatest={1e9}
        />
        <QuantityField
          label="uncertainty, k = 2"
          pointer="/brief/wantedUncertainty"
          unit="1"
          value={brief.wantedUncertainty}
          share
          least={1e-6}
          greatest={1}
        />
        <QuantityField
          label="band from"
          pointer="/brief/band_Hz/0"
          unit="Hz"
          value={brief.band_Hz[0]}
          greatest={1e10}
        />
        <QuantityField label="band to" pointer="/brief/band_Hz/1" unit="Hz" value={brief.band_Hz[1]} greatest={1e10} />
      </div>
    </section>
  );
}

const earths = [
  ["oneSide", "one side is earthed"],
  ["floating", "floating"],
  ["none", "no earth at all"],
] as const;

function Source({ brief }: Part) {
  const at = "/brief/source";
  const { source } = brief;
  return (
    <section className="sheet" aria-labelledby="source-heading">
      <h2 id="source-heading">source</h2>
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
    </section>
  );
}

const yesNo = [
  [false, "no, isolated"],
  [true, "yes, connected"],
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

function Surroundings({ brief }: Part) {
  const at = "/brief/surroundings";
  const s = brief.surroundings;
  return (
    <section className="sheet" aria-labelledby="surroundings-heading">
      <h2 id="surroundings-heading">surroundings</h2>
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
      </div>
    </section>
  );
}

const series = (["E3", "E6", "E12", "E24", "E48", "E96", "E192"] as const).map((name) => [name, name] as const);
const compensations = [
  ["whenNeeded", "when the band asks for it"],
  ["always", "always"],
  ["never", "never"],
] as const;

function Policy({ brief }: Part) {
  const at = "/brief/policy";
  const p = brief.policy;
  return (
    <section className="sheet" aria-labelledby="policy-heading">
      <h2 id="policy-heading">how cautious</h2>
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
          blank="the uncertainty wanted"
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
    </section>
  );
}

export default AskScreen;
