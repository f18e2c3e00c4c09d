import { useId } from "react";
import { useDocument, useInputs, useSession } from "../frame/session.ts";
import { useApply } from "../frame/useApply.ts";

/** The name of the design: of its file, its parts list and its printed pages. */
export function NameField() {
  const id = useId();
  const session = useSession();
  const apply = useApply();
  const { name } = useDocument();
  const locked = useInputs((state) => state.file.readOnly !== null);
  return (
    <div className="field name-field">
      <label htmlFor={id}>name of the design</label>
      <div className="line">
        <input
          id={id}
          type="text"
          autoComplete="off"
          value={name}
          maxLength={200}
          readOnly={locked}
          onChange={(event) => apply((store) => store.rename(event.target.value))}
          onBlur={() => session.store.getState().leaveField()}
        />
      </div>
    </div>
  );
}
