/** Where a command reads and prints; waits for a slow reader, and is silent about progress unless it is seen on a terminal. */

import { once } from "node:events";

export interface Streams {
  readonly input: NodeJS.ReadableStream;
  print(text: string): Promise<void>;
  warn(message: string): void;
  /** Shows how far a run is, at most ten times a second; undefined takes the line away. */
  progress(words: (() => string) | undefined): void;
}

const SHOW_EVERY_MS = 100;

/** The streams of this process. */
export function processStreams(): Streams {
  const { stdin, stdout, stderr } = process;
  // A reader that has seen enough (head, a pager) closes the pipe: that is no error of ours.
  stdout.on("error", (error: NodeJS.ErrnoException) => {
    if (error.code !== "EPIPE")
      stderr.write(`oxomargin: standard output cannot be written (${error.code ?? error.message})\n`);
    process.exit(error.code === "EPIPE" ? 0 : 2);
  });
  const seen = stderr.isTTY && !stdout.isTTY;
  let shown = Number.NEGATIVE_INFINITY;
  return {
    input: stdin,
    async print(text) {
      if (!stdout.write(text)) await once(stdout, "drain");
    },
    warn(message) {
      stderr.write(`${seen ? "\r\u001b[K" : ""}oxomargin: ${message}\n`);
    },
    progress(words) {
      if (!seen) return;
      if (words === undefined) stderr.write("\r\u001b[K");
      else if (performance.now() - shown > SHOW_EVERY_MS) {
        shown = performance.now();
        stderr.write(`\r${words()}\u001b[K`);
      }
    },
  };
}

/** All bytes of an input. */
export async function readAll(input: NodeJS.ReadableStream): Promise<Uint8Array> {
  const chunks: Buffer[] = [];
  for await (const chunk of input) chunks.push(Buffer.from(chunk as Uint8Array));
  return Buffer.concat(chunks);
}
