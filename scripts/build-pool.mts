/** Puts the thread library's own worker beside the bundles, where the library looks for it. */

import { build } from "esbuild";

await build({
  entryPoints: ["node_modules/tinypool/dist/entry/worker.js"],
  outfile: "dist/entry/worker.js",
  bundle: true,
  minify: true,
  legalComments: "none",
  platform: "node",
  format: "esm",
  target: "es2022",
  logLevel: "warning",
});
