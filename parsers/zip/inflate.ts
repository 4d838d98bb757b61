import { crc32, inflateRawSync } from 'node:zlib';
import { Inflate } from 'fflate';
import { damaged, UnreadableFile } from '@/parsers/errors';
import { LIMITS } from '@/parsers/limits';
import type { ZipArchive, ZipEntry } from './directory';

/** Deflate cannot do better than this (zlib technical details: 1032 to 1). */
const BEST_RATIO = 1032;
const SLICE = 16 * 1024;
const PART_TOO_LARGE =
  'A part of this workbook unpacks to more than 300 MB. Send a workbook that holds only the activity list.';

/** The entry's bytes as they stand in the archive, packed or not. */
export function packedBytes(archive: ZipArchive, entry: ZipEntry): Uint8Array {
  return archive.bytes.subarray(entry.dataOffset, entry.dataOffset + entry.compressedSize);
}

/** The entry's content; throws UnreadableFile where it is damaged or larger than declared. */
export function unpack(archive: ZipArchive, entry: ZipEntry): Uint8Array {
  if (entry.size > LIMITS.partBytes) throw new UnreadableFile('unpacks-too-large', PART_TOO_LARGE);
  const packed = packedBytes(archive, entry);
  const bytes = entry.method === 0 ? packed : inflate(packed, entry);
  if (bytes.length !== entry.size || crc32(bytes) !== entry.crc) throw brokenPart(entry);
  return bytes;
}

function inflate(packed: Uint8Array, entry: ZipEntry): Uint8Array {
  if (entry.size > packed.length * BEST_RATIO + BEST_RATIO) throw brokenPart(entry);
  try {
    // One byte more than declared, so that the whole content lands in one buffer and nothing is copied.
    return inflateRawSync(packed, {
      chunkSize: Math.max(64, entry.size + 1),
      maxOutputLength: entry.size + 1,
    });
  } catch {
    throw measure(packed) > LIMITS.unpackedBytes
      ? new UnreadableFile('unpacks-too-large')
      : brokenPart(entry);
  }
}

/** Refuses an archive that declares more than the limit. */
export function checkDeclaredSize(archive: ZipArchive): void {
  let total = 0;
  for (const entry of archive.entries) total += entry.size;
  if (total > LIMITS.unpackedBytes) throw new UnreadableFile('unpacks-too-large');
}

/**
 * Refuses an archive in which an entry that nobody has unpacked holds more than it declares, so that the
 * sizes declared can be relied on. Looks only at entries large enough to matter, and keeps nothing.
 */
export function checkNotUnpacked(archive: ZipArchive, unpacked: ReadonlySet<ZipEntry>): void {
  for (const entry of archive.entries) {
    const most = entry.method === 0 ? entry.size : entry.compressedSize * BEST_RATIO;
    if (!unpacked.has(entry) && most > LIMITS.unpackedBytes) inflate(packedBytes(archive, entry), entry);
  }
}

/** Bytes a deflate stream unpacks to, counted slice by slice up to just over the limit. */
function measure(packed: Uint8Array): number {
  let count = 0;
  const stream = new Inflate((chunk) => {
    count += chunk.length;
  });
  try {
    for (let at = 0; at < packed.length && count <= LIMITS.unpackedBytes; at += SLICE) {
      stream.push(packed.subarray(at, at + SLICE), at + SLICE >= packed.length);
    }
  } catch {
    return count; // A stream that breaks off counts as far as it goes.
  }
  return count;
}

function brokenPart(entry: ZipEntry): UnreadableFile {
  return damaged(`The part ${entry.name.slice(0, 80)} inside this workbook is damaged.`);
}
