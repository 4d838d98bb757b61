/** Which finding is selected when one moves, filters or adopts. Ids in the order shown. */

/** The id `step` places from `current`, held at both ends; the first (or last) one where nothing is selected. */
export function neighbour(ids: readonly string[], current: string | null, step: 1 | -1): string | null {
  if (ids.length === 0) return null;
  const at = current === null ? -1 : ids.indexOf(current);
  if (at < 0) return (step === 1 ? ids[0] : ids[ids.length - 1]) ?? null;
  return ids[Math.min(ids.length - 1, Math.max(0, at + step))] ?? null;
}

/**
 * What stays selected when the shown list changes from `before` to `after`: the same finding while it is
 * shown, else the nearest one that followed it, else the nearest before it.
 */
export function reselect(
  before: readonly string[],
  after: readonly string[],
  current: string | null,
): string | null {
  if (current === null || after.length === 0) return after[0] ?? null;
  const shown = new Set(after);
  if (shown.has(current)) return current;
  const at = before.indexOf(current);
  if (at < 0) return after[0] ?? null;
  for (let i = at + 1; i < before.length; i += 1) {
    const id = before[i];
    if (id !== undefined && shown.has(id)) return id;
  }
  for (let i = at - 1; i >= 0; i -= 1) {
    const id = before[i];
    if (id !== undefined && shown.has(id)) return id;
  }
  return after[0] ?? null;
}

/** "Finding 3 of 26": the place of the selected one among those shown; null where it is not among them. */
export function placeOf(ids: readonly string[], current: string | null): { at: number; of: number } | null {
  const at = current === null ? -1 : ids.indexOf(current);
  return at < 0 ? null : { at: at + 1, of: ids.length };
}
