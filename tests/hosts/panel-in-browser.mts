/** The panel in VS Code in the browser: plots, sliders by keyboard, table, policy, and no accessibility violation that axe can find. */

import { readFileSync } from "node:fs";
import type { Frame } from "playwright-core";
import { startBrowserHost } from "./browser-host.mts";
import { createChecks, mustShow } from "./checks.mts";
import { unpackExtension, workspaceNotes } from "./extension-folder.mts";
import { clickOn, command, openNote, type Person, picture, sitDown, webviewWith } from "./person.mts";

const AXE = readFileSync("node_modules/axe-core/axe.min.js", "utf8");

export async function panelHost(): Promise<number> {
  const host = await startBrowserHost({
    extension: unpackExtension(),
    files: workspaceNotes(),
    settings: { "workbench.colorTheme": "Default Light Modern" },
  });
  const person = await sitDown(host.url, { width: 1500, height: 950 });
  const checks = createChecks((name) => picture(person, `failed-${name.replaceAll(/\W+/g, "-")}`));
  let frame: Frame | undefined;

  await checks.check("the panel opens on the charge at the cursor", async () => {
    await openNote(person, "trial.md", "Trial of the day");
    await clickOn(person, "Acetaldehyde", "4.41 g");
    await command(person, "Plot the forms in this flask");
    frame = await webviewWith(person, "#plot canvas");
    await frame.locator(".key li", { hasText: "hydrate" }).first().waitFor();
    mustShow(await frame.locator("#title").textContent(), /acetaldehyde/i);
    await person.page.waitForTimeout(500);
    await picture(person, "panel-water");
  });
  await checks.check("the page's policy lets nothing else in", async () => {
    const policy = await frame?.locator("meta[http-equiv='Content-Security-Policy']").first().getAttribute("content");
    mustShow(policy ?? "", "default-src 'none'");
    mustShow(policy ?? "", /script-src 'nonce-[0-9a-f]{32}'(?:;|$)/);
    if (/unsafe/.test(policy ?? "")) throw new Error(`the policy is ${policy}`);
  });
  for (const axis of ["pH", "temperature", "concentration", "time"] as const)
    await checks.check(`plots against ${axis}`, async () => {
      await frame?.locator("#axis").selectOption(axis);
      await frame
        ?.locator("#plot .u-label", { hasText: /pH|Temperature|Concentration|Time/ })
        .first()
        .waitFor({ timeout: 3000 })
        .catch(() => {});
      await person.page.waitForTimeout(400);
      await picture(person, `panel-${axis}`);
      const rows = (await frame?.locator("#table tbody tr").count()) ?? 0;
      if (rows < 10) throw new Error(`the table has ${rows} rows`);
    });
  await checks.check("a slider answers the keyboard and moves the figures", () => slides(person, frame));
  await checks.check("axe finds no violation", async () => {
    if (!frame) throw new Error("the panel did not open");
    const found = await violations(frame);
    if (found.length > 0) throw new Error(found.join("; "));
  });
  await person.leave();
  host.close();
  return checks.failed;
}

/** Hydration of acetaldehyde falls with temperature (exothermic; Bell 1966): the table must say so after the slider moved. */
async function slides(person: Person, frame: Frame | undefined): Promise<void> {
  if (!frame) throw new Error("the panel did not open");
  await frame.locator("#axis").selectOption("pH");
  const neutral = async (): Promise<number> => {
    const cells = await frame.locator("#table tbody tr").nth(5).locator("td").first().textContent();
    return Number(cells?.split(" / ")[0]);
  };
  await frame.locator("details summary").click();
  await person.page.waitForTimeout(400);
  const before = await neutral();
  const slider = frame.locator("#slide-temperature");
  await slider.focus();
  for (let press = 0; press < 30; press++) await person.page.keyboard.press("ArrowRight");
  await person.page.waitForTimeout(800);
  const after = await neutral();
  if (!(Math.abs(after - before) > 5)) throw new Error(`the first figure went from ${before} to ${after}`);
}

/** Our page alone, with axe put in past its policy by the debugger. */
async function violations(frame: Frame): Promise<string[]> {
  await frame.evaluate(AXE);
  const result = await frame.evaluate(async () => {
    const { axe } = globalThis as unknown as {
      axe: { run(): Promise<{ violations: { id: string; nodes: { html: string }[] }[] }> };
    };
    return (await axe.run()).violations.map(
      ({ id, nodes }) => `${id}: ${nodes.map((node) => node.html.slice(0, 120)).join(", ")}`,
    );
  });
  return result;
}
