import type { Sheet } from '@/lib/schedule/sheet';

type Merge = Sheet['merges'][number];
interface Place {
  readonly row: number;
  readonly column: number;
}

/** Ranges taller than this are looked through one by one; the others are found by row. */
const TALL = 64;

/** Leads a cell that a merged range covers to the range's top-left cell, and any other to itself. */
export function coveredBy(merges: readonly Merge[]): (place: Place) => Place {
  const byRow = new Map<number, Merge[]>();
  const tall: Merge[] = [];
  for (const merge of merges) {
    if (merge.bottom - merge.top >= TALL) tall.push(merge);
    else
      for (let row = merge.top; row <= merge.bottom; row += 1) {
        const there = byRow.get(row);
        if (there) there.push(merge);
        else byRow.set(row, [merge]);
      }
  }
  return (place) => {
    const covers = ({ top, bottom, left, right }: Merge) =>
      place.row >= top && place.row <= bottom && place.column >= left && place.column <= right;
    const merge = byRow.get(place.row)?.find(covers) ?? tall.find(covers);
    return merge ? { row: merge.top, column: merge.left } : place;
  };
}
