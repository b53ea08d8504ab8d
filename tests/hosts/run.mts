/**
 * Drives real editors as a person does and asserts on what is seen. Runs every host whose name is given, or all of them:
 *   tsx tests/hosts/run.mts [browser] [panel] [themes] [terminal-editors] [code-server]
 * A host whose program the machine lacks is skipped, and that is said.
 */

import { browserHost } from "./browser-vscode.mts";
import { codeServerHost } from "./code-server.mts";
import { panelHost } from "./panel-in-browser.mts";
import { terminalEditors } from "./terminal-editors.mts";
import { themesHost } from "./themes.mts";

const HOSTS: Readonly<Record<string, () => Promise<number>>> = {
  browser: browserHost,
  panel: panelHost,
  themes: themesHost,
  "terminal-editors": terminalEditors,
  "code-server": codeServerHost,
};

const wanted = process.argv.slice(2).filter((name) => name in HOSTS);
let failures = 0;
for (const [name, run] of Object.entries(HOSTS)) {
  if (wanted.length > 0 && !wanted.includes(name)) continue;
  console.log(`\n${name}`);
  failures += await run();
}
console.log(failures === 0 ? "\nhosts: all checks passed" : `\nhosts: ${failures} checks failed`);
process.exitCode = failures === 0 ? 0 : 1;
