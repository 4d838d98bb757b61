/** The keys of the findings page. One table: the handler, the list under `?` and the hints on buttons read it. */
export const SHORTCUTS = [
  { key: 'j', action: 'next', label: 'Next finding' },
  { key: 'k', action: 'previous', label: 'Previous finding' },
  { key: 'a', action: 'adopt', label: 'Adopt the chosen fix' },
  { key: 'd', action: 'decline', label: 'Decline the fix, or propose it again' },
  { key: 'e', action: 'edit', label: 'Edit the cell by hand' },
  { key: 'c', action: 'comment', label: 'Write a comment' },
  { key: 'z', action: 'undo', label: 'Undo the last step' },
  { key: '/', action: 'search', label: 'Search the findings' },
  { key: '?', action: 'help', label: 'Show this list of keys' },
] as const;

export type ShortcutAction = (typeof SHORTCUTS)[number]['action'];

/** What of a keyboard event decides; a real KeyboardEvent fits. */
export interface KeyPress {
  readonly key: string;
  readonly ctrlKey: boolean;
  readonly metaKey: boolean;
  readonly altKey: boolean;
  readonly isComposing: boolean;
  readonly defaultPrevented: boolean;
  readonly repeat: boolean;
}

/** Where the focus is when the key goes down. */
export interface FocusPlace {
  /** In a field that takes text, or in a list that jumps to what is typed. */
  readonly typing: boolean;
  /** Inside a dialog or menu that is not part of the findings page's own work surface. */
  readonly elsewhere: boolean;
}

/** Moving may repeat while the key is held; nothing that writes may. */
const REPEATS: ReadonlySet<ShortcutAction> = new Set(['next', 'previous']);

export function shortcutFor(press: KeyPress, focus: FocusPlace): ShortcutAction | null {
  if (press.ctrlKey || press.metaKey || press.altKey || press.isComposing || press.defaultPrevented)
    return null;
  if (focus.typing || focus.elsewhere) return null;
  const found = SHORTCUTS.find((shortcut) => shortcut.key === press.key.toLowerCase());
  if (!found || (press.repeat && !REPEATS.has(found.action))) return null;
  return found.action;
}

export function keyOf(action: ShortcutAction): string {
  return SHORTCUTS.find((shortcut) => shortcut.action === action)?.key ?? '';
}
