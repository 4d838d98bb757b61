const UNSTORABLE = /[\u0000\p{Surrogate}]/gu;

/** Text that PostgreSQL takes: NUL and halves of surrogate pairs become the replacement character. */
export function storableText(text: string): string {
  return text.replace(UNSTORABLE, '\uFFFD');
}

/** The same for every text within a JSON value; the value itself where nothing has to change. */
export function storable<T>(value: T): T {
  const json = JSON.stringify(value);
  if (json === undefined || !/\\u0000|\\ud[89a-f]/i.test(json)) return value;
  return JSON.parse(json, (_name, member: unknown) =>
    typeof member === 'string' ? storableText(member) : member,
  ) as T;
}
