/**
 * Joins a connection to the features. Knows nothing of the host: start-node.ts and start-worker.ts give it a connection and a way
 * to load the structure toolkit. Every handler runs behind a guard, so that a fault in one feature leaves the others working.
 */

import {
  type Connection,
  type InitializeParams,
  type InitializeResult,
  TextDocumentSyncKind,
  TextDocuments,
} from "vscode-languageserver";
import { TextDocument } from "vscode-languageserver-textdocument";
import type { StructureToolkit } from "../shared-lib/compounds/types.ts";
import { abilitiesOf, type ClientAbilities } from "./abilities.ts";
import { answerEditor } from "./answer-editor.ts";
import { answerOwnClient, ESTIMATE_COMMAND } from "./answer-own-client.ts";
import { createConfiguration } from "./configuration.ts";
import { createDrawings } from "./drawings.ts";
import { createEngine } from "./engine.ts";
import { FIX_ALL, LEDGER } from "./features/code-actions.ts";
import { LEGEND } from "./features/semantic-tokens.ts";
import { createGuard } from "./guard.ts";
import { createNoteStore, type OpenNote } from "./notes.ts";
import type { StartOptions } from "./protocol.ts";
import { createPublisher } from "./publisher.ts";

export interface ServerHost {
  loadStructures(options: StartOptions): Promise<StructureToolkit>;
}

/** Puts every handler on the connection and listens. */
export function wire(connection: Connection, host: ServerHost): void {
  let abilities: ClientAbilities = abilitiesOf({}, {});
  let startOptions: StartOptions = {};
  const engine = createEngine(
    () => host.loadStructures(startOptions),
    (problem) => connection.console.error(problem),
  );
  const documents = new TextDocuments(TextDocument);
  const store = createNoteStore(engine);
  const configuration = createConfiguration(connection, () => abilities);
  const drawings = createDrawings(engine.structures);
  const guard = createGuard((message) => connection.console.error(message));

  /** The note at its present version, or undefined for one that is not open or too long. */
  const noteAt = async (uri: string): Promise<OpenNote | undefined> => {
    const settings = await configuration.of(uri);
    const document = documents.get(uri);
    if (!document) return undefined;
    const note = store.open(document, settings);
    if (note?.analysis.reading.needsStructures && !engine.structures()) void learnStructures();
    return note;
  };
  const publisher = createPublisher({
    connection,
    documents,
    noteAt,
    configuration,
    abilities: () => abilities,
    guard,
  });

  let learning: Promise<void> | undefined;
  /** Loads the toolkit once and reads every open note again with it. */
  const learnStructures = (): Promise<void> => {
    learning ??= engine.loadStructures().then((toolkit) => {
      if (toolkit) publisher.refresh(() => store.forgetAll());
    });
    return learning;
  };

  connection.onInitialize((params) => {
    startOptions = (params.initializationOptions ?? {}) as StartOptions;
    abilities = abilitiesOf(params.capabilities, startOptions);
    configuration.start(startOptions);
    if (startOptions.theme) drawings.setTheme(startOptions.theme);
    return serverAbilities(params, abilities);
  });
  connection.onInitialized(() => configuration.subscribe(() => publisher.refresh(() => store.forgetAll())));
  documents.onDidChangeContent(({ document }) => publisher.later(document.uri));
  documents.onDidClose(({ document }) => {
    store.forget(document.uri);
    configuration.forget(document.uri);
    publisher.clear(document.uri);
  });

  const context = { connection, guard, engine, noteAt, configuration, drawings, abilities: () => abilities };
  answerEditor(context);
  answerOwnClient({ ...context, refresh: () => publisher.refresh(() => store.forgetAll()) });
  documents.listen(connection);
  connection.listen();
}

function serverAbilities(params: InitializeParams, abilities: ClientAbilities): InitializeResult {
  return {
    serverInfo: { name: "oxomargin" },
    capabilities: {
      positionEncoding: "utf-16",
      textDocumentSync: { openClose: true, change: TextDocumentSyncKind.Incremental },
      hoverProvider: true,
      codeActionProvider: { codeActionKinds: ["quickfix", FIX_ALL, LEDGER] },
      inlayHintProvider: { resolveProvider: true },
      codeLensProvider: { resolveProvider: false },
      documentSymbolProvider: true,
      foldingRangeProvider: true,
      selectionRangeProvider: true,
      completionProvider: { triggerCharacters: [] },
      definitionProvider: true,
      referencesProvider: true,
      renameProvider: params.capabilities.textDocument?.rename?.prepareSupport ? { prepareProvider: true } : true,
      semanticTokensProvider: { legend: LEGEND, full: true },
      executeCommandProvider: { commands: [ESTIMATE_COMMAND] },
      ...(abilities.pullsDiagnostics
        ? { diagnosticProvider: { interFileDependencies: false, workspaceDiagnostics: false } }
        : {}),
    },
  };
}
