import { createContext, useContext } from "react";
import { useStore } from "zustand";
import { createStore, type StoreApi } from "zustand/vanilla";
import type { ColumnField, DividerDocument, Proof, Refusal, Sizing } from "../../solver/index.ts";
import type { Keeper } from "../../store/keeper.ts";
import type { Store } from "../../store/state.ts";
import type { DividerStore } from "../../store/store.ts";
import type { Runner } from "../../work/runner.ts";
import type { FileHandle } from "./fileHandles.ts";

/** The last answer of the solver. While a newer one is awaited it stands, marked as stale, never mixed with new inputs. */
export interface Judged {
  readonly document: DividerDocument | null;
  readonly sizing: Sizing | null;
  readonly proof: Proof | null;
  readonly refusal: Refusal | null;
  readonly stale: boolean;
  /** The list of candidates is being searched for anew; the one shown is of an earlier brief. */
  readonly searching: boolean;
  /** The field solved last; the proof uses it where it is that of the drawing. */
  readonly field: ColumnField | null;
  /** The field of the drawing is being solved; the closed formula stands in. */
  readonly solving: boolean;
  /** Time the worker took for it, ms. */
  readonly took_ms: number;
}

export type ScreenName = "ask" | "route" | "size" | "prove" | "build" | "calibrate" | "use";

/** What the page looks at: nothing of it is saved. */
export interface Looking {
  readonly screen: ScreenName;
  /** Selected element, 1 next to the tap; null: none. */
  readonly element: number | null;
  readonly why: WhyAsked | null;
  /** Pointer of the field that was last asked for; what holds it opens. */
  readonly field: string | null;
  readonly notice: Notice | null;
  readonly offline: boolean;
}

export interface WhyAsked {
  readonly path: string;
  readonly index: number | null;
  readonly from: "proof" | "sizing";
  /** Figures gone through to come here, the first one pressed first. */
  readonly trail: readonly string[];
  /** Where the number stands that was pressed, px on the page. */
  readonly at: { readonly left: number; readonly top: number; readonly bottom: number };
}

export interface Notice {
  readonly text: string;
  readonly bad: boolean;
  readonly details?: readonly string[];
}

export interface Session {
  readonly store: DividerStore;
  readonly judged: StoreApi<Judged>;
  readonly looking: StoreApi<Looking>;
  readonly runner: Runner;
  /** null until the browser copy is open, or where there is none. */
  keeper: Keeper | null;
  /** The file that Save writes into; null: none yet, or the browser hands out none. */
  handle: FileHandle | null;
}

export const SessionContext = createContext<Session | null>(null);

export function useSession(): Session {
  const session = useContext(SessionContext);
  if (session === null) throw new Error("outside of a session");
  return session;
}

export const useInputs = <T>(pick: (state: Store) => T): T => useStore(useSession().store, pick);
export const useDocument = (): DividerDocument => useInputs((state) => state.document);
export const useJudged = <T>(pick: (state: Judged) => T): T => useStore(useSession().judged, pick);
export const useLooking = <T>(pick: (state: Looking) => T): T => useStore(useSession().looking, pick);

const candidatesAsked = 60;

/** Asks for the outcome of every new document; the design chosen while it follows the brief is taken over into the document. */
export function judgeEveryChange(session: Session): () => void {
  const { store, judged, runner } = session;
  let settled: DividerDocument | null = null;
  let searched: DividerDocument | null = null;
  const search = (document: DividerDocument) => {
    searched = document;
    judged.setState({ searching: true });
    runner.long.ask({ kind: "size", document, top: candidatesAsked }, (answer) => {
      if (answer.kind === "done") judged.setState({ sizing: answer.outcome.sizing, searching: false });
      if (answer.kind === "refused") judged.setState({ sizing: null, searching: false });
    });
  };
  /** The field of a drawing that was proved without it; then the proof again. */
  const solve = (document: DividerDocument) => {
    judged.setState({ solving: true });
    runner.field.ask({ kind: "field", document }, (answer) => {
      if (answer.kind === "refused") judged.setState({ solving: false });
      if (answer.kind !== "done") return;
      judged.setState({ field: answer.outcome.field, solving: false });
      if (store.getState().document === document) prove(document);
    });
  };
  const prove = (document: DividerDocument) =>
    runner.check.ask({ kind: "prove", document, field: judged.getState().field }, (answer) => {
      if (answer.kind !== "done") return;
      judged.setState({ proof: answer.outcome.proof, document, took_ms: answer.took_ms });
      if (answer.outcome.awaitsField) solve(document);
    });
  /** The best candidate is chosen again, taken over into the document, and judged. */
  const choose = (document: DividerDocument) =>
    runner.check.ask({ kind: "follow", document, top: 1, field: judged.getState().field }, (answer) => {
      if (answer.kind === "refused") {
        judged.setState({ document, refusal: answer.refusal, stale: false, proof: null });
        return;
      }
      if (answer.kind !== "done") return;
      const { outcome, took_ms } = answer;
      judged.setState({ proof: outcome.proof, document: outcome.document, refusal: null, stale: false, took_ms });
      if (!sameQuestion(searched, document)) search(document);
      store.getState().adopt(document, outcome.document);
      settled = store.getState().document;
      judged.setState({ document: settled });
      if (outcome.awaitsField) solve(settled);
    });
  const ask = (document: DividerDocument) => {
    if (document === settled) return;
    judged.setState({ stale: true });
    const { design } = document;
    if (design === null) {
      choose(document);
      return;
    }
    // The design that stands is judged first, within a frame; a search takes longer and comes after it.
    runner.check.ask({ kind: "prove", document, field: judged.getState().field }, (answer) => {
      if (answer.kind !== "done" && answer.kind !== "refused") return;
      if (design.follows) {
        if (answer.kind === "done")
          judged.setState({ proof: answer.outcome.proof, document, refusal: null, took_ms: answer.took_ms });
        choose(document);
        return;
      }
      settled = document;
      const refusal = answer.kind === "refused" ? answer.refusal : null;
      const proof = answer.kind === "done" ? answer.outcome.proof : null;
      judged.setState({ proof, document, refusal, stale: false });
      if (answer.kind === "done") {
        judged.setState({ took_ms: answer.took_ms });
        if (answer.outcome.awaitsField) solve(document);
      }
      if (!sameQuestion(searched, document)) search(document);
    });
  };
  ask(store.getState().document);
  return store.subscribe((now, before) => {
    if (now.document !== before.document) queueMicrotask(() => ask(store.getState().document));
  });
}

/** Whether a search would find the same: the brief, the instruments and who reads. */
const sameQuestion = (a: DividerDocument | null, b: DividerDocument): boolean =>
  a !== null &&
  a.brief === b.brief &&
  a.instruments === b.instruments &&
  a.principal === b.principal &&
  ownParts(a) === ownParts(b);

const ownParts = ({ parts }: DividerDocument): string =>
  JSON.stringify(parts.filter((part) => part.origin !== "catalogue"));

export const newJudged = (): StoreApi<Judged> =>
  createStore<Judged>()(() => ({
    document: null,
    sizing: null,
    proof: null,
    refusal: null,
    stale: true,
    searching: false,
    field: null,
    solving: false,
    took_ms: 0,
  }));

export const newLooking = (): StoreApi<Looking> =>
  createStore<Looking>()(() => ({
    screen: "ask",
    element: null,
    why: null,
    field: null,
    notice: null,
    offline: false,
  }));

/** Opens the why of a figure beside the number that was pressed. */
export function openWhy(
  session: Session,
  path: string,
  index: number | null = null,
  from: WhyAsked["from"] = "proof",
): void {
  const box = document.activeElement?.getBoundingClientRect();
  const { scrollX, scrollY } = window;
  const at = {
    left: (box?.left ?? 80) + scrollX,
    top: (box?.top ?? 80) + scrollY,
    bottom: (box?.bottom ?? 80) + scrollY,
  };
  session.looking.setState({ why: { path, index, from, trail: [], at } });
}

/** Whether the page has a field for an input. */
export const hasField = (pointer: string): boolean =>
  /^\/(brief|instruments)\/|^\/design\/(geometry\/(footHeight|columnLength|columnDiameter|electrode)|hvArm\/elements\/\d+\/resistance_ohm$|lead\/|lvArm\/inductance_H$)/.test(
    pointer,
  );

/** Goes to the field of an input: opens what holds it, and puts the caret into it. */
export function goToField(session: Session, pointer: string): void {
  const { looking, store } = session;
  const element = /^\/design\/hvArm\/elements\/(\d+)\//.exec(pointer)?.[1];
  const inColumn = pointer.startsWith("/design/geometry");
  looking.setState({ why: null, field: pointer });
  if (element !== undefined) looking.setState({ element: Number(element) + 1 });
  else if (!inColumn) looking.setState({ screen: screenOf(pointer) });
  const focus = () => {
    if (looking.getState().field !== pointer) return;
    const field = document.querySelector<HTMLElement>(`[data-pointer="${CSS.escape(pointer)}"]`);
    field?.focus();
    field?.scrollIntoView({ block: "center" });
    looking.setState({ field: null });
  };
  if (store.getState().document.design === null && inColumn) return;
  setTimeout(focus, 60);
}

/** The screen that has the field of an input. */
function screenOf(pointer: string): ScreenName {
  if (pointer === "/brief/generator_Vpp") return "prove";
  return pointer.startsWith("/design/") ? "size" : "ask";
}
