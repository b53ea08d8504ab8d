/** Palette: an estimate for the selected SMILES or name; medium, temperature and pH are asked and remembered. */

import * as vscode from "vscode";
import { type EstimateReply, type EstimateRequest, METHODS } from "../../../server/protocol.ts";
import { showPage } from "../pages.ts";
import type { Server } from "../server.ts";

const MEMORY = "oxomargin.lastEstimate";

type Field = keyof EstimateRequest;

interface Question {
  readonly field: Field;
  readonly title: string;
  readonly prompt: string;
  readonly usual: string;
}

/** The questions in their order; each may be left as it stands. */
function questions(): readonly Question[] {
  return [
    { field: "what", title: vscode.l10n.t("Compound"), prompt: vscode.l10n.t("SMILES, name or CAS number"), usual: "" },
    {
      field: "medium",
      title: vscode.l10n.t("Medium"),
      prompt: vscode.l10n.t("As written in a note: water, MeOH, 9:1 MeOH/H2O, PBS"),
      usual: "water",
    },
    {
      field: "temperature",
      title: vscode.l10n.t("Temperature"),
      prompt: vscode.l10n.t("Degrees Celsius"),
      usual: "25",
    },
    { field: "pH", title: "pH", prompt: vscode.l10n.t("Leave empty for neutral"), usual: "" },
  ];
}

export function registerEstimate(context: vscode.ExtensionContext, server: Server): vscode.Disposable[] {
  const ask = async (): Promise<void> => {
    const remembered = context.workspaceState.get<Partial<EstimateRequest>>(MEMORY) ?? {};
    const request = await answers(server, { ...remembered, what: selectedWords() ?? remembered.what ?? "" });
    if (!request) return;
    await context.workspaceState.update(MEMORY, request);
    const reply = await server.request<EstimateReply>(METHODS.estimate, request);
    if (reply.ok) await showPage(`Estimate for ${pathSafe(request.what)}`, reply.card);
    else void vscode.window.showWarningMessage(reply.problem);
  };
  return [vscode.commands.registerCommand("oxomargin.estimate", ask)];
}

function selectedWords(): string | undefined {
  const editor = vscode.window.activeTextEditor;
  const text = editor?.document.getText(editor.selection).trim();
  return text && !text.includes("\n") && text.length <= 400 ? text : undefined;
}

function pathSafe(what: string): string {
  return what.replaceAll("/", "∕").replaceAll("\\", "∖").slice(0, 60);
}

/** Asks each field in turn; Escape ends it. An answer that the server cannot read is said below the box at once. */
async function answers(server: Server, start: Partial<EstimateRequest>): Promise<EstimateRequest | undefined> {
  let request: EstimateRequest = { what: "", ...start };
  const asked = questions();
  for (const [index, { field, title, prompt, usual }] of asked.entries()) {
    const answer = await vscode.window.showInputBox({
      title: `${title} (${index + 1}/${asked.length})`,
      prompt,
      value: request[field] ?? usual,
      validateInput: (text) => problemWith(server, { ...request, [field]: text }, field),
    });
    if (answer === undefined) return undefined;
    request = { ...request, [field]: answer };
  }
  return request;
}

async function problemWith(server: Server, request: EstimateRequest, field: Field): Promise<string | undefined> {
  const reply = await server.request<EstimateReply>(METHODS.estimate, request);
  return !reply.ok && reply.field === field ? reply.problem : undefined;
}
