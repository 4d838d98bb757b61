import { describe, expect, it } from 'vitest';
import {
  openCount,
  sentenceFor,
  sentenceForNothing,
  waitingFor,
  type Latest,
} from '@/components/desk/waiting';
import type { ProjectView } from '@/lib/contract/project';

const figures = {
  state: 'corrected',
  computable: true,
  expectedDuration: 10,
  finish: '2027-01-15',
  variance: 1,
  standardDeviation: 1,
  chanceOfTarget: null,
} as const;

function latest(
  status: Latest['status'],
  open: number,
  receivedAt = '2027-03-01T00:00:00Z',
  blocks = 0,
): Latest {
  return { id: 'l', revision: 1, status, receivedAt, open: { blocks, distorts: open, query: 0 }, figures };
}

function project(code: string, of: Latest | null): ProjectView {
  return {
    id: code,
    code,
    name: code,
    contractor: { id: 'c', name: 'C' },
    start: '2027-01-04',
    targetFinish: null,
    unit: 'day',
    hoursPerDay: 8,
    calendar: { workingDays: [1, 2, 3, 4, 5], holidays: [] },
    latest: of,
  };
}

const codes = (role: Parameters<typeof waitingFor>[0], projects: ProjectView[]) =>
  waitingFor(role, projects).map(({ project: { code }, task }) => `${code} ${task}`);

describe('waitingFor', () => {
  const projects = [
    project('new', null),
    project('in', latest('received', 2)),
    project('review', latest('under review', 1, '2027-02-01T00:00:00Z')),
    project('clean', latest('under review', 0, '2027-01-01T00:00:00Z')),
    project('back', latest('returned', 4)),
    project('done', latest('accepted', 0)),
  ];

  it('gives an analyst what came in and is not decided, longest waiting first', () => {
    expect(codes('analyst', projects)).toEqual(['clean decide', 'review review', 'in review']);
  });

  it('gives a reviewer and an administrator what has open findings', () => {
    expect(codes('reviewer', projects)).toEqual(['review review', 'in review']);
    expect(codes('administrator', projects)).toEqual(['review review', 'in review']);
  });

  it('gives a scheduler what came back, what is asked, and what is to be handed in', () => {
    expect(codes('scheduler', projects)).toEqual(['new first', 'review answer', 'back revise', 'in answer']);
  });

  it('puts what blocks first', () => {
    const blocked = project('blocked', latest('received', 0, '2027-04-01T00:00:00Z', 1));
    expect(codes('analyst', [...projects, blocked])[0]).toBe('blocked review');
  });
});

describe('sentenceForNothing', () => {
  it('says no more than is so for the role', () => {
    expect(sentenceForNothing('analyst')).toBe('Each revision that came in has been dealt with.');
    expect(sentenceForNothing('reviewer')).toContain('still to be decided');
    expect(sentenceForNothing('scheduler')).toContain('None of your revisions came back');
  });
});

describe('sentenceFor', () => {
  it('counts what is open, in words', () => {
    const one = project('p', latest('received', 1));
    expect(sentenceFor({ project: one, latest: one.latest, task: 'review' })).toBe('One finding is open.');
    expect(sentenceFor({ project: one, latest: latest('received', 3, '', 2), task: 'review' })).toBe(
      '5 findings are open.',
    );
    expect(openCount(latest('received', 3, '', 2))).toBe(5);
    const many = { project: one, latest: latest('received', 24_982), task: 'review' } as const;
    expect(sentenceFor(many, (value) => value.toLocaleString('en-GB'))).toBe('24,982 findings are open.');
  });
});
