import { describe, expect, it } from 'vitest';
import { keyOf, SHORTCUTS, shortcutFor, type KeyPress } from '@/components/findings/keys';

const press = (key: string, given: Partial<KeyPress> = {}): KeyPress => ({
  key,
  ctrlKey: false,
  metaKey: false,
  altKey: false,
  isComposing: false,
  defaultPrevented: false,
  repeat: false,
  ...given,
});
const onPage = { typing: false, elsewhere: false };

describe('the keys of the findings page', () => {
  it('give each action its key, and no key two actions', () => {
    for (const { key, action } of SHORTCUTS) expect(shortcutFor(press(key), onPage)).toBe(action);
    expect(new Set(SHORTCUTS.map(({ key }) => key)).size).toBe(SHORTCUTS.length);
    expect(keyOf('adopt')).toBe('a');
  });

  it('work with the capital lock on', () => {
    expect(shortcutFor(press('A'), onPage)).toBe('adopt');
  });

  it('do nothing while someone types, or in another dialog', () => {
    expect(shortcutFor(press('a'), { typing: true, elsewhere: false })).toBeNull();
    expect(shortcutFor(press('a'), { typing: false, elsewhere: true })).toBeNull();
    expect(shortcutFor(press('a', { isComposing: true }), onPage)).toBeNull();
  });

  it('leave the browser its own keys', () => {
    expect(shortcutFor(press('c', { ctrlKey: true }), onPage)).toBeNull();
    expect(shortcutFor(press('z', { metaKey: true }), onPage)).toBeNull();
    expect(shortcutFor(press('d', { altKey: true }), onPage)).toBeNull();
    expect(shortcutFor(press('j', { defaultPrevented: true }), onPage)).toBeNull();
    expect(shortcutFor(press('q'), onPage)).toBeNull();
  });

  it('repeat only what moves: a held key never adopts twice', () => {
    expect(shortcutFor(press('j', { repeat: true }), onPage)).toBe('next');
    expect(shortcutFor(press('a', { repeat: true }), onPage)).toBeNull();
    expect(shortcutFor(press('z', { repeat: true }), onPage)).toBeNull();
  });
});
