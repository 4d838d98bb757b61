import fc from 'fast-check';

/** A row of a list in the short notation, part by part. */
export interface Row {
  readonly id: string;
  readonly name: string;
  readonly numbers: readonly [string, string, string];
  readonly before: readonly string[];
}

export const written = ({ id, name, numbers, before }: Row) =>
  `${id} "${name}" ${numbers.join(' ')}${before.length === 0 ? '' : ` <- ${before.join(', ')}`}`;

const relation = fc.constantFrom('', '', '', ' SS', ' FF', ' SS+2', ' FS+1', ' FF-0.5');
const estimates = fc
  .tuple(fc.integer({ min: 1, max: 40 }), fc.integer({ min: 1, max: 20 }), fc.integer({ min: 0, max: 30 }))
  .map(([a, up, further]) => [String(a), String(a + up), String(a + up + further)] as const);
const middle = fc.record({
  numbers: estimates,
  picks: fc.array(fc.tuple(fc.nat(), relation), { minLength: 1, maxLength: 3 }),
});

/**
 * A list with nothing to be found in it: one start, one finish, each activity after some above it, a ≤ m ≤ b.
 * IDs P-101, P-102 … stand far enough apart for a slip to be seen.
 */
export const cleanList: fc.Arbitrary<Row[]> = fc
  .tuple(estimates, fc.array(middle, { minLength: 1, maxLength: 14 }))
  .map(([first, others]) => {
    const idOf = (index: number) => `P-${101 + index}`;
    const nameOf = (index: number) => `Work ${index}`;
    const rows: Row[] = [{ id: idOf(0), name: nameOf(0), numbers: first, before: [] }];
    others.forEach(({ numbers, picks }, i) => {
      const chosen = new Map(picks.map(([pick, kind]) => [pick % (i + 1), kind]));
      const before = [...chosen].map(([index, kind]) => idOf(index) + kind);
      rows.push({ id: idOf(i + 1), name: nameOf(i + 1), numbers, before });
    });
    const followed = new Set(rows.flatMap(({ before }) => before.map((entry) => entry.split(' ')[0])));
    const open = rows.filter(({ id }) => !followed.has(id)).map(({ id }) => id);
    return [...rows, { id: idOf(rows.length), name: 'Handed over', numbers: ['0', '0', '0'], before: open }];
  });

/** One defect put into a row; `pick` chooses among what there is. */
type Slip = (rows: readonly Row[], at: number, pick: number) => Row;

const rowAt = (rows: readonly Row[], at: number): Row =>
  rows[at] ?? { id: '', name: '', numbers: ['1', '2', '3'], before: [] };
const other = (rows: readonly Row[], pick: number) => rowAt(rows, pick % rows.length).id;

/** Slips of every kind that has a fix. */
const SLIPS: Readonly<Record<string, Slip>> = {
  exchanged: (rows, at) => {
    const row = rowAt(rows, at);
    return { ...row, numbers: [row.numbers[1], row.numbers[0], row.numbers[2]] };
  },
  downwards: (rows, at) => {
    const row = rowAt(rows, at);
    return { ...row, numbers: [row.numbers[2], row.numbers[1], row.numbers[0]] };
  },
  tenfold: (rows, at) => {
    const row = rowAt(rows, at);
    return { ...row, numbers: [`${row.numbers[0]}0`, row.numbers[1], row.numbers[2]] };
  },
  negative: (rows, at) => {
    const row = rowAt(rows, at);
    return { ...row, numbers: [row.numbers[0], `-${row.numbers[1].replace('-', '')}`, row.numbers[2]] };
  },
  self: (rows, at) => {
    const row = rowAt(rows, at);
    return { ...row, before: [...row.before, row.id] };
  },
  twice: (rows, at) => {
    const row = rowAt(rows, at);
    return { ...row, before: [...row.before, ...row.before.slice(0, 1)] };
  },
  unknown: (rows, at, pick) => {
    const row = rowAt(rows, at);
    return {
      ...row,
      before: row.before
        .map((entry, i) => (i === 0 ? entry.replace('P-', 'p-') : entry))
        .concat(pick % 2 === 0 ? [] : ['QUARRY']),
    };
  },
  backwards: (rows, at, pick) => {
    const row = rowAt(rows, at);
    const later = rows.slice(at + 1);
    return { ...row, before: [...row.before, ...(later.length === 0 ? [] : [other(later, pick)])] };
  },
  repeated: (rows, at, pick) => ({ ...rowAt(rows, at), id: other(rows, pick) }),
  nameless: (rows, at) => ({ ...rowAt(rows, at), id: '_' }),
  unlinked: (rows, at) => ({ ...rowAt(rows, at), before: [] }),
};

/** A clean list with up to three slips put into it. */
export const slippedList: fc.Arbitrary<readonly Row[]> = fc
  .tuple(
    cleanList,
    fc.array(fc.tuple(fc.constantFrom(...Object.keys(SLIPS)), fc.nat(), fc.nat()), {
      minLength: 1,
      maxLength: 3,
    }),
  )
  .map(([rows, slips]) =>
    slips.reduce<readonly Row[]>((now, [kind, at, pick]) => {
      const index = at % now.length;
      const slip = SLIPS[kind];
      return slip ? now.map((row, i) => (i === index ? slip(now, index, pick) : row)) : now;
    }, rows),
  );
