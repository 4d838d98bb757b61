import type { Form, UploadedFile } from '@/lib/contract/transfer';
import { Malformed, TooLarge, UnsupportedMedia } from '@/lib/contract/errors';
import { limitedBody, MEGABYTE } from './limited';

export const FILE_LIMIT = 20 * MEGABYTE;
const JSON_LIMIT = 12 * MEGABYTE;
/** What the form may hold around the file. */
const FORM_SLACK = MEGABYTE;
const FILE_SENTENCE = 'The file is larger than 20 MB, so it was not taken.';

/** JSON of a request; null where it has no body. */
export async function readJson(request: Request): Promise<unknown> {
  const type = mediaType(request);
  const text = await new Response(
    limitedBody(request, JSON_LIMIT, 'The request is larger than 12 MB.'),
  ).text();
  if (text === '') return null;
  if (type !== 'application/json' && !type.endsWith('+json')) {
    throw new UnsupportedMedia('Send this as JSON, with the content type application/json.');
  }
  try {
    return JSON.parse(text);
  } catch (error) {
    throw new Malformed('The body is not JSON that can be read.', {
      errors: [{ path: '', message: error instanceof Error ? error.message : 'not JSON' }],
    });
  }
}

/** A multipart form with at most one file that counts. */
export async function readForm(request: Request): Promise<Form> {
  if (mediaType(request) !== 'multipart/form-data') {
    throw new UnsupportedMedia('Send the file as a form, with the content type multipart/form-data.');
  }
  const form = await parseForm(request);
  const fields: Record<string, string[]> = {};
  let file: UploadedFile | null = null;
  for (const [name, value] of form) {
    if (typeof value === 'string') (fields[name] ??= []).push(value);
    else if (name === 'file' && !file) file = await toFile(value);
  }
  return { file, fields };
}

async function parseForm(request: Request): Promise<FormData> {
  const body = limitedBody(request, FILE_LIMIT + FORM_SLACK, FILE_SENTENCE);
  const headers = { 'content-type': request.headers.get('content-type') ?? '' };
  try {
    return await new Response(body, { headers }).formData();
  } catch (error) {
    const cause = error instanceof Error && error.cause instanceof TooLarge ? error.cause : error;
    if (cause instanceof TooLarge) throw cause;
    throw new Malformed('The form that carries the file cannot be read.');
  }
}

async function toFile(value: File): Promise<UploadedFile> {
  if (value.size > FILE_LIMIT) throw new TooLarge(FILE_SENTENCE);
  return { name: value.name, bytes: new Uint8Array(await value.arrayBuffer()) };
}

function mediaType(request: Request): string {
  return (request.headers.get('content-type') ?? '').split(';', 1)[0]?.trim().toLowerCase() ?? '';
}
