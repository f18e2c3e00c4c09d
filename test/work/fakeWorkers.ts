/** Workers of the tests: they keep what they were sent and say what the test tells them to. */
import type { JobMessage, OutcomeMessage } from "../../src/work/job.ts";
import type { WorkerLike } from "../../src/work/workerLike.ts";

export class FakeWorker implements WorkerLike {
  onmessage: unknown = null;
  onerror: unknown = null;
  onmessageerror: unknown = null;
  readonly sent: JobMessage[] = [];
  ended = false;

  postMessage(message: JobMessage): void {
    this.sent.push(message);
  }
  terminate(): void {
    this.ended = true;
  }
  say(message: OutcomeMessage): void {
    (this.onmessage as (event: { data: OutcomeMessage }) => void)({ data: message });
  }
  die(message: string): void {
    (this.onerror as (event: { message: string }) => void)({ message });
  }
  /** Answers job `number` with a document named after it. */
  finish(number: number): void {
    const { document } = this.sent.find((sent) => sent.number === number)!.job;
    this.say({
      number,
      kind: "done",
      outcome: { document, sizing: null, proof: null, field: null, awaitsField: false, through: null },
      took_ms: 1,
    });
  }
}

export class FakeWorkers {
  readonly all: FakeWorker[] = [];
  readonly start = (): FakeWorker => {
    const worker = new FakeWorker();
    this.all.push(worker);
    return worker;
  };
  get last(): FakeWorker {
    return this.all.at(-1)!;
  }
}
