import { damaged, UnreadableFile } from '@/parsers/errors';
import { checkNotUnpacked, openZip, unpack, type ZipArchive, type ZipEntry } from '@/parsers/zip';
import { readXml } from './xml';

export interface Relationship {
  readonly id: string;
  /** Last word of its type: worksheet, sharedStrings, styles … */
  readonly kind: string;
  /** Name of the part; '' where it lies outside the package. */
  readonly target: string;
}

/** The parts of a workbook by name and their relationships (ECMA-376 part 2). */
export class OfficePackage {
  private readonly parts = new Map<string, ZipEntry>();
  private readonly unpacked = new Set<ZipEntry>();

  private constructor(private readonly archive: ZipArchive) {
    for (const entry of archive.entries) {
      const key = partKey(entry.name);
      if (key.endsWith('/')) continue;
      if (this.parts.has(key))
        throw damaged(`The part ${entry.name.slice(0, 80)} is in this workbook twice.`);
      this.parts.set(key, entry);
    }
  }

  static open(bytes: Uint8Array): OfficePackage {
    return new OfficePackage(openZip(bytes));
  }

  has(name: string): boolean {
    return this.parts.has(partKey(name));
  }

  /** The part's content; null where there is no such part. */
  read(name: string): Uint8Array | null {
    const entry = this.parts.get(partKey(name));
    if (!entry) return null;
    this.unpacked.add(entry);
    return unpack(this.archive, entry);
  }

  /** Relationships of a part, or of the package ('' as its name). */
  relationships(part: string): Relationship[] {
    const slash = part.lastIndexOf('/') + 1;
    const folder = part.slice(0, slash);
    const name = `${folder}_rels/${part.slice(slash)}.rels`;
    const bytes = this.read(name);
    const found: Relationship[] = [];
    if (!bytes) return found;
    readXml(bytes, name, {
      open(element, { Id, Type, Target, TargetMode }) {
        if (element !== 'Relationship' || !Id || !Type || Target === undefined) return;
        const kind = Type.slice(Type.lastIndexOf('/') + 1);
        found.push({ id: Id, kind, target: TargetMode === 'External' ? '' : resolve(folder, Target) });
      },
    });
    return found;
  }

  /** Refuses a package in which a part that was not read unpacks to more than it declares. */
  checkRest(): void {
    checkNotUnpacked(this.archive, this.unpacked);
  }

  /** Name of the workbook's main part; throws UnreadableFile where the package is something else. */
  mainPart(): string {
    const main = this.relationships('').find(({ kind }) => kind === 'officeDocument')?.target;
    const name = main ?? 'xl/workbook.xml';
    if (name.endsWith('.bin')) {
      throw new UnreadableFile(
        'old-format',
        'This is a binary workbook (.xlsb). Open it, save it as an Excel workbook (.xlsx), and send that.',
      );
    }
    if (this.has(name)) return name;
    if (this.isOpenDocument()) {
      throw new UnreadableFile(
        'not-a-spreadsheet',
        'This is an OpenDocument file. Open it, save it as an Excel workbook (.xlsx), and send that.',
      );
    }
    throw main === undefined
      ? new UnreadableFile('not-a-spreadsheet')
      : damaged('The main part of this workbook is missing.');
  }

  private isOpenDocument(): boolean {
    const type = this.has('mimetype') ? this.read('mimetype') : null;
    return type !== null && new TextDecoder().decode(type.subarray(0, 80)).includes('opendocument');
  }
}

/** Part names are compared without regard to case; some writers put backslashes. */
function partKey(name: string): string {
  return name.replaceAll('\\', '/').replace(/^\/+/, '').toLowerCase();
}

function resolve(folder: string, target: string): string {
  const path = target.replaceAll('\\', '/');
  const steps = path.startsWith('/') ? path.split('/') : [...folder.split('/'), ...path.split('/')];
  const kept: string[] = [];
  for (const step of steps) {
    if (step === '..') kept.pop();
    else if (step !== '' && step !== '.') kept.push(step);
  }
  return unescape(kept.join('/'));
}

function unescape(name: string): string {
  if (!name.includes('%')) return name;
  try {
    return decodeURIComponent(name);
  } catch {
    return name;
  }
}
