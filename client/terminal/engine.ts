/** The analysis as the terminal runs it: the structure toolkit is loaded when the first note needs it. */

import { type Analysis, analyze } from "../../shared-lib/analyze.ts";
import { createLexicon } from "../../shared-lib/compounds/create-lexicon.ts";
import type { Lexicon } from "../../shared-lib/compounds/lexicon.ts";
import type { StructureToolkit } from "../../shared-lib/compounds/types.ts";

export class Engine {
  readonly lexicon: Lexicon = createLexicon();
  #structures: StructureToolkit | undefined;

  /** The toolkit, loaded once. */
  async structures(): Promise<StructureToolkit> {
    this.#structures ??= (await import("../../shared-lib/compounds/structure.ts")).createStructureToolkit();
    return this.#structures;
  }

  /** Analysis of a note in the format that the end of its name says: Markdown, or plain text for any other. */
  async analyze(text: string, name: string): Promise<Analysis> {
    const format = /\.(?:md|markdown)$/i.test(name) ? "markdown" : "plain";
    const options = { format, lexicon: this.lexicon } as const;
    const first = analyze(text, this.#structures ? { ...options, structures: this.#structures } : options);
    return first.reading.needsStructures ? analyze(text, { ...options, structures: await this.structures() }) : first;
  }
}
