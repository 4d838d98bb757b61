import fc from 'fast-check';
import type { Relation } from '@/lib/schedule/relation';
import { RELATIONS } from '@/lib/schedule/relation';

export interface PlanActivity {
  readonly id: string;
  readonly name: string;
  /** Working days. */
  readonly estimates: readonly [number, number, number];
  readonly links: readonly { readonly from: string; readonly type: Relation; readonly lag: number }[];
}

/** How a list is laid out in a sheet; every layout of a list says the same. */
export interface Layout {
  readonly title: number;
  readonly left: number;
  readonly headers: 'long' | 'letters' | 'two rows' | 'german' | 'upper';
  readonly order: readonly number[];
  readonly links: 'cell' | 'row each' | 'columns' | 'successors';
  readonly separator: string;
  readonly unit: 'header' | 'cell' | 'none';
  readonly comma: boolean;
  readonly asText: boolean;
  readonly headings: boolean;
  readonly blanks: boolean;
  readonly total: boolean;
  readonly note: boolean;
}

export type Cell = string | number | null;

const ID_STYLES: readonly ((i: number) => string)[] = [
  (i) => String.fromCharCode(65 + (i % 26)) + (i >= 26 ? String(Math.floor(i / 26)) : ''),
  (i) => String(i + 1),
  (i) => `A${(i + 1) * 10}`,
  (i) => `C-${String(i + 1).padStart(3, '0')}`,
  (i) => `1.${i + 1}.x`,
  (i) => `Lot ${i + 1}`,
];
const NAMES = [
  'Dig the pit',
  'Pour "north" slab',
  'Cure, then strip',
  'Erect frame; level 2',
  'Gl\u00e4sern & Caf\u00e9',
  'Wire up\nand test',
  "Paint 'em",
];

/** Lists without a loop: each activity waits for some before it. */
export const plan: fc.Arbitrary<PlanActivity[]> = fc
  .tuple(fc.constantFrom(...ID_STYLES), fc.integer({ min: 4, max: 14 }))
  .chain(([idOf, count]) =>
    fc.tuple(
      ...Array.from({ length: count }, (_, i) =>
        fc
          .record({
            name: fc.constantFrom(...NAMES),
            a: fc.integer({ min: 1, max: 40 }),
            m: fc.integer({ min: 1, max: 40 }),
            b: fc.integer({ min: 1, max: 60 }),
            links: fc.uniqueArray(
              fc.record({
                from: fc.integer({ min: 0, max: Math.max(0, i - 1) }),
                type: fc.constantFrom<Relation>('FS', 'FS', 'FS', ...RELATIONS),
                lag: fc.constantFrom(0, 0, 0, 1, 2.5, -1.5),
              }),
              { maxLength: i === 0 ? 0 : 3, selector: ({ from }) => from },
            ),
          })
          .map(({ name, a, m, b, links }): PlanActivity => ({
            id: idOf(i),
            name: `${name} ${i}`,
            estimates: [a / 2, (a + m) / 2, (a + m + b) / 2],
            links: links.map((link) => ({ ...link, from: idOf(link.from) })),
          })),
      ),
    ),
  );

export const layout: fc.Arbitrary<Layout> = fc.record({
  title: fc.integer({ min: 0, max: 3 }),
  left: fc.integer({ min: 0, max: 3 }),
  headers: fc.constantFrom('long', 'letters', 'two rows', 'german', 'upper'),
  order: fc.shuffledSubarray([0, 1, 2, 3, 4, 5, 6], { minLength: 7, maxLength: 7 }),
  links: fc.constantFrom('cell', 'row each', 'columns', 'successors'),
  separator: fc.constantFrom(', ', ';', '\n', ' and ', ' & '),
  unit: fc.constantFrom('header', 'cell', 'none'),
  comma: fc.boolean(),
  asText: fc.boolean(),
  headings: fc.boolean(),
  blanks: fc.boolean(),
  total: fc.boolean(),
  note: fc.boolean(),
});

const HEADERS = {
  long: ['Activity ID', 'Description', 'Optimistic', 'Most likely', 'Pessimistic', 'Predecessors', 'Area'],
  letters: ['ID', 'Name', 'a', 'm', 'b', 'Depends on', 'Zone'],
  'two rows': ['Task No.', 'Task name', 'a', 'm', 'b', 'Preds', 'Zone'],
  german: [
    'Vorgang-Nr.',
    'Bezeichnung',
    'Optimistisch',
    'Wahrscheinlich',
    'Pessimistisch',
    'Vorg\u00e4nger',
    'Bereich',
  ],
  upper: ['CODE', 'ACTIVITY NAME', 'MIN', 'LIKELY', 'MAX', 'AFTER', 'BLOCK'],
} as const;
const FIELDS = ['id', 'name', 'a', 'm', 'b', 'links', 'other'] as const;

/** The list in a layout: rows of cells, row 1 first. */
export function laidOut(list: readonly PlanActivity[], layout: Layout): Cell[][] {
  const order = layout.order.map((i) => FIELDS[i] ?? 'other');
  const withTies = layout.links === 'columns';
  const pad: Cell[] = Array.from({ length: layout.left }, () => null);
  const put = (cells: Partial<Record<(typeof FIELDS)[number] | 'relation' | 'lag', Cell>>): Cell[] => [
    ...pad,
    ...order.map((field) => cells[field] ?? null),
    ...(withTies ? [cells.relation ?? null, cells.lag ?? null] : []),
  ];
  const rows: Cell[][] = Array.from({ length: layout.title }, (_, i) => [
    ...pad,
    ['Lock gates, north', 'Kestrel Marine', 'Rev C'][i] ?? null,
  ]);
  rows.push(...headerRows(order, layout, put));
  const number = (days: number): Cell => written(days, layout);
  list.forEach((activity, i) => {
    if (layout.blanks && i % 4 === 3) rows.push([]);
    if (layout.headings && i % 5 === 0) rows.push(put({ name: `Part ${i / 5 + 1}` }));
    const [a, m, b] = activity.estimates.map(number);
    const base = {
      id: activity.id,
      name: activity.name,
      a: a ?? null,
      m: m ?? null,
      b: b ?? null,
      other: i % 2 === 0 ? 'north' : null,
    };
    rows.push(
      ...linkRows(list, activity, layout).map((links, k) => put(k === 0 ? { ...base, ...links } : links)),
    );
  });
  const sum = (part: number) =>
    number(list.reduce((total, { estimates }) => total + (estimates[part] ?? 0), 0));
  if (layout.total) rows.push(put({ name: 'Total', a: sum(0), m: sum(1), b: sum(2) }));
  if (layout.note) rows.push([], [...pad, 'Note: estimates by the foremen.']);
  return rows;
}

function headerRows(
  order: readonly (typeof FIELDS)[number][],
  { headers, unit, links }: Layout,
  put: (cells: Record<string, Cell>) => Cell[],
): Cell[][] {
  const names = HEADERS[headers];
  const suffix = unit === 'header' ? (headers === 'german' ? ' (Tage)' : ' (days)') : '';
  const cells: Record<string, Cell> = {};
  FIELDS.forEach((field, i) => {
    cells[field] = (names[i] ?? '') + (['a', 'm', 'b'].includes(field) ? suffix : '');
  });
  if (links === 'successors') cells.links = 'Successors';
  cells.relation = 'Relation';
  cells.lag = 'Lag';
  if (headers !== 'two rows') return [put(cells)];
  const first = order.find((field) => ['a', 'm', 'b'].includes(field)) ?? 'a';
  const adjacent =
    order.join('').includes('amb') ||
    ['a', 'm', 'b'].every(
      (one, i, all) => Math.abs(order.indexOf(one as 'a') - order.indexOf((all[0] ?? 'a') as 'a')) < 3,
    );
  return adjacent ? [put({ [first]: 'Duration' }), put(cells)] : [put(cells)];
}

function written(days: number, { unit, comma, asText }: Layout): Cell {
  const digits = comma ? String(days).replace('.', ',') : String(days);
  if (unit === 'cell') return `${digits} d`;
  return asText ? digits : days;
}

/** The cells that give an activity's links, a row each where the layout has it so. */
function linkRows(
  list: readonly PlanActivity[],
  activity: PlanActivity,
  { links: way, separator, comma }: Layout,
): Record<string, Cell>[] {
  const spell = (id: string, type: Relation, lag: number) => {
    // Among whole numbers as IDs, `1 FS+2,5` says 1 and 5.
    const withComma = comma && separator !== ', ' && !/^\d+$/.test(id);
    const size = withComma ? String(Math.abs(lag)).replace('.', ',') : String(Math.abs(lag));
    return type === 'FS' && lag === 0 ? id : `${id} ${type}${lag === 0 ? '' : (lag < 0 ? '-' : '+') + size}`;
  };
  if (way === 'successors') {
    const after = list.flatMap(({ id, links }) =>
      links.filter(({ from }) => from === activity.id).map(({ type, lag }) => spell(id, type, lag)),
    );
    return [{ links: after.join(separator) || null }];
  }
  if (way === 'cell')
    return [
      { links: activity.links.map(({ from, type, lag }) => spell(from, type, lag)).join(separator) || null },
    ];
  const rows = activity.links.map(({ from, type, lag }): Record<string, Cell> =>
    way === 'row each'
      ? { links: spell(from, type, lag) }
      : { links: from, relation: type, lag: lag === 0 ? null : lag },
  );
  return rows.length === 0 ? [{ links: null }] : rows;
}
