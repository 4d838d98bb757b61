import { describe, expect, it } from 'vitest';
import { initials } from '@/components/shell/account-menu';
import { parseTheme } from '@/components/shell/theme';

describe('initials', () => {
  it('takes the first and the last name', () => {
    expect(initials('Ines Vandermeer')).toBe('IV');
    expect(initials('  Piet van den Berg ')).toBe('PB');
    expect(initials('Olu')).toBe('O');
    expect(initials('')).toBe('');
  });
});

describe('parseTheme', () => {
  it('follows the system unless one of two is chosen', () => {
    expect(['light', 'dark', 'system', 'blue', undefined].map(parseTheme)).toEqual([
      'light',
      'dark',
      'system',
      'system',
      'system',
    ]);
  });
});
