import { describe, expect, it } from 'vitest';
import type { ActivityList, ReadingOptions } from '@/lib/schedule/activity-list';
import { cellAddress } from '@/lib/schedule/cell';
import { ErrorValue, type Sheet } from '@/lib/schedule/sheet';
import { detectMatching, readActivityList, sampleRows } from '@/parsers';
import { drawn, sheetOf } from '../support/sheets';

const HOURS: ReadingOptions = { unit: 'hour', hoursPerDay: 8, daysPerWeek: 5 };
const read = (sheet: Sheet | string, options?: ReadingOptions): ActivityList => {
  const sheets = [typeof sheet === 'string' ? drawn(sheet) : sheet];
  return readActivityList(sheets, detectMatching(sheets).matching, options);
};
const HEAD = 'ID|Name|Optimistic|Most likely|Pessimistic|Predecessors';
const kinds = (list: ActivityList) => {
  const { read: all, ...rest } = list.rows;
  expect(Object.values(rest).reduce((sum, count) => sum + count, 0)).toBe(all);
  return Object.fromEntries(Object.entries(list.rows).filter(([, count]) => count > 0));
};
const links = (list: ActivityList) =>
  list.links.map(
    ({ from, to, type, lag, fromIndex, toIndex }) =>
      `${from}>${to} ${type} ${lag}${fromIndex < 0 || toIndex < 0 ? ' ?' : ''}`,
  );

describe('activities', () => {
  it('keep what their cells hold, and where', () => {
    const list = read(`${HEAD}\nA|Dig|1|2|3|\n7.0| Pour |2|x||A SS+1`);
    expect(list.activities[0]).toMatchObject({
      index: 0,
      id: 'A',
      name: 'Dig',
      sheet: 'Works',
      row: 2,
      hidden: false,
    });
    expect(list.activities[1]).toMatchObject({
      id: '7',
      idContent: 7,
      idCell: { sheet: 'Works', row: 3, column: 0 },
      likely: { days: null, text: 'x', content: 'x', problem: 'unreadable', cell: { row: 3, column: 3 } },
      pessimistic: { days: null, text: '', content: null, problem: 'empty', cell: { row: 3, column: 4 } },
    });
    expect(list.linkCells).toMatchObject([
      { owner: 1, gives: 'predecessors', text: 'A SS+1', separator: ', ', error: null },
    ]);
    expect(links(list)).toEqual(['A>7 SS 1']);
    expect(list.singleDuration).toBe(false);
    expect(list.unit).toEqual({ value: 'day', from: 'assumed' });
  });

  it('have one estimate for three where the list has one duration', () => {
    const list = read('ID|Duration (weeks)|Preds\nA|1|\nB|0.5|A');
    expect(list).toMatchObject({ singleDuration: true, unit: { value: 'week', from: 'header' } });
    expect(list.activities[0]?.pessimistic).toMatchObject({ days: 5, unit: 'week', cell: { column: 1 } });
    expect(list.activities[0]?.likely).toBe(list.activities[0]?.optimistic);
  });

  it('without an ID are activities where they have estimates, or a name and links', () => {
    const list = read(`${HEAD}\nA|Dig|1|2|3|\n|Pour|1|2|3|A\n|Cure||||A`);
    expect(list.activities.map(({ id, name }) => [id, name])).toEqual([
      ['A', 'Dig'],
      ['', 'Pour'],
      ['', 'Cure'],
    ]);
    expect(list.activities[2]?.likely.problem).toBe('empty');
    expect(list.links[0]).toMatchObject({ from: 'A', to: '', fromIndex: 0, toIndex: 1 });
  });

  it('may bear the same ID; links go to the first', () => {
    const list = read(`${HEAD}\nA|Dig|1|2|3|\nB|Pour|1|2|3|A\nB|Cure|1|2|3|A\nC|Strip|1|1|2|B`);
    expect(list.activities).toHaveLength(4);
    expect(list.indexOf.get('B')).toBe(1);
    expect(list.links.map(({ fromIndex, toIndex }) => [fromIndex, toIndex])).toEqual([
      [0, 1],
      [0, 2],
      [1, 3],
    ]);
  });

  it('of a hidden row are told', () => {
    const sheet = drawn(`${HEAD}\nA|Dig|1|2|3|\nB|Pour|1|2|3|A`);
    const hidden = { ...sheet, rows: sheet.rows.map((row) => ({ ...row, hidden: row.number === 3 })) };
    expect(read(hidden).activities.map((activity) => activity.hidden)).toEqual([false, true]);
  });

  it('show errors where they have them', () => {
    const error = new ErrorValue('#REF!');
    const list = read(
      sheetOf([
        HEAD.split('|'),
        ['A', 'Dig', 1, error, 3, null],
        [error, 'Pour', 1, 2, 3, error],
        ['C', 'Cure', 1, 2, 3, 'A'],
        ['Total', null, null, error, null, null],
      ]),
    );
    expect(
      list.errorCells.map(({ cell, field, code, owner }) => [cellAddress(cell), field, code, owner]),
    ).toEqual([
      ['D2', 'likely', '#REF!', 0],
      ['A3', 'id', '#REF!', 1],
      ['F3', 'predecessors', '#REF!', 1],
    ]);
    expect(list.activities[0]?.likely).toMatchObject({ problem: 'error', content: '#REF!' });
    expect(list.activities[1]).toMatchObject({ id: '', idError: '#REF!' });
    expect(list.linkCells[0]).toMatchObject({ error: '#REF!', items: [] });
  });
});

describe('every row is accounted for', () => {
  it('as heading, continued, blank, note or refused', () => {
    const list = read(`
      ${HEAD}
      1|Civil works||||
      A|Dig|1|2|3|
      .
      B|Pour|1|2|3|A
      |||||C
      B|||||A SS+1
      Phase 2|||||
      C|Cure|1|2|3|-
      ${HEAD}
      D|Strip|1|2|3|C
      |Total|4|8|12|
      Note: all durations are in working days.|||||
    `);
    expect(kinds(list)).toEqual({ read: 12, activities: 4, headings: 2, continued: 2, blank: 1, notes: 3 });
    expect(list.headings.map(({ id, name, row }) => [id, name, row])).toEqual([
      ['1', 'Civil works', 2],
      ['Phase 2', 'Phase 2', 8],
    ]);
    expect(links(list)).toEqual(['A>B FS 0', 'C>B FS 0', 'A>B SS 1', 'C>D FS 0']);
  });

  it('with blank rows up to the last that holds anything, and no further', () => {
    const sheet = drawn(`${HEAD}\nA|Dig|1|2|3|\nB|Pour|1|2|3|A`);
    const rows = [
      ...sheet.rows,
      { number: 9, hidden: false, outline: 0, cells: [null, 'See drawing 4.'] },
      { number: 900_000, hidden: false, outline: 0, cells: [' \u00a0'] },
    ];
    expect(kinds(read({ ...sheet, rows }))).toEqual({ read: 8, activities: 2, blank: 5, notes: 1 });
  });

  it('and a row that nothing can be made of is refused with its reason', () => {
    const list = read(`${HEAD}\n|||||B\nA|Dig|1|2|3|\nB|Pour|1|2|3|A`);
    expect(kinds(list)).toEqual({ read: 3, activities: 2, refused: 1 });
    expect(list.refused).toEqual([
      { sheet: 'Works', row: 2, reason: expect.stringContaining('no activity stands above it') },
    ]);
  });

  it.each([
    ['|Total|3|6|9|', 'notes'],
    ['Total||3|6|9|', 'notes'],
    ['||2|4|6|', 'activities'],
    ['||3|6|9|', 'notes'],
    ['|Project duration|||9|', 'notes'],
    ['|Total station survey|1|2|3|', 'activities'],
    ['T9|Total|1|2|3|', 'activities'],
    ['|Prepared by K. Osei||||', 'notes'],
    ['M9|Handover||||', 'headings'],
    ['M9|Handover||||C', 'activities'],
  ])('a last row %s is one of the %s', (row, kind) => {
    const list = read(`${HEAD}\nA|Dig|1|2|3|\nB|Pour|1|2|3|A\nC|Cure|1|2|3|B\n${row}`);
    expect(kinds(list)).toEqual({ read: 4, activities: 3, [kind]: kind === 'activities' ? 4 : 1 });
  });

  it('a row of sums is a note, and a rolled-up row a heading', () => {
    const sheet = drawn(`${HEAD}\n1|Civil|2|4|6|\nA|Dig|1|2|3|\nB|Pour|1|2|3|A\n||9|9|9|`);
    const sums = ['C2', 'D2', 'E2', 'C5', 'D5', 'E5'].map(
      (cell) => [cell, { text: `SUM(${cell[0]}3:${cell[0]}4)`, hasResult: true }] as const,
    );
    expect(kinds(read({ ...sheet, formulas: new Map(sums) }))).toEqual({
      read: 4,
      activities: 2,
      headings: 1,
      notes: 1,
    });
  });

  it('a row without an ID that stands above its parts is a heading', () => {
    const wbs = 'WBS|ID|Name|Duration|Preds\n1||Civil|20|\n1.1|A|Dig|10|\n1.2|B|Pour|10|A\n||Cure|2|B';
    expect(kinds(read(wbs))).toEqual({ read: 4, activities: 3, headings: 1 });
    const sheet = drawn('ID|Name|Duration|Preds\n|Civil|20|\nA|Dig|10|\nB|Pour|10|A');
    const grouped = {
      ...sheet,
      rows: sheet.rows.map((row) => ({ ...row, outline: row.number > 2 ? 1 : 0 })),
    };
    expect(kinds(read(grouped))).toEqual({ read: 3, activities: 2, headings: 1 });
  });

  it('an activity that is repeated for each of its links goes on, and a second one of the same ID does not', () => {
    const list = read(
      'ID|Name|Duration|Predecessor|Type|Lag\nA|Dig|2||\nB|Pour|3|A|SS|1\nB|Pour|3|Z|FF|\nB|Pour|3|Z|FF|\nC|Cure|3|B||',
    );
    expect(kinds(list)).toEqual({ read: 5, activities: 4, continued: 1 });
    expect(links(list).slice(0, 2)).toEqual(['A>B SS 1', 'Z>B FF 0 ?']);
  });
});

describe('links', () => {
  it('take relation and lag from columns of their own, for one entry or each', () => {
    const list = read(
      'ID|Duration|Predecessors|Relation|Lag (days)\nA|2|||\nB|3|A|Start to start|2\nC|3|A, B|SS, FF|1; -2\nD|1|A, B|SS|\nE|1|A FF+4|SS|1\nF|1|A||3 h\nG|1|A|XX|2',
    );
    expect(links(list)).toEqual([
      'A>B SS 2',
      'A>C SS 1',
      'B>C FF -2',
      'A>D SS 0',
      'B>D SS 0',
      'A>E FF 4',
      'A>F FS 0.375',
    ]);
    expect(list.linkCells.at(-1)?.items).toEqual([{ text: 'A XX 2', link: null, readings: [] }]);
  });

  it('may be given as successors; a link both ends state is one', () => {
    expect(links(read('ID|Duration|Successors\nA|2|B, C SS+1\nB|3|\nC|3|Z'))).toEqual([
      'A>B FS 0',
      'A>C SS 1',
      'C>Z FS 0 ?',
    ]);
    expect(links(read('ID|Duration|Predecessors|Successors\nA|2||B\nB|3|A|C\nC|3||'))).toEqual([
      'A>B FS 0',
      'B>C FS 0',
    ]);
  });

  it('have lags in the unit of the durations', () => {
    expect(links(read('ID|Duration (h)|Preds\nA|16|\nB|8|A FS+16'))).toEqual(['A>B FS 2']);
    expect(links(read('ID|Duration|Preds\nA|16|\nB|8|A FS+16', HOURS))).toEqual(['A>B FS 2']);
    expect(links(read('ID|Duration|Preds\nA|16 h|\nB|8 h|A FS+16'))).toEqual(['A>B FS 2']);
    expect(links(read('ID|Duration|Preds\nA|16 h|\nB|8|A FS+16'))).toEqual(['A>B FS 16']);
  });

  it('find IDs however they are typed', () => {
    const rows = [
      ['ID', 'Duration', 'Preds'],
      [7, 1, null],
      ['8', 1, '7.0'],
      ['007', 1, 8],
      [10, 1, ' 007\u00a0'],
      ['1.5', 1, 10],
      [12, 1, 1.5],
      [15, 1, '7,8'],
    ];
    expect(links(read(sheetOf(rows)))).toEqual([
      '7>8 FS 0',
      '8>007 FS 0',
      '007>10 FS 0',
      '10>1.5 FS 0',
      '1.5>12 FS 0',
      '7>15 FS 0',
      '8>15 FS 0',
    ]);
  });

  it('find numbers under their formats', () => {
    const format = (rows: Sheet['rows']) =>
      rows.map((row) => (row.number > 1 ? { ...row, formats: [1] } : row));
    const sheet = sheetOf(
      [
        ['ID', 'Duration', 'Preds'],
        [7, 1, null],
        [8, 1, 7],
        [9, 1, '008'],
      ],
      { formatCodes: ['General', '000'] },
    );
    const list = read({ ...sheet, rows: format(sheet.rows) });
    expect(list.activities.map(({ id }) => id)).toEqual(['007', '008', '009']);
    expect(links(list)).toEqual(['007>008 FS 0', '008>009 FS 0']);
  });

  it('do not guess at a number that two IDs were typed as', () => {
    const rows = [
      ['ID', 'Duration', 'Preds'],
      [1, 1, null],
      [5, 1, 1],
      [6, 1, 1.5],
      [7, 1, 2.5],
    ];
    const list = read(sheetOf(rows));
    expect(list.linkCells[1]?.items).toEqual([{ text: '1.5', link: null, readings: ['1, 5'] }]);
    expect(links(list)).toEqual(['1>5 FS 0', '2.5>7 FS 0 ?']);
  });

  it('cannot be read where a formula has no result; they are never dropped', () => {
    const formulas = new Map([
      ['F3', { text: 'A2', hasResult: false }],
      ['F4', { text: 'A2&", "&A3', hasResult: false }],
    ]);
    const sheet = drawn(`${HEAD}\nA|Dig|1|2|3|\nB|Pour|1|2|3|\nC|Cure|1|2|3|`, { formulas });
    const list = read(sheet);
    expect(
      list.linkCells.map(({ cell, items }) => [cell.row, items.map(({ text, link }) => [text, link])]),
    ).toEqual([
      [3, [['=A2', null]]],
      [4, [['=A2&", "&A3', null]]],
    ]);
    expect(list.links).toEqual([]);
  });

  it('to headings are kept, and lead nowhere', () => {
    const list = read(`${HEAD}\nH1|Civil works||||\nA|Dig|1|2|3|\nB|Pour|1|2|3|H1 SS+2`);
    expect(list.links).toMatchObject([{ from: 'H1', fromIndex: -1, type: 'SS', lag: 2 }]);
  });
});

describe('numbers', () => {
  it('are ambiguous where their column does not settle the decimal mark', () => {
    const list = read('ID|Optimistic|Most likely|Pessimistic|Preds\nA|1,234|1,5|3|\nB|1|1,234|3|A');
    expect(list.activities[0]?.optimistic).toMatchObject({ problem: 'ambiguous', readings: [1.234, 1234] });
    expect(list.activities[1]?.likely).toMatchObject({ problem: null, days: 1.234 });
  });
});

describe('a list over several sheets', () => {
  it('goes on from one to the next, links across', () => {
    const sheets = [
      drawn('ID|Duration|Preds\nA|1|\nB|2|A', { name: 'One' }),
      drawn('C|3|B\nD|1|A, C', { name: 'Two' }),
    ];
    const columns = { id: 0, duration: 1, predecessors: 2 };
    const list = readActivityList(sheets, [
      { sheet: 'One', headerRow: 1, columns },
      { sheet: 'Two', headerRow: 0, columns },
    ]);
    expect(links(list)).toEqual(['A>B FS 0', 'B>C FS 0', 'A>D FS 0', 'C>D FS 0']);
    expect(list.activities.map(({ sheet, row }) => [sheet, row])).toEqual([
      ['One', 2],
      ['One', 3],
      ['Two', 1],
      ['Two', 2],
    ]);
    expect(kinds(list)).toEqual({ read: 4, activities: 4 });
  });

  it('needs its sheets', () => {
    expect(() =>
      readActivityList(
        [drawn('ID|Duration\nA|1')],
        [{ sheet: 'Gone', headerRow: 1, columns: { id: 0, duration: 1 } }],
      ),
    ).toThrow(/no sheet “Gone”/);
  });
});

it('shows the first rows as they are read', () => {
  const sheets = [drawn(`${HEAD}\n1|Civil||||\nA|Dig|1|2|3|\nB|Pour|1|2 wks|x|A SS+1`)];
  expect(sampleRows(sheets, detectMatching(sheets).matching, HOURS, 3)).toMatchObject([
    { row: 2, kind: 'heading', id: '1', name: 'Civil', likely: null },
    { row: 3, kind: 'activity', id: 'A', optimistic: 0.125, predecessors: '' },
    { row: 4, kind: 'activity', id: 'B', likely: 10, pessimistic: null, predecessors: 'A SS+1' },
  ]);
});
