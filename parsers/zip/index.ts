import { readDirectory, type ZipArchive } from './directory';
import { checkDeclaredSize } from './inflate';

export type { ZipArchive, ZipEntry } from './directory';
export { checkNotUnpacked, packedBytes, unpack } from './inflate';

/**
 * Opens a zip archive: its entries in order, nothing unpacked yet. Throws UnreadableFile where the
 * directory is broken, an entry is encrypted, or the sizes declared come to more than the limit.
 */
export function openZip(bytes: Uint8Array): ZipArchive {
  const archive = readDirectory(bytes);
  checkDeclaredSize(archive);
  return archive;
}
