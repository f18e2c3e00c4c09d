/** The worker's side: message in, one job run, message out. */
import { answer } from "./answer.ts";
import type { JobMessage, OutcomeMessage } from "./job.ts";
import { runJob } from "./runJob.ts";

declare const self: {
  onmessage: ((event: { readonly data: JobMessage }) => void) | null;
  postMessage(message: OutcomeMessage): void;
};

self.onmessage = ({ data }) => answer(data, runJob, (message) => self.postMessage(message));
