import { createHash } from "node:crypto";
import { readdirSync, readFileSync } from "node:fs";
import react from "@vitejs/plugin-react";
import type { Plugin } from "vite";
import { configDefaults, defineConfig } from "vitest/config";
import { PlainCount } from "./test/support/plainCount.ts";

const policy =
  "default-src 'none'; script-src 'self'; style-src 'self'; img-src 'self' blob: data:; font-src 'self'; worker-src 'self'; connect-src 'self'; manifest-src 'self'; base-uri 'none'; object-src 'none'; form-action 'none'";

/** The shut doors, put first in the built page's head (development needs inline scripts). */
const contentSecurityPolicy: Plugin = {
  name: "content-security-policy",
  apply: "build",
  transformIndexHtml: {
    order: "post",
    handler: () => [
      { tag: "meta", attrs: { "http-equiv": "Content-Security-Policy", content: policy }, injectTo: "head-prepend" },
    ],
  },
};

/** Writes the service worker with the list of built files, so that the page works with the server stopped. */
const offline: Plugin = {
  name: "offline",
  apply: "build",
  generateBundle(_, bundle) {
    const shipped = readdirSync(new URL("./public", import.meta.url)).filter((name) => !name.endsWith(".json"));
    const files = [...Object.keys(bundle).filter((name) => !name.endsWith(".map")), ...shipped];
    const hash = createHash("sha256");
    for (const name of files.sort()) {
      const item = bundle[name];
      const body =
        item === undefined
          ? readFileSync(new URL(`./public/${name}`, import.meta.url))
          : item.type === "chunk"
            ? item.code
            : item.source;
      hash.update(name).update(body);
    }
    const source = readFileSync(new URL("./src/start/offline.js", import.meta.url), "utf8")
      .replace("__FILES__", JSON.stringify(["./", ...files.filter((f) => f !== "index.html")]))
      .replace("__VERSION__", hash.digest("hex").slice(0, 16));
    this.emitFile({ type: "asset", fileName: "offline.js", source });
  },
};

const shell = (entry: string) => ({
  ssr: { noExternal: true as const },
  build: {
    ssr: entry,
    outDir: "dist-cli",
    emptyOutDir: false,
    copyPublicDir: false,
    target: "node20",
    rolldownOptions: { output: { entryFileNames: "[name].js", chunkFileNames: "[name]-[hash].js" } },
  },
});

export default defineConfig(({ command, mode }) => {
  process.env.NODE_ENV = command === "build" ? "production" : process.env.VITEST ? "test" : "development";
  const project = (name: string, include: string[], extra: object = {}) => ({
    extends: true as const,
    test: { name, include, exclude: configDefaults.exclude, ...extra },
  });
  return {
    base: "./",
    plugins: mode === "cli" || mode === "bench" ? [] : [react(), contentSecurityPolicy, offline],
    worker: { format: "es" as const },
    ...(mode === "cli" ? shell("src/cli/stringwright.ts") : {}),
    ...(mode === "bench" ? shell("test/bench/bench.ts") : {}),
    ...(mode === "cli" || mode === "bench"
      ? {}
      : { build: { target: "es2023", assetsInlineLimit: 0, modulePreload: { polyfill: false } } }),
    test: {
      reporters: ["default", new PlainCount()],
      projects: [
        project("unit", ["test/{solver,work,file,cli,published,rules}/**/*.test.ts"], {
          environment: "node",
          testTimeout: 30_000,
        }),
        project("page", ["test/{store,ui}/**/*.test.{ts,tsx}"], {
          environment: "happy-dom",
          setupFiles: ["test/support/page.ts"],
        }),
        project("browser", ["test/browser/**/*.test.ts"], {
          environment: "node",
          fileParallelism: false,
          testTimeout: 60_000,
          hookTimeout: 120_000,
        }),
      ],
    },
  };
});
