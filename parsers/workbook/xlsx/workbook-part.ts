import { damaged } from '@/parsers/errors';
import { parseArea, type SheetArea } from './areas';
import type { Dialect } from './notes';
import type { EditablePackage } from './package';
import {
  addRelation,
  declareType,
  dropParts,
  freeName,
  isOfType,
  readXml,
  type Relation,
  relationsOf,
  removeRelations,
  requireRoot,
  writeXml,
} from './parts';
import type { NameBook } from './references';
import {
  append,
  attribute,
  child,
  children,
  type Element,
  escapeAttribute,
  prefixOf,
  relationId,
  rootOf,
  splice,
  textIn,
  withAttribute,
} from './xml';

export interface SheetPart {
  readonly name: string;
  readonly part: string;
}

export interface WorkbookPart {
  readonly part: string;
  readonly relations: readonly Relation[];
  readonly sheets: readonly SheetPart[];
  /** All tabs, chart sheets included. */
  readonly tabNames: readonly string[];
  readonly dialect: Dialect;
}

const STANDARD_RELATIONS = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships/';

/** Opens the main part and finds the worksheets. */
export function openWorkbook(pack: EditablePackage): WorkbookPart {
  const main = relationsOf(pack, '').find((relation) => isOfType(relation, 'officeDocument'));
  const part = main?.target ?? 'xl/workbook.xml';
  const xml = readXml(pack, part);
  if (!xml) throw damaged('The main part of this workbook is missing.');
  const root = requireRoot(xml, part);
  const relations = relationsOf(pack, part);
  const tabs = sheetTags(xml, root).map((tag) => ({
    name: attribute(tag, 'name') ?? '',
    id: relationId(tag),
  }));
  const sheets = tabs.flatMap(({ name, id }) => {
    const relation = relations.find((each) => each.id === id);
    return relation && isOfType(relation, 'worksheet') ? [{ name, part: relation.target }] : [];
  });
  const namespace =
    attribute(
      xml.slice(root.start, root.inner),
      `xmlns${prefixOf(root.name) && ':' + prefixOf(root.name).slice(0, -1)}`,
    ) ?? '';
  const like = relations.find((relation) => isOfType(relation, 'worksheet'))?.type.replace(/worksheet$/, '');
  const dialect = { namespace, relations: like ?? STANDARD_RELATIONS };
  return { part, relations, sheets, tabNames: tabs.map((tab) => tab.name), dialect };
}

function sheetTags(xml: string, root: Element): string[] {
  const list = child(xml, root, `${prefixOf(root.name)}sheets`);
  return list ? [...children(xml, list)].map(({ start, inner }) => xml.slice(start, inner)) : [];
}

/** What names and tables stand for. */
export function nameBookOf(pack: EditablePackage, workbook: WorkbookPart): NameBook {
  const xml = readXml(pack, workbook.part) ?? '';
  const root = requireRoot(xml, workbook.part);
  const list = child(xml, root, `${prefixOf(root.name)}definedNames`);
  const names = new Map<string, string[]>();
  for (const { start, inner, innerEnd } of list ? children(xml, list) : []) {
    const name = attribute(xml.slice(start, inner), 'name')?.toLowerCase() ?? '';
    names.set(name, [...(names.get(name) ?? []), textIn(xml.slice(inner, innerEnd))]);
  }
  return { names, tables: workbook.sheets.flatMap((sheet) => tablesOf(pack, sheet)) };
}

function tablesOf(pack: EditablePackage, { name: sheet, part }: SheetPart): (SheetArea & { name: string })[] {
  return relationsOf(pack, part)
    .filter((relation) => isOfType(relation, 'table'))
    .flatMap(({ target }) => {
      const xml = readXml(pack, target) ?? '';
      const root = rootOf(xml);
      const tag = root ? xml.slice(root.start, root.inner) : '';
      const area = parseArea(attribute(tag, 'ref') ?? '');
      const name = attribute(tag, 'displayName') ?? attribute(tag, 'name') ?? '';
      return area ? [{ ...area, sheet, name }] : [];
    });
}

const SHEET_TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml.worksheet+xml';

/** Adds a worksheet as the last tab, so that no other changes its number. */
export function addSheet(
  pack: EditablePackage,
  workbook: WorkbookPart,
  name: string,
  sheetXml: string,
): void {
  const part = freeName(pack, 'xl/worksheets/sheet', '.xml');
  writeXml(pack, part, sheetXml);
  declareType(pack, part, SHEET_TYPE);
  const { relations } = workbook.dialect;
  const id = addRelation(pack, workbook.part, `${relations}worksheet`, part);
  const xml = readXml(pack, workbook.part) ?? '';
  const root = requireRoot(xml, workbook.part);
  const prefix = prefixOf(root.name);
  const list = child(xml, root, `${prefix}sheets`);
  if (!list) throw damaged('This workbook does not list its sheets.');
  const numbers = sheetTags(xml, root).map((tag) => Number(attribute(tag, 'sheetId') ?? 0));
  const number = numbers.reduce((most, each) => Math.max(most, each), 0) + 1;
  const namespace = `xmlns:r="${relations.replace(/\/$/, '')}"`;
  const tag = `<${prefix}sheet name="${escapeAttribute(name)}" sheetId="${number}" ${namespace} r:id="${id}"/>`;
  writeXml(pack, workbook.part, splice(xml, [append(xml, list, tag)]));
}

/** Elements of a workbook that come after how it calculates (ECMA-376 part 1, 18.2.27). */
const AFTER_CALCULATION = [
  ...['oleSize', 'customWorkbookViews', 'pivotCaches', 'smartTagPr', 'smartTagTypes', 'webPublishing'],
  ...['fileRecoveryPr', 'webPublishObjects', 'extLst'],
];

/** Has everything calculated anew when the workbook is opened, and drops the order it was last calculated in. */
export function askForCalculation(pack: EditablePackage, workbook: WorkbookPart): void {
  const chains = workbook.relations.filter((relation) => isOfType(relation, 'calcChain'));
  removeRelations(pack, workbook.part, (relation) => isOfType(relation, 'calcChain'));
  dropParts(
    pack,
    chains.map((relation) => relation.target),
  );
  const xml = readXml(pack, workbook.part) ?? '';
  const root = requireRoot(xml, workbook.part);
  const prefix = prefixOf(root.name);
  const parts = [...children(xml, root)];
  const known = parts.find(({ name }) => name === `${prefix}calcPr`);
  const after = parts.find(({ name }) => AFTER_CALCULATION.includes(name.slice(prefix.length)));
  const at = after?.start ?? root.innerEnd;
  const change = known
    ? {
        start: known.start,
        end: known.inner,
        text: withAttribute(xml.slice(known.start, known.inner), 'fullCalcOnLoad', '1'),
      }
    : { start: at, end: at, text: `<${prefix}calcPr fullCalcOnLoad="1"/>` };
  writeXml(pack, workbook.part, splice(xml, [change]));
}

/** Takes a signature of the whole package out, which a change makes void; tells whether there was one. */
export function dropSignature(pack: EditablePackage): boolean {
  const origin = relationsOf(pack, '').find((relation) => /\/digital-signature\/origin$/.test(relation.type));
  if (!origin) return false;
  const signatures = relationsOf(pack, origin.target).map((relation) => relation.target);
  removeRelations(pack, '', (relation) => relation.id === origin.id);
  const folder = origin.target.replace(/[^/]*$/, '');
  const rels = pack.names().filter((name) => name.startsWith(`${folder}_rels/`));
  dropParts(pack, [origin.target, ...signatures, ...(folder === '' ? [] : rels)]);
  return true;
}
