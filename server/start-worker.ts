/** The language server in a Web Worker. The structure toolkit is a script of its own, fetched from the extension when first needed. */

import { BrowserMessageReader, BrowserMessageWriter, createConnection } from "vscode-languageserver/browser";
import type { StructureToolkit } from "../shared-lib/compounds/types.ts";
import { wire } from "./wire.ts";

interface WorkerScope {
  importScripts(address: string): void;
  /** What structures-script.ts leaves behind. */
  oxomarginStructures?: () => StructureToolkit;
}

const scope = globalThis as unknown as WorkerScope;

wire(createConnection(new BrowserMessageReader(globalThis as never), new BrowserMessageWriter(globalThis as never)), {
  loadStructures: async ({ structuresScript }) => {
    if (structuresScript === undefined) throw new Error("the client did not say where the script is");
    scope.importScripts(structuresScript);
    if (!scope.oxomarginStructures) throw new Error("the script holds no toolkit");
    return scope.oxomarginStructures();
  },
});
