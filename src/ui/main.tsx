import { StrictMode } from "react";
import { createRoot } from "react-dom/client";
import { takeCandidate } from "../solver/index.ts";
import { Autosave } from "../store/autosave.ts";
import { IndexedDbShelf } from "../store/indexedDbShelf.ts";
import { Keeper } from "../store/keeper.ts";
import { createDividerStore } from "../store/store.ts";
import { createRunner } from "../work/runner.ts";
import { App } from "./App.tsx";
import { firstExample, lastSlot } from "./frame/files.ts";
import { keepOffline } from "./frame/offline.ts";
import { judgeEveryChange, newJudged, newLooking, type Session, SessionContext } from "./frame/session.ts";
import { restoreTheme } from "./frame/ThemeButton.tsx";
import "./theme.css";

const startWorker = () => new Worker(new URL("../work/worker.ts", import.meta.url), { type: "module" });

async function start(): Promise<void> {
  restoreTheme();
  const example = await firstExample();
  const store = createDividerStore(example, { now: Date.now, takeCandidate }, { example: true });
  const session: Session = {
    store,
    judged: newJudged(),
    looking: newLooking(),
    runner: createRunner(startWorker),
    keeper: null,
    handle: null,
  };
  await recover(session);
  createRoot(document.getElementById("page")!).render(
    <StrictMode>
      <SessionContext value={session}>
        <App />
      </SessionContext>
    </StrictMode>,
  );
  judgeEveryChange(session);
  keepOffline(session);
}

/** Goes on with the copy in this browser; where there is none, or no store for one, the example stands and the page says so. */
async function recover(session: Session): Promise<void> {
  try {
    const autosave = new Autosave({ shelf: new IndexedDbShelf(), locks: navigator.locks ?? null, now: Date.now });
    const keeper = new Keeper(session.store, autosave);
    const slot = (await lastSlot()) ?? crypto.randomUUID();
    sessionStorage.setItem("slot", slot);
    const { damaged, kept } = await keeper.open(slot);
    session.keeper = keeper;
    document.addEventListener("visibilitychange", () => void keeper.flush());
    window.addEventListener("pagehide", () => void keeper.flush());
    if (damaged.length > 0) {
      session.looking.setState({
        notice: {
          text: `The newest copy in this browser was damaged; ${kept === null ? "none older was left" : "the one before it was opened"}.`,
          bad: true,
          details: damaged.map((each) => `${new Date(each.at).toLocaleString()}: ${each.why}`),
        },
      });
    }
  } catch (error) {
    session.store.getState().noteBrowserCopy({ savedAt: null, problem: (error as Error).message });
  }
}

void start();
