import type { Result } from "../solver/index.ts";
import type { JobMessage, Outcome, OutcomeMessage } from "./job.ts";
import type { jobsOf } from "./outcomeOf.ts";

/** Runs the job of a message and posts what comes of it; a fault of the program is said, not thrown. */
export function answer(
  { number, job }: JobMessage,
  run: ReturnType<typeof jobsOf>,
  post: (message: OutcomeMessage) => void,
  now: () => number = Date.now,
): void {
  const from = now();
  const result = guarded(() => run(job, (share) => post({ number, kind: "progress", share })));
  if (result.ok) post({ number, kind: "done", outcome: result.value, took_ms: now() - from });
  else post({ number, kind: "refused", refusal: result.error });
}

function guarded(run: () => Result<Outcome>): Result<Outcome> {
  try {
    return run();
  } catch (error) {
    const what = error instanceof Error ? error.message : String(error);
    const why = `The computation stopped: ${what}. That is a fault of the program, not of what was typed.`;
    return { ok: false, error: { where: "the computation", why, cure: "Undo the last step; nothing typed is lost." } };
  }
}
