'use client';

import { X } from 'lucide-react';
import Link from 'next/link';
import { useSyncExternalStore } from 'react';

/** How a list was read when it went straight through, kept in this browser tab by submission. */
interface Note {
  sentence: string;
  project: string;
}

const listeners = new Set<() => void>();
const keyOf = (submission: string) => `plumbrow-read:${submission}`;

export function noteReading(submission: string, note: Note): void {
  window.sessionStorage.setItem(keyOf(submission), JSON.stringify(note));
}

/** A line over the findings of what has just been handed in: how the columns were read, and how to change that. */
export function ReadNote({ office, submission }: { office: string; submission: string }) {
  const text = useSyncExternalStore(
    subscribe,
    () => window.sessionStorage.getItem(keyOf(submission)),
    () => null,
  );
  const note = parse(text);
  if (!note) return null;
  const dismiss = () => {
    window.sessionStorage.removeItem(keyOf(submission));
    for (const listener of listeners) listener();
  };
  return (
    <div
      role="status"
      className="mb-4 flex items-start gap-3 border border-l-4 border-hair border-l-cord bg-leaf p-3"
    >
      <p className="min-w-0 flex-1">
        The columns were clear, so the list was read at once. {note.sentence}{' '}
        <Link href={`/${office}/projects/${note.project}/intake?again=1`}>Read it with other columns</Link>;
        that makes the next revision.
      </p>
      <button
        type="button"
        aria-label="Close this note"
        onClick={dismiss}
        className="rounded p-1 text-slate hover:text-ink"
      >
        <X aria-hidden="true" size={16} />
      </button>
    </div>
  );
}

function parse(text: string | null): Note | null {
  if (text === null) return null;
  const value: unknown = JSON.parse(text);
  const record = typeof value === 'object' && value !== null ? (value as Record<string, unknown>) : {};
  return typeof record.sentence === 'string' && typeof record.project === 'string'
    ? { sentence: record.sentence, project: record.project }
    : null;
}

function subscribe(listener: () => void) {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
