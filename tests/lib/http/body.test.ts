import { describe, expect, it } from 'vitest';
import { FILE_LIMIT, readForm, readJson } from '@/lib/http/body';

function formRequest(form: FormData): Request {
  return new Request('http://x.test/', { method: 'POST', body: form });
}

function streamed(length: number, chunk: number, headers: Record<string, string>): Request {
  let left = length;
  const body = new ReadableStream<Uint8Array>({
    pull(controller) {
      controller.enqueue(new Uint8Array(Math.min(chunk, left)));
      left -= chunk;
      if (left <= 0) controller.close();
    },
  });
  return new Request('http://x.test/', { method: 'POST', body, headers, duplex: 'half' } as RequestInit);
}

describe('a form', () => {
  it('gives the file, and every value of a field that is repeated', async () => {
    const form = new FormData();
    form.append('sheet', 'Bau 1');
    form.append('sheet', 'Bau 2');
    form.append('file', new File(['ä;b'], 'Süd – 計画.csv'));
    const { file, fields } = await readForm(formRequest(form));
    expect(file?.name).toBe('Süd – 計画.csv');
    expect(new TextDecoder().decode(file?.bytes)).toBe('ä;b');
    expect(fields).toEqual({ sheet: ['Bau 1', 'Bau 2'] });
  });

  it('takes a file of exactly the limit, and refuses a byte more', async () => {
    const sized = (size: number) => {
      const form = new FormData();
      form.append('file', new File([new Uint8Array(size)], 'x.csv'));
      return readForm(formRequest(form));
    };
    expect((await sized(FILE_LIMIT)).file?.bytes.byteLength).toBe(FILE_LIMIT);
    await expect(sized(FILE_LIMIT + 1)).rejects.toMatchObject({ status: 413 });
  });

  it('is refused by its announced length before it is read', async () => {
    const request = streamed(10, 10, {
      'content-type': 'multipart/form-data; boundary=x',
      'content-length': '99999999',
    });
    await expect(readForm(request)).rejects.toMatchObject({ status: 413 });
    expect(request.bodyUsed).toBe(false);
  });

  it('breaks off while it streams in, where nothing was announced', async () => {
    const request = streamed(60 * 1024 * 1024, 1024 * 1024, {
      'content-type': 'multipart/form-data; boundary=x',
    });
    await expect(readForm(request)).rejects.toMatchObject({ status: 413 });
  });

  it('that cannot be read is 400, and anything else than a form 415', async () => {
    const broken = streamed(10, 10, { 'content-type': 'multipart/form-data; boundary=x' });
    await expect(readForm(broken)).rejects.toMatchObject({ status: 400 });
    await expect(readForm(streamed(10, 10, { 'content-type': 'text/csv' }))).rejects.toMatchObject({
      status: 415,
    });
  });

  it('without a file says so by null', async () => {
    const form = new FormData();
    form.append('file', 'only a text');
    expect(await readForm(formRequest(form))).toEqual({ file: null, fields: { file: ['only a text'] } });
  });
});

describe('JSON', () => {
  it('is refused over the limit', async () => {
    const request = streamed(13 * 1024 * 1024, 1024 * 1024, { 'content-type': 'application/json' });
    await expect(readJson(request)).rejects.toMatchObject({ status: 413 });
  });
});
