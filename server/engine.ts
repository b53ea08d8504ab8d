/** The one place of the server that holds the lexicon and the structure toolkit; everything else gets plain analyses. */

import { type Analysis, analyze } from "../shared-lib/analyze.ts";
import { createLexicon } from "../shared-lib/compounds/create-lexicon.ts";
import type { Lexicon } from "../shared-lib/compounds/lexicon.ts";
import type { StructureToolkit } from "../shared-lib/compounds/types.ts";
import type { Settings } from "../shared-lib/model/settings.ts";

export type NoteFormat = "markdown" | "plain";

export interface Engine {
  analyze(text: string, format: NoteFormat, settings: Settings): Analysis;
  lexicon(): Lexicon;
  /** The toolkit when it is loaded. */
  structures(): StructureToolkit | undefined;
  /** Loads the toolkit once; undefined when it cannot be loaded (the reason goes to `report`). */
  loadStructures(): Promise<StructureToolkit | undefined>;
}

/**
 * @param load fetches the structure toolkit, as this host can
 * @param report takes the reason why it could not be loaded
 */
export function createEngine(load: () => Promise<StructureToolkit>, report: (problem: string) => void): Engine {
  const lexicon = createLexicon();
  let toolkit: StructureToolkit | undefined;
  let loading: Promise<StructureToolkit | undefined> | undefined;
  return {
    analyze: (text, format, settings) =>
      analyze(text, { format, lexicon, settings, ...(toolkit ? { structures: toolkit } : {}) }),
    lexicon: () => lexicon,
    structures: () => toolkit,
    loadStructures() {
      loading ??= load().then(
        (loaded) => {
          toolkit = loaded;
          return loaded;
        },
        (error: unknown) => {
          report(`The structure toolkit cannot be loaded: ${error instanceof Error ? error.message : String(error)}`);
          return undefined;
        },
      );
      return loading;
    },
  };
}
