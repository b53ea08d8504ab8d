import { compileTables } from "../scripts/compile-tables.mts";

/** The tables are compiled before any test, so that a test never sees yesterday's numbers. */
export async function setup(): Promise<void> {
  await compileTables();
}
