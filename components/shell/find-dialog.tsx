'use client';

import { Search } from 'lucide-react';
import { useRouter } from 'next/navigation';
import { useId, useState, type KeyboardEvent } from 'react';
import { classes } from '@/components/ui/classes';
import { Dialog } from '@/components/ui/dialog';
import { Input } from '@/components/ui/field';
import { Kbd } from '@/components/ui/kbd';
import { findTargets, type Target } from './finder';
import { useTargets } from './use-targets';

const WHAT = 'Find a project, an activity, a rule';

export function FindButton({ onOpen }: { onOpen: () => void }) {
  return (
    <button
      type="button"
      onClick={onOpen}
      aria-keyshortcuts="f"
      className="flex h-8 min-w-8 items-center justify-center gap-2 rounded border border-slate px-2 text-slate hover:border-ink hover:text-ink lg:min-w-68 lg:justify-between"
    >
      <span className="max-lg:sr-only">{WHAT}</span>
      <Search aria-hidden="true" size={16} className="lg:hidden" />
      <span aria-hidden="true" className="max-lg:hidden">
        <Kbd>f</Kbd>
      </span>
    </button>
  );
}

/** A name is typed, arrow keys choose among what bears it, Enter goes there. */
export function FindDialog({ onClose }: { onClose: () => void }) {
  const router = useRouter();
  const { targets, pending } = useTargets();
  const [query, setQuery] = useState('');
  const [at, setAt] = useState(0);
  const list = useId();
  const found = findTargets(targets, query);
  const chosen = found[Math.min(at, found.length - 1)];
  const go = (target: Target) => {
    onClose();
    router.push(target.href);
  };
  const onKey = (event: KeyboardEvent) => {
    const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
    if (step !== 0 && found.length > 0) {
      event.preventDefault();
      setAt((Math.min(at, found.length - 1) + step + found.length) % found.length);
    } else if (event.key === 'Enter' && chosen) {
      event.preventDefault();
      go(chosen);
    }
  };
  return (
    <Dialog
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      title="Find"
    >
      <Input
        role="combobox"
        aria-label={WHAT}
        aria-expanded={found.length > 0}
        aria-controls={list}
        aria-autocomplete="list"
        aria-activedescendant={chosen ? `${list}-${String(found.indexOf(chosen))}` : undefined}
        autoComplete="off"
        spellCheck={false}
        value={query}
        onKeyDown={onKey}
        onChange={(event) => {
          setQuery(event.target.value);
          setAt(0);
        }}
      />
      <p role="status" className="mt-2 min-h-5 text-slate">
        {found.length === 0 && (pending ? 'Looking …' : `Nothing here is called “${query.trim()}”.`)}
      </p>
      <ul id={list} role="listbox" aria-label="Found" className="max-h-96 overflow-auto">
        {found.map((target, index) => (
          <Row
            key={target.kind + target.key}
            id={`${list}-${String(index)}`}
            target={target}
            chosen={target === chosen}
            onPoint={() => setAt(index)}
            onChoose={() => go(target)}
          />
        ))}
      </ul>
    </Dialog>
  );
}

interface RowProps {
  id: string;
  target: Target;
  chosen: boolean;
  onPoint: () => void;
  onChoose: () => void;
}

function Row({ id, target, chosen, onPoint, onChoose }: RowProps) {
  return (
    <li
      id={id}
      role="option"
      aria-selected={chosen}
      onPointerMove={onPoint}
      onClick={onChoose}
      className={classes(
        'flex min-h-8 cursor-pointer items-baseline gap-2 px-3 py-1',
        chosen && 'bg-tint shadow-[inset_3px_0_var(--cord)]',
      )}
    >
      <span className="min-w-0 flex-1">
        {target.label || target.code}
        {target.code !== '' && target.label !== '' && <span className="text-slate"> · {target.code}</span>}
      </span>
      <span className="text-slate">{target.kind}</span>
    </li>
  );
}
