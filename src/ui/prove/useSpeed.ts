import { useEffect, useState } from "react";
import type { Speed } from "../../solver/index.ts";
import { useJudged, useSession } from "../frame/session.ts";

/** The answer on speed for the design that is judged, asked for while Prove is on the screen; the last one stands until a newer comes. */
export function useSpeed(): Speed | null {
  const { runner } = useSession();
  const document_ = useJudged((state) => state.document);
  const field = useJudged((state) => state.field);
  const stale = useJudged((state) => state.stale);
  const [held, setHeld] = useState<Speed | null>(null);
  useEffect(() => {
    if (stale || document_ === null || document_.design === null) return;
    runner.view.ask({ kind: "speed", document: document_, field }, (answer) => {
      if (answer.kind !== "done" || answer.outcome.speed === undefined) return;
      setHeld(answer.outcome.speed);
    });
  }, [runner, stale, document_, field]);
  return held;
}
