/** Requests of our own client, and the estimate command that any client can execute. */

import { cardOfMention } from "../shared-lib/report/card/card.ts";
import { cardMarkdown } from "../shared-lib/report/card/card-markdown.ts";
import { toNoteReport } from "../shared-lib/report/note-report.ts";
import type { NoteOnFile } from "../shared-lib/report/types.ts";
import type { AnswerContext } from "./answer-editor.ts";
import { answerEstimate } from "./estimate-request.ts";
import { curvesOf } from "./features/curves.ts";
import { carbonylMentionAt } from "./features/hover.ts";
import { pageOf } from "./features/page.ts";
import { reportOf } from "./features/report.ts";
import { checkOf, listOf, marginOf } from "./features/whole-note.ts";
import { formatOfName } from "./notes.ts";
import {
  type CheckReply,
  type Curves,
  type CurvesRequest,
  type EstimateReply,
  type EstimateRequest,
  type ListedEstimate,
  type MarginLabel,
  METHODS,
  type NoteText,
  type ReportRequest,
  type Theme,
} from "./protocol.ts";
import { DEFAULT_EDITOR_SETTINGS } from "./settings.ts";

/** `workspace/executeCommand` with one EstimateRequest; answers an EstimateReply. */
export const ESTIMATE_COMMAND = "oxomargin.estimateFor";

interface Place {
  readonly uri: string;
  readonly line: number;
  readonly character: number;
}

export function answerOwnClient(context: AnswerContext & { readonly refresh: () => void }): void {
  const { connection, guard, engine, noteAt, drawings, configuration } = context;
  const failed: EstimateReply = { ok: false, field: "what", problem: "The estimate failed; the log says why." };
  const estimateReply = (request: EstimateRequest): Promise<EstimateReply> =>
    answerEstimate(engine, request, context.abilities().images ? drawings.image : undefined);

  connection.onRequest(METHODS.estimate, guard<EstimateRequest, EstimateReply>("estimate", failed, estimateReply));
  connection.onExecuteCommand(
    guard("command", null, async (params) => {
      if (params.command !== ESTIMATE_COMMAND) return null;
      const given = params.arguments?.[0] as Partial<EstimateRequest> | undefined;
      if (typeof given?.what !== "string")
        return { ...failed, problem: "Give one argument with `what`: a SMILES, a name or a CAS number." };
      return await estimateReply({ ...given, what: given.what });
    }),
  );
  const analysed = async ({ name, text }: NoteText) => {
    const settings = await configuration.of(name).catch(() => DEFAULT_EDITOR_SETTINGS);
    const format = formatOfName(name);
    const first = engine.analyze(text, format, settings.analysis);
    if (!first.reading.needsStructures || engine.structures()) return first;
    await engine.loadStructures();
    return engine.analyze(text, format, settings.analysis);
  };
  connection.onRequest(
    METHODS.checkText,
    guard<NoteText, CheckReply>("check", { findings: [], carbonyls: 0 }, async (note) =>
      checkOf(note.text, await analysed(note)),
    ),
  );
  connection.onRequest(
    METHODS.margin,
    guard<NoteText, MarginLabel[]>("preview", [], async (note) => marginOf(note.text, await analysed(note))),
  );
  connection.onRequest(
    METHODS.list,
    guard<{ readonly uri: string }, ListedEstimate[]>("list", [], async ({ uri }) => {
      const note = await noteAt(uri);
      return note ? listOf(note) : [];
    }),
  );
  connection.onRequest(
    METHODS.curves,
    guard<CurvesRequest, Curves | null>("curves", null, async (request) => {
      const note = await noteAt(request.uri);
      return (note && curvesOf(note, request)) ?? null;
    }),
  );
  connection.onRequest(
    METHODS.report,
    guard<ReportRequest, string>("report", "", async ({ notes, format }) => {
      const settings = DEFAULT_EDITOR_SETTINGS.analysis;
      const read: NoteOnFile[] = [];
      for (const note of notes) {
        const report = toNoteReport(note.name, note.text, await analysed(note), engine.lexicon(), settings);
        read.push({ report, text: note.text });
      }
      return reportOf(read, format);
    }),
  );
  connection.onRequest(
    METHODS.page,
    guard<{ readonly code: string }, string>("page", "", ({ code }) => pageOf(code)),
  );
  connection.onRequest(
    METHODS.card,
    guard<Place, string>("card", "", async ({ uri, line, character }) => {
      const note = await noteAt(uri);
      const mention = note && carbonylMentionAt(note, note.document.offsetAt({ line, character }));
      const card = note && mention !== undefined ? cardOfMention(note.analysis, mention) : undefined;
      return card ? cardMarkdown(card) : "";
    }),
  );
  connection.onNotification(METHODS.theme, (theme: Theme) => drawings.setTheme(theme));
}
