/** The card keeps text that came from a note inert, and says shares with the digits they carry. */

import fc from "fast-check";
import MarkdownIt from "markdown-it";
import { expect, test } from "vitest";
import type { Card } from "../../shared-lib/report/card/card.ts";
import { cardMarkdown } from "../../shared-lib/report/card/card-markdown.ts";
import { escapeMarkdown } from "../../shared-lib/report/card/escape-markdown.ts";
import { celsius, duration, percent, percentRange, shareBar } from "../../shared-lib/report/card/share-words.ts";

const md = new MarkdownIt({ html: true, linkify: true });

const HOSTILE = [
  "<img src=x onerror=alert(1)>",
  "[a](command:evil)",
  "![a](http://x/y.png)",
  "http://evil.example",
  "www.evil.example",
  "a@b.example",
  "`code`",
  "*b* _c_",
  "| a | b |",
  "<!-- x -->",
  "\\[a\\](b)",
  "$(icon)",
  "# head",
  "\n\n# head\n",
  "\u0000",
];

test.each(HOSTILE)("%j is shown as it was written", (text) => {
  const html = md.render(`x ${escapeMarkdown(text)} y`);
  expect(html).not.toMatch(/<(?!\/?p>)/);
});

test("no text makes a tag, a link or an image", () => {
  const part = fc.oneof(fc.constantFrom(...HOSTILE), fc.string({ unit: "grapheme" }));
  fc.assert(
    fc.property(fc.array(part, { maxLength: 6 }), (parts) => {
      expect(md.renderInline(`x ${escapeMarkdown(parts.join(""))} y`)).not.toMatch(/<(?!\/?p>)/);
    }),
    { numRuns: 2_000 },
  );
});

const share = (value: number) => ({ value, low: value * 0.9, high: Math.min(1, value * 1.1) });
const CARD: Card = {
  name: "acetaldehyde",
  answer: "51 % hydrate (95 % range 44–58 %)",
  conditions: "In water, 25 °C, pH 7 (assumed).",
  meaning: ["Half of it is bound."],
  reasons: [{ says: "a", source: "s" }, { says: "b" }, { says: "c" }],
  forms: [
    { kind: "hydrate", label: "hydrate", smiles: "CC(O)O", fraction: share(0.51) },
    { kind: "free carbonyl", label: "free carbonyl", smiles: "CC=O", fraction: share(0.49) },
    { kind: "hydrate anion", label: "anion", fraction: share(1e-6) },
  ],
  derivation: [{ says: "a", value: "log K = 0.03", source: "s" }],
  cautions: ["mind"],
};

test("twelve lines hold answer, range, meaning and three reasons", () => {
  const top = cardMarkdown(CARD).split("\n").slice(0, 12).join("\n");
  expect(top).toContain("51 % hydrate");
  expect(top).toContain("44–58 %");
  expect(top).toContain("Half of it is bound");
  expect(top.match(/^- /gm)).toHaveLength(3);
});

test("the table is a table, with drawings only when there is a hand to draw them", () => {
  const bare = md.render(cardMarkdown(CARD));
  expect(bare).toContain("<table>");
  expect(bare).not.toContain("<img");
  expect(bare).not.toContain("anion");
  md.validateLink = () => true;
  const drawn = md.render(cardMarkdown(CARD, { image: () => "data:image/svg+xml;base64,AAAA" }));
  expect(drawn.match(/<img src="data:image/g)).toHaveLength(2);
});

test.each([
  [0.5132, "51 %"],
  [0.9996, "99.96 %"],
  [0.999999, "> 99.99 %"],
  [0.995, "99.5 %"],
  [0.0021, "0.21 %"],
  [0.034, "3.4 %"],
  [0.97, "97 %"],
  [0, "0 %"],
  [1, "100 %"],
])("a share of %f is %s", (value, words) => expect(percent(value)).toBe(words));

test("ranges, temperatures, times and bars", () => {
  expect(percentRange({ value: 0.5, low: 0.44, high: 0.58 })).toBe("44–58 %");
  expect(celsius(273.15 - 78)).toBe("−78 °C");
  expect(duration(44)).toBe("44 s");
  expect(duration(5400)).toBe("1.5 h");
  expect(duration(1e-9)).toBe("under 1 ms");
  expect(shareBar(0.5)).toBe("▰▰▰▰▰▱▱▱▱▱");
});
