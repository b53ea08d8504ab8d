/** Folders for a test, made from names and contents, and taken away after it. */

import { mkdir, mkdtemp, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import path from "node:path";
import { onTestFinished } from "vitest";

/** A fresh folder that holds these files; gone when the test ends. */
export async function folderWith(files: Readonly<Record<string, string | Uint8Array>>): Promise<string> {
  const folder = await mkdtemp(path.join(tmpdir(), "oxomargin-test-"));
  onTestFinished(() => rm(folder, { recursive: true, force: true }));
  for (const [name, content] of Object.entries(files)) {
    const file = path.join(folder, name);
    await mkdir(path.dirname(file), { recursive: true });
    await writeFile(file, content);
  }
  return folder;
}

/** A note with one aqueous charge that is worth a finding. Our own invention. */
export const CHLORAL_NOTE = `# Trial

Chloral hydrate (1.65 g, 10.0 mmol, 1.0 equiv) and phenylhydrazine (1.08 g, 10.0 mmol) were stirred in water (20 mL) at 25 °C for 2 h.
`;

/** A note that the program has nothing to say about. Our own invention. */
export const QUIET_NOTE = "# Rinse\n\nThe flask was rinsed with acetone (20 mL) and dried.\n";
