/**
 * Makes the .vsix, the npm tarball and a list of what is in them (CycloneDX) in dist/, the same bytes from the same sources.
 * `--check` makes all twice, compares them, and runs the command from each in an empty folder with no network.
 */

import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, mkdtempSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";

/** Date of every packed file, so that the hour of a build never shows: 1 January 2026. */
const EPOCH = "1767225600";
const { version } = JSON.parse(readFileSync("package.json", "utf8")) as { version: string };
const PACKAGES = {
  vsix: "dist/oxomargin.vsix",
  tarball: `dist/oxomargin-${version}.tgz`,
  contents: "dist/sbom.json",
} as const;

function run(command: string, args: readonly string[], cwd?: string): string {
  const ran = spawnSync(command, args, {
    cwd,
    encoding: "utf8",
    env: { ...process.env, SOURCE_DATE_EPOCH: EPOCH },
    maxBuffer: 1 << 28,
  });
  if (ran.status !== 0)
    throw new Error(`${command} ${args.join(" ")} failed:\n${ran.stdout}${ran.stderr}${ran.error ?? ""}`);
  return ran.stdout;
}

/** The list of libraries, without its date and its random number. */
function writeContents(): void {
  const {
    serialNumber: _,
    metadata,
    ...list
  } = JSON.parse(run("npm", ["sbom", "--sbom-format", "cyclonedx", "--package-lock-only"])) as {
    serialNumber: string;
    metadata: { timestamp?: string };
  };
  const { timestamp: __, ...dateless } = metadata;
  writeFileSync(PACKAGES.contents, `${JSON.stringify({ ...list, metadata: dateless }, null, 1)}\n`);
}

function makeAll(): void {
  run("npm", ["run", "build"]);
  writeContents();
  run("npx", [
    "vsce",
    "package",
    "--no-dependencies",
    "--allow-missing-repository",
    "--no-rewrite-relative-links",
    "--out",
    PACKAGES.vsix,
  ]);
  const [{ filename }] = JSON.parse(run("npm", ["pack", "--ignore-scripts", "--json"])) as [{ filename: string }];
  renameSync(filename, PACKAGES.tarball);
}

function hashes(): Readonly<Record<string, string>> {
  return Object.fromEntries(
    Object.values(PACKAGES).map((file) => [file, createHash("sha256").update(readFileSync(file)).digest("hex")]),
  );
}

/** Runs the main job from a package in an empty folder. */
function smoke(entry: string, folder: string): void {
  const note = path.join(folder, "trial.md");
  writeFileSync(note, "Acetaldehyde (4.41 g, 100 mmol) in water (50 mL) and 3-phenylpropanal (1.3 g) at 25 °C.\n");
  const { files } = JSON.parse(run(process.execPath, [entry, "check", note, "--format", "json"], folder)) as {
    files: { charges: unknown[] }[];
  };
  if (files[0]?.charges.length === 0) throw new Error(`${entry}: found no charge`);
  const estimate = JSON.parse(
    run(process.execPath, [entry, "estimate", "O=Cc1ccccn1", "--format", "json"], folder),
  ) as {
    forms: unknown[];
  };
  if (estimate.forms.length < 2) throw new Error(`${entry}: gave no forms`);
}

function smokeAll(): void {
  const folder = mkdtempSync(path.join(tmpdir(), "oxomargin-packed-"));
  try {
    const tarball = path.resolve(PACKAGES.tarball);
    writeFileSync(path.join(folder, "package.json"), "{}");
    run("npm", ["install", "--offline", "--ignore-scripts", "--no-audit", "--no-fund", tarball], folder);
    smoke(path.join(folder, "node_modules/oxomargin/dist/oxomargin.mjs"), folder);
    run("python3", ["-m", "zipfile", "-e", path.resolve(PACKAGES.vsix), path.join(folder, "vsix")]);
    const entry = path.join(folder, "vsix/extension/dist/oxomargin.mjs");
    if (!existsSync(entry)) throw new Error("the .vsix holds no terminal command");
    smoke(entry, folder);
  } finally {
    rmSync(folder, { recursive: true });
  }
}

makeAll();
if (process.argv.includes("--check")) {
  const first = hashes();
  makeAll();
  const second = hashes();
  const moved = Object.keys(first).filter((file) => first[file] !== second[file]);
  if (moved.length > 0) throw new Error(`two builds differ: ${moved.join(", ")}`);
  smokeAll();
  console.log("two builds are the same bytes; both packages work in an empty folder, offline");
}
for (const file of Object.values(PACKAGES)) console.log(`${file}  ${(readFileSync(file).length / 1e6).toFixed(2)} MB`);
