import { describe, expect, it } from 'vitest';
import { edit, give, sheetXml } from '../giving';
import { compareParts, makeWorkbook, malformedParts, override, partsOf, relation } from '../packages';

const OFFICE = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const rows = '<sheetData><row r="1"><c r="A1"><v>1</v></c></row></sheetData>';
const shapes =
  '<xml xmlns:vml="urn:schemas-microsoft-com:vml"><vml:shape id="_x0000_s1030"><vml:textbox/></vml:shape></xml>';

describe('notes on corrected cells', () => {
  it('stand at their place among the elements after the rows', () => {
    const tail =
      '<conditionalFormatting sqref="A1"><cfRule type="top10"><extLst/></cfRule></conditionalFormatting><pageMargins/><tableParts/><extLst/>';
    const { bytes } = give(makeWorkbook({ sheets: { List: rows + tail } }), edit('A1', 2));
    expect(sheetXml(bytes)).toMatch(/<pageMargins\/><legacyDrawing [^>]*\/><tableParts\/><extLst\/>/);
    expect(compareParts(makeWorkbook({ sheets: { List: rows } }), bytes).added).toEqual(
      expect.arrayContaining(['xl/comments1.xml', 'xl/drawings/vmlDrawing1.vml']),
    );
  });

  it('leave the shapes of a header alone', () => {
    const content = `${rows}<legacyDrawingHF xmlns:r="${OFFICE}" r:id="rId7"/>`;
    const bytes = makeWorkbook({
      sheets: { List: content },
      sheetRelations: relation('rId7', 'vmlDrawing', '../drawings/vmlDrawing1.vml'),
      types:
        '<Default Extension="vml" ContentType="application/vnd.openxmlformats-officedocument.vmlDrawing"/>',
      parts: { 'xl/drawings/vmlDrawing1.vml': shapes },
    });
    const after = give(bytes, edit('A1', 2)).bytes;
    expect(partsOf(after).get('xl/drawings/vmlDrawing1.vml')?.content).toBe(shapes);
    expect(partsOf(after).has('xl/drawings/vmlDrawing2.vml')).toBe(true);
    expect(sheetXml(after)).toMatch(/<legacyDrawing [^>]*r:id="rId3"\/><legacyDrawingHF/);
  });

  it('join shapes that are there, of whatever prefix', () => {
    const bytes = makeWorkbook({
      sheets: { List: `${rows}<legacyDrawing xmlns:r="${OFFICE}" r:id="rId7"/>` },
      sheetRelations: relation('rId7', 'vmlDrawing', '../drawings/vmlDrawing1.vml'),
      parts: { 'xl/drawings/vmlDrawing1.vml': shapes },
    });
    const after = give(bytes, edit('A1', 2)).bytes;
    const drawing = partsOf(after).get('xl/drawings/vmlDrawing1.vml')?.content ?? '';
    expect(drawing).toContain('<vml:shape id="_x0000_s1030">');
    expect(drawing).toMatch(/<v:shape xmlns:v="urn:schemas-microsoft-com:vml"[^>]* id="_x0000_s1031"/);
    expect(malformedParts(after)).toEqual([]);
    expect(sheetXml(after).match(/<legacyDrawing /g)).toHaveLength(1);
  });

  it('add to a plain comment, and name their author once', () => {
    const comments =
      '<comments xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main"><authors><author>Yard</author></authors><commentList><comment ref="A1" authorId="0"><text><t>Wet.</t></text></comment></commentList></comments>';
    const bytes = makeWorkbook({
      sheets: { List: rows },
      sheetRelations: relation('rId1', 'comments', '../comments1.xml'),
      types: override(
        'xl/comments1.xml',
        'application/vnd.openxmlformats-officedocument.spreadsheetml.comments+xml',
      ),
      parts: { 'xl/comments1.xml': comments },
    });
    const once = give(bytes, edit('A1', 2), edit('B1', 'x')).bytes;
    const twice = give(once, edit('A1', 3), edit('C1', 'y')).bytes;
    const after = partsOf(twice).get('xl/comments1.xml')?.content ?? '';
    expect(after).toContain('<authors><author>Yard</author><author>Plumbrow</author></authors>');
    expect(after).toMatch(
      /<r><t>Wet\.<\/t><\/r><r><t xml:space="preserve">\s+Corrected: was “1”, is now “2”\./,
    );
    expect(after).toMatch(/was “2”, is now “3”/);
    expect(after).toContain('<comment ref="C1" authorId="1">');
  });

  it('show the beginning of a long text', () => {
    const { bytes } = give(makeWorkbook({ sheets: { List: rows } }), edit('A1', 'x'.repeat(32_000)));
    expect(partsOf(bytes).get('xl/comments1.xml')?.content.length).toBeLessThan(1500);
  });
});
