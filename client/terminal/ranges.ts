/** Ranges of an option: LOW..HIGH or LOW..HIGH/STEPS. */

import { UsageError } from "./usage-error.ts";

const MOST_STEPS = 200;
const USUAL_STEPS = 6;

/**
 * The values that an option asks for: one, or evenly spaced ones of a range with both ends.
 *
 * @param read reads one value, and throws a UsageError naming the mend
 * @throws UsageError for a range that cannot be
 */
export function valuesOf(option: string, text: string, read: (one: string) => number): readonly number[] {
  const dots = text.indexOf("..");
  if (dots < 0) return [read(text)];
  const slash = text.lastIndexOf("/");
  const stepped = slash > dots && /^\d+$/.test(text.slice(slash + 1));
  const steps = stepped ? Number(text.slice(slash + 1)) : USUAL_STEPS;
  if (steps < 1 || steps > MOST_STEPS)
    throw new UsageError(`${option}: a range has 1 to ${MOST_STEPS} steps, not ${text.slice(slash + 1)}`);
  const low = read(text.slice(0, dots).trim());
  const high = read(text.slice(dots + 2, stepped ? slash : undefined).trim());
  if (!(low < high)) throw new UsageError(`${option}: the range ${text} must run from the lower to the higher value`);
  return Array.from({ length: steps + 1 }, (_, i) => low + ((high - low) * i) / steps);
}
