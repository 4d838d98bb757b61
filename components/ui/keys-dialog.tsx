'use client';

import { Dialog } from './dialog';
import { useHotkeyGroups, useHotkeysOn } from './hotkeys';
import { Kbd } from './kbd';

/** The list of keys that work on this page, under `?`. */
export function KeysDialog({ open, onOpenChange }: { open: boolean; onOpenChange: (open: boolean) => void }) {
  const groups = useHotkeyGroups();
  const [on, setOn] = useHotkeysOn();
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title="Keys on this page">
      {groups.map(({ title, keys }) => (
        <section key={title} className="mb-4">
          <h3 className="mb-1 font-semibold">{title}</h3>
          <dl className="grid grid-cols-[64px_1fr] gap-y-1">
            {keys.map(({ key, does }) => (
              <div key={key} className="contents">
                <dt>
                  <Kbd>{key}</Kbd>
                </dt>
                <dd>{does}</dd>
              </div>
            ))}
          </dl>
        </section>
      ))}
      <label className="flex items-start gap-2 border-t border-hair pt-3">
        <input
          type="checkbox"
          checked={on}
          onChange={(event) => setOn(event.target.checked)}
          className="mt-1 accent-cord"
        />
        <span>
          Single keys act on the page. Switch this off if you speak your input, or press keys by accident.
        </span>
      </label>
    </Dialog>
  );
}
