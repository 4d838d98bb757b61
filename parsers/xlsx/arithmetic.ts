import { callFunction, isOnLists, type Operand, PLAIN_FUNCTIONS } from './arithmetic-functions';

export interface Operands {
  /** A cell, by sheet ('' the formula's own), row from 1 and column from 0. */
  cell(sheet: string, row: number, column: number): Operand;
  /** The numbers in a block of cells. */
  numbers(
    sheet: string,
    top: number,
    left: number,
    bottom: number,
    right: number,
  ): readonly number[] | { readonly error: string } | null;
}

const TOKEN =
  /\s*(?:(\d+\.?\d*(?:[eE][+-]?\d+)?|\.\d+(?:[eE][+-]?\d+)?)|((?:'(?:[^']|'')+'|[A-Za-z_][\w.]*)!)?\$?([A-Za-z]{1,3})\$?(\d{1,7})(?![\w(!.])|([A-Z]{3,9})(?=\s*\()|([-+*/(),:]))/iy;

type Token =
  | { readonly kind: 'number'; readonly value: number }
  | { readonly kind: 'cell'; readonly sheet: string; readonly row: number; readonly column: number }
  | { readonly kind: 'function'; readonly name: string }
  | { readonly kind: 'sign'; readonly text: string };

const LENGTH_MAX = 1000;
const DEPTH_MAX = 60;

/**
 * The result of a formula that is plain arithmetic: + − * /, brackets and functions that are counted as such
 * over numbers and cells. Null where it is anything else, or rests on a cell that cannot be read.
 */
export function evaluate(
  formula: string,
  operands: Operands,
  functions: ReadonlySet<string> = PLAIN_FUNCTIONS,
): Operand {
  const tokens = tokenize(formula, functions);
  if (!tokens) return null;
  const parser = new Parser(tokens, operands);
  const value = parser.sum();
  return parser.finished ? value : null;
}

function tokenize(formula: string, functions: ReadonlySet<string>): Token[] | null {
  const text = formula.trim().replace(/^=/, '').trimEnd();
  if (text === '' || text.length > LENGTH_MAX) return null;
  const tokens: Token[] = [];
  TOKEN.lastIndex = 0;
  while (TOKEN.lastIndex < text.length) {
    const match = TOKEN.exec(text);
    if (!match) return null;
    const [, number, sheet, letters, row, word, sign] = match;
    const name = word?.toUpperCase();
    if (name !== undefined && !functions.has(name)) return null;
    if (number !== undefined) tokens.push({ kind: 'number', value: Number(number) });
    else if (letters !== undefined && row !== undefined)
      tokens.push({ kind: 'cell', sheet: sheetName(sheet), row: Number(row), column: toColumn(letters) });
    else if (name !== undefined) tokens.push({ kind: 'function', name });
    else tokens.push({ kind: 'sign', text: sign ?? '' });
  }
  return tokens;
}

function sheetName(prefix: string | undefined): string {
  if (!prefix) return '';
  const name = prefix.slice(0, -1);
  return name.startsWith("'") ? name.slice(1, -1).replaceAll("''", "'") : name;
}

function toColumn(letters: string): number {
  let column = 0;
  for (const letter of letters.toUpperCase()) column = column * 26 + letter.charCodeAt(0) - 64;
  return column - 1;
}

/** Recursive descent: sum → product → signed → value. */
class Parser {
  private at = 0;
  private depth = 0;
  private failed = false;

  constructor(
    private readonly tokens: readonly Token[],
    private readonly operands: Operands,
  ) {}

  get finished(): boolean {
    return !this.failed && this.at === this.tokens.length;
  }

  sum(): Operand {
    let value = this.product();
    for (;;) {
      if (this.take('+')) value = combine(value, this.product(), (a, b) => a + b);
      else if (this.take('-')) value = combine(value, this.product(), (a, b) => a - b);
      else return value;
    }
  }

  private product(): Operand {
    let value = this.signed();
    for (;;) {
      if (this.take('*')) value = combine(value, this.signed(), (a, b) => a * b);
      else if (this.take('/')) value = divide(value, this.signed());
      else return value;
    }
  }

  private signed(): Operand {
    let negative = false;
    for (;;) {
      if (this.take('-')) negative = !negative;
      else if (!this.take('+')) break;
    }
    const value = this.value();
    return negative ? combine(0, value, (a, b) => a - b) : value;
  }

  private value(): Operand {
    const token = this.tokens[this.at];
    if (token?.kind === 'number') {
      this.at++;
      return token.value;
    }
    if (token?.kind === 'cell') {
      this.at++;
      return this.operands.cell(token.sheet, token.row, token.column);
    }
    if (token?.kind === 'function') {
      this.at++;
      return this.brackets(() => callFunction(token.name, this.arguments(token.name)));
    }
    return this.brackets(() => this.sum());
  }

  private brackets(inner: () => Operand): Operand {
    if (this.failed || !this.take('(') || ++this.depth > DEPTH_MAX) return this.fail();
    const value = inner();
    this.depth--;
    return this.take(')') ? value : this.fail();
  }

  /** What stands in a function's brackets; blocks of cells are taken apart where it works on lists. */
  private arguments(name: string): Operand[] {
    const values: Operand[] = [];
    do {
      const block = isOnLists(name) ? this.block() : undefined;
      if (block === undefined) values.push(this.sum());
      else if (block !== null && 'error' in block) values.push(block);
      else if (block !== null) for (const value of block) values.push(value);
      else values.push(this.fail());
    } while (this.take(','));
    return values;
  }

  /** A cell that stands alone, or a block such as C2:C9; undefined (and nothing taken) where none stands here. */
  private block(): ReturnType<Operands['numbers']> | undefined {
    const [from, colon, other] = this.tokens.slice(this.at, this.at + 3);
    if (from?.kind !== 'cell' || colon?.kind !== 'sign') return undefined;
    const isBlock = colon.text === ':' && other?.kind === 'cell';
    if (!isBlock && !/^[,)]$/.test(colon.text)) return undefined;
    const to = isBlock ? other : from;
    this.at += isBlock ? 3 : 1;
    const [top, bottom] = from.row < to.row ? [from.row, to.row] : [to.row, from.row];
    const [left, right] = from.column < to.column ? [from.column, to.column] : [to.column, from.column];
    return this.operands.numbers(from.sheet, top, left, bottom, right);
  }

  private take(sign: string): boolean {
    const token = this.tokens[this.at];
    if (token?.kind !== 'sign' || token.text !== sign) return false;
    this.at++;
    return true;
  }

  private fail(): null {
    this.failed = true;
    return null;
  }
}

function combine(a: Operand, b: Operand, how: (a: number, b: number) => number): Operand {
  if (a === null || b === null) return null;
  if (typeof a !== 'number') return a;
  if (typeof b !== 'number') return b;
  const value = how(a, b);
  return Number.isFinite(value) ? value : { error: '#NUM!' };
}

function divide(a: Operand, b: Operand): Operand {
  return b === 0 && typeof a === 'number' ? { error: '#DIV/0!' } : combine(a, b, (x, y) => x / y);
}
