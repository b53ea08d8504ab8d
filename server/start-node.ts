/** The language server in Node: over IPC when the editor forks it, over standard input and output with --stdio. */

import { createConnection, ProposedFeatures } from "vscode-languageserver/node";
import { wire } from "./wire.ts";

wire(createConnection(ProposedFeatures.all), {
  loadStructures: async () => (await import("../shared-lib/compounds/structure.ts")).createStructureToolkit(),
});
