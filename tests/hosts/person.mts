/** What a person does in the editor, in Chromium: open a note, rest the pointer, ask for fixes, run a command, read. */

import { mkdirSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { type BrowserContext, chromium, type Frame, type Locator, type Page } from "playwright-core";

export const SHOTS = "test-results";
const CHROMIUM = process.env.CHROMIUM_PATH ?? "/usr/bin/chromium";
const PATIENCE = 20_000;

export interface Person {
  readonly page: Page;
  /** Lines that the page wrote as errors. */
  readonly errors: readonly string[];
  leave(): Promise<void>;
}

export async function sitDown(url: string, size = { width: 1200, height: 750 }): Promise<Person> {
  mkdirSync(SHOTS, { recursive: true });
  const profile = mkdtempSync(path.join(tmpdir(), "oxomargin-host-"));
  const context: BrowserContext = await chromium.launchPersistentContext(profile, {
    executablePath: CHROMIUM,
    headless: true,
    viewport: size,
    args: [
      "--no-sandbox",
      "--disable-gpu",
      "--no-first-run",
      "--disable-background-networking",
      "--disable-component-update",
      "--disable-sync",
    ],
  });
  await context.grantPermissions(["clipboard-read", "clipboard-write"]);
  const page = context.pages()[0] ?? (await context.newPage());
  page.setDefaultTimeout(PATIENCE);
  // The loader that runs these tests marks functions with a helper that the page does not have.
  await page.addInitScript("globalThis.__name = (body) => body");
  const errors: string[] = [];
  page.on("console", (message) => {
    if (message.type() === "error") errors.push(message.text().slice(0, 600));
  });
  await page.goto(url, { timeout: 90_000, waitUntil: "commit" });
  await page.locator(".monaco-workbench").waitFor({ timeout: 60_000 });
  return {
    page,
    errors,
    async leave() {
      await context.close();
      rmSync(profile, { recursive: true, force: true });
    },
  };
}

/** Opens a note by name; asks again while the workspace is still loading. */
export async function openNote({ page }: Person, name: string, words: string): Promise<void> {
  const row = page.locator(".quick-input-list .monaco-list-row", { hasText: name }).first();
  const end = Date.now() + 3 * PATIENCE;
  for (;;) {
    await page.keyboard.press("Control+P");
    const box = page.locator(".quick-input-widget input.input");
    const asked = box.fill(name, { timeout: 4_000 }).then(() => row.click({ timeout: 4_000 }));
    const found = await asked.then(
      () => true,
      () => false,
    );
    if (found) break;
    await page.keyboard.press("Escape");
    if (Date.now() > end) throw new Error(`the workspace does not show ${name}`);
  }
  await page.locator(".view-lines", { hasText: words }).first().waitFor();
}

/** Runs a command by its title in the palette. */
export async function command({ page }: Person, title: string): Promise<void> {
  await page.keyboard.press("F1");
  const box = page.locator(".quick-input-widget input.input");
  await box.waitFor();
  await box.fill(`>${title}`);
  await page.locator(".quick-input-list .monaco-list-row", { hasText: title }).first().click();
}

/** The middle of the first place where the editor shows the words, on the screen. */
export async function placeOf({ page }: Person, words: string, line?: string): Promise<{ x: number; y: number }> {
  const place = await page.evaluate(
    ([wanted, within]) => {
      const plain = (text: string): string => text.replaceAll("\u00a0", " ");
      for (const row of document.querySelectorAll(".monaco-editor .view-line")) {
        if (within !== undefined && !plain(row.textContent ?? "").includes(within)) continue;
        const walker = document.createTreeWalker(row, NodeFilter.SHOW_TEXT);
        const nodes: Text[] = [];
        while (walker.nextNode()) nodes.push(walker.currentNode as Text);
        const whole = plain(nodes.map((node) => node.data).join(""));
        const at = whole.indexOf(wanted as string);
        if (at < 0) continue;
        let left = at + Math.floor((wanted as string).length / 2);
        const node = nodes.find((candidate) => {
          if (left < candidate.length) return true;
          left -= candidate.length;
          return false;
        });
        if (!node) continue;
        const range = document.createRange();
        range.setStart(node, left);
        range.setEnd(node, Math.min(node.length, left + 1));
        const box = range.getBoundingClientRect();
        return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
      }
      return undefined;
    },
    [words, line],
  );
  if (!place) throw new Error(`the editor does not show “${words}”`);
  return place;
}

/** Rests the pointer on words and gives the card; tries again while the server is still starting. */
export async function restOn(person: Person, words: string, line?: string): Promise<Locator> {
  const card = person.page.locator(".monaco-hover:not(.hidden)").first();
  const end = Date.now() + PATIENCE;
  for (;;) {
    const { x, y } = await placeOf(person, words, line);
    await person.page.mouse.move(x - 40, y + 200);
    await person.page.mouse.move(x, y, { steps: 4 });
    const seen = await card.waitFor({ timeout: 3_000 }).then(
      () => true,
      () => false,
    );
    if (seen) return card;
    if (Date.now() > end) throw new Error(`no card appears over “${words}”`);
  }
}

/** Puts the cursor on words. */
export async function clickOn(person: Person, words: string, line?: string): Promise<void> {
  const { x, y } = await placeOf(person, words, line);
  await person.page.mouse.click(x, y);
}

/** A page inside a webview that holds the selector. */
export async function webviewWith({ page }: Person, selector: string): Promise<Frame> {
  const end = Date.now() + PATIENCE;
  while (Date.now() < end) {
    for (const frame of page.frames())
      if (
        (await frame
          .locator(selector)
          .count()
          .catch(() => 0)) > 0
      )
        return frame;
    await page.waitForTimeout(200);
  }
  throw new Error(`no webview shows ${selector}`);
}

export async function picture({ page }: Person, name: string): Promise<void> {
  await page.screenshot({ path: path.join(SHOTS, `${name}.png`) });
}
