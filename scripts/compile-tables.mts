/**
 * Validates the tables of shared-lib and compiles them to shared-lib/generated/.
 * Each file of scripts/tables/ compiles one family of tables; a row that is wrong stops the build and names file, line and mend.
 */

import { readdirSync } from "node:fs";
import { mkdir, readFile, rm, writeFile } from "node:fs/promises";
import path from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";

const here = path.dirname(fileURLToPath(import.meta.url));
const target = path.join(here, "..", "shared-lib", "generated");

/** What a file of scripts/tables/ exports as `compile`: file name in generated/ to its content. */
export type CompileTables = () => Promise<Readonly<Record<string, string>>>;

async function writeIfChanged(file: string, content: string): Promise<void> {
  const old = await readFile(file, "utf8").catch(() => undefined);
  if (old !== content) await writeFile(file, content);
}

/** Compiles all tables. @throws Error naming file, line and mend for a row that is wrong */
export async function compileTables(): Promise<void> {
  await mkdir(target, { recursive: true });
  const modules = readdirSync(path.join(here, "tables")).filter((name) => name.endsWith(".table.mts"));
  const kept = new Set<string>();
  for (const name of modules.sort()) {
    const { compile } = (await import(pathToFileURL(path.join(here, "tables", name)).href)) as {
      compile: CompileTables;
    };
    for (const [file, content] of Object.entries(await compile())) {
      kept.add(file);
      await writeIfChanged(path.join(target, file), content);
    }
  }
  for (const file of readdirSync(target)) if (!kept.has(file)) await rm(path.join(target, file), { recursive: true });
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  try {
    await compileTables();
  } catch (error) {
    console.error(error instanceof Error ? error.message : error);
    process.exitCode = 1;
  }
}
