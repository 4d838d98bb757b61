import { cellAddress } from '@/lib/schedule/cell';
import type { Field } from '@/lib/schedule/field';
import type { SheetRow } from '@/lib/schedule/sheet';
import { clean, fold, isBlank } from '@/parsers/cells/text';
import type { EstimateReader, ThreeEstimates } from './estimates';
import type { SheetCells } from './sheet-cells';

/** What a row holds, as far as it tells what kind of row it is. */
export interface RowFacts {
  readonly row: SheetRow;
  readonly id: string;
  readonly idError: string | null;
  readonly name: string;
  readonly estimates: ThreeEstimates;
  /** Whether any estimate cell holds something, an error included. */
  readonly hasEstimates: boolean;
  /** Whether a predecessor or successor is given. */
  readonly hasLinks: boolean;
  /** Whether only a relation or a lag is given. */
  readonly hasTie: boolean;
  /** Predecessors, successors, relation and lag as one text, for telling rows that repeat. */
  readonly ties: string;
}

const NONE = /^(?:[-\u2012-\u2015\u2212]*|none|nil|n\/?a|n\.a\.)$/i;
const TIES: readonly Field[] = ['predecessors', 'successors', 'relation', 'lag'];
const USED: readonly Field[] = [
  'id',
  'name',
  'optimistic',
  'likely',
  'pessimistic',
  'duration',
  ...TIES,
  'wbs',
];

export function factsOf(row: SheetRow, cells: SheetCells, estimates: EstimateReader): RowFacts {
  const three = estimates.read(row);
  const parts = TIES.map(
    (field) => cells.error(row, field) ?? cells.pendingFormula(row, field) ?? cells.text(row, field),
  );
  const [predecessors = '', successors = '', relation = '', lag = ''] = parts;
  return {
    row,
    id: cells.id(row),
    idError: cells.error(row, 'id'),
    name: cells.text(row, 'name'),
    estimates: three,
    hasEstimates: Object.values(three).some(({ problem }) => problem !== 'empty'),
    hasLinks: !NONE.test(predecessors) || !NONE.test(successors),
    hasTie: !NONE.test(relation) || !NONE.test(lag),
    ties: parts.join('\u0000'),
  };
}

/** Whether a row says again what the header says. */
export class HeaderRepeats {
  private readonly texts = new Map<number, Set<string>>();

  constructor(private readonly cells: SheetCells) {
    const { sheet, matching } = cells;
    const header = sheet.rows.filter(
      ({ number }) => number <= matching.headerRow && number > matching.headerRow - 3,
    );
    for (const field of USED) {
      const column = matching.columns[field];
      if (column === undefined) continue;
      const texts = header
        .map(({ cells: held }) => held[column])
        .filter((value) => typeof value === 'string');
      this.texts.set(column, new Set(texts.map(fold)));
    }
  }

  test(row: SheetRow): boolean {
    let same = 0;
    for (const [column, texts] of this.texts) {
      const value = row.cells[column] ?? null;
      if (isBlank(value)) continue;
      if (typeof value !== 'string' || !texts.has(fold(value))) return false;
      same++;
    }
    return same >= Math.min(2, this.texts.size) && same > 0 && this.cells.matching.headerRow > 0;
  }
}

const LABEL =
  /^(?:(?:sub|grand|over-?all|project|sheet|page|phase|section|stage)[\s-]*)?(?:totals?|sums?|subtotals?)(?:\s+(?:duration|days|hours|weeks|time|float|of\b.*|for\b.*|\(.*\)))?\s*[:=]?$|^(?:summe|gesamt|gesamtsumme|gesamtdauer|zwischensumme|somme|total general|suma|somma|totale|totaal|somma totale)\s*:?$|^(?:project|overall|expected|critical path|total)\s+(?:duration|variance|length|finish|completion|standard deviation|std\.? ?dev\.?)\b.*$|^(?:average|mean|variance|standard deviation|std\.? ?dev\.?|minimum|maximum|count)\s*[:=]?$/i;
const REMARK =
  /^(?:notes?|remarks?|n\.?\s?b\.?|legend|key|prepared|checked|approved|issued|reviewed|revision|source|assumptions?|all durations|disclaimer|page|end of|hinweis|anmerkung|remarque|nota)\b|^\*|^end$/i;
const ROLL_UP = /^(?:SUM|SUBTOTAL|AGGREGATE|MAX|MIN|AVERAGE|COUNT)\(/i;

/** Whether a row is headed as a total or another figure of the whole list. */
export function isTotalLabel(text: string): boolean {
  return LABEL.test(text);
}

/** Whether a text that stands alone in a row is a remark rather than a heading. */
export function isRemark(text: string): boolean {
  const words = text.split(' ').length;
  return REMARK.test(text) || text.length > 90 || (words > 5 && /[.!]$/.test(text)) || words > 12;
}

/** Whether nothing but a remark stands in a row, in whatever column. */
export function isLoneRemark({ cells }: SheetRow): boolean {
  const held = cells.filter((value) => !isBlank(value));
  const [only] = held;
  return held.length === 1 && typeof only === 'string' && isRemark(clean(only));
}

/** Whether every estimate a row gives is rolled up from other rows by its formula. */
export function isRolledUp({ row, estimates }: RowFacts, cells: SheetCells): boolean {
  if (cells.sheet.formulas.size === 0) return false;
  const given = Object.values(estimates).filter(({ problem, cell }) => problem !== 'empty' && cell);
  return (
    given.length > 0 &&
    given.every(({ cell }) => {
      const text = cells.sheet.formulas.get(addressOf(cell?.column ?? 0, row))?.text ?? '';
      return ROLL_UP.test(clean(text).replace(/^=/, ''));
    })
  );
}

function addressOf(column: number, row: SheetRow): string {
  return cellAddress({ row: row.number, column });
}
