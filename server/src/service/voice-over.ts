import { LineIndex } from '../text/line-index.ts';
import { absolute, type Place } from '../text/span.ts';
import type { Voice } from '../wording/voice.ts';

/** A voice that speaks about one file and may point into others. `lineName`: how the lines of this one are called, where not by their numbers. */
export function voiceOver(file: string, textOf: (file: string) => string, lineName?: (offset: number) => string): Voice {
  const indexes = new Map<string, LineIndex>();
  const indexOf = (name: string): LineIndex => {
    let index = indexes.get(name);
    if (!index) {
      index = LineIndex.of(textOf(name));
      indexes.set(name, index);
    }
    return index;
  };
  return {
    textAt(place: Place): string {
      const span = absolute(place);
      return indexOf(place.anchor.file).text.slice(span.start, span.end);
    },
    lineAt(place) {
      const { start } = absolute(place);
      return lineName && place.anchor.file === file ? lineName(start) : `line ${indexOf(place.anchor.file).lineAt(start) + 1}`;
    },
    otherFile: (place) => (place.anchor.file === file ? undefined : place.anchor.file.slice(place.anchor.file.lastIndexOf('/') + 1)),
  };
}
