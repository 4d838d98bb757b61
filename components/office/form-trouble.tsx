import { ClientError, sentenceOf } from '@/lib/client/error';

/** The server's sentences by field. */
export function fieldErrorsOf(error: unknown): Record<string, string> {
  return error instanceof ClientError ? error.fieldErrors : {};
}

/**
 * Above a form: why it was refused, unless every fault stands at one of its fields already. What belongs to
 * no field of the form is named here.
 */
export function FormTrouble({ error, fields }: { error: unknown; fields: readonly string[] }) {
  if (!error) return null;
  const errors = Object.entries(fieldErrorsOf(error));
  const elsewhere = errors.filter(
    ([path]) => !fields.some((field) => path === field || path.startsWith(`${field}.`)),
  );
  const sentence =
    errors.length === 0
      ? sentenceOf(error)
      : elsewhere.length > 0
        ? [...new Set(elsewhere.map(([, message]) => message))].join(' ')
        : errors.length === 1
          ? 'Nothing was saved: one field needs another look.'
          : `Nothing was saved: ${String(errors.length)} fields need another look.`;
  return (
    <p role="alert" className="border-l-4 border-umber py-1 pl-3 font-semibold">
      {sentence}
    </p>
  );
}
