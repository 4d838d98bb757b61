import { cellAddress } from '@/lib/schedule/cell';
import type { CellContent } from '@/lib/schedule/sheet';
import type { CellAction, SheetActions } from './actions';
import { parseArea } from './areas';
import { toBytes } from './parts';
import {
  type CellSpot,
  cellsOf,
  findIn,
  rowAt,
  type RowSpot,
  rowsOf,
  type SheetMarkup,
} from './sheet-markup';
import {
  attribute,
  child,
  children,
  type Element,
  escapeText,
  type Splice,
  withAttribute,
  withoutAttribute,
} from './xml';

/** Gives the style of a corrected cell, made from the style it had. */
export type StyleOf = (base: number, to: CellContent) => number;

interface Columns {
  /** The style that a column gives to cells that are not written. */
  styleOf(column: number): number;
}

export function contentMarkup(prefix: string, to: CellContent): { type: string | null; inner: string } {
  if (to === null) return { type: null, inner: '' };
  if (typeof to === 'number') return { type: null, inner: `<${prefix}v>${to}</${prefix}v>` };
  const text = `<${prefix}t xml:space="preserve">${escapeText(to)}</${prefix}t>`;
  return { type: 'inlineStr', inner: `<${prefix}is>${text}</${prefix}is>` };
}

function cellMarkup(prefix: string, tag: string, style: number, to: CellContent): string {
  const { type, inner } = contentMarkup(prefix, to);
  const bare = ['t', 'cm', 'vm'].reduce(withoutAttribute, tag).replace(/\s*\/?>$/, '>');
  const styled = withAttribute(bare, 's', String(style));
  const open = type ? withAttribute(styled, 't', type) : styled;
  return toBytes(inner === '' ? open.replace(/>$/, '/>') : `${open}${inner}</${prefix}c>`);
}

const newTag = (prefix: string, row: number, column: number) =>
  `<${prefix}c r="${cellAddress({ row, column })}">`;

function changeCell(
  sheet: SheetMarkup,
  cell: CellSpot,
  row: number,
  action: CellAction,
  styleOf: StyleOf,
): Splice[] {
  const { xml, structure, prefix } = sheet;
  const tag = structure.slice(cell.start, cell.inner);
  if (action.set) {
    const style = styleOf(Number(attribute(tag, 's') ?? 0), action.set.to);
    const address = attribute(tag, 'r')
      ? tag
      : withAttribute(tag, 'r', cellAddress({ row, column: cell.column }));
    return [{ start: cell.start, end: cell.end, text: cellMarkup(prefix, address, style, action.set.to) }];
  }
  let open = xml.slice(cell.start, cell.inner);
  const isRenewed = action.result !== undefined;
  if (action.dropResult || isRenewed) open = withoutAttribute(open, 't');
  if (action.formula === null) open = withoutAttribute(open, 'cm');
  const splices: Splice[] = [{ start: cell.start, end: cell.inner, text: open }];
  const replace = (element: Element | null, text: string) => {
    if (element) splices.push({ start: element.start, end: element.end, text });
  };
  if (action.formula === null) replace(findIn(sheet, cell, 'f'), '');
  else if (action.formula !== undefined) {
    replace(findIn(sheet, cell, 'f'), toBytes(`<${prefix}f>${escapeText(action.formula)}</${prefix}f>`));
  }
  if (action.dropResult || isRenewed) replace(findIn(sheet, cell, 'v'), '');
  if (isRenewed) {
    // In the order the schema asks for: the formula, then its result.
    const end = findIn(sheet, cell, 'f')?.end ?? cell.innerEnd;
    splices.push({ start: end, end, text: `<${prefix}v>${action.result}</${prefix}v>` });
  }
  return splices;
}

const inOrder = (actions: ReadonlyMap<number, CellAction>) => [...actions].sort(([a], [b]) => a - b);

function newCells(
  prefix: string,
  row: number,
  actions: readonly [number, CellAction][],
  styleOf: StyleOf,
  base: (column: number) => number,
) {
  return actions.map(([column, { set }]) =>
    set && set.to !== null
      ? cellMarkup(prefix, newTag(prefix, row, column), styleOf(base(column), set.to), set.to)
      : '',
  );
}

function widened(tag: string, columns: readonly number[]): string {
  const [first, last] = (attribute(tag, 'spans') ?? '').split(':').map(Number);
  if (!first || !last || columns.length === 0) return tag;
  const spans = `${Math.min(first, ...columns.map((c) => c + 1))}:${Math.max(last, ...columns.map((c) => c + 1))}`;
  return withAttribute(tag, 'spans', spans);
}

function changeRow(
  sheet: SheetMarkup,
  spot: RowSpot,
  actions: ReadonlyMap<number, CellAction>,
  styleOf: StyleOf,
  columns: Columns,
): Splice[] {
  const { xml, structure, prefix } = sheet;
  const row = rowAt(sheet, spot);
  const tag = structure.slice(row.start, row.inner);
  const rowStyle = /^(?:1|true)$/.test(attribute(tag, 'customFormat') ?? '')
    ? Number(attribute(tag, 's') ?? 0)
    : null;
  const base = (column: number) => rowStyle ?? columns.styleOf(column);
  const cells = cellsOf(sheet, row);
  const there = new Map(cells.map((cell) => [cell.column, cell]));
  const missing = inOrder(actions).filter(
    ([column, { set }]) => !there.has(column) && set && set.to !== null,
  );
  const splices = [...actions].flatMap(([column, action]) => {
    const cell = there.get(column);
    return cell ? changeCell(sheet, cell, spot.number, action, styleOf) : [];
  });
  if (missing.length === 0) return splices;

  const markup = newCells(prefix, spot.number, missing, styleOf, base);
  const open = widened(
    xml.slice(row.start, row.inner),
    missing.map(([column]) => column),
  );
  if (row.inner === row.end) {
    const text = `${open.replace(/\s*\/>$/, '>')}${markup.join('')}</${prefix}row>`;
    return [{ start: row.start, end: row.end, text }];
  }
  splices.push({ start: row.start, end: row.inner, text: open });
  missing.forEach(([column], index) => {
    const at = cells.find((cell) => cell.column > column)?.start ?? row.innerEnd;
    splices.push({ start: at, end: at, text: markup[index] ?? '' });
  });
  return splices;
}

/** Where missing rows are to be put in, each before the first row with a higher number. */
function addRows(
  sheet: SheetMarkup,
  rows: readonly RowSpot[],
  actions: SheetActions,
  missing: readonly number[],
  styleOf: StyleOf,
  columns: Columns,
): Splice[] {
  const { prefix, data } = sheet;
  const sorted = [...rows].sort((a, b) => a.number - b.number);
  let next = 0;
  const made = missing.flatMap((number) => {
    while ((sorted[next]?.number ?? Infinity) < number) next += 1;
    const cells = newCells(prefix, number, inOrder(actions.get(number) ?? new Map()), styleOf, (c) =>
      columns.styleOf(c),
    );
    const text = cells.join('');
    const at = sorted[next]?.start ?? data.innerEnd;
    return text === ''
      ? []
      : [{ start: at, end: at, text: `<${prefix}row r="${number}">${text}</${prefix}row>` }];
  });
  if (data.inner < data.end || made.length === 0) return made;
  const open = sheet.xml.slice(data.start, data.end).replace(/\s*\/>$/, '>');
  const text = `${open}${made.map((each) => each.text).join('')}</${data.name}>`;
  return [{ start: data.start, end: data.end, text }];
}

function columnsOf({ xml, prefix, root, data }: SheetMarkup): Columns {
  const cols = child(xml, { inner: root.inner, innerEnd: data.start }, `${prefix}cols`);
  const ranges = cols ? [...children(xml, cols)].map(({ start, inner }) => xml.slice(start, inner)) : [];
  return {
    styleOf: (column) => {
      const number = (tag: string, name: string) => Number(attribute(tag, name) ?? 0);
      const range = ranges.find((tag) => number(tag, 'min') <= column + 1 && number(tag, 'max') > column);
      return range ? number(range, 'style') : 0;
    },
  };
}

function dimension({ xml, prefix, root, data }: SheetMarkup, actions: SheetActions): Splice[] {
  const element = child(xml, { inner: root.inner, innerEnd: data.start }, `${prefix}dimension`);
  if (!element) return [];
  const tag = xml.slice(element.start, element.inner);
  const used = parseArea(attribute(tag, 'ref') ?? '');
  if (!used) return [];
  let { top, left, bottom, right } = used;
  for (const [row, cells] of actions) {
    for (const [column, { set }] of cells) {
      if (!set || set.to === null) continue;
      [top, bottom] = [Math.min(top, row), Math.max(bottom, row)];
      [left, right] = [Math.min(left, column), Math.max(right, column)];
    }
  }
  const ref = `${cellAddress({ row: top, column: left })}:${cellAddress({ row: bottom, column: right })}`;
  const same = top === used.top && left === used.left && bottom === used.bottom && right === used.right;
  return same ? [] : [{ start: element.start, end: element.inner, text: withAttribute(tag, 'ref', ref) }];
}

/** Carries out what is to be done to the cells of a sheet; nothing else of the part changes. */
export function patchCells(sheet: SheetMarkup, actions: SheetActions, styleOf: StyleOf): Splice[] {
  const rows = rowsOf(sheet);
  const columns = columnsOf(sheet);
  const found = new Set<number>();
  const splices = rows.flatMap((spot) => {
    const cells = actions.get(spot.number);
    if (!cells) return [];
    found.add(spot.number);
    return changeRow(sheet, spot, cells, styleOf, columns);
  });
  const missing = [...actions.keys()].filter((row) => !found.has(row)).sort((a, b) => a - b);
  return [
    ...dimension(sheet, actions),
    ...splices,
    ...addRows(sheet, rows, actions, missing, styleOf, columns),
  ];
}
