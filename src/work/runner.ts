import { Lane } from "./lane.ts";
import type { WorkerLike } from "./workerLike.ts";

/** A new check waits this long for the one that runs before it is terminated. */
const checkPatience_ms = 1000;
/** A drawing that is dragged asks again and again: what runs is let finish, so that something comes while it moves. */
const fieldPatience_ms = 3000;

export interface Runner {
  /** The current design: kept warm, newest job only; one asked for while another runs waits, and replaces any that waits. */
  readonly check: Lane;
  /** Search and the like: a new one ends the one that runs. */
  readonly long: Lane;
  /** The field of the drawing: one asked for while another runs waits, and replaces any that waits. */
  readonly field: Lane;
  /** A recorded waveform through the design: a new one ends the one that runs. */
  readonly through: Lane;
  /** What a panel in view asks for beyond the proof; one asked for while another runs waits, and replaces any that waits. */
  readonly view: Lane;
  readonly close: () => void;
}

/** Five lanes of work, each with a worker of its own, started when first needed. */
export function createRunner(startWorker: () => WorkerLike, now: () => number = Date.now): Runner {
  const check = new Lane({ startWorker, now, patience_ms: checkPatience_ms });
  const long = new Lane({ startWorker, now, patience_ms: 0 });
  const field = new Lane({ startWorker, now, patience_ms: fieldPatience_ms });
  const through = new Lane({ startWorker, now, patience_ms: 0 });
  const view = new Lane({ startWorker, now, patience_ms: checkPatience_ms });
  return {
    check,
    long,
    field,
    through,
    view,
    close: () => {
      check.close();
      long.close();
      field.close();
      through.close();
      view.close();
    },
  };
}
