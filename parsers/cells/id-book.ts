import { clean } from './text';
import { normalId } from './id';

/** A longer span of IDs is not written out. */
const SPAN_MAX = 30;

/** The IDs of a list, as the reader of predecessor cells needs to know them. */
export class IdBook {
  /** Position in the list, by ID. */
  private readonly ids = new Map<string, number>();
  /** Other ways a number that is an ID may stand in a cell: 7 under the format 000 is 007. */
  private readonly aliases = new Map<string, string>();
  private readonly shapes = new Set<string>();
  private readonly withoutBlanks = new Set<string>();
  private readonly inOrder: string[] = [];
  private readonly byName = new Map<string, string | null>();
  /** The most separators an ID has in it. */
  separators = 0;
  /** The length of the longest. */
  longest = 0;

  constructor(private readonly separator: RegExp) {}

  add(id: string, name = ''): void {
    if (id === '') return;
    if (!this.ids.has(id)) {
      this.ids.set(id, this.inOrder.length);
      this.inOrder.push(id);
      this.shapes.add(shapeOf(id));
      this.withoutBlanks.add(looseId(id));
      this.longest = Math.max(this.longest, id.length);
      if (/[,;&\s]/.test(id))
        this.separators = Math.max(this.separators, id.split(this.separator).length - 1);
    }
    const key = clean(name).toLowerCase();
    if (key !== '') this.byName.set(key, this.byName.has(key) && this.byName.get(key) !== id ? null : id);
  }

  /** A second way of writing an ID, used where no ID is written so and no other has the same. */
  addAlias(alias: string, id: string): void {
    if (alias !== id) this.aliases.set(alias, this.aliases.has(alias) ? '' : id);
  }

  /** The ID that a text literally is; null where it is none. */
  find(text: string): string | null {
    if (this.ids.has(text)) return text;
    const id = normalId(text);
    if (this.ids.has(id)) return id;
    return this.aliases.get(id) || null;
  }

  /** Whether a text is built as an ID of the list is: letters and digits in the same places. */
  hasShape(text: string): boolean {
    return this.shapes.has(shapeOf(clean(text)));
  }

  /** Whether a text is an ID of the list but for blanks within it and case: `A 3` for A3. */
  isNearlyId(text: string): boolean {
    return this.withoutBlanks.has(looseId(text));
  }

  /** IDs from one to another in the order of the list, both included; empty where they stand the other way. */
  between(first: string, last: string): string[] {
    const from = this.ids.get(first) ?? 0;
    const to = this.ids.get(last) ?? -1;
    return to > from && to - from <= SPAN_MAX ? this.inOrder.slice(from, to + 1) : [];
  }

  /** The only activity of a name. */
  named(name: string): string | null {
    return this.byName.get(clean(name).toLowerCase()) ?? null;
  }
}

function looseId(id: string): string {
  return id.replace(/\s+/g, '').toLowerCase();
}

function shapeOf(id: string): string {
  return id.replace(/\p{L}+/gu, 'a').replace(/\d+/g, '9');
}
