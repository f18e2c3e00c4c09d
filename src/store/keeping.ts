/** Where each key of the state goes. A key without an answer does not compile. */
import type { State } from "./state.ts";

interface Keeping {
  /** Into the file that the engineer saves. */
  readonly file: boolean;
  /** Into the copy that this browser keeps. */
  readonly browser: boolean;
}

export const keeping = {
  document: { file: true, browser: true },
  file: { file: false, browser: true },
  /** Found again by comparing: nothing unsaved means that the document is what the file holds. */
  saved: { file: false, browser: false },
  past: { file: false, browser: true },
  future: { file: false, browser: true },
  typing: { file: false, browser: false },
  browserCopy: { file: false, browser: false },
} as const satisfies Readonly<Record<keyof State, Keeping>>;

export type BrowserKey = {
  [K in keyof State]: (typeof keeping)[K]["browser"] extends true ? K : never;
}[keyof State];
