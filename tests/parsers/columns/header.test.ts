import { describe, expect, it } from 'vitest';
import { letterEstimates, readHeader } from '@/parsers/columns/header';

const fieldOf = (text: string) => readHeader(text).fields[0]?.field ?? null;

describe('names of columns', () => {
  it.each([
    [
      'id',
      [
        'ID',
        'Id.',
        'Activity ID',
        'Task No.',
        'Act. #',
        'Activity-Nr.',
        'Activity Code',
        'Task Number',
        'WP ID',
        'Ref',
        'N\u00ba',
        'Code',
        'Vorgangsnummer',
        'Item No',
        'ACTIVITY_ID',
        'Job No.',
        'Identificador',
      ],
    ],
    [
      'name',
      [
        'Name',
        'Description',
        'Activity Name',
        'Description of Works',
        'Task description',
        'Bezeichnung',
        'D\u00e9signation',
        'Descripci\u00f3n',
      ],
    ],
    [
      'optimistic',
      [
        'Optimistic',
        'Optimistic (a)',
        'a (optimistic)',
        'Optimistic time (days)',
        'Min',
        'Minimum Duration',
        'Best case',
        'Best',
        'Opt.',
        'Opt. Dur. [h]',
        'Low',
        'Min Dur',
        'Duration (min)',
        'Duration \u2013 optimistic',
        'Duration (optimistic) [days]',
        'Optimistisch',
        'Optimistic duration in weeks',
        'Optimistic estimate of duration',
        'Optimisitc',
      ],
    ],
    [
      'likely',
      [
        'Most likely',
        'Likely',
        'ML',
        'Most probable',
        'Most Likely (m)',
        'Most-likely duration',
        'Normal',
        'Realistic',
        'Duration (most likely)',
        'Probable',
        'Mode',
        'Most likely time, days',
        'Wahrscheinlich',
        'Plus probable',
      ],
    ],
    [
      'pessimistic',
      [
        'Pessimistic',
        'Pess.',
        'Max',
        'Maximum',
        'Worst case',
        'Worst',
        'High',
        'Pessimistic (b)',
        'Duration (max)',
        'Pessimistic [d]',
        'Pesimista',
        'pessimistc',
      ],
    ],
    [
      'duration',
      [
        'Duration',
        'Dur.',
        'Duration (days)',
        'Duration in weeks',
        'Days',
        'Working days',
        'OD',
        'Dur. (d)',
        'Dauer',
        'Dur\u00e9e',
        'Duration/days',
        'Planned duration [wks]',
        'Estimated Duration',
      ],
    ],
    [
      'predecessors',
      [
        'Predecessors',
        'Predecessor(s)',
        'Pred',
        'Preds.',
        'Immediate predecessors',
        'Depends on',
        'After',
        'Waits for',
        'Follows',
        'Dependencies',
        'Preceding activities',
        'Predecessor ID',
        'Vorg\u00e4nger',
        'Pr\u00e9d\u00e9cesseurs',
        'Predecesores',
        'Predecesors',
        'Prerequisites',
      ],
    ],
    ['successors', ['Successors', 'Succ.', 'Successor(s)', 'Followed by', 'Nachfolger']],
    ['relation', ['Relation', 'Relationship type', 'Link type', 'Rel.']],
    ['lag', ['Lag', 'Lag (days)', 'Lead/Lag', 'Lag time']],
    ['wbs', ['WBS', 'WBS Code', 'PSP']],
    ['totalFloat', ['Total Float', 'Float', 'TF', 'Slack']],
    ['start', ['Start', 'Start date', 'ES']],
    ['remaining', ['Remaining duration', 'Rem. Dur.']],
    ['percentComplete', ['% complete', 'Progress', 'Percent Complete']],
    ['notes', ['Remarks', 'Notes', 'Comments']],
    [
      null,
      [
        '',
        'Total cost',
        'Optimistic cost',
        'Duration variance',
        'Man-hours',
        'Late start',
        'Free float',
        'Area',
        'Effort (hours)',
        'Risk',
        'x'.repeat(90),
      ],
    ],
  ] as const)('%s', (field, headers) => {
    for (const header of headers) expect([header, fieldOf(header)]).toEqual([header, field]);
  });

  it('may mean an ID or a name, and the cells decide', () => {
    for (const header of ['Activity', 'Task', 'Item']) {
      expect(
        readHeader(header)
          .fields.map(({ field }) => field)
          .sort(),
      ).toEqual(['id', 'name']);
    }
  });

  it('tell the unit', () => {
    const unitOf = (text: string) => readHeader(text).unit?.map(({ unit }) => unit) ?? null;
    expect(unitOf('Duration (days)')).toEqual(['day']);
    expect(unitOf('Optimistic [h]')).toEqual(['hour']);
    expect(unitOf('a (wks)')).toEqual(['week']);
    expect(unitOf('Optimistic, weeks')).toEqual(['week']);
    expect(unitOf('Duration in hours')).toEqual(['hour']);
    expect(unitOf('Days')).toEqual(['day']);
    expect(unitOf('Duration (in working days)')).toEqual(['day']);
    expect(unitOf('Duration (min)')).toBeNull();
    expect(unitOf('Optimistic')).toBeNull();
    expect(unitOf('Duration (months)')).toHaveLength(2);
  });

  it('of a letter or two mean the estimates where all three are there', () => {
    const told = (...headers: string[]) =>
      [...letterEstimates(headers.map(readHeader))].map(([i, field]) => `${i} ${field}`);
    const all = ['1 optimistic', '2 likely', '3 pessimistic'];
    expect(told('ID', 'a', 'm', 'b')).toEqual(all);
    expect(told('ID', 'A (days)', 'M (days)', 'B (days)')).toEqual(all);
    expect(told('ID', 'O', 'M', 'P')).toEqual(all);
    expect(told('ID', 't_o', 't_m', 't_p')).toEqual(all);
    expect(told('ID', 'Duration a', 'Duration m', 'Duration b')).toEqual(all);
    expect(told('ID', 'a', 'b')).toEqual([]);
  });
});
