'use client';

import { X } from 'lucide-react';
import { Toast as Radix } from 'radix-ui';
import { useSyncExternalStore, type ReactNode } from 'react';
import { classes } from './classes';

export interface ToastMessage {
  text: string;
  tone?: 'plain' | 'trouble';
  /** One thing that can be done about it, such as undoing it. */
  action?: { label: string; run: () => void };
}
type Entry = ToastMessage & { id: number };

let entries: readonly Entry[] = [];
let lastId = 0;
const listeners = new Set<() => void>();

function change(next: readonly Entry[]) {
  entries = next;
  for (const listener of listeners) listener();
}

/** Says in passing what was done. What must not be missed belongs on the page instead. */
export function toast(message: ToastMessage | string): void {
  const entry = typeof message === 'string' ? { text: message } : message;
  lastId += 1;
  change([...entries.slice(-2), { ...entry, id: lastId }]);
}

export function ToastProvider({ children }: { children: ReactNode }) {
  const shown = useSyncExternalStore(subscribe, () => entries, noEntries);
  return (
    <Radix.Provider label="Message" duration={8000} swipeDirection="right">
      {children}
      {shown.map((entry) => (
        <ToastView key={entry.id} entry={entry} />
      ))}
      <Radix.Viewport className="fixed right-4 bottom-4 z-50 flex w-96 max-w-[calc(100vw-32px)] flex-col gap-2 print:hidden" />
    </Radix.Provider>
  );
}

function ToastView({ entry }: { entry: Entry }) {
  return (
    <Radix.Root
      type={entry.tone === 'trouble' ? 'foreground' : 'background'}
      onOpenChange={(open) => {
        if (!open) change(entries.filter(({ id }) => id !== entry.id));
      }}
      className={classes(
        'flex items-start gap-3 border border-l-4 border-ink bg-leaf p-3 text-ink shadow-lift',
        entry.tone === 'trouble' ? 'border-l-umber' : 'border-l-cord',
      )}
    >
      <Radix.Description className="min-w-0 flex-1">{entry.text}</Radix.Description>
      {entry.action && (
        <Radix.Action
          altText={entry.action.label}
          onClick={entry.action.run}
          className="rounded px-1 font-semibold text-cord underline"
        >
          {entry.action.label}
        </Radix.Action>
      )}
      <Radix.Close aria-label="Close" className="rounded text-slate hover:text-ink">
        <X aria-hidden="true" size={16} />
      </Radix.Close>
    </Radix.Root>
  );
}

function subscribe(listener: () => void) {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

const NONE: readonly Entry[] = [];
function noEntries() {
  return NONE;
}
