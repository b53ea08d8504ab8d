/** A note's text from its bytes: UTF-8 with or without its mark, or UTF-16 with its mark; anything else is refused, never mangled. */

import { readFile } from "node:fs/promises";

export type TextOfFile =
  | { readonly ok: true; readonly text: string; readonly encoding: "utf-8" | "utf-16" }
  | { readonly ok: false; readonly problem: string };

const SYSTEM_PROBLEMS: Readonly<Record<string, string>> = {
  ENOENT: "it is no longer there",
  EACCES: "no permission to read it",
  EPERM: "no permission to read it",
  EISDIR: "it is a folder",
  ELOOP: "its links lead in a circle",
  EMFILE: "too many files are open",
  ERR_FS_FILE_TOO_LARGE: "it is too large for one note",
};

/** What a system error means to the caller of a command. */
export function systemProblem(error: unknown): string {
  const code = (error as NodeJS.ErrnoException | undefined)?.code ?? "";
  return SYSTEM_PROBLEMS[code] ?? (code === "" ? "it cannot be read" : `it cannot be read (${code})`);
}

/** Byte and line of the first byte that is no UTF-8, found by halving. */
function firstBadByte(bytes: Uint8Array): number {
  let good = 0;
  let bad = bytes.length;
  while (bad - good > 1) {
    const middle = (good + bad) >> 1;
    try {
      new TextDecoder("utf-8", { fatal: true }).decode(bytes.subarray(0, middle), { stream: true });
      good = middle;
    } catch {
      bad = middle;
    }
  }
  return good;
}

/** Text of the bytes; a byte-order mark stays as the first character, so that offsets and a rewrite keep it. */
export function textOfBytes(bytes: Uint8Array): TextOfFile {
  const wide =
    bytes[0] === 0xff && bytes[1] === 0xfe
      ? "utf-16le"
      : bytes[0] === 0xfe && bytes[1] === 0xff
        ? "utf-16be"
        : undefined;
  if (wide) return { ok: true, text: new TextDecoder(wide, { ignoreBOM: true }).decode(bytes), encoding: "utf-16" };
  const nothing = bytes.indexOf(0);
  if (nothing >= 0)
    return { ok: false, problem: `it holds binary data (a zero byte at byte ${nothing + 1}): save it as UTF-8 text` };
  try {
    const text = new TextDecoder("utf-8", { fatal: true, ignoreBOM: true }).decode(bytes);
    return { ok: true, text, encoding: "utf-8" };
  } catch {
    const at = firstBadByte(bytes);
    let line = 1;
    for (let i = 0; i < at; i++) if (bytes[i] === 0x0a) line++;
    return { ok: false, problem: `line ${line} is not UTF-8 (byte ${at + 1}): save the note as UTF-8` };
  }
}

/** Text of a file, or why there is none; never throws. */
export async function readText(file: string): Promise<TextOfFile> {
  try {
    return textOfBytes(await readFile(file));
  } catch (error) {
    return { ok: false, problem: systemProblem(error) };
  }
}
