/** Undo and redo as pure functions on the state: 200 named steps, typing in one field is one. */
import type { Snapshot, State, Step } from "./state.ts";

export const mostSteps = 200;

type Past = Pick<State, "past" | "future" | "typing">;

export const snapshotOf = (state: State): Snapshot => ({ document: state.document, example: state.file.example });

/** The histories after a step that leaves `state` behind; `field` names a field whose typing may go on. */
export function stepped(state: State, name: string, field: string | null): Past {
  const goesOn = field !== null && state.typing === field && state.past.length > 0;
  const past = goesOn ? state.past : [...state.past, { name, snapshot: snapshotOf(state) }].slice(-mostSteps);
  return { past, future: [], typing: field };
}

/** Moves one step from `from` onto `to`; null when there is none. */
function moved(state: State, from: readonly Step[], to: readonly Step[]) {
  const step = from.at(-1);
  if (step === undefined) return null;
  return {
    snapshot: step.snapshot,
    from: from.slice(0, -1),
    to: [...to, { name: step.name, snapshot: snapshotOf(state) }],
  };
}

export function undone(state: State): (Past & { readonly snapshot: Snapshot }) | null {
  const move = moved(state, state.past, state.future);
  return move === null ? null : { past: move.from, future: move.to, typing: null, snapshot: move.snapshot };
}

export function redone(state: State): (Past & { readonly snapshot: Snapshot }) | null {
  const move = moved(state, state.future, state.past);
  return move === null ? null : { past: move.to, future: move.from, typing: null, snapshot: move.snapshot };
}

/** Names of the steps that undo would take back, newest first. */
export const undoNames = (state: State): readonly string[] => state.past.map((step) => step.name).reverse();
/** Names of the steps that redo would bring again, next first. */
export const redoNames = (state: State): readonly string[] => state.future.map((step) => step.name).reverse();
