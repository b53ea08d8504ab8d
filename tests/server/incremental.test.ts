/** Random edits over the protocol against a fresh analysis of the same text: identical answers. */

import { readdirSync, readFileSync } from "node:fs";
import fc from "fast-check";
import { expect, test } from "vitest";
import { startClient } from "./client.ts";

const FOLDER = "media/example-notes";
const NOTES = readdirSync(FOLDER)
  .filter((name) => name.endsWith(".md"))
  .map((name) => readFileSync(`${FOLDER}/${name}`, "utf8"));

/** Words whose coming and going changes what a note says. */
const WORDS = [
  "acetaldehyde",
  " (4.41 g, 100 mmol)",
  "water (50 mL)",
  "\n\n",
  "\r\n",
  "## Step\n",
  "|",
  "🧪",
  "é",
  "37 wt% ",
  "<!-- oxomargin: basis free -->\n",
  "",
  " ",
];

test("edits and a fresh reading agree", { timeout: 120_000 }, async () => {
  const client = await startClient();
  let note = 0;
  const edit = fc.record({
    at: fc.double({ min: 0, max: 1, noNaN: true }),
    cut: fc.nat(30),
    word: fc.constantFrom(...WORDS),
  });
  const property = fc.asyncProperty(
    fc.constantFrom(...NOTES),
    fc.array(edit, { minLength: 1, maxLength: 8 }),
    async (text, edits) => {
      const uri = `file:///note-${note++}.md`;
      client.open(uri, text);
      for (const { at, cut, word } of edits) {
        const now = client.text(uri);
        const start = Math.floor(at * now.length);
        const end = Math.min(now.length, start + cut);
        if (splits(now, start) || splits(now, end)) continue;
        client.edit(uri, start, end, word);
      }
      const fresh = `file:///fresh-${note}.md`;
      client.open(fresh, client.text(uri));
      const range = { start: { line: 0, character: 0 }, end: { line: 9999, character: 0 } };
      const ask = async (of: string) => {
        const textDocument = { uri: of };
        const hints = await client.request<{ position: unknown; label: unknown }[]>("textDocument/inlayHint", {
          textDocument,
          range,
        });
        const symbols = await client.request("textDocument/documentSymbol", { textDocument });
        return { hints: hints.map(({ position, label }) => ({ position, label })), symbols };
      };
      expect(await ask(uri)).toEqual(await ask(fresh));
      for (const of of [uri, fresh])
        void client.connection.sendNotification("textDocument/didClose", { textDocument: { uri: of } });
    },
  );
  await fc.assert(property, { numRuns: Number(process.env.OXOMARGIN_RUNS ?? 60) });
  client.close();
});

/** An editor never cuts a pair of surrogates or a CR LF. */
function splits(text: string, at: number): boolean {
  const pair = text.slice(at - 1, at + 1);
  return pair === "\r\n" || /^[\ud800-\udbff][\udc00-\udfff]$/.test(pair);
}
