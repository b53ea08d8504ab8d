/** Offsets to lines and columns, by binary search. */

export interface Place {
  /** From 1. */
  readonly line: number;
  readonly column: number;
}

/** Starts of the lines of a text. */
export function lineStartsOf(text: string): readonly number[] {
  const starts = [0];
  for (let i = text.indexOf("\n"); i >= 0; i = text.indexOf("\n", i + 1)) starts.push(i + 1);
  return starts;
}

/** Line and column (both from 1) of an offset. */
export function placeOf(starts: readonly number[], offset: number): Place {
  let low = 0;
  let high = starts.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if ((starts[middle] as number) <= offset) low = middle;
    else high = middle - 1;
  }
  return { line: low + 1, column: offset - (starts[low] as number) + 1 };
}
