import { parseAddress } from '@/lib/schedule/cell';
import { shiftFormula } from '@/parsers/xlsx/formula';
import { type Area, parseArea } from './areas';
import { fromBytes } from './parts';
import { allOf, cellsOf, findIn, rowAt, rowsOf, type SheetMarkup } from './sheet-markup';
import { attribute, type Element, textIn } from './xml';

/** A formula with the cell it stands in. */
export interface FormulaCell {
  readonly row: number;
  readonly column: number;
  /** As it reads in this cell; '' for a table of data, whose formula is not text. */
  readonly text: string;
  readonly kind: 'own' | 'shared' | 'array' | 'data table';
  /** Of a shared formula: which group, and whether its text stands in this cell. */
  readonly group: string;
  readonly leads: boolean;
  /** The cells that hold its results. */
  readonly area: Area;
}

interface Found {
  readonly row: number;
  readonly column: number;
  readonly formula: Element;
}

/** Places of the formulas by the address that each cell tells; null where a cell tells none. */
function byAddress(sheet: SheetMarkup): Found[] | null {
  const { structure, prefix } = sheet;
  const found: Found[] = [];
  for (const formula of allOf(sheet, 'f')) {
    const cell = structure.lastIndexOf(`<${prefix}c`, formula.start - 1);
    const place = parseAddress(attribute(structure.slice(cell, formula.start), 'r') ?? '');
    if (!place) return null;
    found.push({ ...place, formula });
  }
  return found;
}

function byCounting(sheet: SheetMarkup): Found[] {
  return rowsOf(sheet).flatMap((spot) =>
    cellsOf(sheet, rowAt(sheet, spot)).flatMap((cell) => {
      const formula = findIn(sheet, cell, 'f');
      return formula ? [{ row: spot.number, column: cell.column, formula }] : [];
    }),
  );
}

/** All formulas of a sheet, in order, shared ones as each cell has them (ECMA-376 part 1, 18.3.1.40). */
export function formulasOf(sheet: SheetMarkup): FormulaCell[] {
  const leaders = new Map<string, { text: string; row: number; column: number }>();
  return (byAddress(sheet) ?? byCounting(sheet)).map(({ row, column, formula }) => {
    const tag = sheet.structure.slice(formula.start, formula.inner);
    const written = fromBytes(textIn(sheet.xml.slice(formula.inner, formula.innerEnd)));
    const type = attribute(tag, 't');
    const group = type === 'shared' ? (attribute(tag, 'si') ?? '') : '';
    const own = { top: row, bottom: row, left: column, right: column };
    const result = { row, column, text: written, kind: 'own', group, leads: false, area: own } as const;
    if (type === 'array' || type === 'dataTable') {
      const area = parseArea(attribute(tag, 'ref') ?? '') ?? own;
      return { ...result, kind: type === 'array' ? 'array' : 'data table', area };
    }
    if (type !== 'shared') return result;
    if (written !== '') leaders.set(group, { text: written, row, column });
    const leader = leaders.get(group);
    const text = leader ? shiftFormula(leader.text, row - leader.row, column - leader.column) : '';
    return { ...result, kind: 'shared', text, leads: written !== '' };
  });
}
