import { damaged, UnreadableFile } from '@/parsers/errors';

/** One entry of a zip archive, as the central directory has it (PKWARE APPNOTE 6.3, sections 4.3.12 and 4.4). */
export interface ZipEntry {
  readonly name: string;
  readonly nameBytes: Uint8Array;
  /** 0 stored, 8 deflated. */
  readonly method: number;
  readonly flags: number;
  readonly crc: number;
  readonly compressedSize: number;
  /** As declared; what it unpacks to is held against it. */
  readonly size: number;
  /** Of the local header. */
  readonly headerOffset: number;
  /** Of the first byte of the data. */
  readonly dataOffset: number;
  /** The entry's record in the central directory, for copying it unchanged. */
  readonly record: Uint8Array;
}

export interface ZipArchive {
  readonly bytes: Uint8Array;
  /** In the order of the central directory. */
  readonly entries: readonly ZipEntry[];
  readonly comment: Uint8Array;
}

const LOCAL_HEADER = 0x04034b50;
const DIRECTORY_RECORD = 0x02014b50;
const END_RECORD = 0x06054b50;
const END_RECORD_64 = 0x06064b50;
const LOCATOR_64 = 0x07064b50;
const END_SIZE = 22;
const ENTRIES_MAX = 65_535;
const WIDE = 0xffffffff;

interface DirectoryPlace {
  readonly count: number;
  readonly offset: number;
  readonly end: number;
  readonly comment: Uint8Array;
}

/** Reads the directory; throws UnreadableFile where it is not whole. */
export function readDirectory(bytes: Uint8Array): ZipArchive {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const place = findDirectory(bytes, view);
  const entries: ZipEntry[] = [];
  let at = place.offset;
  while (entries.length < place.count) {
    if (at + 46 > place.end || view.getUint32(at, true) !== DIRECTORY_RECORD) throw brokenDirectory();
    const length =
      46 + view.getUint16(at + 28, true) + view.getUint16(at + 30, true) + view.getUint16(at + 32, true);
    if (at + length > place.end) throw brokenDirectory();
    entries.push(readEntry(bytes, view, at, length));
    at += length;
  }
  return { bytes, entries, comment: place.comment };
}

function findDirectory(bytes: Uint8Array, view: DataView): DirectoryPlace {
  const end = findEnd(view);
  let count = view.getUint16(end + 10, true);
  let size = view.getUint32(end + 12, true);
  let offset = view.getUint32(end + 16, true);
  let directoryEnd = end;
  if (count === 0xffff || size === WIDE || offset === WIDE) {
    const wide = findEnd64(view, end);
    if (wide >= 0) {
      count = wideNumber(view, wide + 32);
      size = wideNumber(view, wide + 40);
      offset = wideNumber(view, wide + 48);
      directoryEnd = wide;
    }
  }
  if (count > ENTRIES_MAX || offset + size > directoryEnd) throw brokenDirectory();
  return { count, offset, end: offset + size, comment: bytes.subarray(end + END_SIZE) };
}

function findEnd(view: DataView): number {
  const last = view.byteLength - END_SIZE;
  for (let at = last; at >= 0 && at >= last - 0xffff; at--) {
    if (
      view.getUint32(at, true) === END_RECORD &&
      at + END_SIZE + view.getUint16(at + 20, true) <= view.byteLength
    )
      return at;
  }
  throw damaged('The end of this workbook is missing; perhaps it was not transferred whole.');
}

function findEnd64(view: DataView, end: number): number {
  const locator = end - 20;
  if (locator < 0 || view.getUint32(locator, true) !== LOCATOR_64) return -1;
  const at = wideNumber(view, locator + 8);
  if (at + 56 > locator || view.getUint32(at, true) !== END_RECORD_64) throw brokenDirectory();
  return at;
}

function readEntry(bytes: Uint8Array, view: DataView, at: number, length: number): ZipEntry {
  const flags = view.getUint16(at + 8, true);
  const nameBytes = bytes.subarray(at + 46, at + 46 + view.getUint16(at + 28, true));
  const name = new TextDecoder().decode(nameBytes);
  const sizes = readSizes(view, at);
  if ((flags & 1) !== 0) throw new UnreadableFile('encrypted');
  const method = view.getUint16(at + 10, true);
  if (method !== 0 && method !== 8)
    throw damaged('A part of this workbook is packed in a way that cannot be unpacked.');
  const dataOffset = findData(view, sizes.headerOffset);
  if (dataOffset + sizes.compressedSize > bytes.length) throw brokenDirectory();
  const record = bytes.subarray(at, at + length);
  return { name, nameBytes, method, flags, crc: view.getUint32(at + 16, true), ...sizes, dataOffset, record };
}

/** Sizes and offset; a field that is full stands in the 64-bit extra field (APPNOTE 4.5.3). */
function readSizes(view: DataView, at: number) {
  let compressedSize = view.getUint32(at + 20, true);
  let size = view.getUint32(at + 24, true);
  let headerOffset = view.getUint32(at + 42, true);
  let extra = at + 46 + view.getUint16(at + 28, true);
  const end = extra + view.getUint16(at + 30, true);
  while (extra + 4 <= end) {
    const next = extra + 4 + view.getUint16(extra + 2, true);
    if (view.getUint16(extra, true) === 1 && next <= end) {
      let field = extra + 4;
      const take = (narrow: number) => {
        if (narrow !== WIDE || field + 8 > next) return narrow;
        field += 8;
        return wideNumber(view, field - 8);
      };
      size = take(size);
      compressedSize = take(compressedSize);
      headerOffset = take(headerOffset);
    }
    extra = next;
  }
  return { compressedSize, size, headerOffset };
}

function findData(view: DataView, header: number): number {
  if (header + 30 > view.byteLength || view.getUint32(header, true) !== LOCAL_HEADER) throw brokenDirectory();
  return header + 30 + view.getUint16(header + 26, true) + view.getUint16(header + 28, true);
}

function wideNumber(view: DataView, at: number): number {
  if (at + 8 > view.byteLength) throw brokenDirectory();
  return view.getUint32(at, true) + view.getUint32(at + 4, true) * 2 ** 32;
}

function brokenDirectory(): UnreadableFile {
  return damaged('The list of parts inside this workbook is broken.');
}
