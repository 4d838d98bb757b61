import { z } from 'zod';
import type {
  ZodOpenApiOperationObject,
  ZodOpenApiRequestBodyObject,
  ZodOpenApiResponsesObject,
} from 'zod-openapi';
import { problem, uuid } from '@/lib/contract/shared';

export const METHODS = ['get', 'post', 'patch', 'delete'] as const;
export type Method = (typeof METHODS)[number];

/** One call of the HTTP surface, told in its shapes. */
export interface Operation {
  readonly id: string;
  readonly method: Method;
  readonly path: string;
  readonly tag: string;
  readonly summary: string;
  readonly query?: z.ZodObject;
  readonly body?: z.ZodType;
  /** A form with a file, in place of JSON. */
  readonly form?: z.ZodObject;
  readonly status?: 200 | 201 | 204;
  /** JSON, unless a media type is named. */
  readonly answer?: z.ZodType | { readonly mediaType: string; readonly about: string };
  /** Problems beside those every call of its kind can have: status → when. */
  readonly problems?: Readonly<Record<number, string>>;
  /** True where no identity is asked for. */
  readonly open?: boolean;
}

export function describe(operation: Operation): ZodOpenApiOperationObject {
  const params = pathParameters(operation.path);
  const body = requestBody(operation);
  return {
    operationId: operation.id,
    tags: [operation.tag],
    summary: operation.summary,
    ...(operation.open ? { security: [] } : {}),
    requestParams: {
      ...(params ? { path: params } : {}),
      ...(operation.query ? { query: operation.query } : {}),
    },
    ...(body ? { requestBody: body } : {}),
    responses: responses(operation),
  };
}

/** `{office}` is a slug, `{token}` a secret; every other parameter is an id. */
function pathParameters(path: string): z.ZodObject | null {
  const names = [...path.matchAll(/\{(\w+)\}/g)].map((match) => match[1] ?? '');
  if (names.length === 0) return null;
  const shapeOf = (name: string) => (name === 'office' || name === 'token' ? z.string() : uuid);
  return z.object(Object.fromEntries(names.map((name) => [name, shapeOf(name)])));
}

function requestBody({ body, form }: Operation): ZodOpenApiRequestBodyObject | null {
  if (body) return { required: true, content: { 'application/json': { schema: body } } };
  if (form) return { required: true, content: { 'multipart/form-data': { schema: form } } };
  return null;
}

function responses(operation: Operation): ZodOpenApiResponsesObject {
  const answers: Record<string, ZodOpenApiResponsesObject[`${1 | 2 | 3 | 4 | 5}${string}`]> = {
    [String(operation.status ?? 200)]: success(operation),
  };
  const special = Object.entries(operation.problems ?? {}).map(
    ([status, when]) => [Number(status), when] as const,
  );
  for (const [status, when] of [...usualProblems(operation), ...special]) {
    answers[String(status)] = {
      description: when,
      content: { 'application/problem+json': { schema: problem } },
    };
  }
  return answers as ZodOpenApiResponsesObject;
}

function success({ answer }: Operation) {
  if (!answer) return { description: 'Done.' };
  if (answer instanceof z.ZodType)
    return { description: 'As asked.', content: { 'application/json': { schema: answer } } };
  return {
    description: answer.about,
    content: { [answer.mediaType]: { schema: { type: 'string' as const } } },
  };
}

function usualProblems({ method, path, query, body, form, open }: Operation): [number, string][] {
  const list: [number, string][] = [[500, 'Unexpected; the id to quote is in it.']];
  if (body || form) {
    list.push([400, 'The body cannot be read.'], [413, 'It is too large.']);
    list.push([415, 'It is of another content type.']);
  }
  if (query || body || form) list.push([422, 'A field is not as it must be; `errors` names it.']);
  if (path.includes('{')) list.push([404, 'There is no such thing, or it is not yours to see.']);
  if (!open) list.push([401, 'No session, or a token that is unknown, expired or revoked.']);
  if (method !== 'get' || path.includes('{office}')) {
    list.push([403, 'The role may not, the token may only read, or another site sent it.']);
  }
  return list;
}
