/** Something that can be gone to by its name. */
export interface Target {
  readonly key: string;
  /** What is shown and looked in first: a name. */
  readonly label: string;
  /** A code or an ID, looked in as well. */
  readonly code: string;
  readonly kind: 'place' | 'project' | 'activity' | 'rule';
  readonly href: string;
}

/** Best first: the code itself, then names and codes that begin so, then words within, then anything that holds it. */
export function findTargets(targets: readonly Target[], query: string, limit = 12): Target[] {
  const wanted = folded(query.trim());
  if (wanted === '')
    return targets.filter(({ kind }) => kind === 'place' || kind === 'project').slice(0, limit);
  const ranked = targets.flatMap((target, order) => {
    const rank = Math.min(rankOf(folded(target.label), wanted), rankOf(folded(target.code), wanted));
    return rank === NO_MATCH ? [] : [{ target, rank, order }];
  });
  ranked.sort((a, b) => a.rank - b.rank || a.order - b.order);
  return ranked.slice(0, limit).map(({ target }) => target);
}

const NO_MATCH = 4;

function rankOf(text: string, wanted: string): number {
  if (text === wanted) return 0;
  if (text.startsWith(wanted)) return 1;
  const at = text.indexOf(wanted);
  if (at === -1) return NO_MATCH;
  return /[\p{L}\p{N}]/u.test(text.charAt(at - 1)) ? 3 : 2;
}

/** Without case and accents, so that "cote" finds "Côte". */
function folded(text: string): string {
  return text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase();
}
