import { zipSync } from 'fflate';
import { describe, expect, it } from 'vitest';
import { EditablePackage } from '@/parsers/workbook/xlsx/package';
import { openZip } from '@/parsers/zip';
import { compareParts, partsOf } from '../packages';

const bytes = zipSync({
  'b.xml': [Buffer.from('<b/>'.repeat(50)), { level: 9 }],
  'stored.bin': [Buffer.from([1, 2, 3]), { level: 0 }],
  'A.xml': Buffer.from('<a/>'),
  'folder/': [new Uint8Array(), { level: 0 }],
});

describe('a package whose parts are changed', () => {
  it('copies what is not changed as it is, in its order', () => {
    const pack = new EditablePackage(bytes);
    pack.write('a.xml', Buffer.from('<changed/>'));
    pack.write('new/part.xml', Buffer.from('<new/>'));
    const after = pack.toBytes();
    expect([...partsOf(after).keys()]).toEqual(['b.xml', 'stored.bin', 'A.xml', 'folder/', 'new/part.xml']);
    expect(compareParts(bytes, after)).toEqual({ changed: ['A.xml'], added: ['new/part.xml'], gone: [] });
    expect(partsOf(after).get('A.xml')?.content).toBe('<changed/>');
    expect(openZip(after).entries[1]?.method).toBe(0);
  });

  it('needs no data descriptor, since it knows the sizes', () => {
    // An archive as a streaming writer makes it: bit 3 set, sizes after the data.
    const streamed = Buffer.from(bytes);
    for (const { headerOffset, record } of openZip(bytes).entries) {
      streamed.writeUInt16LE(8, headerOffset + 6);
      streamed.writeUInt16LE(8, record.byteOffset - bytes.byteOffset + 8);
    }
    const after = new EditablePackage(new Uint8Array(streamed)).toBytes();
    expect(openZip(after).entries.map(({ flags }) => flags & 8)).toEqual([0, 0, 0, 0]);
    expect(compareParts(bytes, after)).toEqual({ changed: [], added: [], gone: [] });
  });

  it('reads, overwrites and removes by name without regard to case', () => {
    const pack = new EditablePackage(bytes);
    expect(pack.has('/B.XML')).toBe(true);
    expect(pack.read('stored.BIN')).toEqual(Buffer.from([1, 2, 3]));
    expect(pack.read('none')).toBeNull();
    pack.write('x', Buffer.from('1'));
    expect(pack.read('X')?.toString()).toBe('1');
    pack.remove('b.xml');
    expect(pack.names()).toEqual(['stored.bin', 'A.xml', 'folder/', 'x']);
    expect(partsOf(pack.toBytes()).has('b.xml')).toBe(false);
  });

  it('packs large parts quickly, or small where asked', () => {
    const pack = new EditablePackage(bytes);
    const rows = Array.from(
      { length: 40_000 },
      (_, index) => `<row r="${index}"><c>${(index * 7919) % 1009}</c></row>`,
    );
    pack.write('large.xml', Buffer.from(rows.join('')));
    const [quick, small] = [pack.toBytes(), pack.toBytes('small')];
    expect(small.length).toBeLessThan(quick.length);
    expect(partsOf(small).get('large.xml')?.content).toBe(rows.join(''));
  });

  it('gives the same bytes each time', () => {
    const write = () => {
      const pack = new EditablePackage(bytes);
      pack.write('new.xml', Buffer.from('<new/>'));
      return pack.toBytes();
    };
    expect(write().equals(write())).toBe(true);
  });
});
