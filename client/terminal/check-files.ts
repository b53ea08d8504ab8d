/** Checks many files on several threads with bounded memory; results come in the order of the files. */

import { availableParallelism } from "node:os";
import type { CheckedFile, CheckTask } from "./check-file.ts";

/** From this many notes on, threads earn their start and their warming up (measured: 150 notes are faster on one). */
const FEWEST_FOR_THREADS = 400;
/** A thread beyond this many adds memory, not speed, to work that ends in one stream. */
const MOST_THREADS = 8;
/** Notes in work or done and waiting for their turn, a thread. */
const AHEAD = 16;

/** Threads for a call: as asked, else as many as the machine runs at once, none for a handful of notes. */
export function threadsFor(files: number, asked: number | undefined): number {
  if (asked !== undefined) return Math.min(asked, files);
  return files < FEWEST_FOR_THREADS ? 1 : Math.min(MOST_THREADS, availableParallelism());
}

async function* oneByOne(tasks: readonly CheckTask[]): AsyncGenerator<CheckedFile> {
  const { checkFile } = await import("./check-file.ts");
  for (const task of tasks) yield await checkFile(task);
}

async function* onThreads(tasks: readonly CheckTask[], threads: number, entry: string): AsyncGenerator<CheckedFile> {
  const { Tinypool } = await import("tinypool");
  const pool = new Tinypool({
    filename: entry,
    name: "checkInThread",
    minThreads: threads,
    maxThreads: threads,
    concurrentTasksPerWorker: 2,
  });
  const running: Promise<CheckedFile>[] = [];
  const start = (task: CheckTask): void => {
    const run = pool
      .run(task)
      .catch((error: unknown): CheckedFile => ({ ok: false, problem: `its thread failed (${String(error)})` }));
    running.push(run as Promise<CheckedFile>);
  };
  try {
    let next = 0;
    for (let done = 0; done < tasks.length; done++) {
      while (next < tasks.length && running.length < threads * AHEAD) start(tasks[next++] as CheckTask);
      yield await (running.shift() as Promise<CheckedFile>);
    }
  } finally {
    await pool.destroy();
  }
}

/**
 * Results of the tasks, in their order.
 *
 * @param entry address of the bundle's entry module, which the threads load
 */
export function checkFiles(tasks: readonly CheckTask[], threads: number, entry: string): AsyncGenerator<CheckedFile> {
  return threads > 1 ? onThreads(tasks, threads, entry) : oneByOne(tasks);
}
