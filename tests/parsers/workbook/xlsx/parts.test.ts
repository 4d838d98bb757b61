import { describe, expect, it } from 'vitest';
import { readSheets } from '@/parsers';
import { edit, give, sheetXml, withList } from '../giving';
import { compareParts, malformedParts, makeWorkbook, partsOf } from '../packages';

describe('dialects', () => {
  it('changes parts whose elements bear a prefix', () => {
    const namespace = 'xmlns:x="http://schemas.openxmlformats.org/spreadsheetml/2006/main"';
    const content = `<?xml version="1.0"?><x:worksheet ${namespace}><x:sheetData><x:row r="1"><x:c r="A1"><x:v>1</x:v></x:c></x:row></x:sheetData></x:worksheet>`;
    const styles = `<?xml version="1.0"?><x:styleSheet ${namespace}><x:fonts><x:font/></x:fonts><x:cellXfs><x:xf/></x:cellXfs></x:styleSheet>`;
    const { bytes, check } = give(
      makeWorkbook({ sheets: { List: content }, styles }),
      edit('A1', 'x'),
      edit('B3', 2),
    );
    expect(check.found).toBe(2);
    expect(sheetXml(bytes)).toContain(
      '<x:c r="A1" s="1" t="inlineStr"><x:is><x:t xml:space="preserve">x</x:t></x:is></x:c>',
    );
    expect(malformedParts(bytes)).toEqual([]);
    expect(sheetXml(bytes)).toMatch(/<x:legacyDrawing [^>]*r:id="rId2"\/><\/x:worksheet>/);
    const after = partsOf(bytes).get('xl/styles.xml')?.content ?? '';
    expect(after).toMatch(/<x:fills count="3">.*<x:borders count="1">.*<x:cellXfs count="\d">/);
  });

  it('makes a style sheet where there is none', () => {
    const bytes = makeWorkbook({
      sheets: { List: '<sheetData><row r="1"><c r="A1"><v>1</v></c></row></sheetData>' },
      styles: null,
    });
    const after = give(bytes, edit('A1', 2));
    expect(after.check.found).toBe(1);
    expect(compareParts(bytes, after.bytes).added).toContain('xl/styles1.xml');
    expect(partsOf(after.bytes).get('[Content_Types].xml')?.content).toContain('/xl/styles1.xml');
  });

  it('keeps the namespaces of the strict dialect', () => {
    const main = 'http://purl.oclc.org/ooxml/spreadsheetml/main';
    const office = 'http://purl.oclc.org/ooxml/officeDocument/relationships';
    const parts = partsOf(withList('<sheetData><row r="1"><c r="A1"><v>1</v></c></row></sheetData>'));
    const strict = [...parts].map(([name, { content }]) => [
      name,
      content
        .replaceAll('http://schemas.openxmlformats.org/spreadsheetml/2006/main', main)
        .replaceAll('http://schemas.openxmlformats.org/officeDocument/2006/relationships', office),
    ]);
    const bytes = makeWorkbook({ sheets: {}, parts: Object.fromEntries(strict) });
    const after = give(bytes, edit('A1', 2));
    expect(after.check.found).toBe(1);
    for (const [, { content }] of partsOf(after.bytes))
      expect(content).not.toContain('spreadsheetml/2006/main');
  });

  it('reads a part in UTF-16 and writes it in UTF-8', () => {
    const content =
      '<?xml version="1.0" encoding="UTF-16"?><worksheet xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main"><sheetData><row r="1"><c r="A1" t="inlineStr"><is><t>Łódź</t></is></c><c r="B1"><v>1</v></c></row></sheetData></worksheet>';
    const part = Buffer.from(`\ufeff${content}`, 'utf16le');
    const parts = [...partsOf(withList('')).entries()].map(([name, { content: old }]) => [
      name,
      name.endsWith('sheet1.xml') ? part : old,
    ]);
    const after = give(makeWorkbook({ sheets: {}, parts: Object.fromEntries(parts) }), edit('B1', 2));
    expect(after.check.found).toBe(1);
    expect(readSheets(after.bytes, 'x.xlsx')[0]?.rows[0]?.cells).toEqual(['Łódź', 2]);
  });
});
