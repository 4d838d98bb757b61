'use client';

import { useState } from 'react';

/** Texts begun and not sent, by what they are about: moving to another finding and back loses nothing. */
const drafts = new Map<string, string>();

export function useDraft(about: string): [string, (text: string) => void] {
  const [, redraw] = useState(0);
  return [
    drafts.get(about) ?? '',
    (text) => {
      if (text === '') drafts.delete(about);
      else drafts.set(about, text);
      redraw((count) => count + 1);
    },
  ];
}
