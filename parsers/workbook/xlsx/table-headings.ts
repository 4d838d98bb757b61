import type { ChangedCell } from '../types';
import { parseArea } from './areas';
import type { EditablePackage } from './package';
import { isOfType, readXml, relationsOf, requireRoot, writeXml } from './parts';
import { attribute, child, children, prefixOf, splice, withAttribute } from './xml';

/**
 * The heading of a table stands in its cell and, once more, in the table's own part (ECMA-376 part 1,
 * 18.5.1.3): where the cell is corrected, the part has to say the same.
 */
export function renameTableColumns(
  pack: EditablePackage,
  sheet: string,
  cells: readonly ChangedCell[],
): void {
  for (const { target } of relationsOf(pack, sheet).filter((relation) => isOfType(relation, 'table'))) {
    const xml = readXml(pack, target);
    if (xml) renameIn(pack, target, xml, cells);
  }
}

function renameIn(pack: EditablePackage, part: string, xml: string, cells: readonly ChangedCell[]): void {
  const root = requireRoot(xml, part);
  const tag = xml.slice(root.start, root.inner);
  const area = parseArea(attribute(tag, 'ref') ?? '');
  const list = child(xml, root, `${prefixOf(root.name)}tableColumns`);
  if (!area || !list || attribute(tag, 'headerRowCount') === '0') return;
  const columns = [...children(xml, list)];
  const splices = cells.flatMap(({ row, column, to }) => {
    const element = row === area.top && column <= area.right ? columns[column - area.left] : undefined;
    if (!element || to === null) return [];
    const { start, inner } = element;
    return [{ start, end: inner, text: withAttribute(xml.slice(start, inner), 'name', String(to)) }];
  });
  if (splices.length > 0) writeXml(pack, part, splice(xml, splices));
}
