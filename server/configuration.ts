/** Settings of each note: asked of the client where it answers, else what it sent. */

import { type Connection, DidChangeConfigurationNotification } from "vscode-languageserver";
import type { ClientAbilities } from "./abilities.ts";
import type { StartOptions } from "./protocol.ts";
import { DEFAULT_EDITOR_SETTINGS, type EditorSettings, readSettings, SECTION } from "./settings.ts";

export interface Configuration {
  start(options: StartOptions): void;
  of(uri: string): Promise<EditorSettings>;
  forget(uri: string): void;
  /** Calls back when a setting changed. */
  subscribe(changed: () => void): void;
}

export function createConfiguration(connection: Connection, abilities: () => ClientAbilities): Configuration {
  let sent: EditorSettings = DEFAULT_EDITOR_SETTINGS;
  const asked = new Map<string, Promise<EditorSettings>>();
  const ask = async (uri: string): Promise<EditorSettings> => {
    try {
      return readSettings(await connection.workspace.getConfiguration({ scopeUri: uri, section: SECTION }));
    } catch {
      return sent;
    }
  };
  return {
    start(options) {
      sent = readSettings(options.settings);
    },
    of(uri) {
      if (!abilities().answersConfiguration) return Promise.resolve(sent);
      const known = asked.get(uri) ?? ask(uri);
      asked.set(uri, known);
      return known;
    },
    forget: (uri) => void asked.delete(uri),
    subscribe(changed) {
      if (abilities().registersConfiguration)
        void connection.client.register(DidChangeConfigurationNotification.type, { section: SECTION });
      connection.onDidChangeConfiguration(({ settings }) => {
        const section = (settings as Record<string, unknown> | null)?.[SECTION];
        if (section !== undefined) sent = readSettings(section);
        asked.clear();
        changed();
      });
    },
  };
}
