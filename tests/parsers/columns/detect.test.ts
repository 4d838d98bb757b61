import { describe, expect, it } from 'vitest';
import type { Sheet } from '@/lib/schedule/sheet';
import { detectMatching, matchingFrom, UnmatchedColumns } from '@/parsers/columns';
import { drawn, merge, sheetOf } from '../../support/sheets';

/** `field=letter` for each column told, with the header row. */
function told(...sheets: Sheet[]): string {
  const { matching, problems } = detectMatching(sheets);
  const [first] = matching;
  const columns = Object.entries(first?.columns ?? {}).sort(([, a], [, b]) => a - b);
  const text = columns.map(([field, column]) => `${field}=${String.fromCharCode(65 + column)}`).join(' ');
  return `${first?.headerRow}: ${text}${problems.length > 0 ? ' !' : ''}`;
}
const THREE = 'optimistic=C likely=D pessimistic=E';

describe('the header row and the columns', () => {
  it('are told under the usual names', () => {
    expect(
      told(drawn('ID|Name|Optimistic|Most likely|Pessimistic|Predecessors\nA|Dig|1|2|3|\nB|Pour|2|3|4|A')),
    ).toBe(`1: id=A name=B ${THREE} predecessors=F`);
    expect(
      told(
        drawn(
          'Task No.|Task|Min|Likely|Max|Depends on\n1|Dig the pit|1|2|3|\n2|Pour it all|2|3|4|1\n3|Cure it well|1|2|3|2',
        ),
      ),
    ).toBe(`1: id=A name=B ${THREE} predecessors=F`);
    expect(told(drawn('Activity|Description|a|m|b|After\nA|Dig|1|2|3|\nB|Pour|2|3|4|A'))).toBe(
      `1: id=A name=B ${THREE} predecessors=F`,
    );
    expect(told(drawn('Vorgang-Nr.|Bezeichnung|Dauer (AT)|Vorg\u00e4nger\nA|Aushub|3|\nB|Beton|4|A'))).toBe(
      '1: id=A name=B duration=C predecessors=D',
    );
  });

  it('are found below a title block, and in a table that starts in column D', () => {
    const text =
      '|||Lock gates, activity list\n|||Contractor|Brenner Hydraulics\n|||Date|12 March 2027\n.\n|||Code|Activity|Duration (days)|Preds\n|||A|Dig|3|\n|||B|Pour|4|A';
    expect(told(drawn(text))).toBe('5: id=D name=E duration=F predecessors=G');
  });

  it('are told from a header of two rows, merged or not', () => {
    const text = 'ID|Name|Duration (days)|||Predecessors\n||a|m|b|\nA|Dig|1|2|3|\nB|Pour|2|3|4|A';
    expect(told(drawn(text, { merges: [merge(2, 1, 4), merge(0, 1, 0, 2)] }))).toBe(
      `2: id=A name=B ${THREE} predecessors=F`,
    );
    expect(told(drawn(text))).toBe(`2: id=A name=B ${THREE} predecessors=F`);
    expect(detectMatching([drawn(text)]).sheets[0]?.columns[3]).toMatchObject({
      unit: 'day',
      field: 'likely',
    });
  });

  it('include a row of units below the header', () => {
    const { sheets } = detectMatching([
      drawn('ID|Name|Optimistic|Likely|Pessimistic|Preds\n||h|h|h|\nA|Dig|1|2|3|\nB|Pour|2|3|4|A'),
    ]);
    expect(sheets[0]).toMatchObject({ headerRow: 2, rows: 2 });
    expect(sheets[0]?.columns[2]).toMatchObject({ field: 'optimistic', unit: 'hour' });
  });

  it('take letters for estimates only where all three are there', () => {
    expect(told(drawn('ID|a|b|Duration\nA|x|y|3\nB|z|w|4'))).toBe('1: id=A duration=D');
  });

  it('take the column that the predecessors name for the ID', () => {
    expect(
      told(
        drawn(
          'No|Activity|Description|Duration|Predecessors\n1|A|Dig it|2|\n2|B|Pour it|3|A\n3|C|Cure it|1|A, B',
        ),
      ),
    ).toBe('1: id=B name=C duration=D predecessors=E');
    expect(
      told(drawn('No|Activity|Duration|Predecessors\n1|Dig it|2|\n2|Pour it|3|1\n3|Cure it|1|1, 2')),
    ).toBe('1: id=A name=B duration=C predecessors=D');
    expect(told(drawn('ID|Activity ID|Duration|Predecessors\n1|A10|2|\n2|A20|3|A10\n3|A30|1|A10, A20'))).toBe(
      '1: id=B duration=C predecessors=D',
    );
  });

  it('take names for IDs where there are no others and the predecessors name them', () => {
    const text =
      'Activity name|Duration|Predecessors\nDig the pit|2|\nPour the slab|3|Dig the pit\nCure the slab|1|Pour the slab';
    expect(told(drawn(text))).toBe('1: id=A duration=B predecessors=C');
    expect(told(drawn('Activity name|Duration\nDig the pit|2\nPour the slab|3\nCure the slab|1'))).toMatch(
      /name=A duration=B !$/,
    );
  });

  it('take an expected time for the likely one only beside a best and a worst', () => {
    expect(told(drawn('ID|Best|Expected|Worst|After\nA|1|2|3|\nB|1|2|3|A\nC|1|2|3|B'))).toBe(
      '1: id=A optimistic=B duration=C pessimistic=D predecessors=E',
    );
    expect(told(drawn('ID|Expected time|After\nA|1|\nB|1|A\nC|1|B'))).toBe(
      '1: id=A duration=B predecessors=C',
    );
  });

  it('take WBS codes for IDs where there are no others', () => {
    expect(
      told(drawn('WBS|Name|Duration|Predecessors\n1.1|Dig it|2|\n1.2|Pour it|3|1.1\n1.3|Cure it|3|1.2')),
    ).toBe('1: id=A name=B duration=C predecessors=D');
  });

  it('tell relation and lag columns, and no type that is something else', () => {
    expect(told(drawn('ID|Duration|Predecessor|Type|Lag\nA|2||FS|\nB|3|A|SS|2\nC|3|B|FS|'))).toBe(
      '1: id=A duration=B predecessors=C relation=D lag=E',
    );
    expect(told(drawn('ID|Type|Duration|Predecessor\nA|Task|2|\nB|Task|3|A\nC|Milestone|0|B'))).toBe(
      '1: id=A duration=C predecessors=D',
    );
  });

  it('leave out columns that are something else', () => {
    expect(
      told(
        drawn(
          'ID|Name|Optimistic|Most likely|Pessimistic|Expected|Variance|Preds|Optimistic cost\nA|Dig|1|2|3|2|0.1||9\nB|Pour|2|3|4|3|0.1|A|9',
        ),
      ),
    ).toBe(`1: id=A name=B ${THREE} duration=F predecessors=H`.replace(' duration=F', ''));
  });
});

describe('the sheet', () => {
  const cover = drawn('Lock gates\nPrepared by|Brenner Hydraulics', { name: 'Cover' });
  const list = drawn('ID|Duration|Preds\nA|1|\nB|2|A\nC|2|B', { name: 'List' });

  it('proposed is the one that reads like a list, the visible one first', () => {
    const old = { ...list, name: 'Old', hidden: true };
    expect(detectMatching([cover, old, list])).toMatchObject({ proposed: 'List', sure: true, problems: [] });
    expect(detectMatching([cover, old]).proposed).toBe('Old');
    expect(detectMatching([list, { ...list, name: 'Copy' }])).toMatchObject({
      proposed: 'List',
      sure: false,
    });
  });

  it('can be chosen, several to be read one after the other', () => {
    const more = drawn('D|3|C\nE|1|D', { name: 'More' });
    expect(matchingFrom({ sheet: ['List', 'More'] }, [cover, list, more])).toEqual([
      { sheet: 'List', headerRow: 1, columns: { id: 0, duration: 1, predecessors: 2 } },
      { sheet: 'More', headerRow: 0, columns: { id: 0, duration: 1, predecessors: 2 } },
    ]);
  });

  it('must be in the file', () => {
    expect(() => matchingFrom({ sheet: ['Nowhere'] }, [list])).toThrow(/no sheet called “Nowhere”/);
  });
});

describe('what a form settles', () => {
  const list = drawn('foo|bar|baz|qux\nA|1|x|\nB|2|y|A\nC|4|z|B');
  const errorsOf = (form: Parameters<typeof matchingFrom>[0], ...sheets: Sheet[]) => {
    try {
      matchingFrom(form, sheets.length > 0 ? sheets : [list]);
    } catch (error) {
      if (error instanceof UnmatchedColumns)
        return error.errors.map(({ path, message }) => `${path}: ${message}`);
      throw error;
    }
    return [];
  };

  it('is the matching, below a header that names nothing', () => {
    expect(matchingFrom({ columns: { id: 0, duration: 1, predecessors: 3 } }, [list])).toEqual([
      { sheet: 'Works', headerRow: 1, columns: { id: 0, duration: 1, predecessors: 3 } },
    ]);
  });

  it('leaves out what it does not name', () => {
    const named = drawn('ID|Name|Duration|Preds\nA|Dig|1|\nB|Pour|2|A');
    expect(matchingFrom({ columns: { id: 0, duration: 2 } }, [named])[0]?.columns).toEqual({
      id: 0,
      duration: 2,
    });
  });

  it('is completed where it names no ID or no duration', () => {
    const twice = drawn('ID|Duration|Preds|Preds\nA|1||\nB|2|A|\nC|2|B|A');
    expect(errorsOf({}, twice)).toEqual([
      'columns: Columns C (“Preds”) and D (“Preds”) both seem to hold the predecessors. Choose one of them.',
    ]);
    expect(matchingFrom({ columns: { predecessors: 3 } }, [twice])[0]?.columns).toEqual({
      id: 0,
      duration: 1,
      predecessors: 3,
    });
  });

  it('is refused where it cannot be', () => {
    expect(errorsOf({ columns: { id: 0, duration: 9 } })).toEqual([
      'columns.duration: Column 9 is not in the sheet “Works”, whose columns are 0 (A) to 3 (D).',
    ]);
    expect(errorsOf({ columns: { id: 0, duration: 0 } })).toEqual([
      'columns.duration: Column A is given for id and for duration. One column holds one field.',
    ]);
    expect(errorsOf({ columns: { id: 0, duration: 1, colour: 2 } })[0]).toMatch(
      /^columns.colour: There is no field called/,
    );
    expect(errorsOf({ columns: { id: 0.5, duration: 1 } })[0]).toMatch(/^columns.id: Column 0.5/);
    expect(errorsOf({ columns: { toString: 0 } })[0]).toMatch(/^columns.toString: There is no field/);
    expect(errorsOf({ columns: { name: 0, duration: 1 } })).toEqual([
      'columns: No column could be told to hold the IDs. Choose it.',
    ]);
    expect(errorsOf({ columns: { id: 0, optimistic: 1 } })[0]).toMatch(/most likely/);
    expect(errorsOf({ headerRow: 4 })[0]).toMatch(/^headerRow: Nothing stands below row 4/);
  });

  it('may be the header row alone', () => {
    const twoHeads = drawn('ID|Duration|Preds\nA|1|\nID|Preds|Duration\nA||1\nB|A|2');
    expect(matchingFrom({ headerRow: 3 }, [twoHeads])).toEqual([
      { sheet: 'Works', headerRow: 3, columns: { id: 0, predecessors: 1, duration: 2 } },
    ]);
  });
});

describe('what cannot be told', () => {
  it('is proposed from the cells, and not taken', () => {
    const detection = detectMatching([drawn('foo|bar|baz|qux\nA|1|2|3\nB|2|3|5\nC|2|2|4')]);
    expect(detection.problems).toEqual([
      'No column could be told to hold the IDs. Choose it.',
      'No column could be told to hold estimates or a duration. Choose them.',
    ]);
    expect(detection.sure).toBe(false);
    expect(detection.sheets[0]?.columns.map(({ field }) => field)).toEqual([
      'id',
      'optimistic',
      'likely',
      'pessimistic',
    ]);
    expect(() => matchingFrom({}, [drawn('foo|bar\nA|1\nB|2')])).toThrow(UnmatchedColumns);
  });

  it('is refused where two columns bear the name of one field', () => {
    const refused = (header: string) => () =>
      matchingFrom({}, [drawn(`${header}\nA|1|2|3|4|\nB|1|2|3|4|A\nC|1|2|3|4|B`)]);
    expect(refused('ID|Optimistic|Likely|Pessimistic|Optimistic|Preds')).toThrow(
      /Columns B .* and E .* optimistic/,
    );
    expect(refused('ID|Optimistic|Likely|Pessimistic|Minimum|Preds')).toThrow(/optimistic/);
    expect(refused('ID|Duration|x|y|Duration|Preds')).toThrow(/the duration/);
    expect(refused('ID|Optimistic|Most likely|Pessimistic|ID|Preds')).toThrow(/hold the ID/);
    expect(refused('ID|Optimistic|Most likely|Pessimistic|Area|Preds')).not.toThrow();
  });

  it('is said of a list without a header', () => {
    const detection = detectMatching([drawn('A|1|2|3\nB|2|3|5\nC|2|2|4')]);
    expect(detection.sheets[0]).toMatchObject({ headerRow: 0, rows: 3 });
    expect(detection.problems[0]).toBe('No row could be told to be the header. Choose it, and the columns.');
    expect(
      matchingFrom({ headerRow: 0, columns: { id: 0, optimistic: 1, likely: 2, pessimistic: 3 } }, [
        drawn('A|1|2|3\nB|2|3|5'),
      ]),
    ).toEqual([
      { sheet: 'Works', headerRow: 0, columns: { id: 0, optimistic: 1, likely: 2, pessimistic: 3 } },
    ]);
  });

  it('is refused where the list has more than 200 000 rows, the header not counted', () => {
    const rows = (count: number) =>
      sheetOf([['ID', 'Duration'], ...Array.from({ length: count }, (_, i) => [i + 1, 1])]);
    expect(() => matchingFrom({}, [rows(200_000)])).not.toThrow();
    expect(() => matchingFrom({}, [rows(200_001)])).toThrow(/more than 200 000 rows/);
  });

  it('costs no more than the sheet is wide and long', () => {
    const wide = drawn(
      Array.from({ length: 10_000 }, (_, i) => `c${i}`).join('|') + '\n' + 'x|'.repeat(9_999),
    );
    const start = performance.now();
    detectMatching([wide, wide]);
    expect(performance.now() - start).toBeLessThan(2000);
  });
});
