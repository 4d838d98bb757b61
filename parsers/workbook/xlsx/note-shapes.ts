import type { Note } from './notes';

/** The kind of shape that notes have, by the name that every writer gives it. */
const KIND = '_x0000_t202';
const KIND_MARKUP = `<v:shapetype id="${KIND}" coordsize="21600,21600" o:spt="202" path="m,l,21600r21600,l21600,xe"><v:stroke joinstyle="miter"/><v:path gradientshapeok="t" o:connecttype="rect"/></v:shapetype>`;
const NAMESPACES =
  'xmlns:v="urn:schemas-microsoft-com:vml" xmlns:o="urn:schemas-microsoft-com:office:office" xmlns:x="urn:schemas-microsoft-com:office:excel"';
const EMPTY = `<xml ${NAMESPACES}></xml>`;
const PAPER = '#f6f4ee';
/** Shape numbers come in blocks of this many, and a drawing lists the blocks that it uses. */
const BLOCK = 1024;

function shape({ row, column, text }: Note, number: number): string {
  const lines = text.split('\n').reduce((sum, line) => sum + 1 + Math.floor(line.length / 42), 1);
  const top = Math.max(0, row - 2);
  // Left column, offset, top row, offset, right column, offset, bottom row, offset.
  const anchor = [column + 1, 15, top, 4, column + 5, 15, top + lines + 1, 4];
  return [
    `<v:shape id="_x0000_s${number}" type="#${KIND}" style="position:absolute;visibility:hidden" fillcolor="${PAPER}" o:insetmode="auto">`,
    `<v:fill color2="${PAPER}"/><v:path o:connecttype="none"/><v:textbox style="mso-direction-alt:auto"><div style="text-align:left"></div></v:textbox>`,
    `<x:ClientData ObjectType="Note"><x:MoveWithCells/><x:SizeWithCells/><x:Anchor>${anchor.join(', ')}</x:Anchor>`,
    `<x:AutoFill>False</x:AutoFill><x:Row>${row - 1}</x:Row><x:Column>${column}</x:Column></x:ClientData></v:shape>`,
  ].join('');
}

/** Adds the shapes that notes are shown in to a drawing in VML (ECMA-376 part 4, 19.1 and 19.4), or makes one. */
export function addShapes(drawing: string | null, notes: readonly Note[]): string {
  const xml = drawing ?? EMPTY;
  const numbers = [...xml.matchAll(/_x0000_s(\d+)/g)].map(([, number]) => Number(number));
  const first = numbers.reduce((most, number) => Math.max(most, number), BLOCK) + 1;
  const last = first + notes.length - 1;
  const blocks = Array.from({ length: Math.floor(last / BLOCK) }, (_, index) => index + 1).join(',');
  const layout = `<o:shapelayout v:ext="edit"><o:idmap v:ext="edit" data="${blocks}"/></o:shapelayout>`;
  const kind = xml.includes(`id="${KIND}"`) ? '' : KIND_MARKUP;
  const shapes = notes.map((note, index) => shape(note, first + index)).join('');
  const added = (drawing === null ? layout : '') + kind + shapes;
  // A drawing of another writer may call the namespaces something else.
  const known = NAMESPACES.split(' ').every((each) => xml.slice(0, xml.indexOf('>')).includes(each));
  const declared = known ? added : added.replace(/<(v:shape(?:type)?)(?=\s)/g, `<$1 ${NAMESPACES}`);
  const at = xml.lastIndexOf('</');
  return xml.slice(0, at) + declared + xml.slice(at);
}
