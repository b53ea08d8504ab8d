/** What both hosts tell the server at the start, and how its answers are shown. */

import * as vscode from "vscode";
import type { StartOptions, Theme } from "../../server/protocol.ts";

/** Notes in any file system, and those not yet saved. */
export const NOTES = [{ language: "markdown" }, { language: "plaintext" }];

/** Commands that a card may run; every other link of the kind stays dead. */
const TRUSTED = ["oxomargin.openPanel", "oxomargin.copyCard"];

export function themeNow(): Theme {
  switch (vscode.window.activeColorTheme.kind) {
    case vscode.ColorThemeKind.Dark:
      return "dark";
    case vscode.ColorThemeKind.HighContrast:
      return "high contrast dark";
    case vscode.ColorThemeKind.HighContrastLight:
      return "high contrast light";
    default:
      return "light";
  }
}

/** @param more what only one host has to say */
export function clientOptions(more: Partial<StartOptions>) {
  const initializationOptions: StartOptions = {
    images: true,
    commandLinks: true,
    pages: true,
    theme: themeNow(),
    ...more,
  };
  return {
    documentSelector: NOTES,
    initializationOptions,
    diagnosticPullOptions: { onChange: true, onTabs: false },
    markdown: { isTrusted: { enabledCommands: TRUSTED }, supportHtml: false },
  };
}
