/** One short name for the state of all tables: reports print it, and caches go by it. */

import { createHash } from "node:crypto";
import { readdir, readFile } from "node:fs/promises";
import path from "node:path";
import { fileURLToPath } from "node:url";
import type { CompileTables } from "../compile-tables.mts";

const root = path.join(path.dirname(fileURLToPath(import.meta.url)), "..", "..", "shared-lib");
const TABLE = /\.tsv$|[/\\](?:references|coefficients)\.json$/;

async function tablesUnder(folder: string): Promise<readonly string[]> {
  const entries = await readdir(folder, { withFileTypes: true });
  const found = await Promise.all(
    entries.map((entry): Promise<readonly string[]> | readonly string[] => {
      const file = path.join(folder, entry.name);
      if (entry.isDirectory()) return entry.name === "generated" ? [] : tablesUnder(file);
      return TABLE.test(file) ? [file] : [];
    }),
  );
  return found.flat();
}

/** First twelve digits of the SHA-256 over names and contents of the tables, in order of their names; line ends do not count. */
export const compile: CompileTables = async () => {
  const hash = createHash("sha256");
  const files = (await tablesUnder(root)).map((file) => [path.relative(root, file).split(path.sep).join("/"), file]);
  for (const [name, file] of files.sort(([a = ""], [b = ""]) => (a < b ? -1 : 1)))
    hash.update(`${name}\n${(await readFile(file as string, "utf8")).replaceAll("\r\n", "\n")}\n`);
  return { "tables-version.json": `${JSON.stringify({ tables: hash.digest("hex").slice(0, 12) })}\n` };
};
