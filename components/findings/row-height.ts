/** Width of a text in pixels, in the font of its column. */
export type Measure = (text: string) => number;

/** Lines a text takes in a column `width` pixels wide, broken between words; a word too long is broken inside. */
export function linesOf(text: string, width: number, measure: Measure): number {
  if (text === '' || width <= 0) return 1;
  const space = measure(' ');
  let lines = 1;
  let used = 0;
  for (const word of text.split(/\s+/)) {
    const wide = measure(word);
    if (used > 0 && used + space + wide > width) {
      lines += 1;
      used = 0;
    }
    if (wide > width) {
      lines += Math.ceil(wide / width) - 1;
      used = wide % width;
    } else {
      used += (used > 0 ? space : 0) + wide;
    }
  }
  return lines;
}

/** A measure that remembers words: the same few thousand occur again and again. */
export function remembering(measure: Measure): Measure {
  const known = new Map<string, number>();
  return (text) => {
    const seen = known.get(text);
    if (seen !== undefined) return seen;
    const width = measure(text);
    known.set(text, width);
    return width;
  };
}

/** More lines than this are cut off in the grid; the bench shows the whole. */
export const MOST_LINES = 3;
