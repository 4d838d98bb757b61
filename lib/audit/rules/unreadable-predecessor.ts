import type { LinkCell, LinkItem } from '@/lib/schedule/activity';
import { cellAddress } from '@/lib/schedule/cell';
import type { Fix } from '@/lib/schedule/edit';
import type { AuditContext, Defect, Rule } from '../rule';
import { aboutActivity, at } from '../support/about';
import { wouldLoop } from '../support/graph';
import { linkEdit } from '../support/link-edits';
import { type Reading, readingsOf } from '../support/readings';
import { rewritable } from '../support/rewritable';
import { PRACTICE } from '../support/sources';
import { called, capital, joinedIn } from '../support/words';

const endsOf = ({ gives, owner }: LinkCell, other: number) =>
  gives === 'predecessors' ? { from: other, to: owner } : { from: owner, to: other };

function readingFix(cell: LinkCell, item: LinkItem, reading: Reading, only: boolean): Fix {
  return {
    reason: only
      ? `“${item.text}” can be meant in this way only.`
      : `“${item.text}” can be meant in this way, and in others.`,
    edits: [linkEdit(cell, [{ op: 'replace', item: item.text, with: reading.text }])],
    changes: reading.links.map(({ activity, type, lag }) => ({
      kind: 'add-link' as const,
      ...endsOf(cell, activity),
      type,
      lag,
    })),
  };
}

function fits({ network }: AuditContext, cell: LinkCell, { links }: Reading): boolean {
  return links.every(({ activity }) => {
    const { from, to } = endsOf(cell, activity);
    return !wouldLoop(network, from, to);
  });
}

function defectOf(context: AuditContext, cell: LinkCell, item: LinkItem): Defect[] {
  const { list } = context;
  const owner = list.activities[cell.owner];
  if (!owner) return [];
  const readings = rewritable(list, cell)
    ? readingsOf(item, cell.owner, list).filter((reading) => fits(context, cell, reading))
    : [];
  const fixes = readings.map((reading) => readingFix(cell, item, reading, readings.length === 1));
  const [only] = fixes;
  return [
    {
      about: `${aboutActivity(list, owner)}|${item.text}`,
      message: readings.length === 0 ? 'unreadable' : readings.length === 1 ? 'one' : 'several',
      data: {
        id: called(owner),
        text: item.text,
        cell: cellAddress(cell.cell),
        gives: cell.gives,
        readings: readings.map(({ text }) => `“${text}”`),
      },
      ...at(owner, cell.cell),
      ...(fixes.length === 1 && only ? { fix: only } : {}),
      ...(fixes.length > 1 ? { alternatives: fixes } : {}),
    },
  ];
}

export const rule: Rule = {
  id: 'unreadable-predecessor',
  meta: {
    weight: 'distorts',
    title: 'Part of a predecessor cell cannot be read',
    about:
      'A predecessor cell names IDs, each with a relation and a lag where they matter, such as B SS+3. A part that is neither is left out of the network until someone says what it means.',
    source: PRACTICE,
    messages: {
      unreadable: (data) =>
        `“${data.text}” among the ${data.gives} of ${data.id} cannot be read as an ID with a relation and a lag.`,
      one: (data) =>
        `“${data.text}” among the ${data.gives} of ${data.id} cannot be read as it stands; ${joinedIn(data, 'readings')} seems to be meant.`,
      several: (data) =>
        `${capital(data.id)} has “${data.text}” among its ${data.gives}, which may mean ${joinedIn(data, 'readings', 'or')}.`,
    },
  },
  limits: {},
  check(context) {
    return context.list.linkCells.flatMap((cell) =>
      cell.error !== null
        ? []
        : cell.items.filter(({ link }) => link === null).flatMap((item) => defectOf(context, cell, item)),
    );
  },
};
