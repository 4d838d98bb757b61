import { describe, expect, it } from 'vitest';
import { uploadForm } from '@/lib/client/intake';

const file = new File(['ID,m\nA,3\n'], 'list.csv', { type: 'text/csv' });

describe('uploadForm', () => {
  it('leaves to the server what was not settled', () => {
    const form = uploadForm(file);
    expect(form.get('again')).toBe('false');
    expect([...form.keys()]).toEqual(['again', 'file']);
  });

  it('names each sheet, the columns as JSON, and the header row', () => {
    const form = uploadForm(file, {
      sheets: ['One', 'Two'],
      columns: { id: 0, likely: 2 },
      headerRow: 0,
      again: true,
    });
    expect(form.getAll('sheet')).toEqual(['One', 'Two']);
    expect(form.get('columns')).toBe('{"id":0,"likely":2}');
    expect(form.get('headerRow')).toBe('0');
    expect(form.get('again')).toBe('true');
    expect((form.get('file') as File).name).toBe('list.csv');
  });
});
