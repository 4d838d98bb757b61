import type { SubmissionView } from '@/lib/contract/submission';
import { SLUG } from './cast';
import { ask, json } from './http';

/** Seven activities: a swapped pair of estimates (D), an unknown predecessor (F), one without spread (E). */
export const SEVEN = [
  'ID,Activity,Optimistic,Most likely,Pessimistic,Predecessors',
  'A,Set out,1,2,3,',
  'B,Dig,2,4,6,A',
  'C,Pour,1,2,9,B',
  'D,Cure,5,4,6,C',
  'E,Strip,1,1,1,D',
  'F,Backfill,2,3,4,"D, Z9"',
  'G,Hand over,0,0,0,"E, F"',
];

/** A loop of three, an ID twice, a likely estimate that is missing: nothing can be computed. */
export const BLOCKED = [
  'ID,Activity,Optimistic,Most likely,Pessimistic,Predecessors',
  'A,Set out,1,2,3,',
  'B,Dig,2,4,6,"A, D"',
  'C,Pour,1,2,9,B',
  'D,Cure,4,5,6,C',
  'D,Strip,1,1,2,D',
  'F,Hand over,1,1,2,D',
];

export function csv(lines: readonly string[], name = 'list.csv'): File {
  return new File([lines.join('\r\n') + '\r\n'], name, { type: 'text/csv' });
}

export function uploadForm(file: File, fields: Readonly<Record<string, string>> = {}): FormData {
  const form = new FormData();
  form.append('file', file, file.name);
  for (const [name, value] of Object.entries(fields)) form.append(name, value);
  return form;
}

export function upload(
  token: string,
  project: string,
  file: File,
  fields: Readonly<Record<string, string>> = {},
): Promise<Response> {
  return ask('POST', `/api/offices/${SLUG}/projects/${project}/submissions`, {
    token,
    form: uploadForm(file, fields),
  });
}

/** Uploads what must be taken. */
export async function received(
  token: string,
  project: string,
  lines: readonly string[],
): Promise<SubmissionView> {
  const answer = await upload(token, project, csv(lines), { again: 'true' });
  if (answer.status !== 201) throw new Error(`Not taken: ${answer.status} ${await answer.text()}`);
  return json<SubmissionView>(answer);
}

export function submissionAt(id: string, rest = ''): string {
  return `/api/offices/${SLUG}/submissions/${id}${rest}`;
}
