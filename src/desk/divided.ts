import { readDiagram } from '../species/diagram.ts';
import { type ReadingOptions } from '../species/read.ts';
import type { CellFields } from './schema/ask.ts';

/** True where something keeps the electrolytes apart: a separator, the bridge of a diagram. null: the ask does not say. */
export const dividedOf = (cell: CellFields, options: ReadingOptions): boolean | null => {
  if (!('diagram' in cell)) return cell.separator ?? null;
  const diagram = readDiagram(cell.diagram, options);
  return diagram.ok ? diagram.value.bridge : null;
};
