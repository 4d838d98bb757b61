'use client';

import { useState } from 'react';

const NOTHING: ReadonlyMap<string, string> = new Map();
/** By finding, what is typed into its cells and not written yet: looking elsewhere loses nothing. */
const drafts = new Map<string, ReadonlyMap<string, string>>();

export function useHandDraft(finding: string) {
  const [, redraw] = useState(0);
  const keep = (draft: ReadonlyMap<string, string>) => {
    if (draft.size === 0) drafts.delete(finding);
    else drafts.set(finding, draft);
    redraw((count) => count + 1);
  };
  const typed = drafts.get(finding) ?? NOTHING;
  return {
    typed,
    type: (cell: string, text: string) => keep(new Map(typed).set(cell, text)),
    clear: () => keep(NOTHING),
  };
}
