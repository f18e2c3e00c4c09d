import { useCallback } from "react";
import type { Done, Store } from "../../store/state.ts";
import { useSession } from "./session.ts";

/** Runs an action of the store; a refusal is said in the notice line. */
export function useApply(): (action: (store: Store) => Done) => Done {
  const session = useSession();
  return useCallback(
    (action) => {
      const done = action(session.store.getState());
      if (!done.ok) session.looking.setState({ notice: { text: `${done.error.why} ${done.error.cure}`, bad: true } });
      return done;
    },
    [session],
  );
}
