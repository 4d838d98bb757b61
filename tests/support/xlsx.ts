import { strToU8, zipSync } from 'fflate';
import type { Sheet } from '@/lib/schedule/sheet';

export const MAIN = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
export const RELATED = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const PACKAGE_RELATED = 'http://schemas.openxmlformats.org/package/2006/relationships';

/** A workbook made by hand: what is not given is the plainest that is valid. */
export interface HandMade {
  /** Name and the content of `sheetData`. */
  readonly sheets?: readonly { readonly name: string; readonly rows: string; readonly state?: string }[];
  /** Content of the shared string table. */
  readonly strings?: string;
  /** Content of the style sheet. */
  readonly styles?: string;
  /** Attributes of `workbookPr`. */
  readonly properties?: string;
  /** Parts put in place of, or beside, those made. */
  readonly parts?: Readonly<Record<string, string | Uint8Array | null>>;
}

const declared = (xml: string) => `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n${xml}`;

export function handMade({
  sheets = [],
  strings,
  styles,
  properties = '',
  parts = {},
}: HandMade): Uint8Array {
  const files: Record<string, Uint8Array> = {};
  const put = (name: string, xml: string) => {
    files[name] = strToU8(declared(xml));
  };
  const link = (id: string, kind: string, target: string) =>
    `<Relationship Id="${id}" Type="${RELATED}/${kind}" Target="${target}"/>`;
  put('[Content_Types].xml', '<Types xmlns="http://schemas.openxmlformats.org/package/2006/content-types"/>');
  put(
    '_rels/.rels',
    `<Relationships xmlns="${PACKAGE_RELATED}">${link('rId1', 'officeDocument', 'xl/workbook.xml')}</Relationships>`,
  );
  const tabs = sheets.map(
    ({ name, state }, i) =>
      `<sheet name="${name}" sheetId="${i + 1}"${state ? ` state="${state}"` : ''} r:id="s${i + 1}"/>`,
  );
  put(
    'xl/workbook.xml',
    `<workbook xmlns="${MAIN}" xmlns:r="${RELATED}"><workbookPr ${properties}/><sheets>${tabs.join('')}</sheets></workbook>`,
  );
  const links = sheets.map((_, i) => link(`s${i + 1}`, 'worksheet', `worksheets/sheet${i + 1}.xml`));
  if (strings !== undefined) links.push(link('t', 'sharedStrings', 'sharedStrings.xml'));
  if (styles !== undefined) links.push(link('y', 'styles', 'styles.xml'));
  put(
    'xl/_rels/workbook.xml.rels',
    `<Relationships xmlns="${PACKAGE_RELATED}">${links.join('')}</Relationships>`,
  );
  sheets.forEach(({ rows }, i) => {
    put(
      `xl/worksheets/sheet${i + 1}.xml`,
      rows.startsWith('<worksheet')
        ? rows
        : `<worksheet xmlns="${MAIN}"><sheetData>${rows}</sheetData></worksheet>`,
    );
  });
  if (strings !== undefined) put('xl/sharedStrings.xml', `<sst xmlns="${MAIN}">${strings}</sst>`);
  if (styles !== undefined) put('xl/styles.xml', `<styleSheet xmlns="${MAIN}">${styles}</styleSheet>`);
  for (const [name, content] of Object.entries(parts)) {
    if (content === null) delete files[name];
    else files[name] = typeof content === 'string' ? strToU8(content) : content;
  }
  return zipSync(files, { level: 6 });
}

/** Values by address, so that a test can say what it expects. */
export function valuesOf(sheet: Sheet | undefined): Record<string, unknown> {
  const values: Record<string, unknown> = {};
  for (const row of sheet?.rows ?? []) {
    row.cells.forEach((value, column) => {
      if (value === null) return;
      const letters = column < 26 ? String.fromCharCode(65 + column) : `(${column})`;
      values[letters + String(row.number)] = typeof value === 'object' ? String(value) : value;
    });
  }
  return values;
}
