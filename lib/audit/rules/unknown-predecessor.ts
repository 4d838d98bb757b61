import { cellAddress } from '@/lib/schedule/cell';
import type { CellEdit, Fix } from '@/lib/schedule/edit';
import type { ActivityList } from '@/lib/schedule/activity-list';
import type { MessageData, Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import { freeIdFix } from '../support/free-id-fix';
import { linkEdit, withId } from '../support/link-edits';
import { removeLinks, writtenIn } from '../support/link-fixes';
import type { Nearness } from '../support/nearest';
import { PRACTICE } from '../support/sources';
import { rewritable } from '../support/rewritable';
import { endsWith, type UnknownLink, unknownLinks } from '../support/unknown-links';
import { called, capital, joined, joinedIn } from '../support/words';

/** How many of the equally near are offered. */
const OFFERED = 5;

const HOW: Record<Nearness, string> = {
  letters: 'it differs only in case, blanks or dashes',
  lookalike: 'it differs only in leading zeros or in signs that look alike',
  edit: 'it is one character away',
};

const UNFIT = {
  itself: 'is the activity itself',
  linked: 'is linked to it already',
  loop: 'would close a loop',
};

const missing = (data: MessageData) => {
  const verb = data.gives === 'successors' ? 'is to be followed by' : 'waits for';
  return `${capital(data.id)} ${verb} ${data.wanted}, and there is no ${data.wanted} in this list.`;
};

function nearFixes(list: ActivityList, unknown: UnknownLink): Fix[] {
  const { cell, item } = writtenIn(list, unknown.link);
  if (!cell || !item || !rewritable(list, cell)) return [];
  const { near, how, wanted, index, link } = unknown;
  return near.slice(0, OFFERED).map((activity) => {
    const edit: CellEdit = linkEdit(cell, [
      { op: 'replace', item: item.text, with: withId(cell, item.text, wanted, activity.id) },
    ]);
    const [from, to] = endsWith(unknown, activity.index);
    const alone = near.length === 1;
    const why = how === null ? '' : `: ${HOW[how]}`;
    const others = near.filter((other) => other !== activity).map(({ id }) => id);
    const reason = alone
      ? `${activity.id} is the nearest ID${why}.`
      : `${activity.id} is as near as ${joined(others)}; which of them is meant must be asked.`;
    return {
      reason,
      edits: [edit],
      changes: [
        { kind: 'remove-link', link: index },
        { kind: 'add-link', from, to, type: link.type, lag: link.lag },
      ],
    };
  });
}

function namingFix(list: ActivityList, { unnamed, wanted }: UnknownLink): Fix[] {
  const fix = unnamed ? freeIdFix(list, unnamed).fix : undefined;
  if (!unnamed || !fix) return [];
  const reason = `Row ${unnamed.row} has no ID of its own, and ${wanted} is the one that follows there.`;
  return [{ ...fix, reason }];
}

function messageOf({ unnamed, near, unfit }: UnknownLink): string {
  if (unnamed) return 'unnamed';
  if (near.length === 1) return 'nearest';
  if (near.length > 1) return 'several';
  return unfit ? 'unfit' : 'none';
}

function removalReason({ near, unfit, unnamed }: UnknownLink): string {
  if (near.length > 0 || unnamed) return 'Without the link, if no activity of the list is meant.';
  if (unfit) return `The nearest ID, ${unfit.id}, ${UNFIT[unfit.why]}, so the link is removed.`;
  return 'No ID of the list is near, so the link is removed.';
}

export const rule: Rule = {
  id: 'unknown-predecessor',
  meta: {
    weight: 'distorts',
    title: 'A predecessor is not in the list',
    about:
      'A link names an ID that no row bears. The network is computed without that link, so the activity may start too early. Often it is a slip: another case, a zero for an O, one key beside the right one.',
    source: PRACTICE,
    messages: {
      nearest: (data) => `${missing(data)} ${joinedIn(data, 'near')} is the nearest.`,
      several: (data) => `${missing(data)} ${joinedIn(data, 'near')} are equally near.`,
      unfit: (data) => `${missing(data)} The nearest, ${data.unfit}, ${data.why}.`,
      unnamed: (data) => `${missing(data)} Row ${data.row} has no ID of its own, and may be meant.`,
      none: (data) => `${missing(data)} No ID is near to it.`,
    },
  },
  limits: {},
  check(context) {
    const { list } = context;
    return unknownLinks(context).map((unknown) => {
      const { owner, wanted, gives, near, unfit, unnamed } = unknown;
      const { cell } = writtenIn(list, unknown.link);
      const removal = removeLinks(list, [unknown.index], removalReason(unknown));
      const [fix, ...alternatives] = [
        ...namingFix(list, unknown),
        ...nearFixes(list, unknown),
        ...(removal ? [removal] : []),
      ];
      return {
        about: `${aboutActivity(list, owner)}|${wanted}`,
        message: messageOf(unknown),
        data: {
          id: called(owner),
          wanted,
          gives,
          near: near.map(({ id }) => id),
          unfit: unfit?.id ?? null,
          why: unfit ? UNFIT[unfit.why] : null,
          row: unnamed?.row ?? null,
          cell: cell ? cellAddress(cell.cell) : null,
        },
        ...at(owner, cell?.cell ?? null),
        fix,
        alternatives,
      };
    });
  },
};
