import { cellAddress, columnLetters } from '@/lib/schedule/cell';
import type { CellContent } from '@/lib/schedule/sheet';
import { CHANGE_HEADINGS, changeRow } from '../changes';
import type { ListedChange } from '../types';
import type { Dialect } from './notes';
import { contentMarkup } from './sheet-patch';
import type { OwnStyle, Styles } from './styles';
import { escapeAttribute } from './xml';

const NAME = 'Corrected cells';
const WIDTHS = [16, 8, 14, 26, 26, 26, 60, 22, 24];
const CELL_COLUMN = 1;
/** Excel opens no sheet with more links than this. */
const MOST_LINKS = 65_000;

/** A name for the sheet that none of the others bears. */
export function freeSheetName(taken: readonly string[]): string {
  const names = new Set(taken.map((name) => name.toLowerCase()));
  let name = NAME;
  for (let number = 2; names.has(name.toLowerCase()); number += 1) name = `${NAME} (${number})`;
  return name;
}

function rowMarkup(
  row: number,
  contents: readonly CellContent[],
  kind: (column: number) => OwnStyle,
  styles: Styles,
): string {
  const cells = contents.map((content, column) => {
    const text = typeof content === 'string' ? content : '';
    const { type, inner } = contentMarkup('', content);
    const style = styles.sheetStyle(kind(column), text);
    return `<c r="${cellAddress({ row, column })}" s="${style}"${type ? ` t="${type}"` : ''}>${inner}</c>`;
  });
  return `<row r="${row}">${cells.join('')}</row>`;
}

const quoted = (sheet: string) => `'${sheet.replaceAll("'", "''")}'`;

function links(changes: readonly ListedChange[]): string {
  const markup = changes.slice(0, MOST_LINKS).map(({ sheet, cell }, index) => {
    const ref = cellAddress({ row: index + 2, column: CELL_COLUMN });
    return `<hyperlink ref="${ref}" location="${escapeAttribute(`${quoted(sheet)}!${cell}`)}" display="${escapeAttribute(cell)}"/>`;
  });
  return markup.length > 0 ? `<hyperlinks>${markup.join('')}</hyperlinks>` : '';
}

/** The sheet that lists what was changed and why, a link to each cell. */
export function changesSheet(
  changes: readonly ListedChange[],
  styles: Styles,
  { namespace }: Dialect,
): string {
  const widths = WIDTHS.map(
    (width, index) => `<col min="${index + 1}" max="${index + 1}" width="${width}" customWidth="1"/>`,
  );
  const heading = rowMarkup(1, CHANGE_HEADINGS, () => 'heading', styles);
  const rows = changes.map((change, index) =>
    rowMarkup(index + 2, changeRow(change), (column) => (column === CELL_COLUMN ? 'link' : 'text'), styles),
  );
  const last = `${columnLetters(CHANGE_HEADINGS.length - 1)}${changes.length + 1}`;
  return [
    `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n<worksheet xmlns="${namespace}"><dimension ref="A1:${last}"/>`,
    `<sheetViews><sheetView workbookViewId="0"><pane ySplit="1" topLeftCell="A2" activePane="bottomLeft" state="frozen"/></sheetView></sheetViews>`,
    `<cols>${widths.join('')}</cols><sheetData>${heading}`,
    ...rows,
    `</sheetData>${links(changes)}</worksheet>`,
  ].join('');
}
