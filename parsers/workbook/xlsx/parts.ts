import { damaged } from '@/parsers/errors';
import type { EditablePackage } from './package';
import { append, attribute, children, type Element, escapeAttribute, prefixOf, rootOf, splice } from './xml';

const BOM = '\ufeff';

/** A part as text. UTF-16 becomes UTF-8, since what is written back is UTF-8. */
export function readXml(pack: EditablePackage, name: string): string | null {
  const bytes = pack.read(name);
  if (!bytes) return null;
  const [first, second] = bytes;
  const wide =
    first === 0xff && second === 0xfe ? 'utf-16le' : first === 0xfe && second === 0xff ? 'utf-16be' : null;
  const text = new TextDecoder(wide ?? 'utf-8', { ignoreBOM: true }).decode(bytes);
  return checked(wide ? text.replace(BOM, '').replace(/encoding=(["'])utf-16\1/i, 'encoding="UTF-8"') : text);
}

/** A big part as its bytes, one a character: found and cut faster, and only what is looked at is decoded. */
export function readBytes(pack: EditablePackage, name: string): string | null {
  const bytes = pack.read(name);
  if (!bytes) return null;
  const [first] = bytes;
  if (first === 0xff || first === 0xfe) return toBytes(readXml(pack, name) ?? '');
  return checked(bytes.toString('latin1'));
}

export const writeXml = (pack: EditablePackage, name: string, xml: string) =>
  pack.write(name, Buffer.from(xml, 'utf8'));
export const writeBytes = (pack: EditablePackage, name: string, xml: string) =>
  pack.write(name, Buffer.from(xml, 'latin1'));
export const toBytes = (text: string) =>
  isAscii(text) ? text : Buffer.from(text, 'utf8').toString('latin1');
export const fromBytes = (text: string) =>
  isAscii(text) ? text : Buffer.from(text, 'latin1').toString('utf8');

function isAscii(text: string): boolean {
  for (let at = 0; at < text.length; at += 1) if (text.charCodeAt(at) > 126) return false;
  return true;
}

function checked(xml: string): string {
  const head = xml.slice(0, 1000);
  if (head.includes('<!DOCTYPE'))
    throw damaged('This workbook declares a document type, which no workbook needs.');
  const encoding = /^\S{0,3}<\?xml[^>]*encoding=["']([^"']*)/.exec(head)?.[1] ?? 'utf-8';
  if (!/^(utf-?8|us-ascii)$/i.test(encoding)) {
    throw damaged(
      `This workbook keeps a part in the encoding ${encoding}, which cannot be changed in place.`,
    );
  }
  return xml;
}

export function requireRoot(xml: string, part: string): Element {
  const root = rootOf(xml);
  if (!root) throw damaged(`The part ${part} inside this workbook is not complete.`);
  return root;
}

export interface Relation {
  readonly id: string;
  readonly type: string;
  /** Name of the part; the address as it is for what lies outside. */
  readonly target: string;
  readonly element: Element;
}

export const relsOf = (part: string) => part.replace(/([^/]*)$/, '_rels/$1.rels');

/** Resolves a target against the folder of the part that names it. */
function resolve(part: string, target: string): string {
  const path = target.replaceAll('\\', '/');
  const steps = path.startsWith('/') ? [] : part.split('/').slice(0, -1);
  for (const step of path.split('/')) {
    if (step === '..') steps.pop();
    else if (step !== '.' && step !== '') steps.push(step);
  }
  return unescaped(steps.join('/'));
}

function unescaped(name: string): string {
  if (!/%[0-9a-f]{2}/i.test(name)) return name;
  try {
    return decodeURIComponent(name);
  } catch (error) {
    if (error instanceof URIError) return name;
    throw error;
  }
}

/** The way from the folder of one part to another part, which some readers understand only so. */
function wayFrom(part: string, target: string): string {
  const [from, to] = [part.split('/').slice(0, -1), target.split('/')];
  let common = 0;
  while (common < from.length && from[common] === to[common]) common += 1;
  return [...from.slice(common).map(() => '..'), ...to.slice(common)].join('/');
}

/** What a part refers to; `part` '' stands for the package. */
export function relationsOf(pack: EditablePackage, part: string): Relation[] {
  const xml = readXml(pack, relsOf(part));
  if (!xml) return [];
  return [...children(xml, requireRoot(xml, relsOf(part)))].map((element) => {
    const tag = xml.slice(element.start, element.inner);
    const target = attribute(tag, 'Target') ?? '';
    const outside = attribute(tag, 'TargetMode') === 'External';
    return {
      id: attribute(tag, 'Id') ?? '',
      type: attribute(tag, 'Type') ?? '',
      target: outside ? target : resolve(part, target),
      element,
    };
  });
}

/** True for both dialects of the standard, whose types differ in all but the last word. */
export const isOfType = (relation: Relation, kind: string) => relation.type.endsWith(`/${kind}`);

const RELATIONS_NAMESPACE = 'http://schemas.openxmlformats.org/package/2006/relationships';

/** Adds a relation and returns its id. */
export function addRelation(pack: EditablePackage, part: string, type: string, target: string): string {
  const name = relsOf(part);
  const xml =
    readXml(pack, name) ??
    `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n<Relationships xmlns="${RELATIONS_NAMESPACE}"></Relationships>`;
  const root = requireRoot(xml, name);
  const taken = new Set(relationsOf(pack, part).map((relation) => relation.id));
  let number = taken.size + 1;
  while (taken.has(`rId${number}`)) number += 1;
  const tag = `<${prefixOf(root.name)}Relationship Id="rId${number}" Type="${type}" Target="${escapeAttribute(wayFrom(part, target))}"/>`;
  writeXml(pack, name, splice(xml, [append(xml, root, tag)]));
  return `rId${number}`;
}

export function removeRelations(
  pack: EditablePackage,
  part: string,
  which: (relation: Relation) => boolean,
): void {
  const name = relsOf(part);
  const xml = readXml(pack, name);
  const gone = relationsOf(pack, part).filter(which);
  if (!xml || gone.length === 0) return;
  const cuts = gone.map(({ element }) => ({ start: element.start, end: element.end, text: '' }));
  writeXml(pack, name, splice(xml, cuts));
}

const TYPES = '[Content_Types].xml';

/** Declares the content type of a part, or of all parts with an ending where `name` starts with a dot. */
export function declareType(pack: EditablePackage, name: string, type: string): void {
  const xml = readXml(pack, TYPES);
  if (!xml) throw damaged('This workbook does not say what its parts are.');
  const root = requireRoot(xml, TYPES);
  const ending = name.startsWith('.');
  const [element, key, value] = ending
    ? ['Default', 'Extension', name.slice(1)]
    : ['Override', 'PartName', `/${name}`];
  for (const each of children(xml, root)) {
    const tag = xml.slice(each.start, each.inner);
    if (attribute(tag, key)?.toLowerCase() === value.toLowerCase()) return;
  }
  const tag = `<${prefixOf(root.name)}${element} ${key}="${escapeAttribute(value)}" ContentType="${type}"/>`;
  // Defaults come first, as most writers have them.
  const at = ending ? root.inner : root.innerEnd;
  writeXml(pack, TYPES, splice(xml, [{ start: at, end: at, text: tag }]));
}

/** Takes parts out of the package with what declares them. */
export function dropParts(pack: EditablePackage, names: readonly string[]): void {
  const xml = readXml(pack, TYPES);
  if (!xml || names.length === 0) return;
  const gone = new Set(names.map((name) => `/${name}`.toLowerCase()));
  const cuts = [...children(xml, requireRoot(xml, TYPES))]
    .filter(({ start, inner }) =>
      gone.has((attribute(xml.slice(start, inner), 'PartName') ?? '').toLowerCase()),
    )
    .map(({ start, end }) => ({ start, end, text: '' }));
  if (cuts.length > 0) writeXml(pack, TYPES, splice(xml, cuts));
  for (const name of names) pack.remove(name);
}

/** The first name of a series that no part bears: xl/comments1.xml, xl/comments2.xml … */
export function freeName(pack: EditablePackage, before: string, after: string): string {
  let number = 1;
  while (pack.has(`${before}${number}${after}`)) number += 1;
  return `${before}${number}${after}`;
}
