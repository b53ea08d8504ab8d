/** Bundles the terminal command, the language server (Node and Web Worker) and the extension (Node and browser) into dist/. */
import { rm } from "node:fs/promises";
import { type BuildOptions, build } from "esbuild";

const shared: BuildOptions = {
  bundle: true,
  minify: true,
  legalComments: "none",
  target: "es2022",
  logLevel: "warning",
  outdir: "dist",
};

await rm("dist", { recursive: true, force: true });
await Promise.all([
  // One set of chunks for the terminal and the server: the structure toolkit is a chunk of its own, loaded on first need.
  build({
    ...shared,
    entryPoints: { oxomargin: "client/terminal/main.ts", "server-node": "server/start-node.ts" },
    platform: "node",
    format: "esm",
    splitting: true,
    outExtension: { ".js": ".mjs" },
    chunkNames: "chunks/[name]-[hash]",
    banner: { js: "import{createRequire as __cr}from'node:module';const require=__cr(import.meta.url);" },
  }),
  build({
    ...shared,
    entryPoints: { "client-node": "client/editor/start-node.ts" },
    platform: "node",
    format: "cjs",
    external: ["vscode"],
    outExtension: { ".js": ".cjs" },
  }),
  build({
    ...shared,
    entryPoints: { "client-browser": "client/editor/start-browser.ts" },
    platform: "browser",
    format: "cjs",
    external: ["vscode"],
    outExtension: { ".js": ".cjs" },
  }),
  build({
    ...shared,
    entryPoints: { "server-worker": "server/start-worker.ts" },
    platform: "browser",
    format: "iife",
  }),
]);
