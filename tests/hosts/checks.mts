/** Runs named checks in order, prints each with its time, counts those that failed. */

export interface Checks {
  check(name: string, body: () => Promise<void>): Promise<void>;
  readonly failed: number;
}

/** @param onFailure called after a failed check, for a picture of what was seen */
export function createChecks(onFailure: (name: string) => Promise<void> = async () => {}): Checks {
  let failed = 0;
  return {
    get failed() {
      return failed;
    },
    async check(name, body) {
      const start = performance.now();
      const seconds = (): string => `${((performance.now() - start) / 1000).toFixed(1)} s`;
      try {
        await body();
        console.log(`  ok    ${name} (${seconds()})`);
      } catch (error) {
        failed++;
        console.log(
          `  FAIL  ${name} (${seconds()}): ${error instanceof Error ? error.message.slice(0, 800) : String(error)}`,
        );
        await onFailure(name).catch(() => {});
      }
    },
  };
}

/** @throws Error with what was seen when the text lacks the words */
export function mustShow(seen: string | null, wanted: string | RegExp): void {
  const plain = (seen ?? "").replaceAll("\u00a0", " ");
  const found = typeof wanted === "string" ? plain.includes(wanted) : wanted.test(plain);
  if (!found) throw new Error(`wanted ${wanted}, saw: ${plain.slice(0, 500)}`);
}
