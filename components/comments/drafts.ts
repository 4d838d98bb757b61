'use client';

import { useState } from 'react';

/** Texts begun and not sent, by what they are about: moving to another finding and back loses nothing. */
const drafts = new Map<string, string>();

export interface Draft {
  readonly text: string;
  readonly write: (text: string) => void;
  /** It has gone out: forgets it, unless something else was typed while it went. */
  readonly sent: (text: string) => void;
}

export function useDraft(about: string): Draft {
  const [, redraw] = useState(0);
  const write = (text: string) => {
    if (text === '') drafts.delete(about);
    else drafts.set(about, text);
    redraw((count) => count + 1);
  };
  return {
    text: drafts.get(about) ?? '',
    write,
    sent: (text) => {
      if (drafts.get(about) === text) write('');
    },
  };
}
