/* Service worker: keeps every built file, answers from there first, never asks another origin. The build fills in the list. */
const files = __FILES__;
const kept = "stringwright-__VERSION__";

self.addEventListener("install", (event) => {
  event.waitUntil(self.skipWaiting());
});

self.addEventListener("activate", (event) => {
  event.waitUntil(
    (async () => {
      for (const name of await caches.keys()) if (name !== kept) await caches.delete(name);
      await self.clients.claim();
    })(),
  );
});

/** The page asks for this once it has painted: everything is fetched once, then no request goes out any more. */
self.addEventListener("message", (event) => {
  if (event.data !== "keep everything") return;
  event.waitUntil(
    (async () => {
      const cache = await caches.open(kept);
      for (const file of files) {
        if (await cache.match(file, { ignoreVary: true, ignoreSearch: true })) continue;
        const response = await fetch(file, { cache: "no-cache" });
        if (!response.ok) return;
        await cache.put(file, response);
      }
      for (const client of await self.clients.matchAll()) client.postMessage("ready offline");
    })(),
  );
});

self.addEventListener("fetch", (event) => {
  const url = new URL(event.request.url);
  if (event.request.method !== "GET" || url.origin !== self.location.origin) return;
  event.respondWith(
    (async () => {
      const cache = await caches.open(kept);
      const wanted = event.request.mode === "navigate" ? "./" : event.request;
      return (await cache.match(wanted, { ignoreVary: true, ignoreSearch: true })) ?? fetch(event.request);
    })(),
  );
});
