/** Unpacks the .vsix that was just built, so that the hosts run what a user installs. */

import { execFileSync } from "node:child_process";
import { mkdtempSync, readdirSync, readFileSync, statSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";

const VSIX = "dist/oxomargin.vsix";
const LARGEST_BYTES = 1_500_000;

/** @returns the folder of the extension; @throws Error when the .vsix is missing or too large */
export function unpackExtension(): string {
  const { size } = statSync(VSIX);
  console.log(`  ${VSIX}: ${(size / 1e6).toFixed(2)} MB`);
  if (size > LARGEST_BYTES) throw new Error(`${VSIX} is larger than ${LARGEST_BYTES / 1e6} MB`);
  const folder = mkdtempSync(path.join(tmpdir(), "oxomargin-vsix-"));
  execFileSync("python3", ["-m", "zipfile", "-e", VSIX, folder]);
  return path.join(folder, "extension");
}

/** A note of our own, so that the figures that are seen can be compared with the literature. */
const TRIAL = `# Trial of the day

Acetaldehyde (4.41 g, 100 mmol, 1.0 equiv) was added to water (500 mL) at 25 °C, and the mixture was stirred for 2 h.

## Second flask

Chloral hydrate (14.7 g, 100 mmol, 1.0 equiv) was dissolved in water (200 mL) at 25 °C.
`;

/** The example notes and the trial by file name, as the workspace that the hosts open. */
export function workspaceNotes(): Record<string, string> {
  const folder = "media/example-notes";
  const names = readdirSync(folder).filter((name) => /\.(md|txt)$/.test(name));
  const examples = names.map((name) => [name, readFileSync(path.join(folder, name), "utf8")] as const);
  return { ...Object.fromEntries(examples), "trial.md": TRIAL };
}
