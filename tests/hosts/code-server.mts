/**
 * The Node host: code-server with the packed .vsix. Too large to install for every run (300 MB), so it runs where
 * CODE_SERVER names the entry of an installed one (node_modules/code-server/out/node/entry.js) and says so where it does not.
 */

import { execFileSync, spawn } from "node:child_process";
import { mkdirSync, mkdtempSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { createChecks, mustShow } from "./checks.mts";
import { workspaceNotes } from "./extension-folder.mts";
import { clickOn, command, openNote, type Person, picture, restOn, sitDown, webviewWith } from "./person.mts";

const PORT = 32_417;

export async function codeServerHost(): Promise<number> {
  const entry = process.env.CODE_SERVER;
  if (!entry) {
    console.log("  skip  CODE_SERVER does not name an installed code-server");
    return 0;
  }
  const folder = mkdtempSync(path.join(tmpdir(), "oxomargin-code-server-"));
  const workspace = path.join(folder, "notes");
  mkdirSync(workspace);
  for (const [name, text] of Object.entries(workspaceNotes())) writeFileSync(path.join(workspace, name), text);
  writeFileSync(path.join(folder, "config.yaml"), `bind-addr: 127.0.0.1:${PORT}\nauth: none\ncert: false\n`);
  const call = [
    entry,
    "--config",
    path.join(folder, "config.yaml"),
    "--user-data-dir",
    path.join(folder, "data"),
    "--extensions-dir",
    path.join(folder, "extensions"),
  ];
  const checks = createChecks();
  await checks.check("the .vsix installs", async () => {
    mustShow(
      execFileSync(process.execPath, [...call, "--install-extension", path.resolve("dist/oxomargin.vsix"), "--force"], {
        encoding: "utf8",
      }),
      "successfully installed",
    );
  });
  const server = spawn(
    process.execPath,
    [
      ...call,
      "--disable-telemetry",
      "--disable-update-check",
      "--disable-workspace-trust",
      "--disable-getting-started-override",
      workspace,
    ],
    { stdio: "ignore" },
  );
  try {
    await answering(`http://127.0.0.1:${PORT}/healthz`);
    const person = await sitDown(`http://127.0.0.1:${PORT}/?folder=${workspace}`, { width: 1400, height: 850 });
    await acts(person, checks);
    await person.leave();
  } finally {
    server.kill();
  }
  return checks.failed;
}

async function acts(person: Person, checks: ReturnType<typeof createChecks>): Promise<void> {
  const { page } = person;
  await checks.check("labels, card and drawings over IPC", async () => {
    await openNote(person, "trial.md", "Trial of the day");
    await page
      .locator(".view-lines", { hasText: /\d+\s%\s/ })
      .first()
      .waitFor();
    await restOn(person, "Acetaldehyde", "4.41 g");
    await page.locator(".monaco-hover:not(.hidden)", { hasText: "95 % range" }).first().waitFor();
    await page.locator(".monaco-hover:not(.hidden) img").first().waitFor({ state: "attached" });
    await picture(person, "code-server-card");
    await page.keyboard.press("Escape");
  });
  await checks.check("the panel plots", async () => {
    await clickOn(person, "Acetaldehyde", "4.41 g");
    await command(person, "Plot the forms in this flask");
    await webviewWith(person, "#plot canvas");
    await picture(person, "code-server-panel");
  });
  await checks.check("the preview shows labels in our own style", async () => {
    await openNote(person, "trial.md", "Trial of the day");
    await command(person, "Markdown: Open Preview to the Side");
    const frame = await webviewWith(person, ".oxomargin-label");
    const edge = await frame
      .locator(".oxomargin-label")
      .first()
      .evaluate((label) => getComputedStyle(label).borderBottomStyle);
    mustShow(edge, "dotted");
    await picture(person, "code-server-preview");
  });
}

async function answering(url: string): Promise<void> {
  for (let turn = 0; turn < 120; turn++) {
    if (
      await fetch(url).then(
        (reply) => reply.ok,
        () => false,
      )
    )
      return;
    await new Promise((done) => setTimeout(done, 500));
  }
  throw new Error("code-server did not start");
}
