import { crc32, deflateRawSync } from 'node:zlib';
import { openZip, packedBytes, unpack, type ZipArchive, type ZipEntry } from '@/parsers/zip';

/** A part as it is to be written. */
interface Part {
  readonly name: string;
  readonly nameBytes: Uint8Array;
  readonly method: number;
  readonly flags: number;
  readonly crc: number;
  readonly size: number;
  readonly packed: Uint8Array;
  /** Version and system it was made by, and its attributes: kept from the received archive. */
  readonly madeBy: number;
  readonly timeAndDate: number;
  readonly internal: number;
  readonly external: number;
}

const CENTRAL = 0x02014b50;
const LOCAL = 0x04034b50;
const END = 0x06054b50;
const UTF8_NAME = 0x0800;
const DESCRIPTOR_FOLLOWS = 0x0008;
/** 1 January 1980, the first a zip can name: what is added bears no clock. */
const FIRST_DATE = 0x0021_0000;

const tidy = (name: string) => name.replaceAll('\\', '/').replace(/^\/+/, '');
const keyOf = (name: string) => tidy(name).toLowerCase();

function kept(archive: ZipArchive, entry: ZipEntry): Part {
  const record = Buffer.from(entry.record.buffer, entry.record.byteOffset, entry.record.byteLength);
  const { nameBytes, method, flags, crc, size } = entry;
  return {
    ...{ name: tidy(entry.name), nameBytes, method, flags, crc, size, packed: packedBytes(archive, entry) },
    madeBy: record.readUInt16LE(4),
    timeAndDate: record.readUInt32LE(12),
    internal: record.readUInt16LE(36),
    external: record.readUInt32LE(38),
  };
}

/** `quick`: packing is most of the time that giving back takes, so large parts are packed faster and a little less. */
export type Packing = 'quick' | 'small';

function packed(bytes: Uint8Array, base: Part | null, name: string, packing: Packing): Part {
  const quick = bytes.length > 8_000_000 ? 1 : bytes.length > 500_000 ? 3 : 6;
  const level = packing === 'small' ? 9 : quick;
  const nameBytes = base?.nameBytes ?? Buffer.from(name);
  const flags = (base?.flags ?? 0) | (base ? 0 : UTF8_NAME);
  const { madeBy = 20, timeAndDate = FIRST_DATE, internal = 0, external = 0 } = base ?? {};
  return {
    ...{ name: base?.name ?? name, nameBytes, method: 8, flags, crc: crc32(bytes), size: bytes.length },
    ...{ packed: deflateRawSync(bytes, { level }), madeBy, timeAndDate, internal, external },
  };
}

/** The fields that the local and the central header have in common. */
function writeShared(header: Buffer, at: number, part: Part): void {
  header.writeUInt16LE(20, at);
  header.writeUInt16LE(part.flags & ~DESCRIPTOR_FOLLOWS, at + 2);
  header.writeUInt16LE(part.method, at + 4);
  header.writeUInt32LE(part.timeAndDate, at + 6);
  header.writeUInt32LE(part.crc, at + 10);
  header.writeUInt32LE(part.packed.length, at + 14);
  header.writeUInt32LE(part.size, at + 18);
  header.writeUInt16LE(part.nameBytes.length, at + 22);
}

function localHeader(part: Part): Buffer {
  const header = Buffer.alloc(30);
  header.writeUInt32LE(LOCAL, 0);
  writeShared(header, 4, part);
  return header;
}

function centralHeader(part: Part, offset: number): Buffer {
  const header = Buffer.alloc(46);
  header.writeUInt32LE(CENTRAL, 0);
  header.writeUInt16LE(part.madeBy, 4);
  writeShared(header, 6, part);
  header.writeUInt16LE(part.internal, 36);
  header.writeUInt32LE(part.external, 38);
  header.writeUInt32LE(offset, 42);
  return header;
}

function writeZip(parts: readonly Part[]): Buffer {
  const contents: Uint8Array[] = [];
  const directory: Uint8Array[] = [];
  let offset = 0;
  let directorySize = 0;
  for (const part of parts) {
    directory.push(centralHeader(part, offset), part.nameBytes);
    directorySize += 46 + part.nameBytes.length;
    contents.push(localHeader(part), part.nameBytes, part.packed);
    offset += 30 + part.nameBytes.length + part.packed.length;
  }
  const end = Buffer.alloc(22);
  end.writeUInt32LE(END, 0);
  end.writeUInt16LE(parts.length, 8);
  end.writeUInt16LE(parts.length, 10);
  end.writeUInt32LE(directorySize, 12);
  end.writeUInt32LE(offset, 16);
  return Buffer.concat([...contents, ...directory, end]);
}

/** A part of the package; `content` is what replaces the received one. */
interface Slot {
  readonly name: string;
  readonly received: ZipEntry | null;
  readonly content: Buffer | null;
}

/**
 * An OPC package (ECMA-376 part 2) whose parts can be replaced, added and removed; all others keep their
 * order and their packed bytes. Part names are compared without regard to case.
 */
export class EditablePackage {
  private readonly archive: ZipArchive;
  private readonly slots: Map<string, Slot>;

  constructor(bytes: Uint8Array) {
    this.archive = openZip(bytes);
    this.slots = new Map(
      this.archive.entries.map((entry) => [
        keyOf(entry.name),
        { name: tidy(entry.name), received: entry, content: null },
      ]),
    );
  }

  has(name: string): boolean {
    return this.slots.has(keyOf(name));
  }

  names(): string[] {
    return [...this.slots.values()].map((slot) => slot.name);
  }

  /** The part's content; null where there is no such part. Throws UnreadableFile where it is damaged. */
  read(name: string): Buffer | null {
    const slot = this.slots.get(keyOf(name));
    if (!slot?.received || slot.content) return slot?.content ?? null;
    const bytes = unpack(this.archive, slot.received);
    return Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  }

  write(name: string, content: Buffer): void {
    const slot = this.slots.get(keyOf(name)) ?? { name: tidy(name), received: null };
    this.slots.set(keyOf(name), { ...slot, content });
  }

  remove(name: string): void {
    this.slots.delete(keyOf(name));
  }

  toBytes(packing: Packing = 'quick'): Buffer {
    return writeZip(
      [...this.slots.values()].flatMap(({ name, received, content }) => {
        const before = received ? kept(this.archive, received) : null;
        return content ? packed(content, before, name, packing) : (before ?? []);
      }),
    );
  }
}
