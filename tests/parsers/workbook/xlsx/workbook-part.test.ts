import { describe, expect, it } from 'vitest';
import { LIMITS } from '@/parsers/limits';
import { giveBack } from '@/parsers/workbook';
import { edit, give, withList } from '../giving';
import { compareParts, makeWorkbook, override, partsOf, relation } from '../packages';

describe('the package', () => {
  const list = '<sheetData><row r="1"><c r="A1"><v>1</v></c></row></sheetData>';

  it('leaves macros as they are', () => {
    const code = Buffer.from([0xd0, 0xcf, 0x11, 0xe0, 1, 2, 3]);
    const bytes = makeWorkbook({
      sheets: { List: list },
      main: 'application/vnd.ms-excel.sheet.macroEnabled.main+xml',
      relations:
        '<Relationship Id="rIdV" Type="http://schemas.microsoft.com/office/2006/relationships/vbaProject" Target="vbaProject.bin"/>',
      types: override('xl/vbaProject.bin', 'application/vnd.ms-office.vbaProject'),
      parts: { 'xl/vbaProject.bin': code },
    });
    const after = giveBack({ bytes, fileName: 'list.xlsm', corrections: [edit('A1', 2)], changes: [] });
    expect(after.contentType).toBe('application/vnd.ms-excel.sheet.macroEnabled.12');
    expect(after.fileName).toBe('list (corrected).xlsm');
    expect(compareParts(bytes, after.bytes).changed).not.toContain('xl/vbaProject.bin');
    expect(partsOf(after.bytes).has('xl/vbaProject.bin')).toBe(true);
  });

  it('takes a signature out, and says so', () => {
    const signature = 'http://schemas.openxmlformats.org/package/2006/relationships/digital-signature';
    const bytes = makeWorkbook({
      sheets: { List: list },
      packageRelations: `<Relationship Id="rId9" Type="${signature}/origin" Target="_xmlsignatures/origin.sigs"/>`,
      parts: {
        '_xmlsignatures/origin.sigs': ' ',
        '_xmlsignatures/_rels/origin.sigs.rels': `<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"><Relationship Id="rId1" Type="${signature}/signature" Target="sig1.xml"/></Relationships>`,
        '_xmlsignatures/sig1.xml': '<Signature/>',
      },
      types: override(
        '_xmlsignatures/sig1.xml',
        'application/vnd.openxmlformats-package.digital-signature-xmlsignature+xml',
      ),
    });
    const after = give(bytes, edit('A1', 2));
    expect(compareParts(bytes, after.bytes).gone.filter((name) => name.startsWith('_xml'))).toHaveLength(3);
    expect(partsOf(after.bytes).get('_rels/.rels')?.content).not.toContain('signature');
    expect(after.check.remarks).toEqual([
      'The workbook was signed. A change makes a signature void, so it was taken out.',
    ]);
  });

  it('returns the received bytes where nothing is corrected', () => {
    const bytes = withList(list);
    expect(give(bytes).bytes).toBe(bytes);
    expect(give(bytes, edit('A1', 1)).bytes).toBe(bytes);
    expect(give(bytes).check.sentence).toBe('0 of 0 corrections found in the file.');
  });

  it('says what it did not find', () => {
    const { check } = give(withList(list), edit('A1', 2), edit('A1', 3, 'Nowhere'));
    expect(check.sentence).toBe('1 of 2 corrections found in the file.');
    expect(check.missing).toEqual([
      { sheet: 'Nowhere', cell: 'A1', reason: 'There is no cell A1 on a sheet “Nowhere”.' },
    ]);
  });

  it('says so where the list of changes makes the file too long to be read again', () => {
    const full = '<row><c><v>1</v></c></row>'.repeat(LIMITS.rows + LIMITS.rowsAround);
    const { check } = give(withList(`<sheetData>${full}</sheetData>`), edit('A1', 2));
    expect(check.sentence).toBe('0 of 1 correction found in the file.');
    expect(check.remarks[0]).toMatch(/could not be read again\. .* 200 000 rows/);
  });

  it('leaves a thread of comments as it is', () => {
    const comments =
      '<comments xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main"><authors><author>tc={1}</author></authors><commentList><comment ref="A1" authorId="0"><text><t>[Thread]</t></text></comment></commentList></comments>';
    const bytes = makeWorkbook({
      sheets: { List: list },
      sheetRelations: relation('rId1', 'comments', '../comments1.xml'),
      types: override(
        'xl/comments1.xml',
        'application/vnd.openxmlformats-officedocument.spreadsheetml.comments+xml',
      ),
      parts: { 'xl/comments1.xml': comments },
    });
    const after = give(bytes, edit('A1', 2), edit('A2', 'new'));
    const notes = partsOf(after.bytes).get('xl/comments1.xml')?.content ?? '';
    expect(notes).toContain(
      '<comment ref="A1" authorId="0"><text><t>[Thread]</t></text></comment><comment ref="A2" authorId="1">',
    );
    expect(after.check.remarks[0]).toMatch(/A1 had a thread of comments/);
  });
});
