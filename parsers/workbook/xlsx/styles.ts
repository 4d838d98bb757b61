import type { CellContent } from '@/lib/schedule/sheet';
import { startsLikeFormula } from '../formula-start';
import type { EditablePackage } from './package';
import { readXml, requireRoot, writeXml } from './parts';
import {
  append,
  child,
  children,
  type Element,
  prefixOf,
  type Splice,
  splice,
  withAttribute,
  withoutAttribute,
} from './xml';

/** The order of the parts of a style sheet (ECMA-376 part 1, 18.8.39). */
const ORDER = [
  ...['numFmts', 'fonts', 'fills', 'borders', 'cellStyleXfs', 'cellXfs', 'cellStyles', 'dxfs'],
  ...['tableStyles', 'colors', 'extLst'],
];
/** A pale green of our own for a corrected cell. */
const MARK = 'FFDFEBD9';
const PLAIN_XF = '<xf numFmtId="0" fontId="0" fillId="0" borderId="0"/>';

/** How the cells of our own sheet look. */
export type OwnStyle = 'heading' | 'text' | 'link';

export const emptyStyles = (namespace: string) =>
  `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n<styleSheet xmlns="${namespace}"></styleSheet>`;

/** One list of the style sheet (fonts, fills, borders or cell formats), to which entries are added at its end. */
class StyleList {
  readonly added: string[] = [];
  readonly element: Element | null;
  private readonly entries: readonly string[];

  constructor(
    private readonly xml: string,
    root: Element,
    readonly name: string,
    fallback: readonly string[],
  ) {
    this.element = child(xml, root, prefixOf(root.name) + name);
    this.entries = this.element
      ? [...children(xml, this.element)].map(({ start, end }) => xml.slice(start, end))
      : [];
    // Excel reserves the first two fills, and formats refer to a first font and border.
    this.added.push(...fallback.slice(this.entries.length));
  }

  at(index: number): string | undefined {
    return this.entries[index] ?? this.added[index - this.entries.length];
  }

  add(markup: string): number {
    this.added.push(markup);
    return this.entries.length + this.added.length - 1;
  }

  /** Puts the added entries in; a list that is not there is made, where the order wants it. */
  splices(root: Element, parts: readonly Element[]): Splice[] {
    if (this.added.length === 0) return [];
    const prefix = prefixOf(root.name);
    const markup = this.added.join('');
    const count = String(this.entries.length + this.added.length);
    if (!this.element) {
      const place = ORDER.indexOf(this.name);
      const next = parts.find((part) => ORDER.indexOf(part.name.slice(prefix.length)) > place);
      const at = next?.start ?? root.innerEnd;
      const name = prefix + this.name;
      return [{ start: at, end: at, text: `<${name} count="${count}">${markup}</${name}>` }];
    }
    const { start, inner, end } = this.element;
    const tag = withAttribute(this.xml.slice(start, inner), 'count', count);
    const put = append(this.xml, this.element, markup);
    if (inner === end) return [{ ...put, text: put.text.replace(/^[^>]*>/, tag.replace(/\s*\/>$/, '>')) }];
    return [{ start, end: inner, text: tag }, put];
  }
}

/** The style sheet of a workbook: what it has stays as it is, new formats are added at the ends of its lists. */
export class Styles {
  private readonly xml: string;
  private readonly root: Element;
  private readonly prefix: string;
  private readonly fonts: StyleList;
  private readonly fills: StyleList;
  private readonly borders: StyleList;
  private readonly formats: StyleList;
  private readonly made = new Map<string, number>();

  constructor(
    private readonly pack: EditablePackage,
    private readonly part: string,
  ) {
    this.xml = readXml(pack, part) ?? '';
    this.root = requireRoot(this.xml, part);
    this.prefix = prefixOf(this.root.name);
    const list = (name: string, ...fallback: string[]) =>
      new StyleList(
        this.xml,
        this.root,
        name,
        fallback.map((markup) => this.own(markup)),
      );
    this.fonts = list('fonts', '<font><sz val="11"/><name val="Calibri"/></font>');
    this.fills = list(
      'fills',
      '<fill><patternFill patternType="none"/></fill>',
      '<fill><patternFill patternType="gray125"/></fill>',
    );
    this.borders = list('borders', '<border><left/><right/><top/><bottom/><diagonal/></border>');
    this.formats = list('cellXfs', PLAIN_XF);
  }

  /** The cell's own format with the mark of a corrected cell; every other cell keeps its own. */
  corrected(base: number, to: CellContent): number {
    const quoted = typeof to === 'string' && startsLikeFormula(to);
    return this.once(`${base} ${quoted}`, () => {
      const received = this.formats.at(base) ?? this.formats.at(0) ?? this.own(PLAIN_XF);
      return this.addFormat(received, { fillId: String(this.markFill()), applyFill: '1' }, quoted);
    });
  }

  /** A format for our own sheet. */
  sheetStyle(kind: OwnStyle, text = ''): number {
    const quoted = startsLikeFormula(text);
    return this.once(`${kind} ${quoted}`, () => {
      const format = `<xf numFmtId="0" fontId="0" fillId="0" borderId="0" applyAlignment="1"><alignment vertical="top" wrapText="1"/></xf>`;
      if (kind === 'text') return this.addFormat(this.own(format), {}, quoted);
      const font = { fontId: String(this.fontWith(kind === 'heading' ? 'b' : 'u')), applyFont: '1' };
      const fill: Readonly<Record<string, string>> =
        kind === 'heading' ? { fillId: String(this.markFill()), applyFill: '1' } : {};
      return this.addFormat(this.own(format), { ...font, ...fill }, quoted);
    });
  }

  write(): void {
    const parts = [...children(this.xml, this.root)];
    const lists = [this.fonts, this.fills, this.borders, this.formats];
    writeXml(
      this.pack,
      this.part,
      splice(
        this.xml,
        lists.flatMap((list) => list.splices(this.root, parts)),
      ),
    );
  }

  private own(markup: string): string {
    return this.prefix === '' ? markup : markup.replace(/<(\/?)(?=\w)/g, `<$1${this.prefix}`);
  }

  private once(key: string, make: () => number): number {
    const index = this.made.get(key) ?? make();
    this.made.set(key, index);
    return index;
  }

  private markFill(): number {
    const markup = `<fill><patternFill patternType="solid"><fgColor rgb="${MARK}"/><bgColor indexed="64"/></patternFill></fill>`;
    return this.once('fill', () => this.fills.add(this.own(markup)));
  }

  /** The workbook's first font, bold or underlined. */
  private fontWith(mark: 'b' | 'u'): number {
    return this.once(`font ${mark}`, () => {
      const font = this.fonts.at(0) ?? this.own('<font/>');
      const open = font.replace(/^<([^\s/>]+)([^>]*?)\s*\/>$/, '<$1$2></$1>');
      return this.fonts.add(open.replace('>', `><${this.prefix}${mark}/>`));
    });
  }

  private addFormat(xf: string, attributes: Readonly<Record<string, string>>, quoted: boolean): number {
    const end = xf.indexOf('>') + 1;
    let tag = withoutAttribute(xf.slice(0, end), 'quotePrefix');
    for (const [name, value] of Object.entries(attributes)) tag = withAttribute(tag, name, value);
    // The mark of text that is not to be taken for a formula when the cell is edited.
    if (quoted) tag = withAttribute(tag, 'quotePrefix', '1');
    return this.formats.add(tag + xf.slice(end));
  }
}
