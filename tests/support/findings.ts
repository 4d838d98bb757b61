import type { CellEditView, CommentView, FindingView, FixView } from '@/lib/contract/submission';

/** A UUID that tells its number: `id(7)`. */
export function id(number: number): string {
  return `00000000-0000-4000-8000-${String(number).padStart(12, '0')}`;
}

export function edit(cell: string, from: CellEditView['from'], to: CellEditView['to']): CellEditView {
  return { sheet: 'Works', cell, from, to };
}

export function fix(number: number, given: Partial<FixView> = {}): FixView {
  return {
    id: id(number),
    state: 'proposed',
    reason: 'Only this order of the two can be.',
    edits: [edit('G23', 6, 4)],
    effect: { expectedDuration: 1, variance: 0 },
    ...given,
  };
}

export function finding(number: number, given: Partial<FindingView> = {}): FindingView {
  return {
    id: id(number),
    rule: 'likely-below-optimistic',
    title: 'The best case is longer than the likely one',
    weight: 'distorts',
    activityId: `D-${number}`,
    activityName: 'Drive piles, east',
    sheet: 'Works',
    row: number,
    cell: `G${number}`,
    message: 'a = 6 is over m = 4.',
    source: 'Malcolm, Roseboom, Clark, Fazar 1959',
    state: 'open',
    origin: 'received',
    fix: null,
    alternatives: [],
    comments: 0,
    ...given,
  };
}

export function comment(number: number, given: Partial<CommentView> = {}): CommentView {
  return {
    id: id(number),
    finding: null,
    sheet: null,
    row: null,
    audience: 'inside',
    body: 'Ask for the pile log.',
    by: { id: id(900), name: 'Ines Varga', role: 'reviewer' },
    at: '2027-03-09T10:12:00.000Z',
    ...given,
  };
}
