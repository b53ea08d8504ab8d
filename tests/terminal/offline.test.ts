/** Nothing leaves the machine: the bundles ask for no network module of their own, and a run with every socket barred works. */

import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, it } from "vitest";
import { bundledTerminal, oxomargin } from "./run-terminal.ts";

/** Bars sockets, name look-ups and servers before the command is loaded; using one ends the run with status 86. */
const BARRED = `data:text/javascript,${encodeURIComponent(`
import net from "node:net"; import dns from "node:dns"; import dgram from "node:dgram"; import { syncBuiltinESMExports } from "node:module";
const bar = (what) => () => { process.stderr.write("network: " + what); process.exit(86); };
net.Socket.prototype.connect = bar("connect"); net.Server.prototype.listen = bar("listen");
for (const name of ["lookup", "resolve", "resolve4", "resolve6"]) dns[name] = bar(name);
dgram.createSocket = bar("udp"); globalThis.fetch = bar("fetch"); globalThis.WebSocket = bar("websocket");
syncBuiltinESMExports();
`)}`;

describe("with every socket barred", () => {
  it.each([
    [["check", "media/example-notes", "--format", "html"]],
    [["check", "media/example-notes", "--format", "ndjson", "--jobs", "2"]],
    [["estimate", "O=Cc1ccccn1", "--in", "9:1 MeOH/H2O"]],
    [["fix", "media/example-notes"]],
  ])("%j works", async (args) => {
    const ran = await oxomargin(args, { node: ["--import", BARRED] });
    expect(ran).toMatchObject({ status: 0, err: "" });
  });

  it("the bar itself bites", async () => {
    const { run } = await import("./run-terminal.ts");
    const call = `import("node:net").then((net)=>net.connect(9))`;
    expect((await run(process.execPath, ["--import", BARRED, "-e", call])).status).toBe(86);
  });
});

describe("the bundle of check, estimate and fix", () => {
  it("holds no call of a network module and no code made from text", async () => {
    const folder = path.dirname(await bundledTerminal());
    // Two libraries can do more than is asked of them: the server's may listen on a socket that its user names, the structure
    // toolkit's may fetch tables for functions that are never called. The barred runs above show that neither does.
    const texts = readdirSync(folder)
      .filter((name) => name.endsWith(".js"))
      .map((name) => readFileSync(path.join(folder, name), "utf8"))
      .filter((text) => !text.includes("node_modules/vscode-jsonrpc") && !text.includes("node_modules/openchemlib"));
    expect(texts.length).toBeGreaterThan(3);
    for (const text of texts)
      expect(text).not.toMatch(
        /["'](?:node:)?(?:https?|http2|net|tls|dgram|dns)["']|\bfetch\s*\(|new (?:WebSocket|XMLHttpRequest|EventSource|Function)\b|\beval\s*\(/,
      );
  });
});
