/** Where a command reads and prints; waits for a slow reader, and is silent about progress unless it is seen on a terminal. */

import { once } from "node:events";

export interface Streams {
  readonly input: NodeJS.ReadableStream;
  print(text: string): Promise<void>;
  warn(message: string): void;
  progress(message: string): void;
}

export function processStreams(): Streams {
  const { stdin, stdout, stderr } = process;
  // A reader that has seen enough (head, a pager) closes the pipe: that is no error of ours.
  stdout.on("error", (error: NodeJS.ErrnoException) => {
    if (error.code === "EPIPE") process.exit(0);
    throw error;
  });
  return {
    input: stdin,
    async print(text) {
      if (!stdout.write(text)) await once(stdout, "drain");
    },
    warn(message) {
      stderr.write(`oxomargin: ${message}\n`);
    },
    progress(message) {
      if (stderr.isTTY && !stdout.isTTY) stderr.write(`\r${message}\u001b[K`);
    },
  };
}

/** The whole of an input as UTF-8. */
export async function readAll(input: NodeJS.ReadableStream): Promise<string> {
  const chunks: Buffer[] = [];
  for await (const chunk of input) chunks.push(Buffer.from(chunk as Uint8Array));
  return Buffer.concat(chunks).toString("utf8");
}
