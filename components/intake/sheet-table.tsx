'use client';

import { classes } from '@/components/ui/classes';
import { Field as FormField, Select } from '@/components/ui/field';
import type { IntakeView } from '@/lib/contract/intake';
import { columnLetters } from '@/lib/schedule/cell';
import { FIELDS, type Field } from '@/lib/schedule/field';
import { confidenceWord, isField, type IntakeSheet, type MatchingDraft } from './matching';

interface Props {
  view: IntakeView;
  sheet: IntakeSheet;
  draft: MatchingDraft;
  onField: (column: number, field: Field | null) => void;
  onHeader: (row: number) => void;
}

const CELL = 'border border-hair px-2 py-1 align-top';
const EDGE = `${CELL} bg-lime text-center font-semibold text-slate`;

/** The sheet as a sheet: letters and row numbers at its edges, the role of each column above it. */
export function SheetTable({ view, sheet, draft, onField, onHeader }: Props) {
  const columns = draft.fields.map((_, index) => index);
  return (
    <>
      <HeaderChoice rows={view.preview.map(({ row }) => row)} chosen={draft.headerRow} onHeader={onHeader} />
      <div
        role="region"
        aria-label={`Sheet ${sheet.name} as it came`}
        tabIndex={0}
        className="relative max-w-full overflow-x-auto"
      >
        <table className="border-collapse bg-leaf">
          <caption className="sr-only">Sheet {sheet.name} with what each column holds</caption>
          <thead>
            <tr>
              <th scope="row" className={`${EDGE} text-left`}>
                Holds
              </th>
              {columns.map((column) => (
                <td key={column} className="border border-hair bg-lime p-1 align-top">
                  <Role
                    sheet={sheet}
                    column={column}
                    field={draft.fields[column] ?? null}
                    onField={onField}
                  />
                </td>
              ))}
            </tr>
            <tr>
              <td className={EDGE} />
              {columns.map((column) => (
                <th key={column} scope="col" className={EDGE}>
                  {columnLetters(column)}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {view.preview.map(({ row, cells }) => (
              <tr
                key={row}
                className={
                  row === draft.headerRow
                    ? 'bg-tint font-semibold'
                    : row < draft.headerRow
                      ? 'text-slate'
                      : ''
                }
              >
                <th scope="row" className={EDGE}>
                  {row}
                  {row === draft.headerRow && <span className="sr-only">, the header</span>}
                </th>
                {columns.map((column) => (
                  <td
                    key={column}
                    className={classes(
                      CELL,
                      'max-w-60 min-w-32',
                      row === draft.headerRow && 'border-b-2 border-b-ink',
                    )}
                  >
                    <span className="line-clamp-2">{cells[column] ?? ''}</span>
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </>
  );
}

function HeaderChoice({
  rows,
  chosen,
  onHeader,
}: {
  rows: readonly number[];
  chosen: number;
  onHeader: (row: number) => void;
}) {
  const offered = [...new Set([...rows, chosen])].filter((row) => row > 0).sort((a, b) => a - b);
  return (
    <FormField label="Header row" required className="mb-3 max-w-60">
      {(aria) => (
        <Select {...aria} value={chosen} onChange={(event) => onHeader(Number(event.target.value))}>
          <option value={0}>The sheet has none</option>
          {offered.map((row) => (
            <option key={row} value={row}>
              Row {row}
            </option>
          ))}
        </Select>
      )}
    </FormField>
  );
}

interface RoleProps {
  sheet: IntakeSheet;
  column: number;
  field: Field | null;
  onField: Props['onField'];
}

function Role({ sheet, column, field, onField }: RoleProps) {
  const detected = sheet.columns.find(({ index }) => index === column);
  const asDetected = detected?.field === field && field !== null;
  return (
    <div className="min-w-32">
      <Select
        aria-label={`Column ${columnLetters(column)}${detected?.header ? `, ${detected.header},` : ''} holds`}
        value={field ?? ''}
        className={field ? 'font-semibold' : 'text-slate'}
        onChange={(event) => onField(column, isField(event.target.value) ? event.target.value : null)}
      >
        <option value="">not used</option>
        {Object.entries(FIELDS).map(([key, label]) => (
          <option key={key} value={key}>
            {label}
          </option>
        ))}
      </Select>
      {asDetected && (
        <p className="px-1 pt-1 font-normal text-slate">
          <span className={confidenceWord(detected.confidence) === 'sure' ? '' : 'font-semibold text-brass'}>
            {confidenceWord(detected.confidence)}
          </span>
          {detected.reason && `: ${detected.reason}`}
          {detected.unit && ` In ${detected.unit}s, by its header.`}
        </p>
      )}
      {!asDetected && field !== null && <p className="px-1 pt-1 text-slate">set by hand</p>}
    </div>
  );
}
