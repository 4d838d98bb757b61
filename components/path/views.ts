/** How the path can be seen. */
export const VIEWS = { drawn: 'Drawn', table: 'Table' } as const;
export type View = keyof typeof VIEWS;
