/** Open notes with their analysis, one per version; analysed on first need, so that fast typing costs one analysis, not one a key. */

import type { TextDocument } from "vscode-languageserver-textdocument";
import type { Analysis } from "../shared-lib/analyze.ts";
import type { Engine, NoteFormat } from "./engine.ts";
import type { EditorSettings } from "./settings.ts";

export interface OpenNote {
  readonly document: TextDocument;
  readonly analysis: Analysis;
  readonly settings: EditorSettings;
}

export interface NoteStore {
  /** The analysis of the present version; undefined for a note that is longer than the settings allow. */
  open(document: TextDocument, settings: EditorSettings): OpenNote | undefined;
  forget(uri: string): void;
  /** Analyses anew on next need (settings, reagents or toolkit changed). */
  forgetAll(): void;
}

export function createNoteStore(engine: Engine): NoteStore {
  const kept = new Map<string, { readonly version: number; readonly note: OpenNote }>();
  return {
    open(document, settings) {
      const known = kept.get(document.uri);
      if (known && known.version === document.version && known.note.settings === settings) return known.note;
      const text = document.getText();
      if (text.length > settings.longestNote) return undefined;
      const analysis = engine.analyze(text, formatOf(document), settings.analysis);
      const note = { document, analysis, settings };
      kept.set(document.uri, { version: document.version, note });
      return note;
    },
    forget: (uri) => void kept.delete(uri),
    forgetAll: () => kept.clear(),
  };
}

/** Markdown by the client's language id, else by the ending of the name. */
export function formatOf(document: Pick<TextDocument, "languageId" | "uri">): NoteFormat {
  if (document.languageId === "markdown") return "markdown";
  if (document.languageId === "plaintext") return "plain";
  return formatOfName(document.uri);
}

export function formatOfName(name: string): NoteFormat {
  const lower = name.toLowerCase();
  return lower.endsWith(".txt") ? "plain" : "markdown";
}
