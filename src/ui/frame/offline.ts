import type { Session } from "./session.ts";

/** Registers the service worker of the built page and has it keep every file once the page has painted. */
export function keepOffline(session: Session): void {
  if (!import.meta.env.PROD || !("serviceWorker" in navigator)) return;
  navigator.serviceWorker.addEventListener("message", (event) => {
    if (event.data === "ready offline") session.looking.setState({ offline: true });
  });
  const idle = (run: () => void) => ("requestIdleCallback" in window ? requestIdleCallback(run) : setTimeout(run, 500));
  idle(async () => {
    await navigator.serviceWorker.register("./offline.js");
    const { active } = await navigator.serviceWorker.ready;
    active?.postMessage("keep everything");
  });
}
