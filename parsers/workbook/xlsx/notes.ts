import { cellAddress } from '@/lib/schedule/cell';
import {
  addRelation,
  declareType,
  freeName,
  isOfType,
  readXml,
  relationsOf,
  requireRoot,
  writeXml,
} from './parts';
import type { EditablePackage } from './package';
import { addShapes } from './note-shapes';
import {
  append,
  attribute,
  child,
  children,
  type Element,
  escapeText,
  prefixOf,
  relationId,
  rootOf,
  type Splice,
  splice,
} from './xml';

/** A note for one cell. */
export interface Note {
  readonly row: number;
  readonly column: number;
  readonly text: string;
}

/** How the workbook names things: its main namespace, and the beginning of its relationship types. */
export interface Dialect {
  readonly namespace: string;
  readonly relations: string;
}

const AUTHOR = 'Plumbrow';
const TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml.comments+xml';
/** The author of the stand-in that spreadsheet programs keep beside a thread of comments. */
const THREAD = /^tc=\{/;

const run = (prefix: string, text: string) =>
  `<${prefix}r><${prefix}t xml:space="preserve">${escapeText(text)}</${prefix}t></${prefix}r>`;

const emptyComments = (namespace: string) =>
  `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n<comments xmlns="${namespace}"><authors></authors><commentList></commentList></comments>`;

/** Adds a text after what a comment says. */
function extend(xml: string, comment: Element, prefix: string, text: string): Splice[] {
  const body = child(xml, comment, `${prefix}text`);
  if (!body) return [];
  const plain = [...children(xml, body)].filter(({ name }) => name === `${prefix}t`);
  const wrapped = plain.flatMap(({ start, end }) => [
    { start, end: start, text: `<${prefix}r>` },
    { start: end, end, text: `</${prefix}r>` },
  ]);
  return [...wrapped, append(xml, body, run(prefix, `\n\n${text}`))];
}

interface CommentsPatch {
  readonly xml: string;
  /** Notes whose cells had none before. */
  readonly added: readonly Note[];
  /** Addresses of cells whose thread could not be written to. */
  readonly left: readonly string[];
}

/** Puts notes among the comments of a sheet (ECMA-376 part 1, 18.7). */
export function addComments(xml: string, part: string, notes: readonly Note[]): CommentsPatch {
  const root = requireRoot(xml, part);
  const prefix = prefixOf(root.name);
  const authors = child(xml, root, `${prefix}authors`);
  const list = child(xml, root, `${prefix}commentList`);
  if (!authors || !list) return { xml, added: [], left: notes.map(cellAddress) };
  const names = [...children(xml, authors)].map(({ inner, innerEnd }) => xml.slice(inner, innerEnd));
  const here = new Map<string, Element>();
  for (const comment of children(xml, list)) {
    here.set(attribute(xml.slice(comment.start, comment.inner), 'ref') ?? '', comment);
  }
  const known = names.indexOf(AUTHOR);
  const author = known < 0 ? names.length : known;
  const splices: Splice[] =
    known < 0 ? [append(xml, authors, `<${prefix}author>${AUTHOR}</${prefix}author>`)] : [];
  const [added, left, markup]: [Note[], string[], string[]] = [[], [], []];
  for (const note of notes) {
    const address = cellAddress(note);
    const comment = here.get(address);
    const writer =
      comment && names[Number(attribute(xml.slice(comment.start, comment.inner), 'authorId') ?? 0)];
    if (comment && THREAD.test(writer ?? '')) left.push(address);
    else if (comment) splices.push(...extend(xml, comment, prefix, note.text));
    else {
      added.push(note);
      const body = `<${prefix}text>${run(prefix, note.text)}</${prefix}text>`;
      markup.push(`<${prefix}comment ref="${address}" authorId="${author}">${body}</${prefix}comment>`);
    }
  }
  if (markup.length > 0) splices.push(append(xml, list, markup.join('')));
  return { xml: splice(xml, splices), added, left };
}

/** Elements of a worksheet that come after the one that names the shapes of its notes (18.3.1.99). */
const AFTER =
  /^(?:legacyDrawingHF|drawingHF|picture|oleObjects|controls|webPublishItems|tableParts|extLst|AlternateContent)$/;

interface Drawing {
  /** The relationship that names the shapes of the notes; null where the sheet has none. */
  readonly id: string | null;
  /** Where the element that names them belongs. */
  readonly place: number;
  readonly prefix: string;
}

function drawingOf(sheetXml: string, afterRows: number): Drawing {
  const root = rootOf(sheetXml);
  const prefix = prefixOf(root?.name ?? '');
  const tail = { inner: afterRows, innerEnd: root?.innerEnd ?? sheetXml.length };
  for (const { name, start, inner } of children(sheetXml, tail)) {
    if (name === `${prefix}legacyDrawing`)
      return { id: relationId(sheetXml.slice(start, inner)), place: start, prefix };
    if (AFTER.test(name.replace(/^.*:/, ''))) return { id: null, place: start, prefix };
  }
  return { id: null, place: tail.innerEnd, prefix };
}

export interface NotedSheet {
  /** Changes to the sheet's own part. */
  readonly splices: readonly Splice[];
  readonly left: readonly string[];
}

/** Writes the notes of a sheet into its parts for comments, which are made where there are none. */
export function addNotes(
  pack: EditablePackage,
  sheet: { readonly part: string; readonly xml: string; readonly afterRows: number },
  notes: readonly Note[],
  dialect: Dialect,
): NotedSheet {
  const relations = relationsOf(pack, sheet.part);
  const known = relations.find((relation) => isOfType(relation, 'comments'))?.target;
  const part = known ?? freeName(pack, 'xl/comments', '.xml');
  const { xml, added, left } = addComments(
    readXml(pack, part) ?? emptyComments(dialect.namespace),
    part,
    notes,
  );
  writeXml(pack, part, xml);
  if (!known) {
    declareType(pack, part, TYPE);
    addRelation(pack, sheet.part, `${dialect.relations}comments`, part);
  }
  if (added.length === 0) return { splices: [], left };

  // A picture in the header has shapes of its own, so the kind of relationship alone does not tell.
  const drawing = drawingOf(sheet.xml, sheet.afterRows);
  const shapes = relations.find((relation) => relation.id === drawing.id)?.target;
  const shapesPart = shapes ?? freeName(pack, 'xl/drawings/vmlDrawing', '.vml');
  writeXml(pack, shapesPart, addShapes(shapes ? readXml(pack, shapes) : null, added));
  if (shapes) return { splices: [], left };
  declareType(pack, '.vml', 'application/vnd.openxmlformats-officedocument.vmlDrawing');
  const id = addRelation(pack, sheet.part, `${dialect.relations}vmlDrawing`, shapesPart);
  const namespace = `xmlns:r="${dialect.relations.replace(/\/$/, '')}"`;
  const text = `<${drawing.prefix}legacyDrawing ${namespace} r:id="${id}"/>`;
  return { splices: [{ start: drawing.place, end: drawing.place, text }], left };
}
