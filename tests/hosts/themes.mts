/** The same note and card in light, dark and both high-contrast themes: pictures to be looked at, and what can be asserted of them. */

import { startBrowserHost } from "./browser-host.mts";
import { createChecks } from "./checks.mts";
import { unpackExtension, workspaceNotes } from "./extension-folder.mts";
import { clickOn, command, openNote, picture, restOn, sitDown, webviewWith } from "./person.mts";

const THEMES: Readonly<Record<string, { readonly name: string; readonly ink: RegExp }>> = {
  dark: { name: "Default Dark Modern", ink: /#d4d4d4/ },
  "high-contrast-dark": { name: "Default High Contrast", ink: /#ffffff/ },
  "high-contrast-light": { name: "Default High Contrast Light", ink: /#000000/ },
};

export async function themesHost(): Promise<number> {
  const extension = unpackExtension();
  const checks = createChecks();
  for (const [theme, { name, ink }] of Object.entries(THEMES))
    await checks.check(`card and panel in ${theme}`, async () => {
      const host = await startBrowserHost({
        extension,
        files: workspaceNotes(),
        settings: { "workbench.colorTheme": name },
      });
      const person = await sitDown(host.url, { width: 1400, height: 850 });
      try {
        await openNote(person, "trial.md", "Trial of the day");
        await restOn(person, "Acetaldehyde", "4.41 g");
        const image = person.page.locator(".monaco-hover:not(.hidden) img").first();
        await image.waitFor({ state: "attached" });
        const address = (await image.getAttribute("src")) ?? "";
        const svg = Buffer.from(address.slice(address.indexOf(",") + 1), "base64").toString("utf8");
        if (!ink.test(svg)) throw new Error(`the drawing is not in the theme's ink: ${svg.slice(0, 300)}`);
        await picture(person, `${theme}-card`);
        await person.page.keyboard.press("Escape");
        await clickOn(person, "Acetaldehyde", "4.41 g");
        await command(person, "Plot the forms in this flask");
        await webviewWith(person, "#plot canvas");
        await person.page.waitForTimeout(700);
        await picture(person, `${theme}-panel`);
      } finally {
        await person.leave();
        host.close();
      }
    });
  return checks.failed;
}
