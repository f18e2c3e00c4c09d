/**
 * One worker and the newest job. Jobs are numbered; an answer is heard only while its job is the newest asked for, so a late one
 * can never be shown. A worker that dies is replaced and its job tried once more, then explained. To cancel is to terminate.
 */
import type { Refusal } from "../solver/index.ts";
import type { Job, Outcome, OutcomeMessage } from "./job.ts";
import type { WorkerLike } from "./workerLike.ts";

export type Answer =
  | { readonly kind: "done"; readonly number: number; readonly outcome: Outcome; readonly took_ms: number }
  | { readonly kind: "refused"; readonly number: number; readonly refusal: Refusal }
  | { readonly kind: "progress"; readonly number: number; readonly share: number }
  /** A newer job took its place; nothing is to be shown. */
  | { readonly kind: "superseded"; readonly number: number }
  | { readonly kind: "cancelled"; readonly number: number };

export type Hear = (answer: Answer) => void;

export interface LaneOptions {
  readonly startWorker: () => WorkerLike;
  /** Milliseconds; only differences are used. */
  readonly now: () => number;
  /** A running job that a newer one supersedes is let finish for this long, then terminated; 0: at once. */
  readonly patience_ms: number;
}

interface Asked {
  readonly number: number;
  readonly job: Job;
  readonly hear: Hear;
  tries: number;
  since_ms: number;
}

export class Lane {
  readonly #options: LaneOptions;
  #worker: WorkerLike | null = null;
  #running: Asked | null = null;
  #waiting: Asked | null = null;
  #count = 0;
  constructor(options: LaneOptions) {
    this.#options = options;
  }

  /** Starts the worker ahead of the first job. */
  warm(): void {
    if (this.#worker === null) this.#hire();
  }

  get busy(): boolean {
    return this.#running !== null;
  }

  /** Asks for a job in place of any asked before; returns its number. */
  ask(job: Job, hear: Hear): number {
    this.#count += 1;
    const asked: Asked = { number: this.#count, job, hear, tries: 0, since_ms: 0 };
    this.#supersede(this.#waiting);
    this.#waiting = asked;
    const running = this.#running;
    if (running !== null && this.#options.now() - running.since_ms >= this.#options.patience_ms) this.#dismiss();
    if (this.#running === null) this.#next();
    return asked.number;
  }

  /** Ends a job at once; its worker is replaced. False when it is over already. */
  cancel(number: number): boolean {
    const asked = [this.#running, this.#waiting].find((one) => one?.number === number);
    if (asked == null) return false;
    if (asked === this.#waiting) this.#waiting = null;
    else {
      this.#running = null;
      this.#retire();
    }
    asked.hear({ kind: "cancelled", number });
    if (this.#running === null) this.#next();
    this.warm();
    return true;
  }

  /** Ends everything; nothing is heard any more. */
  close(): void {
    this.#retire();
    this.#running = null;
    this.#waiting = null;
  }

  #supersede(asked: Asked | null): void {
    asked?.hear({ kind: "superseded", number: asked.number });
  }

  /** Terminates the worker in the middle of a job that is no longer wanted. */
  #dismiss(): void {
    this.#retire();
    const asked = this.#running;
    this.#running = null;
    this.#supersede(asked);
  }

  #retire(): void {
    const worker = this.#worker;
    this.#worker = null;
    worker?.terminate();
  }

  #next(): void {
    const asked = this.#waiting;
    this.#waiting = null;
    if (asked !== null) this.#run(asked);
  }

  #run(asked: Asked): void {
    asked.tries += 1;
    asked.since_ms = this.#options.now();
    this.#running = asked;
    try {
      (this.#worker ?? this.#hire()).postMessage({ number: asked.number, job: asked.job });
    } catch (error) {
      this.#died(error instanceof Error ? error.message : String(error));
    }
  }

  #hire(): WorkerLike {
    const worker = this.#options.startWorker();
    this.#worker = worker;
    worker.onmessage = ({ data }: { readonly data: OutcomeMessage }) => {
      if (this.#worker === worker) this.#heard(data);
    };
    const died = (event: { readonly message?: string }) => {
      if (this.#worker === worker) this.#died(event?.message ?? "");
    };
    worker.onerror = died;
    worker.onmessageerror = died;
    return worker;
  }

  #heard(message: OutcomeMessage): void {
    const asked = this.#running;
    if (asked === null || message.number !== asked.number) return;
    const late = asked.number < this.#count;
    if (message.kind === "progress") {
      if (!late) asked.hear(message);
      return;
    }
    this.#running = null;
    if (late) this.#supersede(asked);
    else asked.hear(message);
    if (this.#running === null) this.#next();
  }

  #died(what: string): void {
    this.#retire();
    const asked = this.#running;
    this.#running = null;
    if (asked === null) return;
    if (asked.number < this.#count) this.#supersede(asked);
    else if (asked.tries < 2) this.#waiting = asked;
    else asked.hear({ kind: "refused", number: asked.number, refusal: deadWorker(what) });
    if (this.#running === null) this.#next();
  }
}

const deadWorker = (what: string): Refusal => ({
  where: "the computation",
  why: `Its worker stopped twice${what === "" ? ", perhaps for want of memory" : `: ${what}`}.`,
  cure: "Undo the last step or ask for less; nothing typed is lost.",
});
