import { describe, expect, it } from 'vitest';
import {
  assign,
  choiceOf,
  confidenceWord,
  contested,
  draftOf,
  obstacles,
  readAs,
  shownSheet,
} from '@/components/intake/matching';
import type { IntakeView } from '@/lib/contract/intake';

const column = (index: number, field: string | null) => ({
  index,
  header: '',
  field,
  confidence: 1,
  reason: '',
  unit: null,
});
const view: IntakeView = {
  sheets: [
    { name: 'Notes', hidden: true, headerRow: 0, columns: [], rows: 4 },
    {
      name: 'List',
      hidden: false,
      headerRow: 3,
      rows: 12,
      columns: [column(0, 'id'), column(2, 'likely'), column(3, 'colour')],
    },
  ],
  proposed: 'List',
  sure: true,
  problems: [],
  sample: [],
  preview: [{ row: 3, cells: ['No.', 'Text', 'Days', 'Colour', 'After'] }],
};

describe('draftOf', () => {
  it('takes what was detected on the proposed sheet, one entry a column of the sheet', () => {
    expect(draftOf(view)).toEqual({
      sheets: ['List'],
      headerRow: 3,
      fields: ['id', null, 'likely', null, null],
    });
  });

  it('shows the first of the sheets chosen', () => {
    expect(shownSheet(view, ['Notes'])?.name).toBe('Notes');
    expect(shownSheet({ ...view, proposed: null }, [])?.name).toBe('Notes');
    expect(draftOf(view, ['Notes', 'List']).sheets).toEqual(['Notes', 'List']);
  });
});

describe('assign', () => {
  const draft = draftOf(view);

  it('moves a field from the column that had it', () => {
    const { draft: next, from } = assign(draft, 4, 'id');
    expect(next.fields).toEqual([null, null, 'likely', null, 'id']);
    expect(from).toBe(0);
  });

  it('sets a column free, and leaves the draft it was given alone', () => {
    expect(assign(draft, 0, null)).toEqual({
      draft: { ...draft, fields: [null, null, 'likely', null, null] },
      from: null,
    });
    expect(draft.fields[0]).toBe('id');
  });

  it('says nothing was moved where the column keeps its field', () => {
    expect(assign(draft, 0, 'id').from).toBeNull();
  });
});

describe('obstacles', () => {
  const draft = draftOf(view);

  it('finds none where there is an ID and a duration', () => {
    expect(obstacles(draft)).toEqual([]);
    expect(obstacles({ ...draft, fields: ['id', 'duration'] })).toEqual([]);
  });

  it('names each column that claims the same field', () => {
    const fields = ['id', 'likely', 'id'] as const;
    expect(contested({ ...draft, fields })).toEqual([{ field: 'id', columns: [0, 2] }]);
    expect(obstacles({ ...draft, fields })).toEqual([
      'Column A and column C are all taken for ID. Choose one.',
    ]);
  });

  it('asks for what is missing', () => {
    expect(obstacles({ sheets: [], headerRow: 1, fields: [null] })).toHaveLength(3);
  });
});

describe('choiceOf and readAs', () => {
  const draft = draftOf(view);

  it('sends every column that holds a field', () => {
    expect(choiceOf(draft)).toEqual({ sheets: ['List'], headerRow: 3, columns: { id: 0, likely: 2 } });
  });

  it('says in one sentence how the list was read', () => {
    expect(readAs(draft)).toBe(
      'Sheet “List”, header in row 3: ID from column A and Most likely (m) from column C.',
    );
    expect(readAs({ ...draft, sheets: ['One', 'Two'], headerRow: 0 })).toMatch(
      /^Sheets “One” and “Two”, no header row: /,
    );
  });
});

describe('confidenceWord', () => {
  it('has three words', () => {
    expect([0.95, 0.9, 0.7, 0.6, 0.5].map(confidenceWord)).toEqual([
      'sure',
      'sure',
      'likely',
      'likely',
      'a guess',
    ]);
  });
});
