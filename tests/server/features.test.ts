/** Every feature of the language server, asked as an editor asks. */

import { afterAll, beforeAll, describe, expect, test } from "vitest";
import type {
  CodeAction,
  CodeLens,
  CompletionItem,
  DocumentSymbol,
  FoldingRange,
  Hover,
  InlayHint,
  Location,
  SelectionRange,
  SemanticTokens,
} from "vscode-languageserver-protocol";
import { METHODS } from "../../server/protocol.ts";
import { FULL_CLIENT, offsetAt, positionAt, startClient, type TestClient } from "./client.ts";

const URI = "file:///notes/trial.md";
const TEXT = `# Trial 🧪 of the day

Acetaldehyde (4.41 g, 100 mmol, 1.0 equiv) was added to water (500 mL) at 25 °C, and the mixture was stirred for 2 h.

## Second flask

Chloral hydrate (14.7 g, 100 mmol, 1.0 equiv) was dissolved in water (200 mL).
`;
const WHOLE = { start: { line: 0, character: 0 }, end: { line: 99, character: 0 } };
const place = (words: string) => positionAt(TEXT, TEXT.indexOf(words) + 2);

let client: TestClient;
beforeAll(async () => {
  client = await startClient();
  client.open(URI, TEXT);
  await client.until(() => client.pushed(URI) !== undefined);
});
afterAll(() => client.close());

const ask = <R>(method: string, params: object = {}): Promise<R> =>
  client.request<R>(`textDocument/${method}`, { textDocument: { uri: URI }, ...params });

describe("a note that is open", () => {
  test("negotiates UTF-16, the encoding of the analysis", () => {
    expect(client.initialized.capabilities.positionEncoding).toBe("utf-16");
  });

  test("has findings pushed with their version, code and source", () => {
    const pushed = client.pushed(URI);
    expect(pushed?.version).toBe(1);
    expect(pushed?.diagnostics.map(({ code }) => code)).toContain("charge/weighed-as-another-form");
    expect(pushed?.diagnostics.every(({ source, severity }) => source === "Oxomargin" && severity !== 1)).toBe(true);
  });

  test("shows short labels behind the charge they speak of", async () => {
    const hints = await ask<InlayHint[]>("inlayHint", { range: WHOLE });
    expect(hints.length).toBeGreaterThan(0);
    for (const { label, position, paddingLeft } of hints) {
      expect(String(label).length).toBeLessThanOrEqual(24);
      expect(paddingLeft).toBe(true);
      expect(TEXT.slice(0, offsetAt(TEXT, position))).toMatch(/Acetaldehyde[^\n]*$|hydrate[^\n]*$/);
    }
    const resolved = await client.request<InlayHint>("inlayHint/resolve", hints[0]);
    expect(JSON.stringify(resolved.tooltip)).toContain("95 % range");
  });

  // K = 1.06 at 25 °C, 51 % hydrate: R. P. Bell, Adv. Phys. Org. Chem. 1966, 4, 1.
  test("answers a hover with the published share within its range", async () => {
    const hover = await ask<Hover>("hover", { position: place("Acetaldehyde") });
    const { value } = hover.contents as { value: string };
    const [, share, low, high] =
      /(\d+) % (?:gem-diol )?hydrate \(95 % range (\d+)–(\d+) %\)/.exec(value)?.map(Number) ?? [];
    expect(low).toBeLessThanOrEqual(51);
    expect(high).toBeGreaterThanOrEqual(51);
    expect(share).toBeGreaterThan(0);
    const firstTwelve = value.split("\n").slice(0, 12).join("\n");
    expect(firstTwelve.match(/^- /gm)?.length).toBe(3);
    expect(value).toContain("How it was reached");
  });

  test("shows no image and no command to a client that did not ask for them", async () => {
    const { contents } = await ask<Hover>("hover", { position: place("Acetaldehyde") });
    expect(JSON.stringify(contents)).not.toMatch(/data:image|command:/);
  });

  test("hovers over nothing where nothing stands", async () => {
    expect(await ask("hover", { position: place("Trial") })).toBeNull();
    expect(await ask("hover", { position: { line: 4000, character: 7 } })).toBeNull();
  });

  test("offers fixes first and a way to silence last; the fix takes the finding away", async () => {
    const range = { start: place("Chloral"), end: place("Chloral") };
    const actions = await ask<CodeAction[]>("codeAction", { range, context: { diagnostics: [], only: ["quickfix"] } });
    expect(actions.at(-1)?.title).toMatch(/^Silence/);
    const fix = actions[0];
    expect(fix?.title).toMatch(/16\.[56]/);
    const fixed = applied(TEXT, fix?.edit?.changes?.[URI] ?? []);
    const again = await client.request<{ findings: { code: string }[] }>(METHODS.checkText, {
      name: "trial.md",
      text: fixed,
    });
    expect(again.findings.map(({ code }) => code)).not.toContain("charge/weighed-as-another-form");
  });

  test("the silencing edit silences that finding and no other", async () => {
    const range = { start: place("Chloral"), end: place("Chloral") };
    const actions = await ask<CodeAction[]>("codeAction", { range, context: { diagnostics: [], only: ["quickfix"] } });
    const silence = actions.find(({ title }) => title.startsWith("Silence “charge/weighed-as-another-form”"));
    const silenced = applied(TEXT, silence?.edit?.changes?.[URI] ?? []);
    const codesIn = async (text: string): Promise<string[]> =>
      (
        await client.request<{ findings: { code: string }[] }>(METHODS.checkText, { name: "trial.md", text })
      ).findings.map(({ code }) => code);
    const before = await codesIn(TEXT);
    expect(await codesIn(silenced)).toEqual(before.filter((code) => code !== "charge/weighed-as-another-form"));
  });

  test("has an outline of steps with their charges, and folds", async () => {
    const symbols = await ask<DocumentSymbol[]>("documentSymbol");
    const charges = symbols.flatMap(({ children }) => children ?? []);
    expect(charges.map(({ name }) => name.toLowerCase())).toEqual(expect.arrayContaining(["acetaldehyde"]));
    expect(charges.find(({ name }) => /acetaldehyde/i.test(name))?.detail).toContain("4.41 g");
    const folds = await ask<FoldingRange[]>("foldingRange");
    expect(folds.every(({ startLine, endLine }) => endLine > startLine)).toBe(true);
  });

  test("selections grow from the amount to the whole note", async () => {
    const [selection] = await ask<SelectionRange[]>("selectionRange", { positions: [place("4.41")] });
    const widths: number[] = [];
    for (let at: SelectionRange | undefined = selection; at; at = at.parent)
      widths.push(offsetAt(TEXT, at.range.end) - offsetAt(TEXT, at.range.start));
    expect(widths.length).toBeGreaterThanOrEqual(3);
    expect(widths).toEqual([...widths].sort((a, b) => a - b));
  });

  test("marks carbonyls with the legend's modifiers", async () => {
    const { data } = await ask<SemanticTokens>("semanticTokens/full");
    expect(data.length % 5).toBe(0);
    expect(data.length).toBeGreaterThanOrEqual(5);
    expect([1, 2, 4]).toContain(data[4]);
  });

  test("completes units after a figure and solvents elsewhere", async () => {
    const units = await ask<CompletionItem[]>("completion", {
      position: positionAt(TEXT, TEXT.indexOf(" g, 100") + 1),
    });
    expect(units.map(({ label }) => label)).toContain("mmol");
    const names = await ask<CompletionItem[]>("completion", { position: place("water") });
    expect(names.map(({ label }) => label)).toContain("methanol");
  });

  test("keeps code lenses for those who ask", async () => {
    expect(await ask<CodeLens[]>("codeLens")).toEqual([]);
  });

  test("finds the other mentions of a compound", async () => {
    const found = await ask<Location[]>("references", {
      position: place("Acetaldehyde"),
      context: { includeDeclaration: true },
    });
    expect(found.length).toBeGreaterThan(0);
  });

  test("does not rename a compound: that would change the chemistry", async () => {
    expect(await ask("prepareRename", { position: place("Acetaldehyde") })).toBeNull();
  });
});

describe("the estimate command", () => {
  const estimate = (
    request: object,
  ): Promise<{
    ok: boolean;
    text?: string;
    field?: string;
    problem?: string;
    estimate?: { compound: { smiles: string } };
  }> => client.request("workspace/executeCommand", { command: "oxomargin.estimateFor", arguments: [request] });

  test("answers a name, a SMILES and a CAS number alike", async () => {
    const replies = await Promise.all(
      ["acetaldehyde", "CC=O", "75-07-0"].map((what) => estimate({ what, medium: "water" })),
    );
    expect(replies.every(({ ok }) => ok)).toBe(true);
    expect(new Set(replies.map(({ estimate }) => estimate?.compound.smiles)).size).toBe(1);
  });

  test.each([
    [{ what: "" }, "what"],
    [{ what: "C(C" }, "what"],
    [{ what: "CC=O", medium: "gravel" }, "medium"],
    [{ what: "CC=O", temperature: "-400" }, "temperature"],
    [{ what: "CC=O", temperature: "warm" }, "temperature"],
    [{ what: "CC=O", pH: "99" }, "pH"],
    [{ what: "CC=O", concentration: "-1" }, "concentration"],
  ])("says which field of %j is wrong", async (request, field) => {
    const reply = await estimate(request);
    expect(reply.ok).toBe(false);
    expect(reply.field).toBe(field);
    expect(reply.problem?.length).toBeGreaterThan(10);
  });

  test("survives junk", async () => {
    for (const argument of [null, 7, [], {}, { what: 7 }]) expect((await estimate(argument as object)).ok).toBe(false);
  });
});

describe("a client that can do little", () => {
  test("gets plain text, pushed findings and no refresh requests", async () => {
    const poor = await startClient({}, { settings: { displayDelay: 0 } });
    poor.open(URI, TEXT, "plaintext");
    await poor.until(() => poor.pushed(URI) !== undefined);
    const hover = await poor.request<Hover>("textDocument/hover", {
      textDocument: { uri: URI },
      position: place("Acetaldehyde"),
    });
    expect((hover.contents as { kind: string }).kind).toBe("plaintext");
    expect(JSON.stringify(hover.contents)).not.toContain("**");
    poor.close();
  });

  test("pulls when it can pull, and is then not pushed to", async () => {
    const puller = await startClient({ ...FULL_CLIENT, textDocument: { ...FULL_CLIENT.textDocument, diagnostic: {} } });
    puller.open(URI, TEXT);
    const report = await puller.request<{ items: unknown[] }>("textDocument/diagnostic", {
      textDocument: { uri: URI },
    });
    expect(report.items.length).toBeGreaterThan(0);
    expect(puller.pushed(URI)).toBeUndefined();
    puller.close();
  });
});

describe("settings", () => {
  test("are taken from a client that only sends them, and clamped", async () => {
    const sender = await startClient(
      {},
      { settings: { displayDelay: 0, hints: "off", boundShare: 7, neutralPH: "sour" } },
    );
    sender.open(URI, TEXT);
    await sender.until(() => sender.pushed(URI) !== undefined);
    expect(await sender.request("textDocument/inlayHint", { textDocument: { uri: URI }, range: WHOLE })).toEqual([]);
    sender.close();
  });

  test("a note longer than the limit is left alone", async () => {
    const limited = await startClient({}, { settings: { displayDelay: 0, longestNote: 10_000 } });
    limited.open(URI, TEXT + "x".repeat(10_001));
    await limited.until(() => limited.pushed(URI) !== undefined);
    expect(limited.pushed(URI)?.diagnostics).toEqual([]);
    limited.close();
  });
});

describe("life and death", () => {
  test("shuts down and refuses what comes after", async () => {
    const leaving = await startClient();
    expect(await leaving.request("shutdown", undefined)).toBeNull();
    leaving.close();
  });

  test("a note that is not open is answered with nothing", async () => {
    const textDocument = { uri: "file:///nowhere.md" };
    expect(
      await client.request("textDocument/hover", { textDocument, position: { line: 0, character: 0 } }),
    ).toBeNull();
    expect(await client.request("textDocument/documentSymbol", { textDocument })).toEqual([]);
  });
});

function applied(
  text: string,
  edits: readonly {
    range: { start: { line: number; character: number }; end: { line: number; character: number } };
    newText: string;
  }[],
): string {
  const sorted = [...edits].sort((a, b) => offsetAt(text, b.range.start) - offsetAt(text, a.range.start));
  return sorted.reduce(
    (now, { range, newText }) =>
      now.slice(0, offsetAt(text, range.start)) + newText + now.slice(offsetAt(text, range.end)),
    text,
  );
}
