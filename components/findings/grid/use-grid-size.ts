'use client';

import type { GridApi } from 'ag-grid-community';
import { useCallback, useEffect, useMemo, useState, type RefObject } from 'react';
import type { FindingView } from '@/lib/contract/submission';
import { shapeFor, type GridShape } from './context';
import { canvasMeasure, makeHeights, sameWidths, type ColumnWidths } from './heights';

const HEADER = 46;
/** Line height of the page's text in its own size. */
const LEADING = 1.45;

/** The face the cells are set in, as a canvas takes it, and its size; px. */
interface Face {
  readonly font: string;
  readonly size: number;
  /** Whether it has come yet: until then texts are measured in another. */
  readonly loaded: boolean;
}

/** Follows the room the grid has: its shape, the height of each row, and of all of them. */
export function useGridSize(
  frame: RefObject<HTMLDivElement | null>,
  api: GridApi<FindingView> | null,
  findings: readonly FindingView[],
) {
  const [shape, setShape] = useState<GridShape>('wide');
  const [widths, setWidths] = useState<ColumnWidths>({});
  const [face, setFace] = useState<Face>({ font: '14px sans-serif', size: 14, loaded: false });

  useEffect(() => {
    const element = frame.current;
    if (!element) return;
    const look = (loaded: boolean) => {
      setShape(shapeFor(element.clientWidth));
      setFace((known) => changedFace(known, element, loaded));
    };
    const observer = new ResizeObserver(() => look(false));
    observer.observe(element);
    void document.fonts.ready.then(() => look(true));
    return () => observer.disconnect();
  }, [frame]);

  const heightOf = useMemo(
    () => makeHeights(shape, widths, canvasMeasure(face.font), face.size * LEADING),
    [shape, widths, face],
  );
  useEffect(() => api?.resetRowHeights(), [api, heightOf, findings]);

  const readWidths = useCallback((grid: GridApi<FindingView>) => {
    setWidths((known) => sameWidths(known, widthsOf(grid)));
  }, []);
  const contentHeight = useMemo(
    () => findings.reduce((sum, finding) => sum + heightOf(finding), shape === 'cards' ? 2 : HEADER),
    [findings, heightOf, shape],
  );
  return { shape, heightOf, contentHeight, readWidths };
}

function changedFace(known: Face, element: HTMLElement, loaded: boolean): Face {
  const style = getComputedStyle(element);
  const size = Number.parseFloat(style.fontSize) || 14;
  const font = `${style.fontWeight} ${String(size)}px ${style.fontFamily}`;
  const now = { font, size, loaded: loaded || known.loaded };
  return known.font === now.font && known.loaded === now.loaded ? known : now;
}

function widthsOf(grid: GridApi<FindingView>): ColumnWidths {
  return Object.fromEntries(
    grid.getAllDisplayedColumns().map((column) => [column.getColId(), column.getActualWidth()]),
  );
}
