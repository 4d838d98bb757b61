import type { Link } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { RELATION_NAMES } from '@/lib/schedule/relation';
import type { Rule } from '../rule';
import { at } from '../support/about';
import { removeLinks, writtenIn } from '../support/link-fixes';
import { GAO_LOGIC } from '../support/sources';
import { amount, called, capital } from '../support/words';

/** Links into one activity by predecessor and relation, where several are alike and written in one way. */
function alike(list: ActivityList, into: readonly number[]): number[][] {
  if (into.length < 2) return [];
  const groups = new Map<string, number[]>();
  for (const index of into) {
    const link = list.links[index];
    if (!link || link.fromIndex < 0 || link.fromIndex === link.toIndex) continue;
    // A list may say each link from both its ends.
    const key = `${link.fromIndex} ${link.type} ${list.linkCells[link.linkCell]?.gives}`;
    const group = groups.get(key);
    if (group) group.push(index);
    else groups.set(key, [index]);
  }
  return [...groups.values()].filter(({ length }) => length > 1);
}

/** The one that binds: with the largest lag, the first of several. */
function binding(links: readonly Link[], group: readonly number[]): number {
  return group.reduce((best, index) => ((links[index]?.lag ?? 0) > (links[best]?.lag ?? 0) ? index : best));
}

export const rule: Rule = {
  id: 'repeated-link',
  meta: {
    weight: 'query',
    title: 'The same link stands twice',
    about:
      'Two links join the same pair of activities with the same relation. Only the one with the larger lag binds; the other says nothing, or says something else than was meant.',
    source: GAO_LOGIC,
    messages: {
      same: (data) =>
        `${capital(data.to)} waits for ${data.from} twice, ${data.relation}, ${data.kept} each time.`,
      lags: (data) =>
        `${capital(data.to)} waits for ${data.from} twice, ${data.relation}: once ${data.kept} and once ${data.removed}.`,
    },
  },
  limits: {},
  check({ list, linksInto }) {
    return linksInto
      .flatMap((into) => alike(list, into))
      .flatMap((group) => {
        const kept = list.links[binding(list.links, group)];
        return group.flatMap((index) => {
          const link = list.links[index];
          const { cell } = writtenIn(list, link);
          const [from, to] = [list.activities[link?.fromIndex ?? -1], list.activities[link?.toIndex ?? -1]];
          const owner = cell && list.activities[cell.owner];
          if (!link || !kept || link === kept || !from || !to || !owner) return [];
          const same = link.lag === kept.lag;
          const reason = same
            ? 'The two say the same, so the later one is removed.'
            : `The link ${lagWords(kept.lag)} binds, so the other is removed.`;
          return [
            {
              about: `${from.id}|${to.id}|${link.type}`,
              message: same ? 'same' : 'lags',
              data: {
                from: called(from),
                to: called(to),
                relation: RELATION_NAMES[link.type],
                kept: lagWords(kept.lag),
                removed: lagWords(link.lag),
              },
              ...at(owner, cell.cell),
              fix: removeLinks(list, [index], reason),
            },
          ];
        });
      });
  },
};

function lagWords(lag: number): string {
  if (lag === 0) return 'without a lag';
  return lag > 0 ? `with a lag of ${amount(lag)}` : `with a lead of ${amount(-lag)}`;
}
