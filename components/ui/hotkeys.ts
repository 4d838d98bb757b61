'use client';

import { useEffect, useEffectEvent, useSyncExternalStore } from 'react';

export interface Hotkey {
  /** As the keyboard reports it: j, ?, Escape. */
  key: string;
  /** What it does, for the list of keys: "Next finding". */
  does: string;
  /** Holding the key goes on; without it a held key acts once. */
  repeats?: boolean;
  run: (event: KeyboardEvent) => void;
}
export interface HotkeyGroup {
  title: string;
  keys: readonly Hotkey[];
}

const SWITCH = 'plumbrow-keys';
/** Where a key is text, a choice, or meant for what lies on top of the page. */
const BUSY =
  'input:not([type="radio"], [type="checkbox"]), textarea, select, [contenteditable="true"], [role="menu"], [role="listbox"], [role="dialog"]';
const groups = new Map<object, HotkeyGroup>();
const listeners = new Set<() => void>();
let listed: readonly HotkeyGroup[] = [];

/** Binds single keys while the component is on the page, and lists them under `?`. */
export function useHotkeys(title: string, keys: readonly Hotkey[], enabled = true): void {
  const onKey = useEffectEvent((event: KeyboardEvent) => {
    if (!mayAct(event)) return;
    const found = keys.find(({ key }) => key === event.key);
    if (!found || (event.repeat && !found.repeats)) return;
    event.preventDefault();
    found.run(event);
  });
  const signature = keys.map(({ key, does }) => `${key} ${does}`).join('\n');
  const onList = useEffectEvent(() => ({ title, keys }));

  useEffect(() => {
    if (!enabled) return;
    const owner = {};
    groups.set(owner, onList());
    publish();
    document.addEventListener('keydown', onKey);
    return () => {
      groups.delete(owner);
      publish();
      document.removeEventListener('keydown', onKey);
    };
  }, [enabled, title, signature]);
}

export function useHotkeyGroups(): readonly HotkeyGroup[] {
  return useSyncExternalStore(
    subscribe,
    () => listed,
    () => NONE,
  );
}

/** Single-key shortcuts can be switched off (WCAG 2.2, 2.1.4). */
export function useHotkeysOn(): [boolean, (on: boolean) => void] {
  const on = useSyncExternalStore(subscribe, hotkeysOn, () => true);
  return [
    on,
    (next) => {
      window.localStorage.setItem(SWITCH, next ? 'on' : 'off');
      publish();
    },
  ];
}

function hotkeysOn(): boolean {
  return window.localStorage.getItem(SWITCH) !== 'off';
}

/** Not while typing, choosing or in a dialog; not with a modifier, which belongs to the browser. */
function mayAct(event: KeyboardEvent): boolean {
  if (
    event.isComposing ||
    event.defaultPrevented ||
    event.ctrlKey ||
    event.metaKey ||
    event.altKey ||
    !hotkeysOn()
  )
    return false;
  const target = event.target instanceof Element ? event.target : document.body;
  if (target.closest(BUSY)) return false;
  return document.querySelector('[data-hotkeys="held"]') === null;
}

const NONE: readonly HotkeyGroup[] = [];

function publish() {
  listed = [...groups.values()];
  for (const listener of listeners) listener();
}

function subscribe(listener: () => void) {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
