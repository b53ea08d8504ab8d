/** Bundles the terminal command, the language server (Node and Web Worker), the extension (Node and browser) and the panel into dist/. */
import { copyFile, readdir, rm } from "node:fs/promises";
import { type BuildOptions, build, type Plugin } from "esbuild";

const shared: BuildOptions = {
  bundle: true,
  minify: true,
  legalComments: "none",
  target: "es2022",
  logLevel: "warning",
  outdir: "dist",
};

/** A browser cannot list a folder of an extension, so the names of the examples are put in here. */
const exampleNotes = (await readdir("media/example-notes")).filter((name) => /\.(md|txt)$/.test(name)).sort();
const editor: BuildOptions = {
  ...shared,
  external: ["vscode"],
  format: "cjs",
  define: { EXAMPLE_NOTES: JSON.stringify(exampleNotes) },
};

/** The structure toolkit is one module for Node and the worker: a dynamic import of it stays an import, beside the file that makes it. */
const structuresApart: Plugin = {
  name: "structures-apart",
  setup(bundler) {
    bundler.onResolve({ filter: /\/compounds\/structure\.ts$/ }, ({ kind }) =>
      kind === "dynamic-import" ? { path: "./structures.mjs", external: true } : undefined,
    );
  },
};

await rm("dist", { recursive: true, force: true });
await Promise.all([
  build({
    ...shared,
    entryPoints: { structures: "shared-lib/compounds/structure.ts" },
    platform: "neutral",
    format: "esm",
    mainFields: ["module", "main"],
    outExtension: { ".js": ".mjs" },
  }),
  // One set of chunks for the terminal and the server, all in one folder so that they find the toolkit beside them.
  build({
    ...shared,
    entryPoints: { oxomargin: "client/terminal/main.ts", "server-node": "server/start-node.ts" },
    platform: "node",
    format: "esm",
    splitting: true,
    outExtension: { ".js": ".mjs" },
    chunkNames: "shared-[hash]",
    plugins: [structuresApart],
    banner: { js: "import{createRequire as __cr}from'node:module';const require=__cr(import.meta.url);" },
  }),
  build({
    ...editor,
    entryPoints: { "client-node": "client/editor/start-node.ts" },
    platform: "node",
    outExtension: { ".js": ".cjs" },
  }),
  // The browser host appends .js to the name of its entry.
  build({ ...editor, entryPoints: { "client-browser": "client/editor/start-browser.ts" }, platform: "browser" }),
  build({
    ...shared,
    entryPoints: {
      "server-worker": "server/start-worker.ts",
      panel: "client/editor/panel/page/page.ts",
    },
    platform: "browser",
    format: "iife",
  }),
]);
await copyFile("node_modules/uplot/dist/uPlot.min.css", "dist/panel.css");
