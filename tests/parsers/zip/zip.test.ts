import { randomBytes } from 'node:crypto';
import { zipSync, strToU8 } from 'fflate';
import { describe, expect, it } from 'vitest';
import { UnreadableFile } from '@/parsers/errors';
import { checkNotUnpacked, openZip, packedBytes, unpack } from '@/parsers/zip';

const text = 'Drive piles, pour the slab, raise the frame. '.repeat(200);
const archive = () => zipSync({ 'a/one.xml': strToU8(text), 'two.bin': [strToU8('as it is'), { level: 0 }] });

const codeOf = (run: () => unknown): string => {
  try {
    run();
  } catch (error) {
    if (error instanceof UnreadableFile) return error.code;
    throw error;
  }
  return 'read';
};

/** Sets the size that the directory and the local header declare for the only entry. */
function declare(zip: Uint8Array, size: number): Uint8Array {
  const view = new DataView(zip.buffer, zip.byteOffset, zip.byteLength);
  for (let at = 0; at + 28 < zip.length; at++) {
    if (view.getUint32(at, true) === 0x02014b50) view.setUint32(at + 24, size, true);
  }
  return zip;
}

describe('a zip archive', () => {
  it('lists its entries in order and unpacks them', () => {
    const zip = openZip(archive());
    expect(zip.entries.map(({ name, method, size }) => [name, method, size])).toEqual([
      ['a/one.xml', 8, text.length],
      ['two.bin', 0, 8],
    ]);
    const [one, two] = zip.entries;
    if (!one || !two) throw new Error('two entries expected');
    expect(new TextDecoder().decode(unpack(zip, one))).toBe(text);
    expect(new TextDecoder().decode(packedBytes(zip, two))).toBe('as it is');
    expect(packedBytes(zip, one).length).toBe(one.compressedSize);
  });

  it('refuses content that is not what its checksum says', () => {
    const bytes = archive();
    const zip = openZip(bytes);
    for (const entry of zip.entries) {
      const changed = bytes.slice();
      changed[entry.dataOffset + 3] = (changed[entry.dataOffset + 3] ?? 0) ^ 0x10;
      const again = openZip(changed);
      expect(codeOf(() => unpack(again, entry))).toBe('damaged');
    }
  });

  it('refuses an archive cut anywhere', () => {
    const bytes = archive();
    for (let length = 0; length < bytes.length; length++) {
      expect(codeOf(() => openZip(bytes.subarray(0, length)))).toBe('damaged');
    }
  });

  it('refuses encrypted entries', () => {
    const bytes = archive();
    const at = bytes.findIndex(
      (_, i) => new DataView(bytes.buffer).getUint32(Math.min(i, bytes.length - 4), true) === 0x02014b50,
    );
    bytes[at + 8] = 1;
    expect(codeOf(() => openZip(bytes))).toBe('encrypted');
  });

  it('refuses an archive that declares too much', () => {
    expect(codeOf(() => openZip(declare(zipSync({ a: strToU8(text) }), 600_000_000)))).toBe(
      'unpacks-too-large',
    );
  });
});

describe('an archive that unpacks to more than it declares', () => {
  const bomb = declare(zipSync({ bomb: new Uint8Array(600_000_000) }, { level: 6 }), 1000);

  it('is refused when the entry is unpacked', () => {
    const zip = openZip(bomb);
    const [entry] = zip.entries;
    if (!entry) throw new Error('an entry expected');
    const before = process.memoryUsage().rss;
    expect(codeOf(() => unpack(zip, entry))).toBe('unpacks-too-large');
    expect(process.memoryUsage().rss - before).toBeLessThan(200_000_000);
  });

  it('is refused though nobody reads the entry', () => {
    const zip = openZip(bomb);
    expect(codeOf(() => checkNotUnpacked(zip, new Set()))).toBe('unpacks-too-large');
    expect(codeOf(() => checkNotUnpacked(zip, new Set(zip.entries)))).toBe('read');
  });

  it('is called damaged where it stays within the limit', () => {
    const zip = openZip(declare(zipSync({ a: randomBytes(5000) }), 100));
    const [entry] = zip.entries;
    if (!entry) throw new Error('an entry expected');
    expect(codeOf(() => unpack(zip, entry))).toBe('damaged');
  });
});
