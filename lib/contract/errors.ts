import type { z } from 'zod';

export interface FieldError {
  /** `edits.0.cell`; '' where the whole is at fault. */
  readonly path: string;
  readonly message: string;
}

interface More {
  readonly errors?: readonly FieldError[];
  /** Further members of the problem document. */
  readonly members?: Readonly<Record<string, unknown>>;
  readonly headers?: Readonly<Record<string, string>>;
}

/** What a use-case refuses, with a plain sentence; lib/http/problem.ts writes it as a problem document. */
export abstract class Refusal extends Error {
  abstract readonly status: number;
  abstract readonly title: string;
  readonly more: More;

  constructor(sentence: string, more: More = {}) {
    super(sentence);
    this.name = new.target.name;
    this.more = more;
  }
}

/** The request itself cannot be read: broken JSON, a broken form. */
export class Malformed extends Refusal {
  readonly status = 400;
  readonly title = 'The request cannot be read';
}

export class Unauthorised extends Refusal {
  readonly status = 401;
  readonly title = 'Not signed in';
}

export class Forbidden extends Refusal {
  readonly status = 403;
  readonly title = 'Not allowed';
}

/** Also for what exists and is not the asker's to know of. */
export class NotFound extends Refusal {
  readonly status = 404;
  readonly title = 'Not found';
}

/** The request is sound, and the state of things is against it. */
export class Conflict extends Refusal {
  readonly status = 409;
  readonly title = 'Not as things stand';
}

export class TooLarge extends Refusal {
  readonly status = 413;
  readonly title = 'Too large';
}

export class UnsupportedMedia extends Refusal {
  readonly status = 415;
  readonly title = 'Sent in another form than expected';
}

export class Invalid extends Refusal {
  readonly status = 422;
  readonly title = 'Something in it is not right';

  static field(path: string, message: string): Invalid {
    return new Invalid(message, { errors: [{ path, message }] });
  }
}

export class Unavailable extends Refusal {
  readonly status = 503;
  readonly title = 'Not available';
}

/** Reads what a caller sent by its shape; throws `Invalid` naming each field at fault. */
export function checked<T extends z.ZodType>(shape: T, sent: unknown): z.output<T> {
  const result = shape.safeParse(sent, { error: plainly });
  if (result.success) return result.data;
  const errors = result.error.issues.map((issue) => ({ path: issue.path.join('.'), message: issue.message }));
  const [first] = errors;
  const sentence =
    errors.length === 1 && first ? first.message : `${errors.length} fields are not as they must be.`;
  throw new Invalid(sentence, { errors });
}

/** What is wrong with a value, where its shape has no sentence of its own. */
function plainly(issue: z.core.$ZodRawIssue): string | undefined {
  switch (issue.code) {
    case 'invalid_type':
      return issue.input === undefined
        ? 'This is missing.'
        : `This must be ${KINDS[issue.expected] ?? issue.expected}.`;
    case 'invalid_value':
      return `This must be one of ${issue.values.map(String).join(', ')}.`;
    case 'invalid_format':
      return issue.format === 'uuid' ? 'This is no id.' : undefined;
    case 'invalid_union':
      return 'This is of another kind than expected.';
    case 'too_small':
      return bounded('at least', 'more than', issue.origin, issue.minimum, issue.inclusive ?? true);
    case 'too_big':
      return bounded('at most', 'less than', issue.origin, issue.maximum, issue.inclusive ?? true);
    default:
      return undefined;
  }
}

function bounded(
  inclusive: string,
  exclusive: string,
  origin: string,
  limit: number | bigint,
  isInclusive: boolean,
): string {
  const many = `${isInclusive ? inclusive : exclusive} ${limit}`;
  if (origin === 'string') return `This must have ${many} characters.`;
  return origin === 'array' ? `This must hold ${many}.` : `This must be ${many}.`;
}

const KINDS: Readonly<Record<string, string>> = {
  string: 'a text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  array: 'a list',
  object: 'an object',
  record: 'an object',
};
