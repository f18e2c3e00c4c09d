import { redoNames, undoNames } from "../../store/history.ts";
import { FileMenu } from "./FileMenu.tsx";
import { HelpButton } from "./Help.tsx";
import { useDocument, useInputs, useJudged, useLooking, useSession } from "./session.ts";
import { ThemeButton } from "./ThemeButton.tsx";

/** Name, the job as one sentence, where the work is saved, undo, file, theme. */
export function Header({ onDrawer }: { readonly onDrawer: () => void }) {
  const session = useSession();
  const document_ = useDocument();
  const job = useJudged((state) => state.proof?.job);
  const example = useInputs((state) => state.file.example);
  const undo = useInputs((state) => undoNames(state)[0]);
  const redo = useInputs((state) => redoNames(state)[0]);
  return (
    <header className="head">
      <h1 className="mark">Stringwright</h1>
      {example ? <span className="example">example</span> : null}
      <span className="on-paper">{document_.name}</span>
      <span className="job">{job ?? document_.name}</span>
      <Saved />
      <nav aria-label="document">
        <button type="button" className="drawer-button" onClick={onDrawer}>
          column
        </button>
        <button
          type="button"
          disabled={undo === undefined}
          title={undo ?? "nothing to undo"}
          onClick={() => session.store.getState().undo()}
        >
          undo
        </button>
        <button
          type="button"
          disabled={redo === undefined}
          title={redo ?? "nothing to redo"}
          onClick={() => session.store.getState().redo()}
        >
          redo
        </button>
        <FileMenu />
        <ThemeButton />
        <HelpButton />
      </nav>
    </header>
  );
}

const clock = (at: number) => new Date(at).toLocaleTimeString([], { hour: "2-digit", minute: "2-digit" });

function Saved() {
  const file = useInputs((state) => state.file);
  const copy = useInputs((state) => state.browserCopy);
  const offline = useLooking((state) => state.offline);
  const inBrowser =
    copy.problem !== null
      ? `not kept in this browser: ${copy.problem}`
      : copy.savedAt === null
        ? ""
        : `saved in this browser ${clock(copy.savedAt)}`;
  const inFile =
    file.readOnly !== null
      ? `read only, ${file.readOnly}`
      : file.dirtySince !== null
        ? file.name === null
          ? "in no file"
          : `file not saved since ${clock(file.dirtySince)}`
        : file.savedAt !== null
          ? `file saved ${clock(file.savedAt)}`
          : "";
  const words = [inBrowser, inFile, offline ? "ready offline" : ""].filter((each) => each !== "");
  return (
    <span className="quiet" role="status">
      {words.join(" · ")}
    </span>
  );
}
