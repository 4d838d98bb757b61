import type { Problem } from '@/lib/contract/shared';

/** A refusal of the HTTP surface, or a connection that failed (status 0). */
export class ClientError extends Error {
  override readonly name = 'ClientError';

  constructor(
    readonly status: number,
    readonly problem: Problem,
    /** The whole problem document: it may carry more than RFC 9457's members. */
    readonly body: Readonly<Record<string, unknown>> = {},
  ) {
    super(problem.detail ?? problem.title);
  }

  /** The first message for each field at fault, by its path. */
  get fieldErrors(): Record<string, string> {
    const byPath: Record<string, string> = {};
    for (const { path, message } of this.problem.errors ?? []) byPath[path] ??= message;
    return byPath;
  }
}

/** Makes a ClientError of an answer's body, whatever it turns out to be. */
export function toClientError(status: number, text: string): ClientError {
  const body = parseObject(text);
  const errors = Array.isArray(body.errors) ? body.errors.filter(isFieldError) : undefined;
  const problem: Problem = {
    type: typeof body.type === 'string' ? body.type : 'about:blank',
    title: typeof body.title === 'string' ? body.title : titleOf(status),
    status,
    ...(typeof body.detail === 'string' ? { detail: body.detail } : {}),
    ...(errors ? { errors } : {}),
  };
  return new ClientError(status, problem, body);
}

/** When no answer came at all. */
export function unreachable(): ClientError {
  return new ClientError(0, {
    type: 'about:blank',
    title: 'The server could not be reached. Nothing was changed; try again when the connection is back.',
    status: 0,
  });
}

/** A plain sentence for whatever was thrown. */
export function sentenceOf(error: unknown): string {
  // The server's sentence for this is for programs, which have no sign-in page.
  if (error instanceof ClientError && error.status === 401) return titleOf(401);
  if (error instanceof ClientError) return error.message;
  return 'Something went wrong on this page. Reload it and try again.';
}

function titleOf(status: number): string {
  if (status === 401) return 'You are signed out. Sign in again to go on.';
  if (status === 403) return 'Your role in this office does not allow that.';
  if (status === 404) return 'There is nothing here, or it is not yours to see.';
  if (status === 409) return 'Someone else changed this first. Look at what is there now, and try again.';
  if (status === 413) return 'The file is too large.';
  if (status >= 500) return 'The server failed on this. Nothing was changed; try again in a moment.';
  return 'The request was refused.';
}

function parseObject(text: string): Record<string, unknown> {
  try {
    const value: unknown = JSON.parse(text);
    return isRecord(value) ? value : {};
  } catch {
    // A proxy's HTML page, or nothing: the status alone says what happened.
    return {};
  }
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function isFieldError(value: unknown): value is { path: string; message: string } {
  return isRecord(value) && typeof value.path === 'string' && typeof value.message === 'string';
}
