import { type Finding, renderMessage, type RuleBook, runAudit } from '@/lib/audit';
import type { Activity, Estimate, LinkItem } from '@/lib/schedule/activity';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { cellAddress } from '@/lib/schedule/cell';
import type { CellEdit, Fix } from '@/lib/schedule/edit';
import type { CellContent } from '@/lib/schedule/sheet';
import { list } from '@/tests/support/networks';

/** The findings of one rule. */
export const found = (rule: string, audited: ActivityList, book?: RuleBook) =>
  runAudit(audited, undefined, book).filter((finding) => finding.rule === rule);

/** `rule about` of all findings, in order. */
export const keys = (audited: ActivityList) => runAudit(audited).map(({ key }) => key);

export const sentence = ({ rule, message, data }: Finding) => renderMessage(rule, message, data);

/** What a fix writes: [cell, from, to]. */
export const writes = (fix: Fix | undefined) => fix?.edits.map(({ cell, from, to }) => [cell, from, to]);

/** The list with something about one activity changed. */
export function withActivity(
  audited: ActivityList,
  index: number,
  change: (activity: Activity) => Partial<Activity>,
): ActivityList {
  const activities = audited.activities.map((activity) =>
    activity.index === index ? { ...activity, ...change(activity) } : activity,
  );
  return { ...audited, activities };
}

type Part = 'optimistic' | 'likely' | 'pessimistic';

/** The list with one estimate read otherwise than the short notation can say. */
export const withEstimate = (audited: ActivityList, index: number, part: Part, estimate: Partial<Estimate>) =>
  withActivity(audited, index, (activity) => ({ [part]: { ...activity[part], ...estimate } }));

/** The list with other readings of the entries whose text is given. */
export function withReadings(audited: ActivityList, text: string, readings: readonly string[]): ActivityList {
  const change = (item: LinkItem): LinkItem =>
    item.text === text ? { ...item, link: null, readings } : item;
  const linkCells = audited.linkCells.map((cell) => ({ ...cell, items: cell.items.map(change) }));
  const kept = audited.links.filter(({ linkCell, item }) => linkCells[linkCell]?.items[item]?.link !== null);
  return { ...audited, linkCells, links: kept };
}

const shownIn = (content: CellContent) => (content === null ? '-' : String(content));

/** The list read again with edits made in its cells; for lists in the short notation alone. */
export function corrected(received: ActivityList, edits: readonly CellEdit[]): ActivityList {
  const cells = new Map<string, CellContent>();
  for (const { idCell, idContent, optimistic, likely, pessimistic } of received.activities) {
    if (idCell) cells.set(cellAddress(idCell), idContent);
    for (const { cell, content } of [optimistic, likely, pessimistic])
      if (cell) cells.set(cellAddress(cell), content);
  }
  for (const { cell, content } of received.linkCells) cells.set(cellAddress(cell), content);
  for (const { cell, to } of edits) cells.set(cell, to);
  const rows = received.activities.map(({ row, name }) => {
    const at = (column: string) => shownIn(cells.get(column + row) ?? null);
    const id = at('A') === '-' ? '_' : at('A');
    const numbers = received.singleDuration ? at('C') : `${at('C')} ${at('D')} ${at('E')}`;
    const [before, after] = [at('F'), at('G')];
    const links = before !== '-' ? ` <- ${before}` : after !== '-' ? ` -> ${after}` : '';
    return `${id} "${name}" ${numbers}${links}`;
  });
  return list(...rows);
}

/** Keys of the findings after a fix, where the fix's edits are made. */
export const keysAfter = (received: ActivityList, fix: Fix | undefined) =>
  keys(corrected(received, fix?.edits ?? []));
