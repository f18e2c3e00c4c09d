import type { JobMessage } from "./job.ts";

/** As much of a worker as is used here; a page's `Worker` fits. */
export interface WorkerLike {
  onmessage: unknown;
  onerror: unknown;
  onmessageerror: unknown;
  postMessage(message: JobMessage): void;
  terminate(): void;
}
