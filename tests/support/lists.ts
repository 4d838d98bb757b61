import ExcelJS from 'exceljs';
import type { Relation } from '@/lib/schedule/relation';

/** One row of a list made for tests and measurements. */
export interface ListRow {
  readonly id: string;
  readonly name: string;
  readonly optimistic: number;
  readonly likely: number;
  readonly pessimistic: number;
  readonly predecessors: readonly { readonly id: string; readonly type: Relation; readonly lag: number }[];
}

const WORKS = [
  'Excavate',
  'Pile',
  'Shutter',
  'Pour',
  'Erect',
  'Clad',
  'Wire',
  'Plaster',
  'Paint',
  'Commission',
];
const PLACES = [
  'north quay',
  'pump house',
  'lock gate',
  'culvert',
  'east ramp',
  'control room',
  'basin',
  'weir',
];

/** A generator of numbers in [0, 1) from a seed (mulberry32, public domain). */
export function randomFrom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}

/** n activities without a loop, 2.5 links each on average, nine in ten of them plain finish-to-start. */
export function syntheticList(n: number, seed = 1): ListRow[] {
  const random = randomFrom(seed);
  const whole = (below: number) => Math.floor(random() * below);
  const ids = Array.from({ length: n }, (_, i) => `A${String((i + 1) * 10).padStart(5, '0')}`);
  return ids.map((id, i) => {
    const likely = 2 + whole(20);
    const count = i === 0 ? 0 : Math.min(i, 1 + whole(4));
    const chosen = new Set<number>([i === 0 ? 0 : i - 1]);
    while (chosen.size < count) chosen.add(Math.max(0, i - 1 - whole(60)));
    return {
      id,
      name: `${WORKS[whole(WORKS.length)]}, ${PLACES[whole(PLACES.length)]} ${1 + whole(40)}`,
      optimistic: Math.max(1, likely - 1 - whole(4)),
      likely,
      pessimistic: likely + 1 + whole(12),
      predecessors:
        i === 0 ? [] : [...chosen].map((from) => ({ id: ids[from] ?? '', ...relation(random()) })),
    };
  });
}

function relation(chance: number): { type: Relation; lag: number } {
  if (chance < 0.9) return { type: 'FS', lag: chance < 0.05 ? 2 : 0 };
  if (chance < 0.96) return { type: 'SS', lag: 3 };
  return { type: 'FF', lag: chance < 0.98 ? 1 : 0 };
}

/** A predecessor cell in the trade's notation. */
export function notation(predecessors: ListRow['predecessors'], separator = ', '): string {
  return predecessors
    .map(({ id, type, lag }) => {
      if (type === 'FS' && lag === 0) return id;
      return `${id} ${type}${lag === 0 ? '' : lag > 0 ? `+${lag}` : String(lag)}`;
    })
    .join(separator);
}

export const HEADERS = [
  'Activity ID',
  'Description',
  'Optimistic (days)',
  'Most likely (days)',
  'Pessimistic (days)',
  'Predecessors',
  'WBS',
  'Responsible',
  'Calendar',
  'Area',
  'Shift',
  'Remarks',
] as const;

/** Twelve cells, of which the first six are the list. */
export function toCells(row: ListRow, index: number): (string | number)[] {
  return [
    row.id,
    row.name,
    row.optimistic,
    row.likely,
    row.pessimistic,
    notation(row.predecessors),
    `${1 + (index % 9)}.${1 + (index % 7)}`,
    `Foreman ${index % 12}`,
    'Five days',
    `Area ${index % 5}`,
    1 + (index % 3),
    index % 10 === 0 ? 'see drawing' : '',
  ];
}

/** The list as a workbook written by exceljs: twelve columns, header in row 1, shared strings. */
export async function toXlsx(rows: readonly ListRow[]): Promise<Uint8Array> {
  const workbook = new ExcelJS.Workbook();
  const sheet = workbook.addWorksheet('Activities');
  sheet.addRow([...HEADERS]);
  rows.forEach((row, i) => sheet.addRow(toCells(row, i).map((value) => (value === '' ? null : value))));
  return new Uint8Array(await workbook.xlsx.writeBuffer());
}

/** The list as comma-separated text. */
export function toCsv(rows: readonly ListRow[], delimiter = ','): string {
  const quote = (value: string | number) => {
    const text = String(value);
    return /["\r\n]/.test(text) || text.includes(delimiter) ? `"${text.replaceAll('"', '""')}"` : text;
  };
  const line = (cells: readonly (string | number)[]) => cells.map(quote).join(delimiter);
  return [line(HEADERS), ...rows.map((row, i) => line(toCells(row, i)))].join('\r\n') + '\r\n';
}
