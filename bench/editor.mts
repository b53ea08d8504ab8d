/**
 * How quick the editor's parts are, beside a server that does nothing over the same pipe. Needs `npm run build` (and package:vsix for its size).
 *   npm run bench:editor
 */

import { type ChildProcess, spawn } from "node:child_process";
import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import path from "node:path";
import { Script } from "node:vm";
import {
  createProtocolConnection,
  type ProtocolConnection,
  StreamMessageReader,
  StreamMessageWriter,
} from "vscode-languageserver-protocol/node";

const SERVER = ["dist/server-node.mjs", "--stdio"];
const KEYS = 100;

/** Answers every request with nothing: what is left is the pipe and the protocol. */
const EMPTY_SERVER = `
const { createConnection, ProposedFeatures } = require("vscode-languageserver/node");
const c = createConnection(ProposedFeatures.all, process.stdin, process.stdout);
c.onInitialize(() => ({ capabilities: { textDocumentSync: 2, inlayHintProvider: true } }));
c.languages.inlayHint.on(() => []);
c.listen();`;

interface Running {
  readonly connection: ProtocolConnection;
  readonly child: ChildProcess;
  /** ms from the start of the process to its answer to `initialize`. */
  readonly started: number;
}

async function start(args: readonly string[]): Promise<Running> {
  const begin = performance.now();
  const child = spawn(process.execPath, args, { stdio: ["pipe", "pipe", "inherit"] });
  const connection = createProtocolConnection(
    new StreamMessageReader(child.stdout),
    new StreamMessageWriter(child.stdin),
  );
  connection.onNotification(() => {});
  connection.listen();
  await connection.sendRequest("initialize", {
    processId: null,
    rootUri: null,
    capabilities: {},
    initializationOptions: {},
  });
  const started = performance.now() - begin;
  await connection.sendNotification("initialized", {});
  return { connection, child, started };
}

/** The example notes one after another until there are enough lines. */
function noteOf(lines: number): string {
  const folder = "media/example-notes";
  const notes = readdirSync(folder)
    .filter((name) => name.endsWith(".md"))
    .map((name) => readFileSync(path.join(folder, name), "utf8"));
  let text = "";
  for (let at = 0; text.split("\n").length < lines; at++) text += `${notes[at % notes.length]}\n`;
  return text.split("\n").slice(0, lines).join("\n");
}

async function hints({ connection }: Running, uri: string): Promise<unknown> {
  const range = { start: { line: 0, character: 0 }, end: { line: 100_000, character: 0 } };
  return await connection.sendRequest("textDocument/inlayHint", { textDocument: { uri }, range });
}

async function firstHints(running: Running): Promise<number> {
  const uri = "file:///first.md";
  const begin = performance.now();
  await running.connection.sendNotification("textDocument/didOpen", {
    textDocument: { uri, languageId: "markdown", version: 1, text: noteOf(200) },
  });
  await hints(running, uri);
  return performance.now() - begin;
}

/** One letter typed at the end of a line in the middle, and the hints asked again. */
async function keystrokes(running: Running): Promise<readonly number[]> {
  const uri = "file:///long.md";
  const text = noteOf(2_000);
  await running.connection.sendNotification("textDocument/didOpen", {
    textDocument: { uri, languageId: "markdown", version: 1, text },
  });
  await hints(running, uri);
  const at = { line: 1_000, character: 0 };
  const times: number[] = [];
  for (let version = 2; version < KEYS + 2; version++) {
    const begin = performance.now();
    await running.connection.sendNotification("textDocument/didChange", {
      textDocument: { uri, version },
      contentChanges: [{ range: { start: at, end: at }, text: "a" }],
    });
    await hints(running, uri);
    times.push(performance.now() - begin);
  }
  return times.sort((a, b) => a - b);
}

const quantile = (sorted: readonly number[], share: number): number =>
  sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? 0;

/** The bundle of the extension, compiled as an editor would (its own top level needs an editor and is not run). */
function activation(): number {
  const source = readFileSync("dist/client-node.cjs", "utf8");
  const begin = performance.now();
  new Script(source, { filename: "client-node.cjs" });
  return performance.now() - begin;
}

const ms = (value: number): string => `${value.toFixed(1)} ms`;
const ours = await start(SERVER);
const empty = await start(["-e", EMPTY_SERVER]);
const [oursFirst, emptyFirst] = [await firstHints(ours), await firstHints(empty)];
const [oursKeys, emptyKeys] = [await keystrokes(ours), await keystrokes(empty)];
const memory = /VmRSS:\s+(\d+)/.exec(
  existsSync(`/proc/${ours.child.pid}/status`) ? readFileSync(`/proc/${ours.child.pid}/status`, "utf8") : "",
);
console.log(`                                          ours          empty server    aim`);
console.log(`server from start to initialized          ${ms(ours.started).padEnd(14)}${ms(empty.started)}`);
console.log(`first hints of a 200-line note            ${ms(oursFirst).padEnd(14)}${ms(emptyFirst).padEnd(16)}500 ms`);
console.log(
  `keystroke to hints, 2,000 lines, median   ${ms(quantile(oursKeys, 0.5)).padEnd(14)}${ms(quantile(emptyKeys, 0.5))}`,
);
console.log(
  `keystroke to hints, 2,000 lines, p95      ${ms(quantile(oursKeys, 0.95)).padEnd(14)}${ms(quantile(emptyKeys, 0.95)).padEnd(16)}30 ms`,
);
console.log(`extension's bundle compiled               ${ms(activation()).padEnd(30)}60 ms`);
if (memory) console.log(`server's memory after it                  ${(Number(memory[1]) / 1024).toFixed(0)} MB`);
if (existsSync("dist/oxomargin.vsix"))
  console.log(
    `.vsix                                     ${(statSync("dist/oxomargin.vsix").size / 1e6).toFixed(2)} MB                       1.5 MB`,
  );
ours.child.kill();
empty.child.kill();
process.exit(0);
