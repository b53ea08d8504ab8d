/**
 * Writes the table of findings into README.md, between its markers, and one page a finding into docs/findings/.
 * With --check it writes nothing and fails when something is out of date.
 */

import { existsSync } from "node:fs";
import { mkdir, readdir, readFile, rm, writeFile } from "node:fs/promises";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { FINDINGS } from "../shared-lib/advice/findings/list.ts";

const root = path.join(path.dirname(fileURLToPath(import.meta.url)), "..");
const OPENING = "<!-- findings table: npm run findings-table -->";
const CLOSING = "<!-- /findings table -->";

const pageName = (code: string): string => `${code.replace("/", "-")}.md`;

/** The table as it stands in the README, markers included. */
export function findingsTable(): string {
  const rows = FINDINGS.map(
    ({ code, severity, title }) => `| [\`${code}\`](docs/findings/${pageName(code)}) | ${severity} | ${title} |`,
  );
  return [OPENING, "", "| Code | Severity | Speaks when |", "| --- | --- | --- |", ...rows, "", CLOSING].join("\n");
}

/** The page of each finding by file name. */
export function findingPages(): ReadonlyMap<string, string> {
  return new Map(
    FINDINGS.map(({ code, severity, title, page }) => [
      pageName(code),
      `# ${title}\n\n\`${code}\` · usually a ${severity}\n\n${page}\n`,
    ]),
  );
}

/** A README with the table renewed, or the text unchanged if it has no markers. */
export function withTable(readme: string): string {
  const start = readme.indexOf(OPENING);
  const end = readme.indexOf(CLOSING, start);
  return start < 0 || end < 0 ? readme : readme.slice(0, start) + findingsTable() + readme.slice(end + CLOSING.length);
}

/** What is out of date, by path from the root of the project. */
export async function staleFiles(): Promise<readonly (readonly [string, string])[]> {
  const stale: (readonly [string, string])[] = [];
  const compare = async (file: string, wanted: string) => {
    const full = path.join(root, file);
    if (!existsSync(full) || (await readFile(full, "utf8")) !== wanted) stale.push([file, wanted]);
  };
  for (const [name, page] of findingPages()) await compare(path.join("docs", "findings", name), page);
  const readme = path.join(root, "README.md");
  if (existsSync(readme)) await compare("README.md", withTable(await readFile(readme, "utf8")));
  return stale;
}

async function renew(): Promise<void> {
  const folder = path.join(root, "docs", "findings");
  await mkdir(folder, { recursive: true });
  const pages = findingPages();
  for (const name of await readdir(folder)) if (!pages.has(name)) await rm(path.join(folder, name));
  for (const [file, text] of await staleFiles()) await writeFile(path.join(root, file), text);
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  if (process.argv.includes("--check")) {
    const stale = await staleFiles();
    for (const [file] of stale) console.error(`${file} is out of date: npm run findings-table`);
    process.exitCode = stale.length > 0 ? 1 : 0;
  } else {
    await renew();
    const readme = await readFile(path.join(root, "README.md"), "utf8").catch(() => "");
    if (!readme.includes(OPENING)) console.log(findingsTable());
  }
}
