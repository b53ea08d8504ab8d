/** Runs the terminal command as a person does: as a process of its own, from a bundle made of the sources as they are. */

import { spawn } from "node:child_process";
import { rmSync } from "node:fs";
import { chmod, mkdtemp, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import path from "node:path";
import { build } from "esbuild";

export interface Ran {
  readonly status: number | null;
  readonly out: string;
  readonly err: string;
}

export interface RunOptions {
  readonly input?: string | Uint8Array;
  readonly cwd?: string;
  readonly env?: NodeJS.ProcessEnv;
  /** Options of Node itself. */
  readonly node?: readonly string[];
  /** User to run as, where the tests run as root. */
  readonly uid?: number;
}

const ROOT = path.resolve(import.meta.dirname, "..", "..");
let entry: Promise<string> | undefined;

/** Path of the bundled command; bundled once a test file. Only a process of its own shows exit status, streams and start. */
export function bundledTerminal(): Promise<string> {
  entry ??= bundle();
  return entry;
}

async function bundle(): Promise<string> {
  const folder = await mkdtemp(path.join(tmpdir(), "oxomargin-terminal-"));
  // Another user may run it: one test takes permissions away.
  await chmod(folder, 0o755);
  process.on("exit", () => rmSync(folder, { recursive: true, force: true }));
  await build({
    absWorkingDir: ROOT,
    entryPoints: { oxomargin: "client/terminal/main.ts", "entry/worker": "node_modules/tinypool/dist/entry/worker.js" },
    outdir: folder,
    bundle: true,
    splitting: true,
    platform: "node",
    format: "esm",
    banner: { js: "import{createRequire as __cr}from'node:module';const require=__cr(import.meta.url);" },
    logLevel: "error",
  });
  await writeFile(path.join(folder, "package.json"), '{"type":"module"}');
  return path.join(folder, "oxomargin.js");
}

/** Runs `oxomargin ARGS`. */
export async function oxomargin(args: readonly string[], options: RunOptions = {}): Promise<Ran> {
  return run(process.execPath, [...(options.node ?? []), await bundledTerminal(), ...args], options);
}

/** Runs a program to its end. */
export function run(program: string, args: readonly string[], options: RunOptions = {}): Promise<Ran> {
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, {
      cwd: options.cwd ?? ROOT,
      env: { ...process.env, ...options.env },
      ...(options.uid === undefined ? {} : { uid: options.uid, gid: options.uid }),
    });
    const out: Buffer[] = [];
    const err: Buffer[] = [];
    child.stdout.on("data", (chunk: Buffer) => out.push(chunk));
    child.stderr.on("data", (chunk: Buffer) => err.push(chunk));
    child.on("error", reject);
    child.stdin.on("error", () => undefined);
    child.on("close", (status) =>
      resolve({ status, out: Buffer.concat(out).toString("utf8"), err: Buffer.concat(err).toString("utf8") }),
    );
    child.stdin.end(options.input ?? "");
  });
}
