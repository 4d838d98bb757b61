import { damaged, UnreadableFile } from '@/parsers/errors';
import type { OfficePackage } from './package';
import { readXml } from './xml';

export interface SheetEntry {
  readonly name: string;
  readonly hidden: boolean;
  readonly part: string;
}

export interface Workbook {
  /** Worksheets in the order of their tabs; chart and dialog sheets are left out. */
  readonly sheets: readonly SheetEntry[];
  readonly date1904: boolean;
  readonly sharedStrings: string | null;
  readonly styles: string | null;
}

/** Reads the workbook's main part and where its other parts are. */
export function readWorkbook(files: OfficePackage): Workbook {
  const main = files.mainPart();
  const bytes = files.read(main);
  if (!bytes) throw damaged('The main part of this workbook is missing.');
  const listed: { name: string; id: string; hidden: boolean }[] = [];
  let date1904 = false;
  let root = '';
  readXml(bytes, main, {
    open(element, attributes) {
      if (root === '') root = element;
      if (element === 'workbookPr') date1904 = isTrue(attributes.date1904);
      if (element !== 'sheet') return;
      const { name = '', id = '', state } = attributes;
      listed.push({ name, id, hidden: state === 'hidden' || state === 'veryHidden' });
    },
  });
  if (root !== 'workbook') throw new UnreadableFile('not-a-spreadsheet');
  const relationships = files.relationships(main);
  const partOf = (kind: string) => relationships.find((one) => one.kind === kind)?.target ?? null;
  const byId = new Map(relationships.map((one) => [one.id, one]));
  const sheets = listed.flatMap(({ name, id, hidden }) => {
    const related = byId.get(id);
    if (!related) throw damaged(`The sheet ${name} is listed in this workbook, and not in it.`);
    return related.kind === 'worksheet' ? [{ name, hidden, part: related.target }] : [];
  });
  return { sheets, date1904, sharedStrings: partOf('sharedStrings'), styles: partOf('styles') };
}

/** A boolean attribute (xsd:boolean, and the on/off of older writers). */
export function isTrue(value: string | undefined): boolean {
  return value === '1' || value === 'true' || value === 'on';
}
