/** Positions in a note: UTF-16 code units from the start of the text, half-open. */

export interface Span {
  readonly start: number;
  readonly end: number;
}

/** The same span, moved by `by` code units. */
export function moved<T extends Span>(span: T, by: number): T {
  return by === 0 ? span : { ...span, start: span.start + by, end: span.end + by };
}
