import { useEffect, useMemo, useState } from "react";
import { catalogue, formatQuantity, formatShare, type Instrument, type InstrumentRow } from "../../solver/index.ts";
import { useDocument, useInputs, useJudged, useLooking } from "../frame/session.ts";
import { useApply } from "../frame/useApply.ts";
import { InstrumentFields } from "./InstrumentFields.tsx";

/** Who reads it: instruments by range and function with their cable; one is the principal. */
export function Instruments() {
  const { instruments, principal } = useDocument();
  const rows = useJudged((state) => state.proof?.instruments);
  const [open, setOpen] = useState<string | null>(null);
  const asked = useLooking((state) => /^\/instruments\/(\d+)\//.exec(state.field ?? "")?.[1]);
  const wanted = asked === undefined ? undefined : instruments[Number(asked)]?.id;
  useEffect(() => {
    if (wanted !== undefined) setOpen(wanted);
  }, [wanted]);
  const shown = instruments.findIndex((each) => each.id === open);
  const one = instruments[shown];
  return (
    <section className="sheet" aria-labelledby="instruments-asked">
      <h2 id="instruments-asked">instruments</h2>
      <table className="instruments">
        <thead>
          <tr>
            <th scope="col">principal, range and function</th>
            <th scope="col">input</th>
            <th scope="col">may see</th>
            <th scope="col">cable</th>
            <th scope="col">scale factor</th>
            <th scope="col">reads</th>
            <th scope="col">
              <span className="unseen">actions</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {instruments.map((each, i) => (
            <Row
              key={each.id}
              instrument={each}
              judged={rows?.find((row) => row.id === each.id)}
              principal={each.id === principal}
              open={each.id === open}
              only={instruments.length === 1}
              at={`/instruments/${i}`}
              onOpen={() => setOpen(each.id === open ? null : each.id)}
            />
          ))}
        </tbody>
      </table>
      <AddInstrument taken={instruments} onAdded={setOpen} />
      {one === undefined ? null : <InstrumentFields key={one.id} instrument={one} at={`/instruments/${shown}`} />}
    </section>
  );
}

interface RowProps {
  readonly instrument: Instrument;
  readonly judged: InstrumentRow | undefined;
  readonly principal: boolean;
  readonly open: boolean;
  readonly only: boolean;
  readonly at: string;
  readonly onOpen: () => void;
}

function Row({ instrument: each, judged, principal, open, only, at, onOpen }: RowProps) {
  const apply = useApply();
  const locked = useInputs((state) => state.file.readOnly !== null);
  const short = (value: number, unit: "ohm" | "F" | "V" | "m") => formatQuantity(value, unit, { trailing: false });
  return (
    <tr className={principal ? "principal" : ""}>
      <th scope="row">
        <label>
          <input
            type="radio"
            name="principal"
            checked={principal}
            disabled={locked}
            onChange={() => apply((store) => store.editAt("/principal", each.id, { step: "principal instrument" }))}
          />
          {each.name}
        </label>
      </th>
      <td>
        {short(each.resistance_ohm, "ohm")} ‖ {short(each.capacitance_F, "F")}
      </td>
      <td>{short(each.greatestInput_Vpeak, "V")}</td>
      <td>{short(each.cable.length_m, "m")}</td>
      <td>{judged === undefined ? "–" : formatQuantity(judged.scaleFactor, "1", { digits: 5 })}</td>
      <td>
        {judged === undefined ? "–" : formatQuantity(judged.readingAtWorking_V, "V", { digits: 4 })}
        {judged === undefined || judged.principal || Math.abs(judged.errorIfReused) < 1e-6 ? null : (
          <span className="quiet off">{formatShare(judged.errorIfReused, 2)} off on the principal’s factor</span>
        )}
      </td>
      <td className="acts">
        <button type="button" className="figure-button" aria-expanded={open} onClick={onOpen}>
          {open ? "close" : "figures"}
          <span className="unseen"> of {each.name}</span>
        </button>
        {only || principal ? null : (
          <button
            type="button"
            className="figure-button"
            disabled={locked}
            onClick={() => apply((store) => store.removeAt(at, "remove an instrument"))}
          >
            remove<span className="unseen"> {each.name}</span>
          </button>
        )}
      </td>
    </tr>
  );
}

interface AddProps {
  readonly taken: readonly Instrument[];
  readonly onAdded: (id: string) => void;
}

function AddInstrument({ taken, onAdded }: AddProps) {
  const apply = useApply();
  const locked = useInputs((state) => state.file.readOnly !== null);
  const free = useMemo(() => catalogue.instruments.filter((each) => !taken.some((one) => one.id === each.id)), [taken]);
  return (
    <div className="field add-instrument">
      <label htmlFor="add-instrument">add an instrument</label>
      <select
        id="add-instrument"
        value=""
        disabled={locked}
        onChange={(event) => {
          const found = free.find((each) => each.id === event.target.value);
          if (found === undefined) return;
          const done = apply((store) =>
            store.editAt("/instruments/-", found, { step: "add an instrument", origin: "catalogue" }),
          );
          if (done.ok) onAdded(found.id);
        }}
      >
        <option value="">by range and function …</option>
        {free.map((each) => (
          <option key={each.id} value={each.id}>
            {each.name}
          </option>
        ))}
      </select>
    </div>
  );
}
