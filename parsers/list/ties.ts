import type { LinkItem } from '@/lib/schedule/activity';
import type { Relation } from '@/lib/schedule/relation';
import type { SheetRow } from '@/lib/schedule/sheet';
import { type DurationContext, readDuration } from '@/parsers/cells/duration';
import { type CellItem, type LinkContext, SEPARATOR } from '@/parsers/cells/links';
import { readLag, readRelation } from '@/parsers/cells/relation';
import { clean } from '@/parsers/cells/text';
import { markOf } from './estimates';
import type { SheetCells } from './sheet-cells';

/** A relation and a lag from columns of their own; null where one cannot be read. */
interface Tie {
  readonly type: Relation;
  readonly lag: number;
}

const NONE = /^(?:[-\u2012-\u2015\u2212]*|none|nil|n\/?a|n\.a\.)$/i;
const WITH_LAG = /^(.*?\p{L})\s*([+\-\u2212\u2013]\s*\d.*)$/u;

/** Gives the entries of a link cell the relation and lag that stand in columns of their own. */
export class TieReader {
  private readonly context: DurationContext;
  private readonly used: boolean;

  constructor(
    private readonly cells: SheetCells,
    rows: readonly SheetRow[],
    private readonly links: LinkContext,
  ) {
    this.used = cells.has('relation') || cells.has('lag');
    const { unit, options } = links;
    this.context = { mark: markOf(cells, rows, 'lag'), header: cells.header('lag').unit, unit, options };
  }

  /** An entry that states a relation or lag itself keeps it. */
  apply(items: readonly CellItem[], row: SheetRow): LinkItem[] {
    if (!this.used || items.length === 0) return items.map(plain);
    const relation = this.cells.pendingFormula(row, 'relation') ?? this.cells.rawText(row, 'relation');
    const relations = this.shares(relation, items.length);
    const lags = this.lagShares(row, items.length);
    return items.map((item, i) => {
      if (item.stated || !item.link) return plain(item);
      const [own = '', lag = ''] = [relations[i], lags?.[i]];
      const tie = this.read(own, lag, row, lags === null);
      if (tie) return plain({ ...item, link: { ...item.link, ...tie } });
      const text = [item.text, own, lags === null ? this.cells.text(row, 'lag') : lag]
        .filter((part) => part !== '')
        .join(' ');
      return { text, link: null, readings: [] };
    });
  }

  private read(relation: string, lag: string, row: SheetRow, isCell: boolean): Tie | null {
    const [, letters = relation, own = ''] = WITH_LAG.exec(relation) ?? [];
    const type = NONE.test(letters) ? 'FS' : readRelation(letters);
    const ownLag = own === '' ? 0 : readLag(own, this.links);
    const given = isCell ? this.cellLag(row) : this.textLag(lag);
    if (type === null || ownLag === null || given === null) return null;
    return { type, lag: ownLag + given };
  }

  /** The lag cell as a number, or a text with a unit; an empty one is none. */
  private cellLag(row: SheetRow): number | null {
    const { days, problem } = readDuration(this.cells.durationCell(row, 'lag'), this.context);
    return problem === 'empty' ? 0 : days;
  }

  private textLag(text: string): number | null {
    if (NONE.test(text)) return 0;
    const cell = { value: text, format: 'General', date1904: false, formula: null };
    return readDuration(cell, this.context).days;
  }

  /** As many lags as entries, where the cell gives a list of them; null where it gives one for all. */
  private lagShares(row: SheetRow, count: number): string[] | null {
    const value = this.cells.value(row, 'lag');
    if (count < 2 || typeof value !== 'string') return null;
    const parts = value.split(SEPARATOR).map(clean);
    return parts.length === count ? parts : null;
  }

  /** A relation for each entry, or one for all. */
  private shares(text: string, count: number): string[] {
    const parts = text.split(SEPARATOR).map(clean);
    return parts.length === count ? parts : Array.from({ length: count }, () => clean(text));
  }
}

function plain({ text, link, readings }: LinkItem): LinkItem {
  return { text, link, readings };
}
