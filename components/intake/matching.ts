import type { MatchingChoice } from '@/lib/client/intake';
import type { IntakeView } from '@/lib/contract/intake';
import { columnLetters } from '@/lib/schedule/cell';
import { FIELDS, type Field } from '@/lib/schedule/field';

/** How a list is to be read, as it stands on the page: by column, which field it holds. */
export interface MatchingDraft {
  readonly sheets: readonly string[];
  /** From 1; 0: the sheet has no header row. */
  readonly headerRow: number;
  readonly fields: readonly (Field | null)[];
}

export type IntakeSheet = IntakeView['sheets'][number];

export function isField(text: string | null): text is Field {
  return text !== null && Object.hasOwn(FIELDS, text);
}

/** The sheet whose columns are shown: the first of those chosen, else the one proposed, else the first. */
export function shownSheet(view: IntakeView, sheets: readonly string[]): IntakeSheet | null {
  const names = [...sheets, view.proposed];
  for (const name of names) {
    const found = view.sheets.find((sheet) => sheet.name === name);
    if (found) return found;
  }
  return view.sheets[0] ?? null;
}

/** What was detected, ready to be changed. */
export function draftOf(view: IntakeView, sheets: readonly string[] = []): MatchingDraft {
  const shown = shownSheet(view, sheets);
  const width = Math.max(
    0,
    ...(shown?.columns ?? []).map(({ index }) => index + 1),
    ...view.preview.map(widthOf),
  );
  const fields: (Field | null)[] = Array.from({ length: width }, () => null);
  for (const { index, field } of shown?.columns ?? []) fields[index] = isField(field) ? field : null;
  return {
    sheets: sheets.length > 0 ? sheets : shown ? [shown.name] : [],
    headerRow: shown?.headerRow ?? 0,
    fields,
  };
}

function widthOf(row: { cells: readonly string[] }): number {
  return row.cells.length;
}

/** Gives a column a field; a field stands in one column only, so another that had it lets go. */
export function assign(
  draft: MatchingDraft,
  column: number,
  field: Field | null,
): { draft: MatchingDraft; from: number | null } {
  const from =
    field === null ? -1 : draft.fields.findIndex((held, index) => held === field && index !== column);
  const fields = draft.fields.map((held, index) => {
    if (index === column) return field;
    return field !== null && held === field ? null : held;
  });
  return { draft: { ...draft, fields }, from: from === -1 ? null : from };
}

/** Fields that two or more columns claim, each with those columns. */
export function contested(draft: MatchingDraft): { field: Field; columns: number[] }[] {
  const byField = new Map<Field, number[]>();
  draft.fields.forEach((field, column) => {
    if (field) byField.set(field, [...(byField.get(field) ?? []), column]);
  });
  return [...byField]
    .filter(([, columns]) => columns.length > 1)
    .map(([field, columns]) => ({ field, columns }));
}

/** What still keeps the list from being handed in, in plain sentences. */
export function obstacles(draft: MatchingDraft): string[] {
  const has = (field: Field) => draft.fields.includes(field);
  const sentences = contested(draft).map(
    ({ field, columns }) =>
      `${listed(columns.map((column) => `column ${columnLetters(column)}`))} are all taken for ${FIELDS[field]}. Choose one.`,
  );
  if (draft.sheets.length === 0) sentences.push('Choose the sheet that holds the list.');
  if (!has('id')) sentences.push('Say which column holds the ID of each activity.');
  if (!has('likely') && !has('duration')) {
    sentences.push('Say which column holds the most likely estimate, or a single duration.');
  }
  return sentences.map(capital);
}

/** What goes to the server: everything that was settled here. */
export function choiceOf(draft: MatchingDraft): MatchingChoice {
  const columns: Partial<Record<Field, number>> = {};
  draft.fields.forEach((field, column) => {
    if (field) columns[field] ??= column;
  });
  return { sheets: draft.sheets, headerRow: draft.headerRow, columns };
}

/** How a list was read, in one sentence. */
export function readAs(draft: MatchingDraft): string {
  const columns = draft.fields.flatMap((field, column) =>
    field ? [`${FIELDS[field]} from column ${columnLetters(column)}`] : [],
  );
  const sheets = draft.sheets.map((name) => `“${name}”`);
  const where = sheets.length > 1 ? `Sheets ${listed(sheets)}` : `Sheet ${sheets[0] ?? ''}`;
  const header = draft.headerRow > 0 ? `header in row ${String(draft.headerRow)}` : 'no header row';
  return `${where}, ${header}: ${listed(columns)}.`;
}

/** How sure a detection is, in a word. */
export function confidenceWord(confidence: number): 'sure' | 'likely' | 'a guess' {
  if (confidence >= 0.9) return 'sure';
  return confidence >= 0.6 ? 'likely' : 'a guess';
}

function listed(parts: readonly string[]): string {
  if (parts.length < 2) return parts[0] ?? '';
  return `${parts.slice(0, -1).join(', ')} and ${parts.at(-1) ?? ''}`;
}

function capital(sentence: string): string {
  return sentence.charAt(0).toUpperCase() + sentence.slice(1);
}
