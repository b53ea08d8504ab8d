/** Offsets of the analysis to positions of the protocol. Both count UTF-16 code units, the one encoding that every client knows. */

import type { Position, Range } from "vscode-languageserver-protocol";
import type { TextDocument } from "vscode-languageserver-textdocument";
import type { Span } from "../shared-lib/model/span.ts";

export function rangeOf(document: TextDocument, span: Span): Range {
  return { start: document.positionAt(span.start), end: document.positionAt(span.end) };
}

export function spanOf(document: TextDocument, range: Range): Span {
  return { start: document.offsetAt(range.start), end: document.offsetAt(range.end) };
}

export function positionOf(document: TextDocument, offset: number): Position {
  return document.positionAt(offset);
}

export function overlaps(a: Span, b: Span): boolean {
  return a.start <= b.end && b.start <= a.end;
}

export function holds(span: Span, offset: number): boolean {
  return span.start <= offset && offset <= span.end;
}
