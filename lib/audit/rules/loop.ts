import type { Tangle } from '@/lib/network';
import type { Fix } from '@/lib/schedule/edit';
import type { ActivityList } from '@/lib/schedule/activity-list';
import type { AuditContext, Defect, MessageData, Rule } from '../rule';
import { at, WHOLE_LIST } from '../support/about';
import { removeLinks, writtenIn } from '../support/link-fixes';
import { otherCuts } from '../support/loop-cuts';
import { GAO_LOGIC } from '../support/sources';
import { called, capital, counted, joined, listIn } from '../support/words';

/** Longer loops are shown by their beginning and their end. */
const SHOWN = 8;
/** IDs in the key: enough to tell one loop from another. */
const IN_KEY = 12;

/** From A, B, C (each waits for the one before it): "A waits for C, C for B, and B for A". */
function chain(loop: readonly (string | number)[]): string {
  const [first = '', ...rest] = loop;
  const backwards = [first, ...rest.reverse(), first];
  const steps = backwards
    .slice(1)
    .map((waited, i) => `${backwards[i]} ${i === 0 ? 'waits ' : ''}for ${waited}`);
  const shown =
    steps.length > SHOWN
      ? [...steps.slice(0, SHOWN - 2), `${steps.length - SHOWN + 1} more like them`, ...steps.slice(-1)]
      : steps;
  const [last, ...before] = shown.toReversed();
  const comma = before.length > 1 ? ',' : '';
  return `${before.toReversed().join(', ')}${comma} and ${last}`;
}

const sentence = (data: MessageData) => `${capital(chain(listIn(data, 'loop')))}.`;

/** The loop turned so that the smallest ID stands first: the same wherever the search began. */
function keyOf(ids: readonly string[]): string {
  const smallest = ids.reduce((best, id, i) => (id < (ids[best] ?? '') ? i : best), 0);
  const turned = [...ids.slice(smallest), ...ids.slice(0, smallest)];
  const rest = turned.length > IN_KEY ? ` +${turned.length - IN_KEY}` : '';
  return turned.slice(0, IN_KEY).join(' ') + rest;
}

function linkWords(list: ActivityList, index: number): string {
  const link = list.links[index];
  const [from, to] = [list.activities[link?.fromIndex ?? -1], list.activities[link?.toIndex ?? -1]];
  return from && to ? `${called(to)} for ${called(from)}` : '';
}

function cutFix(context: AuditContext, tangle: Tangle, others: number): Fix | undefined {
  const { cut, cutIsSmallest } = tangle;
  const links = cut.map((index) => linkWords(context.list, index));
  const what = `Without the wait of ${joined(links)} no loop is left`;
  const ties = others > 0 ? `; ${counted(others, 'other link')} would do as well, so ask which is wrong` : '';
  const fewer = cutIsSmallest ? '; no smaller number of links would do' : '; a smaller number may do';
  const reason = `${what}${cut.length > 1 ? fewer : ties}.`;
  return removeLinks(context.list, cut, reason);
}

function defectOf(context: AuditContext, tangle: Tangle): Defect {
  const { list } = context;
  const idOf = (index: number) => {
    const activity = list.activities[index];
    return activity ? called(activity) : '';
  };
  const loop = tangle.loop.map(idOf);
  const others = otherCuts(context, tangle);
  const { cell } = writtenIn(list, list.links[tangle.cut[0] ?? -1]);
  const owner = cell && list.activities[cell.owner];
  return {
    about: keyOf(loop),
    message: tangle.activities.length > loop.length ? 'tangle' : 'ring',
    data: {
      loop,
      activities: tangle.activities.length,
      cut: tangle.cut.map((index) => linkWords(list, index)),
      smallest: tangle.cutIsSmallest,
    },
    ...(owner ? at(owner, cell.cell) : WHOLE_LIST),
    fix: cutFix(context, tangle, others.length),
    alternatives: others.flatMap(
      (index) =>
        removeLinks(list, [index], `Without the wait of ${linkWords(list, index)} no loop is left either.`) ??
        [],
    ),
  };
}

export const rule: Rule = {
  id: 'loop',
  meta: {
    weight: 'blocks',
    title: 'Activities wait for one another in a ring',
    about:
      'A chain of links returns to where it started, so none of its activities can be the first, and no date can be computed. Where loops share activities they are one tangle: it is one finding, shown by a shortest loop, with the fewest links that leave no loop in it.',
    source: GAO_LOGIC,
    messages: {
      ring: sentence,
      tangle: (data) =>
        `${sentence(data)} This is the shortest loop among ${data.activities} activities that wait for one another.`,
    },
  },
  limits: {},
  check(context) {
    return context.tangles.map((tangle) => defectOf(context, tangle));
  },
};
