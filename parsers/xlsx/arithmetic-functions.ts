/** What an operand gives: a number, an error code, or nothing that arithmetic can use. */
export type Operand = number | { readonly error: string } | null;

/** Counted as plain arithmetic, also where a file keeps no result. */
export const PLAIN_FUNCTIONS: ReadonlySet<string> = new Set(['SUM']);

type Numbers = readonly number[];

/** They take blocks of cells, and leave out what is no number there. */
const ON_LISTS = new Map<string, (values: Numbers) => Operand>([
  ['SUM', total],
  ['MAX', (values) => values.reduce((most, value) => Math.max(most, value), values[0] ?? 0)],
  ['MIN', (values) => values.reduce((least, value) => Math.min(least, value), values[0] ?? 0)],
  ['AVERAGE', (values) => (values.length > 0 ? total(values) / values.length : { error: '#DIV/0!' })],
]);

const ON_VALUES = new Map<string, (values: Numbers) => Operand>([
  ['ABS', ([value, ...more]) => (value === undefined || more.length > 0 ? null : Math.abs(value))],
  ['INT', ([value, ...more]) => (value === undefined || more.length > 0 ? null : Math.floor(value))],
  ['ROUND', (values) => rounded(values, Math.round)],
  ['ROUNDUP', (values) => rounded(values, Math.ceil)],
  ['ROUNDDOWN', (values) => rounded(values, Math.floor)],
]);

/** Those that can be worked out anew once a cell they rest on has changed. */
export const KNOWN_FUNCTIONS: ReadonlySet<string> = new Set([...ON_LISTS.keys(), ...ON_VALUES.keys()]);

export const isOnLists = (name: string): boolean => ON_LISTS.has(name);

/** A function's result; an error among its arguments is its result, and what cannot be used gives nothing. */
export function callFunction(name: string, given: readonly Operand[]): Operand {
  const values: number[] = [];
  for (const one of given) {
    if (typeof one !== 'number') return one;
    values.push(one);
  }
  const result = (ON_LISTS.get(name) ?? ON_VALUES.get(name))?.(values) ?? null;
  return typeof result === 'number' && !Number.isFinite(result) ? { error: '#NUM!' } : result;
}

function total(values: Numbers): number {
  return values.reduce((sum, value) => sum + value, 0);
}

/** Rounded by size, the sign put back: halves go away from 0. Fifteen digits are what a cell keeps. */
function rounded([value, digits = 0, ...more]: Numbers, how: (size: number) => number): Operand {
  if (value === undefined || more.length > 0) return null;
  const power = 10 ** Math.trunc(digits);
  const size = Number((Math.abs(value) * power).toPrecision(15));
  return (Math.sign(value) * how(size)) / power;
}
