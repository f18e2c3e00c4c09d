import { answer } from "./answer.ts";
import type { JobMessage, OutcomeMessage } from "./job.ts";
import type { jobsOf } from "./outcomeOf.ts";
import type { WorkerLike } from "./workerLike.ts";

/** Stands in where there are no workers (a test, a page that may not start one): the same jobs on this thread, one turn later. */
export function inlineWorker(run: ReturnType<typeof jobsOf>): WorkerLike {
  let stopped = false;
  const worker: WorkerLike & { onmessage: unknown } = {
    onmessage: null,
    onerror: null,
    onmessageerror: null,
    postMessage: (message: JobMessage) => {
      void Promise.resolve().then(() => {
        if (!stopped) answer(message, run, post);
      });
    },
    terminate: () => {
      stopped = true;
    },
  };
  const post = (data: OutcomeMessage) => {
    const hear = worker.onmessage as ((event: { readonly data: OutcomeMessage }) => void) | null;
    if (!stopped) hear?.({ data });
  };
  return worker;
}
