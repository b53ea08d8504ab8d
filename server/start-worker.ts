/** The language server in a Web Worker. The structure toolkit is a module of its own, fetched from the extension when first needed. */

import { BrowserMessageReader, BrowserMessageWriter, createConnection } from "vscode-languageserver/browser";
import { wire } from "./wire.ts";

type StructureModule = typeof import("../shared-lib/compounds/structure.ts");

wire(createConnection(new BrowserMessageReader(globalThis as never), new BrowserMessageWriter(globalThis as never)), {
  loadStructures: async ({ structuresModule }) => {
    if (structuresModule === undefined) throw new Error("the client did not say where the module is");
    const module = (await import(structuresModule)) as StructureModule;
    return module.createStructureToolkit();
  },
});
