import { Lane } from "./lane.ts";
import type { WorkerLike } from "./workerLike.ts";

/** A new check waits this long for the one that runs before it is terminated. */
const checkPatience_ms = 1000;

export interface Runner {
  /** The current design: kept warm, newest job only; one asked for while another runs waits, and replaces any that waits. */
  readonly check: Lane;
  /** Search and the like: a new one ends the one that runs. */
  readonly long: Lane;
  readonly close: () => void;
}

/** Two lanes of work, each with a worker of its own, started when first needed. */
export function createRunner(startWorker: () => WorkerLike, now: () => number = Date.now): Runner {
  const check = new Lane({ startWorker, now, patience_ms: checkPatience_ms });
  const long = new Lane({ startWorker, now, patience_ms: 0 });
  return {
    check,
    long,
    close: () => {
      check.close();
      long.close();
    },
  };
}
