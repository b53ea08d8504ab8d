/** The manifest says what the code does: commands, settings, strings, activation, and nothing that is not there. */

import { existsSync, readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { BUNDLE, editorSources, localisedStrings } from "../../scripts/l10n-bundle.mts";
import { CARD_COMMANDS } from "../../server/features/card-actions.ts";
import { DEFAULT_EDITOR_SETTINGS, readSettings } from "../../server/settings.ts";

const manifest = JSON.parse(readFileSync("package.json", "utf8"));
const strings: Record<string, string> = JSON.parse(readFileSync("package.nls.json", "utf8"));
const sources = editorSources()
  .map((file) => readFileSync(file, "utf8"))
  .join("\n");
const properties: Record<string, { default: unknown; scope: string; markdownDescription: string }> =
  manifest.contributes.configuration.properties;

test("every command of the manifest is registered, and every registered one is in the manifest", () => {
  const declared = manifest.contributes.commands.map(({ command }: { command: string }) => command).sort();
  const registered = [...sources.matchAll(/register(?:TextEditor)?Command\(\s*"(oxomargin\.[A-Za-z]+)"/g)].map(
    ([, command]) => command,
  );
  expect([...new Set(registered)].sort()).toEqual(declared);
  expect(declared).toEqual(expect.arrayContaining([...CARD_COMMANDS]));
});

test("the client trusts exactly the commands that a card links to", () => {
  const trusted = /const TRUSTED = \[([^\]]*)\]/.exec(sources)?.[1]?.match(/oxomargin\.[A-Za-z]+/g) ?? [];
  expect([...trusted].sort()).toEqual([...CARD_COMMANDS].sort());
});

test("every string of the manifest exists, and none is left over", () => {
  const used = new Set([...JSON.stringify(manifest).matchAll(/%([a-zA-Z.]+)%/g)].map(([, key]) => key));
  expect([...used].sort()).toEqual(Object.keys(strings).sort());
});

test("the bundle of strings is what the source says: npm run l10n", () => {
  expect(JSON.parse(readFileSync(BUNDLE, "utf8"))).toEqual(localisedStrings(editorSources()));
});

test("the defaults of the manifest are the defaults of the program, per resource", () => {
  const given = Object.fromEntries(
    Object.entries(properties).map(([key, { default: value }]) => [key.slice("oxomargin.".length), value]),
  );
  expect(readSettings(given)).toEqual(DEFAULT_EDITOR_SETTINGS);
  expect(
    Object.values(properties).every(
      ({ scope, markdownDescription }) => scope === "resource" && markdownDescription.startsWith("%"),
    ),
  ).toBe(true);
});

test("wrong settings are the defaults or the nearest end", () => {
  const read = readSettings({
    hints: "loud",
    boundShare: 9,
    neutralPH: Number.NaN,
    findings: { a: "off", b: "shout" },
    displayDelay: -4,
  });
  expect(read.analysis.hints).toBe("notable");
  expect(read.analysis.boundShare).toBe(1);
  expect(read.analysis.neutralPH).toBe(7);
  expect(read.analysis.findings).toEqual({ a: "off" });
  expect(read.displayDelay).toBe(0);
  for (const junk of [null, undefined, 7, "x", []]) expect(readSettings(junk)).toEqual(DEFAULT_EDITOR_SETTINGS);
});

test("activates on notes alone and declares trust and virtual folders", () => {
  expect(manifest.activationEvents).toEqual(["onLanguage:markdown", "onLanguage:plaintext"]);
  expect(manifest.capabilities).toEqual({ untrustedWorkspaces: { supported: true }, virtualWorkspaces: true });
});

test("every file that the manifest names is there", () => {
  const files = [
    manifest.icon,
    ...manifest.contributes.grammars.map(({ path }: { path: string }) => path),
    ...manifest.contributes["markdown.previewStyles"],
    ...manifest.contributes.walkthroughs[0].steps.map(({ media }: { media: { markdown: string } }) => media.markdown),
  ];
  expect(files.filter((file) => !existsSync(file))).toEqual([]);
});
