/** Neovim and Emacs talk to the packed server over standard input and output; each runs a script that asserts and says so. */

import { execFileSync, spawnSync } from "node:child_process";
import { mkdtempSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { createChecks } from "./checks.mts";
import { unpackExtension } from "./extension-folder.mts";

const NOTE = `# Trial

Chloral hydrate (14.7 g, 100 mmol, 1.0 equiv) was dissolved in water (200 mL) at 25 °C.
`;

export async function terminalEditors(): Promise<number> {
  const server = `node ${path.join(unpackExtension(), "dist", "server-node.mjs")} --stdio`;
  const checks = createChecks();
  const scripts = path.resolve("tests/hosts/terminal-editors");
  const editors: readonly (readonly [string, readonly string[]])[] = [
    ["nvim", ["--headless", "-u", "NONE", "-i", "NONE", "-n", "-c", `luafile ${scripts}/neovim.lua`]],
    ["emacs", ["--batch", "-l", `${scripts}/emacs.el`]],
  ];
  for (const [program, call] of editors) {
    if (spawnSync("which", [program]).status !== 0) {
      console.log(`  skip  ${program} is not on this machine`);
      continue;
    }
    await checks.check(`${program}: findings, card, fix`, async () => {
      const folder = mkdtempSync(path.join(tmpdir(), "oxomargin-stdio-"));
      writeFileSync(path.join(folder, "trial.md"), NOTE);
      execFileSync("git", ["init", "-q", folder]);
      const run = spawnSync(program, call, {
        cwd: folder,
        encoding: "utf8",
        timeout: 60_000,
        env: { ...process.env, LSP_CMD: server },
      });
      const said = `${run.stdout}${run.stderr}`;
      for (const line of said.split("\n").filter((text) => /^(ok|FAIL)/.test(text)))
        console.log(`        ${line.slice(0, 160)}`);
      if (run.status !== 0 || !said.includes("ok   findings gone")) throw new Error(said.slice(-1500));
    });
  }
  return checks.failed;
}
