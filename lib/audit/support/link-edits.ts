import type { LinkCell, LinkItem } from '@/lib/schedule/activity';
import { cellAddress } from '@/lib/schedule/cell';
import type { CellEdit, ItemChange } from '@/lib/schedule/edit';
import { applyItems } from '@/lib/schedule/link-items';
import type { CellContent } from '@/lib/schedule/sheet';

/** A cell of numbers keeps a number where what is left in it is one. */
function contentFor(text: string, content: CellContent): CellContent {
  if (text === '') return null;
  return typeof content === 'number' && String(Number(text)) === text ? Number(text) : text;
}

/** An entry with the relation and lag that a column of their own gives it. */
function spelledOut({ text, link }: LinkItem): string {
  if (!link || text !== link.id) return text;
  const lag = link.lag === 0 ? '' : `${link.lag > 0 ? '+' : ''}${link.lag}d`;
  return `${link.id} ${link.type}${lag}`;
}

/** The cell written anew, where its entries cannot be changed one by one. */
function rebuilt({ items, separator, ties }: LinkCell, changes: readonly ItemChange[]): string {
  const entries = items.map((item) => ({ item: item.text, text: ties ? spelledOut(item) : item.text }));
  for (const change of changes) {
    const at =
      change.op === 'add' ? entries.length : entries.findLastIndex(({ item }) => item === change.item);
    if (change.op === 'add') entries.push({ item: change.item, text: change.item });
    else if (at >= 0)
      entries.splice(at, 1, ...(change.op === 'replace' ? [{ item: '', text: change.with }] : []));
  }
  return entries.map(({ text }) => text).join(separator.trim() === '' ? ', ' : separator);
}

/** A number has no text of its own: its entry is named by what the cell holds. */
const named = (content: CellContent, items: readonly ItemChange[]): readonly ItemChange[] =>
  typeof content === 'number'
    ? items.map((change) => (change.op === 'add' ? change : { ...change, item: String(content) }))
    : items;

/**
 * The change of a predecessor or successor cell, entry by entry and as its new text. Where a column of their
 * own gives several entries their relations and lags, these are written into the cell: a share of that column
 * would go to the wrong entry.
 */
export function linkEdit(cell: LinkCell, changes: readonly ItemChange[]): CellEdit {
  const { content } = cell;
  const items = cell.items.length === 1 ? named(content, changes) : changes;
  const separator =
    cell.separator.trim() === '' && !cell.separator.includes('\n') ? undefined : cell.separator;
  const text = typeof content === 'number' ? String(content) : cell.text;
  const place = { sheet: cell.cell.sheet, cell: cellAddress(cell.cell), from: content };
  const applied = applyItems(text, items, separator);
  const recounted = cell.ties !== undefined && items.some(({ op }) => op !== 'replace');
  if (applied.unmet.length > 0 || (recounted && cell.items.length > 1)) {
    return { ...place, to: contentFor(rebuilt(cell, changes), content) };
  }
  const added = separator !== undefined && items.some(({ op }) => op === 'add');
  return { ...place, to: contentFor(applied.text, content), items, ...(added ? { separator } : {}) };
}

/** The text of an entry with another ID in it, its relation and lag as written. */
export function withId({ content }: LinkCell, text: string, id: string, other: string): string {
  const at = typeof content === 'number' ? -1 : text.indexOf(id);
  return at < 0 ? other : text.slice(0, at) + other + text.slice(at + id.length);
}
