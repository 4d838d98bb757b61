'use client';

import { useState } from 'react';
import { Button } from './button';

/** Copies a text; where the browser does not allow it, says how to do it by hand. */
export function CopyButton({ text, children }: { text: string; children: string }) {
  const [outcome, setOutcome] = useState<'copied' | 'refused' | null>(null);
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(text);
      setOutcome('copied');
    } catch {
      // No permission, or no secure context: the text stands beside the button and can be selected.
      setOutcome('refused');
    }
  };
  return (
    <span className="inline-flex flex-wrap items-center gap-2">
      <Button variant="ghost" onClick={() => void copy()}>
        {children}
      </Button>
      <span role="status" className="text-slate">
        {outcome === 'copied' && 'Copied.'}
        {outcome === 'refused' && 'The browser did not allow it. Select the text and copy it by hand.'}
      </span>
    </span>
  );
}
