import { zipSync } from 'fflate';
import { SaxesParser } from 'saxes';
import { openZip, packedBytes, unpack } from '@/parsers/zip';

export interface PartBytes {
  readonly packed: Buffer;
  readonly content: string;
}

/** The parts of a package by name, in order. */
export function partsOf(bytes: Uint8Array): Map<string, PartBytes> {
  const archive = openZip(bytes);
  return new Map(
    archive.entries.map((entry) => [
      entry.name,
      {
        packed: Buffer.from(packedBytes(archive, entry)),
        content: Buffer.from(unpack(archive, entry)).toString('utf8'),
      },
    ]),
  );
}

/** Names of the parts whose packed bytes differ, that were added, and that went. */
export function compareParts(before: Uint8Array, after: Uint8Array) {
  const [old, now] = [partsOf(before), partsOf(after)];
  return {
    changed: [...old].flatMap(([name, part]) => {
      const other = now.get(name);
      return other && !other.packed.equals(part.packed) ? [name] : [];
    }),
    added: [...now.keys()].filter((name) => !old.has(name)),
    gone: [...old.keys()].filter((name) => !now.has(name)),
  };
}

/** Names of the parts that are not well-formed, each with what is wrong. */
export function malformedParts(bytes: Uint8Array): string[] {
  return [...partsOf(bytes)].flatMap(([name, { content }]) => {
    if (!/\.(?:xml|rels|vml)$/.test(name)) return [];
    const faults: string[] = [];
    const parser = new SaxesParser({ xmlns: true });
    parser.on('error', (error) => void faults.push(`${name}: ${error.message}`));
    parser.write(content).close();
    return faults;
  });
}

const MAIN = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const OFFICE = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const PACKAGE = 'http://schemas.openxmlformats.org/package/2006';
const HEAD = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';
const TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml';

export const STYLES = `${HEAD}<styleSheet xmlns="${MAIN}"><fonts count="1"><font><sz val="10"/><name val="Arial"/></font></fonts><fills count="2"><fill><patternFill patternType="none"/></fill><fill><patternFill patternType="gray125"/></fill></fills><borders count="1"><border/></borders><cellXfs count="3"><xf numFmtId="0" fontId="0" fillId="0" borderId="0"/><xf numFmtId="2" fontId="0" fillId="0" borderId="0" applyNumberFormat="1"><alignment horizontal="right"/></xf><xf numFmtId="49" fontId="0" fillId="0" borderId="0"/></cellXfs></styleSheet>`;

export interface MadeWorkbook {
  /** Content of `worksheet` by the name of the sheet. */
  readonly sheets: Readonly<Record<string, string>>;
  /** After `sheets` in the workbook. */
  readonly workbook?: string;
  /** Null: no style sheet. */
  readonly styles?: string | null;
  /** Further parts, content types (`<Override …/>`) and relations of the workbook. */
  readonly parts?: Readonly<Record<string, string | Uint8Array>>;
  readonly types?: string;
  readonly relations?: string;
  /** Content of the relationships of the first sheet. */
  readonly sheetRelations?: string;
  readonly packageRelations?: string;
  readonly main?: string;
}

const rels = (content: string) =>
  `${HEAD}<Relationships xmlns="${PACKAGE}/relationships">${content}</Relationships>`;
export const relation = (id: string, kind: string, target: string) =>
  `<Relationship Id="${id}" Type="${OFFICE}/${kind}" Target="${target}"/>`;
export const override = (name: string, type: string) =>
  `<Override PartName="/${name}" ContentType="${type}"/>`;

/** A workbook written by hand, part by part. */
export function makeWorkbook(made: MadeWorkbook): Uint8Array {
  const names = Object.keys(made.sheets);
  const styles = made.styles === undefined ? STYLES : made.styles;
  const files: Record<string, string | Uint8Array> = {
    '[Content_Types].xml': `${HEAD}<Types xmlns="${PACKAGE}/content-types"><Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Default Extension="xml" ContentType="application/xml"/>${override('xl/workbook.xml', made.main ?? `${TYPE}.sheet.main+xml`)}${names.map((_, index) => override(`xl/worksheets/sheet${index + 1}.xml`, `${TYPE}.worksheet+xml`)).join('')}${made.types ?? ''}</Types>`,
    '_rels/.rels': rels(
      relation('rId1', 'officeDocument', 'xl/workbook.xml') + (made.packageRelations ?? ''),
    ),
    'xl/workbook.xml': `${HEAD}<workbook xmlns="${MAIN}" xmlns:r="${OFFICE}"><sheets>${names.map((name, index) => `<sheet name="${name}" sheetId="${index + 1}" r:id="rId${index + 1}"/>`).join('')}</sheets>${made.workbook ?? ''}</workbook>`,
    'xl/_rels/workbook.xml.rels': rels(
      names
        .map((_, index) => relation(`rId${index + 1}`, 'worksheet', `worksheets/sheet${index + 1}.xml`))
        .join('') +
        (styles === null ? '' : relation('rIdS', 'styles', 'styles.xml')) +
        (made.relations ?? ''),
    ),
    ...(styles === null ? {} : { 'xl/styles.xml': styles }),
    ...(made.sheetRelations ? { 'xl/worksheets/_rels/sheet1.xml.rels': rels(made.sheetRelations) } : {}),
    ...made.parts,
  };
  Object.values(made.sheets).forEach((content, index) => {
    const whole = content.startsWith('<?xml')
      ? content
      : `${HEAD}<worksheet xmlns="${MAIN}">${content}</worksheet>`;
    files[`xl/worksheets/sheet${index + 1}.xml`] = whole;
  });
  const entries = Object.entries(files).map(([name, content]) => [
    name,
    typeof content === 'string' ? Buffer.from(content) : content,
  ]);
  return zipSync(Object.fromEntries(entries));
}
