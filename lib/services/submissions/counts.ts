import type { countFindings } from '@/db/queries/projects';
import type { Weight } from '@/lib/schedule/weight';

export type Counts = Record<Weight, number>;
type CountRow = Awaited<ReturnType<typeof countFindings>>[number];

export interface FindingCounts {
  readonly all: Counts;
  readonly open: Counts;
}

/** The counts of one submission out of those of several. */
export function countsOf(rows: readonly CountRow[], submission: string): FindingCounts {
  const all: Counts = { blocks: 0, distorts: 0, query: 0 };
  const open: Counts = { blocks: 0, distorts: 0, query: 0 };
  for (const row of rows) {
    if (row.submission !== submission) continue;
    all[row.weight] = row.all;
    open[row.weight] = row.open;
  }
  return { all, open };
}
