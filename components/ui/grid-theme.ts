import { createPart, createTheme } from 'ag-grid-community';

/** Lines as close as on the rest of the page, the text at the top of its cell, and the selected row's mark. */
const drawnRows = createPart({
  feature: 'drawnRows',
  css: `
    .ag-cell { line-height: 1.45; padding-block: 7px; overflow-wrap: anywhere; }
    .ag-header-cell-text { line-height: 1.25; }
    .ag-row-selected .ag-column-first { box-shadow: inset 3px 0 var(--cord); }
    .ag-cell.ag-cell-focus:focus-visible { outline: 2px solid var(--cord); outline-offset: -2px; border-color: transparent; }
    .ag-row { cursor: pointer; }
    .ag-body-vertical-scroll-viewport { background: transparent; }
  `,
});

/** The grid in our tokens: drawn rows, no stripes, no round corners; light and dark follow the variables. */
export const gridTheme = createTheme()
  .withPart(drawnRows)
  .withParams({
    fontFamily: 'inherit',
    fontSize: '0.875rem',
    foregroundColor: 'var(--ink)',
    backgroundColor: 'var(--leaf)',
    accentColor: 'var(--cord)',
    borderColor: 'var(--hair)',
    borderRadius: 0,
    wrapperBorder: false,
    wrapperBorderRadius: 0,
    cellHorizontalPadding: 10,
    cellTextColor: 'var(--ink)',
    headerBackgroundColor: 'var(--leaf)',
    headerTextColor: 'var(--slate)',
    headerFontWeight: 600,
    headerHeight: 36,
    headerRowBorder: { width: 1, style: 'solid', color: 'var(--ink)' },
    headerColumnBorder: false,
    headerColumnResizeHandleColor: 'transparent',
    columnBorder: false,
    rowBorder: { width: 1, style: 'solid', color: 'var(--hair)' },
    rowHoverColor: 'color-mix(in srgb, var(--tint) 55%, var(--leaf))',
    selectedRowBackgroundColor: 'var(--tint)',
    oddRowBackgroundColor: 'var(--leaf)',
  });
