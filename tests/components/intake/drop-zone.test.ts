import type { FileRejection } from 'react-dropzone';
import { describe, expect, it } from 'vitest';
import { refusal } from '@/components/intake/drop-zone';

const rejected = (code: string, size = 3): FileRejection => ({
  file: Object.assign(new File([new Uint8Array(size)], 'list.xlsx'), {
    path: './list.xlsx',
    relativePath: './list.xlsx',
  }),
  errors: [{ code, message: code }],
});

describe('refusal', () => {
  it('says how large the file is, and how large it may be', () => {
    expect(refusal([rejected('file-too-large', 21_500_000)])).toMatch(
      /“list\.xlsx” is 21\.5\sMB; at most 20\sMB/,
    );
  });

  it('takes one file at a time', () => {
    expect(refusal([rejected('too-many-files'), rejected('too-many-files')])).toMatch(/one file at a time/);
  });

  it('has a sentence for anything else', () => {
    expect(refusal([rejected('file-invalid-type')])).toMatch(/could not be taken in/);
  });
});
