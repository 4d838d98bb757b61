import { LIMITS } from '@/parsers/limits';
import { allChanges, changesByCell, noteText } from '../changes';
import type { Results } from '../recalculate';
import type { ChangedCell, ListedChange, Patched } from '../types';
import { planSheet } from './actions';
import { changesSheet, freeSheetName } from './changes-sheet';
import { type SheetFormulas, staleFormulas } from './dependents';
import { formulasOf } from './formulas';
import { addNotes } from './notes';
import { EditablePackage } from './package';
import { addRelation, declareType, freeName, isOfType, readBytes, writeBytes, writeXml } from './parts';
import { openSheet, type SheetMarkup } from './sheet-markup';
import { patchCells } from './sheet-patch';
import { emptyStyles, Styles } from './styles';
import { renameTableColumns } from './table-headings';
import {
  addSheet,
  askForCalculation,
  dropSignature,
  nameBookOf,
  openWorkbook,
  type SheetPart,
  type WorkbookPart,
} from './workbook-part';
import { splice } from './xml';

const STYLES_TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml.styles+xml';

function openStyles(pack: EditablePackage, workbook: WorkbookPart): Styles {
  const known = workbook.relations.find((relation) => isOfType(relation, 'styles'))?.target;
  if (known && pack.has(known)) return new Styles(pack, known);
  const part = known ?? freeName(pack, 'xl/styles', '.xml');
  writeXml(pack, part, emptyStyles(workbook.dialect.namespace));
  declareType(pack, part, STYLES_TYPE);
  if (!known) addRelation(pack, workbook.part, `${workbook.dialect.relations}styles`, part);
  return new Styles(pack, part);
}

interface OpenSheet extends SheetPart, SheetFormulas {
  readonly markup: SheetMarkup;
  readonly cells: readonly ChangedCell[];
}

/** The sheets that corrections or formulas stand in; the others are not looked at again. */
function openSheets(
  pack: EditablePackage,
  workbook: WorkbookPart,
  cells: readonly ChangedCell[],
): OpenSheet[] {
  return workbook.sheets.flatMap(({ name, part }) => {
    const here = cells.filter((cell) => cell.sheet === name);
    const xml = readBytes(pack, part);
    if (!xml) return [];
    const markup = openSheet(xml, part);
    const formulas = formulasOf(markup);
    if (here.length === 0 && formulas.length === 0) return [];
    return [{ name, sheet: name, part, markup, formulas, cells: here }];
  });
}

/** Changes cells inside the package of a workbook; parts that have nothing to do with them stay as they are. */
export function patchXlsx(
  bytes: Uint8Array,
  cells: readonly ChangedCell[],
  changes: readonly ListedChange[],
  results: Results = new Map(),
): Patched {
  const pack = new EditablePackage(bytes);
  const workbook = openWorkbook(pack);
  const styles = openStyles(pack, workbook);
  const sheets = openSheets(pack, workbook, cells);
  const withFormulas = sheets.some((sheet) => sheet.formulas.length > 0);
  const stale = withFormulas ? staleFormulas(sheets, cells, nameBookOf(pack, workbook)) : new Map();
  const listed = allChanges(changes, cells);
  const changesOf = changesByCell(changes);
  const remarks: string[] = [];
  let waiting = 0;

  for (const sheet of sheets) {
    const plan = planSheet(
      sheet.name,
      sheet.cells,
      sheet.formulas,
      stale.get(sheet.name) ?? new Set(),
      results.get(sheet.name),
    );
    remarks.push(...plan.remarks);
    waiting += plan.stale;
    if (plan.actions.size === 0) continue;
    const { markup, part } = sheet;
    renameTableColumns(pack, part, sheet.cells);
    const splices = patchCells(markup, plan.actions, (base, to) => styles.corrected(base, to));
    if (sheet.cells.length > 0) {
      const notes = sheet.cells.map((cell) => ({ ...cell, text: noteText(cell, changesOf(cell)) }));
      const place = { part, xml: markup.xml, afterRows: markup.data.end };
      const noted = addNotes(pack, place, notes, workbook.dialect);
      splices.push(...noted.splices);
      if (noted.left.length > 0) remarks.push(threadRemark(sheet.name, noted.left));
    }
    writeBytes(pack, part, splice(markup.xml, splices));
  }

  const name = freeSheetName(workbook.tabNames);
  addSheet(pack, workbook, name, changesSheet(listed, styles, workbook.dialect));
  styles.write();
  if (withFormulas) askForCalculation(pack, workbook);
  if (waiting > 0) remarks.push(calculationRemark(waiting));
  if (dropSignature(pack)) {
    remarks.push('The workbook was signed. A change makes a signature void, so it was taken out.');
  }
  const quick = pack.toBytes();
  // What is given back must not be too large to be sent in again.
  const bytesOut = quick.length > LIMITS.fileBytes ? pack.toBytes('small') : quick;
  return { bytes: bytesOut, remarks, refused: [] };
}

function calculationRemark(count: number): string {
  return count === 1
    ? 'One formula rests on what was corrected and could not be worked out here; its result is calculated when the workbook is opened.'
    : `${count} formulas rest on what was corrected and could not be worked out here; their results are calculated when the workbook is opened.`;
}

function threadRemark(sheet: string, cells: readonly string[]): string {
  const which = cells.length > 5 ? `${cells.length} cells` : cells.join(', ');
  return `On “${sheet}”, ${which} had a thread of comments, which stays as it is; the correction is marked and listed, without a note of its own.`;
}
