import { describe, expect, it } from 'vitest';
import { edit, give, sheetXml, withList } from '../giving';
import { compareParts, makeWorkbook, override, partsOf, relation } from '../packages';

describe('formulas', () => {
  const cells = (...rows: string[]) =>
    `<sheetData>${rows.map((row, index) => `<row r="${index + 1}">${row}</row>`).join('')}</sheetData>`;

  it('takes the place of a formula, and has what depends on it calculated anew', () => {
    const content = cells(
      '<c r="A1"><v>1</v></c><c r="B1"><f>A1*2</f><v>2</v></c><c r="C1" t="str"><f>B1&amp;"x"</f><v>2x</v></c>',
      '<c r="A2"><v>5</v></c><c r="B2"><f>A2*2</f><v>10</v></c>',
    );
    const bytes = makeWorkbook({
      sheets: {
        List: content,
        Far: cells('<c r="A1"><f>SUM(List!B1:B9)</f><v>12</v></c><c r="B1"><f>Rate*2</f><v>8</v></c>'),
      },
      workbook:
        '<definedNames><definedName name="Rate">List!$A$2</definedName></definedNames><calcPr calcId="1"/>',
      relations: relation('rIdC', 'calcChain', 'calcChain.xml'),
      types: override(
        'xl/calcChain.xml',
        'application/vnd.openxmlformats-officedocument.spreadsheetml.calcChain+xml',
      ),
      parts: { 'xl/calcChain.xml': '<calcChain><c r="B1" i="1"/></calcChain>' },
    });
    const after = give(bytes, edit('B1', 7));
    expect(sheetXml(after.bytes)).toContain('<c r="B1" s="3"><v>7</v></c><c r="C1"><f>B1&amp;"x"</f></c>');
    expect(sheetXml(after.bytes)).toContain('<c r="B2"><f>A2*2</f><v>10</v></c>');
    expect(sheetXml(after.bytes, 2)).toContain(
      '<c r="A1"><f>SUM(List!B1:B9)</f><v>17</v></c><c r="B1"><f>Rate*2</f><v>8</v></c>',
    );
    expect(compareParts(bytes, after.bytes).gone).toEqual(['xl/calcChain.xml']);
    const parts = partsOf(after.bytes);
    expect(parts.get('xl/workbook.xml')?.content).toContain('<calcPr calcId="1" fullCalcOnLoad="1"/>');
    for (const name of ['[Content_Types].xml', 'xl/_rels/workbook.xml.rels'])
      expect(parts.get(name)?.content).not.toContain('calcChain');
    expect(after.check.remarks).toEqual([
      'One formula rests on what was corrected and could not be worked out here; its result is calculated when the workbook is opened.',
    ]);
  });

  it('asks for no calculation where nothing is calculated', () => {
    const { bytes } = give(withList(cells('<c r="A1"><v>1</v></c>')), edit('A1', 2));
    expect(partsOf(bytes).get('xl/workbook.xml')?.content).not.toContain('calcPr');
  });

  it('writes a shared formula out where the cell that holds its text is corrected', () => {
    const content = cells(
      '<c r="A1"><v>1</v></c><c r="B1"><f t="shared" ref="B1:B3" si="0">A1*$C$1</f><v>2</v></c>',
      '<c r="A2"><v>2</v></c><c r="B2"><f t="shared" si="0"/><v>4</v></c>',
      '<c r="A3"><v>3</v></c><c r="B3"><f t="shared" si="0"/><v>6</v></c>',
    );
    const master = sheetXml(give(withList(content), edit('B1', 9)).bytes);
    expect(master).toContain('<c r="B2"><f>A2*$C$1</f><v>4</v></c>');
    expect(master).toContain('<c r="B3"><f>A3*$C$1</f><v>6</v></c>');
    const member = sheetXml(give(withList(content), edit('B2', 9)).bytes);
    expect(member).toContain('<f t="shared" ref="B1:B3" si="0">A1*$C$1</f><v>2</v>');
    expect(member).toContain('<c r="B3"><f t="shared" si="0"/><v>6</v></c>');
  });

  it('follows a shared formula to the cells that each of its cells reads', () => {
    const content = cells(
      '<c r="A1"><v>1</v></c><c r="B1"><f t="shared" ref="B1:B2" si="0">A1*2</f><v>2</v></c>',
      '<c r="A2"><v>2</v></c><c r="B2"><f t="shared" si="0"/><v>4</v></c>',
    );
    const after = sheetXml(give(withList(content), edit('A2', 5)).bytes);
    expect(after).toContain('<f t="shared" ref="B1:B2" si="0">A1*2</f><v>2</v>');
    expect(after).toContain('<c r="B2"><f t="shared" si="0"/><v>10</v></c>');
  });

  it('lets the other cells of an array keep their values', () => {
    const content = cells(
      '<c r="A1" cm="1"><f t="array" ref="A1:A2">B1:B2*2</f><v>2</v></c><c r="B1"><v>1</v></c>',
      '<c r="A2"><v>4</v></c><c r="B2"><v>2</v></c>',
    );
    const { bytes, check } = give(withList(content), edit('A2', 5));
    expect(sheetXml(bytes)).toContain('<c r="A1"><v>2</v></c>');
    expect(check.remarks[0]).toMatch(/A1:A2 were filled by one formula/);
  });

  it('drops every result of an array that reads what was corrected', () => {
    const content = cells(
      '<c r="A1"><f t="array" ref="A1:A2">B1:B2*2</f><v>2</v></c><c r="B1"><v>1</v></c>',
      '<c r="A2"><v>4</v></c><c r="B2"><v>2</v></c>',
    );
    const after = sheetXml(give(withList(content), edit('B2', 5)).bytes);
    expect(after).toContain('<f t="array" ref="A1:A2">B1:B2*2</f></c>');
    expect(after).toContain('<c r="A2"></c>');
  });
});
