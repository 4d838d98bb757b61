/**
 * Whether one character more, less or other, or two neighbours exchanged, makes one text of the other
 * (a distance of 1 as Damerau, "A technique for computer detection and correction of spelling errors",
 * Communications of the ACM 7, 1964, counts it).
 */
export function isOneEdit(one: string, other: string): boolean {
  const [short, long] = one.length <= other.length ? [one, other] : [other, one];
  if (long.length - short.length > 1 || one === other) return false;
  let start = 0;
  while (start < short.length && short[start] === long[start]) start++;
  const rest = (text: string, from: number) => text.slice(from);
  if (short.length < long.length) return rest(short, start) === rest(long, start + 1);
  if (rest(short, start + 1) === rest(long, start + 1)) return true;
  const exchanged = short[start] === long[start + 1] && short[start + 1] === long[start];
  return exchanged && rest(short, start + 2) === rest(long, start + 2);
}

/** The text itself and each text that lacks one of its characters: two texts one edit apart share one of them. */
export function lessOne(text: string): Set<string> {
  const texts = new Set([text]);
  for (let i = 0; i < text.length; i++) texts.add(text.slice(0, i) + text.slice(i + 1));
  return texts;
}
