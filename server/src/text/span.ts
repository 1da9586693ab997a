/** A half-open range of UTF-16 offsets. */
export interface Span {
  readonly start: number;
  readonly end: number;
}

/**
 * Where a chunk of a file stands now. Everything inside a chunk keeps offsets relative to its anchor, so that a chunk
 * whose text did not change is reused after an edit above it: the front end moves the anchor and nothing else.
 */
export interface Anchor {
  readonly file: string;
  start: number;
}

/** A range inside a chunk; absolute offsets come from `absolute`. */
export interface Place extends Span {
  readonly anchor: Anchor;
}

/** The range of a place in its file, as the anchor stands now. */
export function absolute(place: Place): Span {
  return { start: place.anchor.start + place.start, end: place.anchor.start + place.end };
}

export function placeAt(anchor: Anchor, span: Span): Place {
  return { anchor, start: span.start, end: span.end };
}
