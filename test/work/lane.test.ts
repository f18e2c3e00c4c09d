import fc from "fast-check";
import { beforeEach, describe, expect, it } from "vitest";
import type { DividerDocument } from "../../src/solver/index.ts";
import type { Job } from "../../src/work/job.ts";
import { type Answer, Lane } from "../../src/work/lane.ts";
import { createRunner } from "../../src/work/runner.ts";
import { FakeWorkers } from "./fakeWorkers.ts";

const job = (name: string): Job => ({ kind: "prove", document: { name } as DividerDocument });

let workers: FakeWorkers;
let heard: Answer[];
let time: number;
const hear = (answer: Answer) => void heard.push(answer);
const kinds = () => heard.map((answer) => `${answer.number} ${answer.kind}`);
const lane = (patience_ms = 1000) => new Lane({ startWorker: workers.start, now: () => time, patience_ms });

beforeEach(() => {
  workers = new FakeWorkers();
  heard = [];
  time = 0;
});

describe("a lane", () => {
  it("runs the newest of the jobs asked while one runs, in one warm worker", () => {
    const check = lane();
    for (const name of ["a", "b", "c", "d"]) check.ask(job(name), hear);
    expect(workers.last.sent.map((sent) => sent.number)).toEqual([1]);
    workers.last.finish(1);
    expect(workers.last.sent.map((sent) => sent.number)).toEqual([1, 4]);
    workers.last.finish(4);
    expect(kinds()).toEqual(["2 superseded", "3 superseded", "1 superseded", "4 done"]);
    expect(workers.all).toHaveLength(1);
  });

  it("never lets a late answer or late progress be heard", () => {
    const check = lane();
    check.ask(job("a"), hear);
    check.ask(job("b"), hear);
    workers.last.say({ number: 1, kind: "progress", share: 0.5 });
    workers.last.finish(1);
    workers.last.finish(1);
    workers.last.say({ number: 1, kind: "progress", share: 0.9 });
    expect(kinds()).toEqual(["1 superseded"]);
    workers.last.say({ number: 2, kind: "progress", share: 0.5 });
    workers.last.finish(2);
    expect(kinds()).toEqual(["1 superseded", "2 progress", "2 done"]);
  });

  it("loses patience with a job that holds up a newer one", () => {
    const check = lane(1000);
    check.ask(job("slow"), hear);
    const first = workers.last;
    time = 999;
    check.ask(job("b"), hear);
    expect(first.ended).toBe(false);
    time = 1000;
    check.ask(job("c"), hear);
    expect(first.ended).toBe(true);
    first.finish(1);
    workers.last.finish(3);
    expect(kinds()).toEqual(["2 superseded", "1 superseded", "3 done"]);
  });

  it("ends a job at once when it is cancelled and has a worker ready for the next", () => {
    const long = lane(0);
    const number = long.ask(job("a"), hear);
    const first = workers.last;
    expect(long.cancel(number)).toBe(true);
    expect(first.ended).toBe(true);
    expect(workers.all).toHaveLength(2);
    first.finish(1);
    expect(kinds()).toEqual(["1 cancelled"]);
    expect(long.cancel(number)).toBe(false);
    long.ask(job("b"), hear);
    workers.last.finish(2);
    expect(kinds()).toEqual(["1 cancelled", "2 done"]);
    expect(workers.all).toHaveLength(2);
  });

  it("cancels a job that waits; the older one that runs stays superseded", () => {
    const check = lane();
    check.ask(job("a"), hear);
    check.cancel(check.ask(job("b"), hear));
    workers.last.finish(1);
    expect(kinds()).toEqual(["2 cancelled", "1 superseded"]);
    expect(workers.all).toHaveLength(1);
  });

  it("replaces a worker that dies and tries its job once more, then explains", () => {
    const check = lane();
    check.ask(job("a"), hear);
    workers.last.die("out of memory");
    expect(heard).toEqual([]);
    expect(workers.all).toHaveLength(2);
    expect(workers.last.sent.map((sent) => sent.number)).toEqual([1]);
    workers.all[0]!.finish(1);
    expect(heard).toEqual([]);
    workers.last.die("out of memory");
    expect(kinds()).toEqual(["1 refused"]);
    expect(JSON.stringify(heard[0])).toContain("stopped twice: out of memory");
    check.ask(job("b"), hear);
    workers.last.finish(2);
    expect(kinds()).toEqual(["1 refused", "2 done"]);
    expect(workers.all).toHaveLength(3);
  });

  it("answers after a retry that goes well, and goes on to a newer job rather than retry an old one", () => {
    const check = lane();
    check.ask(job("a"), hear);
    workers.last.die("");
    workers.last.finish(1);
    check.ask(job("b"), hear);
    check.ask(job("c"), hear);
    workers.last.die("");
    workers.last.finish(3);
    expect(kinds()).toEqual(["1 done", "2 superseded", "3 done"]);
  });

  it("explains a worker that cannot be started or a message that cannot be sent", () => {
    const check = new Lane({
      startWorker: () => {
        throw new Error("no workers here");
      },
      now: () => 0,
      patience_ms: 0,
    });
    check.ask(job("a"), hear);
    expect(kinds()).toEqual(["1 refused"]);
    expect(JSON.stringify(heard[0])).toContain("no workers here");
  });

  it("hears nothing after it is closed", () => {
    const check = lane();
    check.ask(job("a"), hear);
    check.close();
    workers.last.finish(1);
    expect(heard).toEqual([]);
  });
});

it("ends every job in exactly one way and only the newest as done, whatever happens", () => {
  const events = fc.array(fc.constantFrom("ask", "finish", "die", "cancel", "late"), { maxLength: 40 });
  fc.assert(
    fc.property(events, fc.constantFrom(0, 5, 1000), (list, patience) => {
      workers = new FakeWorkers();
      heard = [];
      time = 0;
      const check = lane(patience);
      let asked = 0;
      for (const event of list) {
        time += 1;
        const sent = workers.all.at(-1)?.sent.at(-1)?.number;
        if (event === "ask") asked = check.ask(job("x"), hear);
        if (event === "finish" && sent !== undefined) workers.last.finish(sent);
        if (event === "die" && workers.all.length > 0) workers.last.die("");
        if (event === "cancel") check.cancel(asked);
        if (event === "late")
          for (const worker of workers.all)
            for (const { number } of worker.sent) if (number < asked) worker.finish(number);
        for (const answer of heard)
          if (answer.kind === "done") expect(heard.filter((a) => a.number === answer.number)).toHaveLength(1);
        if (heard.at(-1)?.kind === "done" && event === "finish") expect(heard.at(-1)?.number).toBe(asked);
      }
      while (check.busy) workers.last.finish(workers.last.sent.at(-1)!.number);
      expect(heard.map((a) => a.number).sort((a, b) => a - b)).toEqual(Array.from({ length: asked }, (_, i) => i + 1));
    }),
    { numRuns: 300 },
  );
});

it("gives checks and searches a worker each", () => {
  const runner = createRunner(workers.start, () => time);
  runner.check.ask(job("a"), hear);
  runner.long.ask(job("b"), hear);
  runner.long.ask(job("c"), hear);
  expect(workers.all.map((worker) => worker.ended)).toEqual([false, true, false]);
  runner.close();
  expect(workers.all.every((worker) => worker.ended)).toBe(true);
});
