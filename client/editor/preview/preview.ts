/**
 * The margin's labels in the built-in Markdown preview. The preview renders at once, the server answers later:
 * labels come from the last answer for the same text, and a new answer renders the preview again.
 */

import type { MarkdownIt } from "markdown-it";
import * as vscode from "vscode";
import { type MarginLabel, METHODS } from "../../../server/protocol.ts";
import type { Server } from "../server.ts";
import { labelPlugin } from "./label-plugin.ts";

const MOST_KEPT = 20;
const LONGEST = 500_000;

export interface Preview extends vscode.Disposable {
  extendMarkdownIt(md: MarkdownIt): MarkdownIt;
}

export function createPreview(server: Server): Preview {
  const known = new Map<string, readonly MarginLabel[]>();
  const asked = new Set<string>();
  let refreshing: ReturnType<typeof setTimeout> | undefined;

  const ask = async (text: string): Promise<void> => {
    asked.add(text);
    const labels = await server.request<MarginLabel[]>(METHODS.margin, { name: "preview.md", text }).catch(() => []);
    asked.delete(text);
    if (known.size >= MOST_KEPT) known.delete(known.keys().next().value ?? "");
    known.set(text, labels);
    if (labels.length === 0) return;
    clearTimeout(refreshing);
    refreshing = setTimeout(() => void vscode.commands.executeCommand("markdown.preview.refresh"), 50);
  };
  const labelsOf = (text: string): readonly MarginLabel[] => {
    const labels = known.get(text);
    if (labels === undefined && !asked.has(text) && text.length <= LONGEST) void ask(text);
    return labels ?? [];
  };
  return {
    extendMarkdownIt: (md) => md.use(labelPlugin, labelsOf),
    dispose: () => clearTimeout(refreshing),
  };
}
