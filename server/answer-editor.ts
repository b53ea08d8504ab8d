/** Requests of the language server protocol, each answered by its feature. */

import type { Connection } from "vscode-languageserver";
import type { ClientAbilities } from "./abilities.ts";
import type { Configuration } from "./configuration.ts";
import type { Drawings } from "./drawings.ts";
import type { Engine } from "./engine.ts";
import { cardActions, OPEN_PANEL } from "./features/card-actions.ts";
import { codeActionsOf } from "./features/code-actions.ts";
import { codeLensesOf } from "./features/code-lens.ts";
import { completionsOf } from "./features/completion.ts";
import { diagnosticsOf } from "./features/diagnostics.ts";
import { hoverOf } from "./features/hover.ts";
import { type HintData, inlayHintsOf, resolveInlayHint } from "./features/inlay-hints.ts";
import { definitionOf, referencesOf, renameOf, renameRange } from "./features/labels.ts";
import { foldsOf, selectionsOf, symbolsOf } from "./features/outline.ts";
import { semanticTokensOf } from "./features/semantic-tokens.ts";
import type { Guard } from "./guard.ts";
import type { OpenNote } from "./notes.ts";

export interface AnswerContext {
  readonly connection: Connection;
  readonly guard: Guard;
  readonly engine: Engine;
  readonly noteAt: (uri: string) => Promise<OpenNote | undefined>;
  readonly configuration: Configuration;
  readonly drawings: Drawings;
  readonly abilities: () => ClientAbilities;
}

interface OfDocument {
  readonly textDocument: { readonly uri: string };
}

export function answerEditor(context: AnswerContext): void {
  const { connection, guard, noteAt, abilities } = context;
  /** A handler that needs the analysed note and answers with nothing where there is none. */
  const ofNote = <P extends OfDocument, R>(
    name: string,
    nothing: R,
    answer: (note: OpenNote, params: P) => R | Promise<R>,
  ) =>
    guard<P, R>(name, nothing, async (params) => {
      const note = await noteAt(params.textDocument.uri);
      return note ? await answer(note, params) : nothing;
    });

  connection.onHover(ofNote("hover", null, (note, params) => hover(context, note, params)));
  connection.onCodeAction(
    ofNote("code action", [], (note, params) =>
      codeActionsOf(note, params, { pages: abilities().pages, lexicon: context.engine.lexicon() }),
    ),
  );
  connection.onCodeLens(
    ofNote("code lens", [], (note) => {
      if (!note.settings.codeLens) return [];
      return codeLensesOf(note, abilities().commandLinks ? { command: OPEN_PANEL } : {});
    }),
  );
  connection.onDocumentSymbol(ofNote("outline", [], symbolsOf));
  connection.onFoldingRanges(ofNote("folding", [], foldsOf));
  connection.onSelectionRanges(ofNote("selection", [], (note, params) => selectionsOf(note, params.positions)));
  connection.onCompletion(ofNote("completion", [], (note, params) => completionsOf(note, params.position)));
  connection.onDefinition(ofNote("definition", null, (note, params) => definitionOf(note, params.position) ?? null));
  connection.onReferences(ofNote("references", [], (note, params) => referencesOf(note, params.position)));
  connection.onPrepareRename(ofNote("rename", null, (note, params) => renameRange(note, params.position) ?? null));
  connection.onRenameRequest(
    ofNote("rename", null, (note, params) => renameOf(note, params.position, params.newName) ?? null),
  );
  connection.languages.semanticTokens.on(ofNote("semantic tokens", { data: [] }, semanticTokensOf));
  connection.languages.inlayHint.on(ofNote("hints", [], (note, params) => inlayHintsOf(note, params.range)));
  connection.languages.inlayHint.resolve(
    guard("hint tooltip", undefined as never, async (hint) => {
      const data = hint.data as HintData | undefined;
      return resolveInlayHint(hint, data ? await noteAt(data.uri) : undefined);
    }),
  );
  connection.languages.diagnostics.on(
    guard("findings", { kind: "full" as const, items: [] }, async (params) => {
      const note = await noteAt(params.textDocument.uri);
      return { kind: "full" as const, items: note ? diagnosticsOf(note, { pages: abilities().pages }) : [] };
    }),
  );
}

async function hover(
  { engine, drawings, abilities }: AnswerContext,
  note: OpenNote,
  params: OfDocument & { readonly position: { line: number; character: number } },
) {
  const { markdownHover, images, commandLinks } = abilities();
  const withImages = markdownHover && images;
  const offered = hoverOf(note, params.position, { markdown: markdownHover, findingsElsewhere: commandLinks });
  if (!offered) return null;
  if (withImages) await engine.loadStructures();
  return (
    hoverOf(note, params.position, {
      markdown: markdownHover,
      findingsElsewhere: commandLinks,
      ...(withImages ? { image: drawings.image } : {}),
      ...(commandLinks ? { actions: cardActions(note, params.position) } : {}),
    }) ?? null
  );
}
