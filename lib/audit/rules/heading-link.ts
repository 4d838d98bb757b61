import type { Activity, Link } from '@/lib/schedule/activity';
import type { Fix } from '@/lib/schedule/edit';
import type { AuditContext, Defect, Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import { wouldLoop } from '../support/graph';
import { type HeadingEnds, linkedHeadings } from '../support/headings';
import { linkEdit, withId } from '../support/link-edits';
import { removeLinks, writtenIn } from '../support/link-fixes';
import { rewritable } from '../support/rewritable';
import { GAO_LOGIC } from '../support/sources';
import { called, capital, joined } from '../support/words';

/** A fix with more links than this would be no correction but a new plan. */
const MOST = 12;

/** The heading's last activities where it is waited for, its first where it waits. */
function standIns({ list, network }: AuditContext, link: Link, ends: HeadingEnds): Activity[] {
  const [members, own] = link.fromIndex < 0 ? [ends.last, link.toIndex] : [ends.first, link.fromIndex];
  const loops = (other: number) =>
    link.fromIndex < 0 ? wouldLoop(network, other, own) : wouldLoop(network, own, other);
  const named = members.filter((index) => index !== own && !loops(index));
  return named.length < members.length ? [] : named.flatMap((index) => list.activities[index] ?? []);
}

/** One entry for each activity in place of the heading's. */
function replacement(
  { list }: AuditContext,
  index: number,
  activities: readonly Activity[],
  heading: string,
): Fix[] {
  const link = list.links[index];
  const { cell, item } = writtenIn(list, link);
  const [first, ...others] = activities.filter(({ id }) => id !== '');
  if (!link || !cell || !item || !first || activities.length > MOST || !rewritable(list, cell)) return [];
  const entry = (activity: Activity) => withId(cell, item.text, heading, activity.id);
  const which = link.fromIndex < 0 ? 'ends' : 'begins';
  const { type, lag } = link;
  return [
    {
      reason: `What stands under ${heading} ${which} with ${joined(activities.map(called))}.`,
      edits: [
        linkEdit(cell, [
          { op: 'replace', item: item.text, with: entry(first) },
          ...others.map((activity) => ({ op: 'add' as const, item: entry(activity) })),
        ]),
      ],
      changes: [
        { kind: 'remove-link', link: index },
        ...activities.map((activity) =>
          link.fromIndex < 0
            ? { kind: 'add-link' as const, from: activity.index, to: link.toIndex, type, lag }
            : { kind: 'add-link' as const, from: link.fromIndex, to: activity.index, type, lag },
        ),
      ],
    },
  ];
}

function defectOf(context: AuditContext, index: number, ends: HeadingEnds): Defect[] {
  const { list } = context;
  const link = list.links[index];
  const { cell } = writtenIn(list, link);
  const owner = cell && list.activities[cell.owner];
  if (!link || !cell || !owner) return [];
  const { id, name, row } = ends.heading;
  const removal = removeLinks(
    list,
    [index],
    'Without the link, if the activities under the heading are linked as they should be.',
  );
  const fixes = replacement(context, index, standIns(context, link, ends), id);
  const [fix, ...alternatives] = [...fixes, ...(removal ? [removal] : [])];
  return [
    {
      about: `${aboutActivity(list, owner)}|${id}`,
      message: link.fromIndex < 0 ? 'from' : 'to',
      data: { id: called(owner), heading: id, name, row },
      ...at(owner, cell.cell),
      ...(fixes.length > 0 && fix ? { fix, alternatives } : { alternatives: removal ? [removal] : [] }),
    },
  ];
}

export const rule: Rule = {
  id: 'heading-link',
  meta: {
    weight: 'distorts',
    title: 'A link names a heading',
    about:
      'A heading is no work, so nothing can wait for it: the network is computed without the link. What is meant is usually the first or the last of the activities under it.',
    source: GAO_LOGIC,
    messages: {
      from: (data) =>
        `${capital(data.id)} waits for ${data.heading}, which is the heading “${data.name}” in row ${data.row}.`,
      to: (data) =>
        `${capital(data.id)} is to be followed by ${data.heading}, which is the heading “${data.name}” in row ${data.row}.`,
    },
  },
  limits: {},
  check(context) {
    const headings = linkedHeadings(context);
    return context.list.links.flatMap(({ fromIndex, from, toIndex, to }, index) => {
      const ends = headings.get(fromIndex < 0 ? from : toIndex < 0 ? to : '');
      return ends ? defectOf(context, index, ends) : [];
    });
  },
};
