import type { IntakeView } from '@/lib/contract/intake';
import { DEFAULT_READING, type ReadingOptions } from '@/lib/schedule/activity-list';
import type { Sheet } from '@/lib/schedule/sheet';
import { sampleRows, type Detection } from '@/parsers';
import { readText } from '@/parsers/cells/id';

const SAMPLED = 12;
/** Rows shown around the header: from the first to a few below it. */
const SHOWN_AT_LEAST = 12;
const SHOWN_BELOW = 6;
const SHOWN_COLUMNS = 60;

/** What was detected, with the first rows as they will be read and as the sheet shows them. */
export function intakeViewOf(
  sheets: readonly Sheet[],
  detection: Detection,
  reading: ReadingOptions = DEFAULT_READING,
): IntakeView {
  const { matching, proposed, sure, problems } = detection;
  return {
    sheets: detection.sheets.map(({ columns, ...sheet }) => ({ ...sheet, columns: [...columns] })),
    proposed,
    sure,
    problems: [...problems],
    sample: sampleRows(sheets, matching, reading, SAMPLED),
    preview: previewOf(
      sheets.find(({ name }) => name === proposed),
      matching[0]?.headerRow ?? 0,
    ),
  };
}

function previewOf(sheet: Sheet | undefined, headerRow: number): IntakeView['preview'] {
  if (!sheet) return [];
  const last = Math.max(SHOWN_AT_LEAST, headerRow + SHOWN_BELOW);
  return sheet.rows
    .filter(({ number }) => number <= last)
    .map(({ number, cells, formats }) => ({
      row: number,
      cells: cells.slice(0, SHOWN_COLUMNS).map((value, column) => {
        const format = sheet.formatCodes[formats?.[column] ?? 0] ?? 'General';
        return readText(value, format, sheet.date1904);
      }),
    }));
}
