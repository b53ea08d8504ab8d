/**
 * Speed and memory as ratios taken in one run on one machine: `npm run bench`.
 * Linters are general-purpose ones from npm, run as their users run them, on the same folder.
 */

import { spawnSync } from "node:child_process";
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import MarkdownIt from "markdown-it";
import { analyze } from "../shared-lib/analyze.ts";
import { createLexicon } from "../shared-lib/compounds/create-lexicon.ts";
import { createStructureToolkit } from "../shared-lib/compounds/structure.ts";
import { longNote, noteOf } from "./corpus.mts";

const TERMINAL = path.resolve("dist/oxomargin.mjs");
const FOLDER_NOTES = Number(process.env.BENCH_FOLDER ?? 300);
const MEMORY_NOTES = Number(process.env.BENCH_MEMORY ?? 10_000);

interface Line {
  readonly what: string;
  readonly measured: string;
  readonly aim: string;
  readonly held: boolean;
}

const median = (times: readonly number[]): number => [...times].sort((a, b) => a - b)[times.length >> 1] as number;

/** Median ms of each work, taken in turns so that a busy moment strikes all alike; the first turns warm up. */
function inTurns(turns: number, ...works: readonly (() => void)[]): readonly number[] {
  const times = works.map((): number[] => []);
  for (let turn = -3; turn < turns; turn++)
    works.forEach((work, i) => {
      const started = performance.now();
      work();
      if (turn >= 0) times[i]?.push(performance.now() - started);
    });
  return times.map(median);
}

const ratio = (a: number, b: number): string => `${(a / b).toFixed(2)}×`;

function parsing(): Line {
  const markdown = new MarkdownIt();
  const options = { format: "markdown", lexicon: createLexicon(), structures: createStructureToolkit() } as const;
  const notes = Array.from({ length: 60 }, (_, i) => noteOf(i));
  const [parse = 1, whole = 1] = inTurns(
    15,
    () => {
      for (const note of notes) markdown.parse(note, {});
    },
    () => {
      for (const note of notes) analyze(note, options);
    },
  );
  const measured = `${ratio(whole, parse)} (${(whole / 60).toFixed(2)} ms a note)`;
  return { what: "whole analysis against markdown-it parsing alone", measured, aim: "≤ 5×", held: whole <= 5 * parse };
}

function growth(): readonly Line[] {
  const options = { format: "markdown", lexicon: createLexicon(), structures: createStructureToolkit() } as const;
  const texts = [20, 40, 80].map(longNote);
  const times = inTurns(9, ...texts.map((text) => () => void analyze(text, options)));
  return [1, 2].map((i) => {
    const by = (times[i] as number) / (times[i - 1] as number);
    return {
      what: `growth, text ${2 ** (i - 1)} to ${2 ** i}`,
      measured: `${by.toFixed(2)}×`,
      aim: "≤ 2.1×",
      held: by <= 2.1,
    };
  });
}

function timed(command: string, args: readonly string[], cwd?: string): number {
  const started = performance.now();
  const { error } = spawnSync(command, args, { cwd, stdio: "ignore" });
  if (error) throw error;
  return performance.now() - started;
}

function coldStart(): Line {
  const note = path.resolve("media/example-notes/1-dilute-in-water.md");
  const [bare = 0, check = 0] = inTurns(
    9,
    () => void timed(process.execPath, ["-e", "0"]),
    () => void timed(process.execPath, [TERMINAL, "check", note]),
  );
  const measured = `node + ${(check - bare).toFixed(0)} ms (node ${bare.toFixed(0)} ms, ${ratio(check, bare)})`;
  return { what: "cold start of check on one note", measured, aim: "≤ node + 120 ms", held: check - bare <= 120 };
}

function folderOf(count: number): string {
  const folder = mkdtempSync(path.join(tmpdir(), "oxomargin-bench-"));
  for (let i = 0; i < count; i++) {
    const place = path.join(folder, `s${i % 20}`);
    mkdirSync(place, { recursive: true });
    writeFileSync(path.join(place, `note-${i}.md`), noteOf(i));
  }
  return folder;
}

function linters(): readonly Line[] {
  const folder = folderOf(FOLDER_NOTES);
  const bin = path.resolve("node_modules/.bin");
  const calls: readonly (readonly [string, readonly string[]])[] = [
    ["markdownlint-cli2", ["**/*.md"]],
    ["cspell", ["lint", "--no-progress", "--no-summary", "**/*.md"]],
  ];
  try {
    const [own = 0, ...others] = inTurns(
      3,
      () => void timed(process.execPath, [TERMINAL, "check", ".", "--format", "ndjson"], folder),
      ...calls.map(
        ([name, args]) =>
          () =>
            void timed(path.join(bin, name), args, folder),
      ),
    );
    return calls.map(([name], i) => {
      const times = (others[i] as number) / own;
      const measured = `${times.toFixed(1)}× (${(own / 1000).toFixed(2)} s and ${((others[i] as number) / 1000).toFixed(2)} s, ${FOLDER_NOTES} notes)`;
      return { what: `faster than ${name}`, measured, aim: "≥ 4×", held: times >= 4 };
    });
  } finally {
    rmSync(folder, { recursive: true });
  }
}

/** Peak resident memory of a run, from the process's own account of it. */
function memory(): Line {
  const folder = folderOf(MEMORY_NOTES);
  try {
    const report = `process.on("exit",()=>process.stderr.write("\\npeak "+process.resourceUsage().maxRSS+"\\n"))`;
    const args = [
      "--import",
      `data:text/javascript,${encodeURIComponent(report)}`,
      TERMINAL,
      "check",
      folder,
      "--format",
      "json",
    ];
    const started = performance.now();
    const { stderr } = spawnSync(process.execPath, args, { stdio: ["ignore", "ignore", "pipe"], encoding: "utf8" });
    const seconds = (performance.now() - started) / 1000;
    const peak = Math.max(...[...stderr.matchAll(/peak (\d+)/g)].map((found) => Number(found[1]))) / 1024;
    const measured = `${peak.toFixed(0)} MB, ${seconds.toFixed(1)} s`;
    return {
      what: `memory, check --format json on ${MEMORY_NOTES} notes`,
      measured,
      aim: "≤ 400 MB",
      held: peak <= 400,
    };
  } finally {
    rmSync(folder, { recursive: true });
  }
}

for (const part of [parsing, growth, coldStart, linters, memory]) {
  const lines = [part()].flat();
  for (const { what, measured, aim, held } of lines) {
    console.log(`${held ? "held  " : "missed"}  ${what}: ${measured} (aim ${aim})`);
    if (!held && process.env.BENCH_STRICT) process.exitCode = 1;
  }
}
