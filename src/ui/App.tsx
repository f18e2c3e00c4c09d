import { lazy, Suspense, useEffect, useState } from "react";
import { AskScreen } from "./ask/AskScreen.tsx";
import { Column } from "./column/Column.tsx";
import { Findings } from "./frame/Findings.tsx";
import { openText } from "./frame/files.ts";
import { Header } from "./frame/Header.tsx";
import { InShort } from "./frame/InShort.tsx";
import { Later } from "./frame/Later.tsx";
import { Notices } from "./frame/Notices.tsx";
import { Strip } from "./frame/Strip.tsx";
import { type ScreenName, useLooking, useSession } from "./frame/session.ts";
import { Why } from "./frame/Why.tsx";
import "./frame/frame.css";

const SizeScreen = lazy(() => import("./size/SizeScreen.tsx"));
const ProveScreen = lazy(() => import("./prove/ProveScreen.tsx"));
const BuildScreen = lazy(() => import("./build/BuildScreen.tsx"));

/** The frame: the job and the screens across the top, the column left, the screen in hand, what it comes to on the right. */
export function App() {
  const session = useSession();
  const screen = useLooking((state) => state.screen);
  const [drawer, setDrawer] = useState(false);
  const dropping = useDrop((text, name) => openText(session, text, name));
  return (
    <div className={dropping ? "frame dropping" : "frame"}>
      <a className="skip" href="#screen">
        skip to the screen in hand
      </a>
      <Header onDrawer={() => setDrawer(!drawer)} />
      <Strip />
      <aside className={drawer ? "side open" : "side"} aria-label="column">
        <div className="column-sheet">
          {drawer ? (
            <button type="button" className="plain-button drawer-button" onClick={() => setDrawer(false)}>
              close
            </button>
          ) : null}
          <Column />
        </div>
      </aside>
      <main id="screen" className="middle" aria-label={screen} tabIndex={-1}>
        <Notices />
        <Suspense fallback={<p className="quiet">Opening …</p>}>
          <Screen name={screen} />
        </Suspense>
      </main>
      <aside className="right" aria-label="what it comes to">
        <div className="pinned">
          <InShort />
          <Findings />
        </div>
      </aside>
      <Why />
    </div>
  );
}

function Screen({ name }: { readonly name: ScreenName }) {
  switch (name) {
    case "ask":
      return <AskScreen />;
    case "size":
      return <SizeScreen />;
    case "prove":
      return <ProveScreen />;
    case "build":
      return <BuildScreen />;
    default:
      return <Later name={name} />;
  }
}

/** A file dropped anywhere on the page is opened. */
function useDrop(open: (text: string, name: string) => Promise<void>): boolean {
  const [dropping, setDropping] = useState(false);
  useEffect(() => {
    const over = (event: DragEvent) => {
      event.preventDefault();
      setDropping(true);
    };
    const leave = (event: DragEvent) => {
      if (event.relatedTarget === null) setDropping(false);
    };
    const drop = async (event: DragEvent) => {
      event.preventDefault();
      setDropping(false);
      const file = event.dataTransfer?.files[0];
      if (file !== undefined) await open(await file.text(), file.name);
    };
    window.addEventListener("dragover", over);
    window.addEventListener("dragleave", leave);
    window.addEventListener("drop", drop);
    return () => {
      window.removeEventListener("dragover", over);
      window.removeEventListener("dragleave", leave);
      window.removeEventListener("drop", drop);
    };
  }, [open]);
  return dropping;
}
