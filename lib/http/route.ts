import { authenticate, officeContext } from '@/lib/access/authenticate';
import type { Identity, OfficeContext } from '@/lib/access/context';
import { bearerToken } from '@/lib/access/token';
import { Download, EventStream, type Form } from '@/lib/contract/transfer';
import { readForm, readJson } from './body';
import { downloadResponse } from './download';
import { eventStreamResponse } from './event-stream';
import { problemResponse } from './problem';
import { requireSameOrigin } from './same-origin';

/** What a use-case is given of a request; it validates what it uses. */
export interface Call {
  readonly path: Readonly<Record<string, string>>;
  readonly query: Readonly<Record<string, string>>;
  /** JSON as sent; null where nothing was. */
  readonly body: unknown;
  readonly form: Form;
  /** Where the asker finds this service: scheme, host and port. */
  readonly origin: string;
  readonly arrived: Date;
}

interface Options {
  readonly status?: 200 | 201 | 204;
  /** `form`: a multipart form is expected in place of JSON. */
  readonly takes?: 'json' | 'form';
}

interface NextParams {
  /** Where the address has no parameter, the framework gives none. */
  readonly params: Promise<Readonly<Record<string, string | string[]>> | undefined>;
}

type Handler = (request: Request, next: NextParams) => Promise<Response>;
type UseCase<Who> = (who: Who, call: never) => Promise<unknown>;

const NO_FORM: Form = { file: null, fields: {} };

/** A handler of the HTTP surface for a use-case within an office. */
export function route(useCase: UseCase<OfficeContext>, options: Options = {}): Handler {
  return handler(useCase, options, (headers, path) => officeContext(headers, path.office ?? ''));
}

/** For what a person asks outside any office. */
export function personRoute(useCase: UseCase<Identity>, options: Options = {}): Handler {
  return handler(useCase, options, (headers) => authenticate(headers));
}

/** For what anybody may ask. */
export function openRoute(useCase: UseCase<null>, options: Options = {}): Handler {
  return handler(useCase, options, () => Promise.resolve(null));
}

function handler<Who>(
  useCase: UseCase<Who>,
  options: Options,
  identify: (headers: Headers, path: Call['path']) => Promise<Who>,
): Handler {
  return async (request, { params }) => {
    const arrived = new Date();
    try {
      const path = flat(await params);
      const who = await identify(request.headers, path);
      if (bearerToken(request.headers) === null) requireSameOrigin(request);
      const call = await read(request, path, arrived, options);
      return respond(await useCase(who, call as never), options, request);
    } catch (error) {
      return problemResponse(error, request);
    }
  };
}

/** A parameter that takes several segments is given as they stand in the address. */
function flat(params: Awaited<NextParams['params']>): Call['path'] {
  return Object.fromEntries(
    Object.entries(params ?? {}).map(([name, value]) => [
      name,
      typeof value === 'string' ? value : value.join('/'),
    ]),
  );
}

async function read(
  request: Request,
  path: Call['path'],
  arrived: Date,
  { takes = 'json' }: Options,
): Promise<Call> {
  // A parameter without a value is one that was not given: a form's empty field.
  const given = [...new URL(request.url).searchParams].filter(([, value]) => value !== '');
  const query = Object.fromEntries(given);
  const sends = request.method !== 'GET' && request.method !== 'HEAD';
  return {
    path,
    query,
    body: sends && takes === 'json' ? await readJson(request) : null,
    form: sends && takes === 'form' ? await readForm(request) : NO_FORM,
    origin: originOf(request),
    arrived,
  };
}

function originOf({ headers, url }: Request): string {
  const configured = process.env.NEXTAUTH_URL;
  if (configured && URL.canParse(configured)) return new URL(configured).origin;
  const scheme = headers.get('x-forwarded-proto') ?? new URL(url).protocol.replace(':', '');
  return `${scheme}://${headers.get('x-forwarded-host') ?? headers.get('host') ?? new URL(url).host}`;
}

function respond(answer: unknown, { status = 200 }: Options, request: Request): Response {
  if (answer instanceof Download) return downloadResponse(answer);
  if (answer instanceof EventStream) return eventStreamResponse(answer, request.signal);
  if (status === 204) return new Response(null, { status });
  return Response.json(answer, { status, headers: { 'cache-control': 'private, no-store' } });
}
