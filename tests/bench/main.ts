import { benchAudit } from './audit';
import { benchGiveBack } from './give-back';
import type { BenchRow } from './measure';
import { benchNetwork } from './network';
import { benchParse } from './parse';
import { benchUpload } from './upload';

const SIZES = [1_000, 10_000, 50_000];
const GROWTH_LIMIT = 6;

const PARTS: Record<string, (sizes: readonly number[]) => Promise<BenchRow[]>> = {
  parse: benchParse,
  audit: benchAudit,
  network: benchNetwork,
  'give-back': benchGiveBack,
  upload: benchUpload,
};

/** `npm run bench [-- part …]`: figures and ratios; nothing here passes or fails by the clock of one machine. */
export async function bench(args: readonly string[]): Promise<void> {
  const parts = args.length > 0 ? args : Object.keys(PARTS);
  const unknown = parts.filter((part) => !Object.hasOwn(PARTS, part));
  if (unknown.length > 0) {
    throw new Error(`There is no part ${unknown.join(', ')}; there are ${Object.keys(PARTS).join(', ')}.`);
  }
  const rows: BenchRow[] = [];
  for (const part of parts) {
    console.log(`${part} …`);
    rows.push(...((await PARTS[part]?.(SIZES)) ?? []));
  }
  console.log(`\n${table(rows)}`);
}

const HEAD = ['what', 'rows', 'ms', 'rows a second', 'peak MB', 'growth', 'compared'];

function table(rows: readonly BenchRow[]): string {
  const lines = [HEAD, ...rows.map((row) => line(row, before(rows, row)))];
  const widths = HEAD.map((_, column) => Math.max(...lines.map((cells) => cells[column]?.length ?? 0)));
  const text = lines.map((cells) =>
    cells
      .map((cell, column) =>
        column === 0 || column === 6 ? cell.padEnd(widths[column] ?? 0) : cell.padStart(widths[column] ?? 0),
      )
      .join('  ')
      .trimEnd(),
  );
  return [
    ...text,
    '',
    `Growth is the time against the size before it; from 10 000 to 50 000 at most ${GROWTH_LIMIT} is wanted.`,
  ].join('\n');
}

/** The same measurement at the next smaller size. */
function before(rows: readonly BenchRow[], row: BenchRow): BenchRow | undefined {
  return rows.filter((other) => other.name === row.name && other.size < row.size).at(-1);
}

function line(row: BenchRow, smaller: BenchRow | undefined): string[] {
  const growth = smaller ? row.ms / smaller.ms : null;
  return [
    row.name,
    count(row.size),
    row.ms.toFixed(row.ms < 100 ? 2 : 0),
    count((row.size / row.ms) * 1000),
    row.peakMb.toFixed(0),
    growth === null ? '' : `${growth.toFixed(1)}×${row.size === 50_000 && growth > GROWTH_LIMIT ? ' !' : ''}`,
    row.ratio ? `${row.ratio.times.toFixed(1)}× faster than ${row.ratio.to}` : '',
  ];
}

const count = (value: number): string => Math.round(value).toLocaleString('en-GB').replaceAll(',', ' ');
