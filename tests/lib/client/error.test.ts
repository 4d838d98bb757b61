import { describe, expect, it } from 'vitest';
import { ClientError, sentenceOf, toClientError, unreachable } from '@/lib/client/error';

describe('toClientError', () => {
  it('reads a problem document', () => {
    const error = toClientError(
      422,
      JSON.stringify({
        type: 'about:blank',
        title: 'Something in it is not right',
        status: 422,
        detail: 'Two fields are not as they must be.',
        errors: [
          { path: 'code', message: 'Give the project a code.' },
          { path: 'code', message: 'Use at most 40 characters.' },
          { path: 'start', message: 'Write a date as 2027-03-12.' },
        ],
        sheets: [],
      }),
    );
    expect(error).toBeInstanceOf(ClientError);
    expect(error.status).toBe(422);
    expect(error.message).toBe('Two fields are not as they must be.');
    expect(error.fieldErrors).toEqual({
      code: 'Give the project a code.',
      start: 'Write a date as 2027-03-12.',
    });
    expect(error.body.sheets).toEqual([]);
  });

  it('has a plain sentence for an answer that is no problem document', () => {
    expect(toClientError(502, '<html>Bad gateway</html>').message).toMatch(/server failed/);
    expect(toClientError(404, '').message).toMatch(/nothing here/);
    expect(toClientError(409, '[]').message).toMatch(/someone else/i);
  });

  it('drops field errors of another shape', () => {
    const error = toClientError(
      400,
      JSON.stringify({ title: 'No', errors: ['x', { path: 'a' }, { path: 'b', message: 'c' }] }),
    );
    expect(error.problem.errors).toEqual([{ path: 'b', message: 'c' }]);
  });
});

describe('sentenceOf', () => {
  it('speaks to people about an ended session, not to programs', () => {
    const error = toClientError(401, JSON.stringify({ title: 'Not signed in', detail: 'Send a token.' }));
    expect(sentenceOf(error)).toMatch(/signed out/);
  });

  it('shows the server’s sentence, and never the inside of a program error', () => {
    expect(sentenceOf(unreachable())).toMatch(/could not be reached/);
    expect(sentenceOf(new TypeError('x is undefined'))).not.toMatch(/undefined/);
  });
});
