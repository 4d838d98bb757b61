'use client';

import type { IntakeView } from '@/lib/contract/intake';
import type { SubmissionView } from '@/lib/contract/submission';
import type { Field } from '@/lib/schedule/field';
import { officePath } from './http';
import { postForm, type SendOptions } from './multipart';

/** What the person has settled beside the file; what is left out is detected. */
export interface MatchingChoice {
  readonly sheets?: readonly string[];
  readonly columns?: Readonly<Partial<Record<Field, number>>>;
  readonly headerRow?: number;
  /** Takes in a file although it is the latest revision, byte for byte. */
  readonly again?: boolean | undefined;
}

/** The form that POST /intake and POST …/submissions take. */
export function uploadForm(file: File, choice: MatchingChoice = {}): FormData {
  const form = new FormData();
  for (const sheet of choice.sheets ?? []) form.append('sheet', sheet);
  if (choice.columns) form.append('columns', JSON.stringify(choice.columns));
  if (choice.headerRow !== undefined) form.append('headerRow', String(choice.headerRow));
  // The page asks before it takes in the same file twice.
  form.append('again', String(choice.again ?? false));
  form.append('file', file, file.name);
  return form;
}

/** Reads a file without keeping anything, and says how it would be read. */
export function detect(office: string, file: File, choice?: MatchingChoice, options?: SendOptions) {
  return postForm<IntakeView>(officePath(office, 'intake'), uploadForm(file, choice), options);
}

/** Hands the file in as the project's next revision. */
export function submit(
  office: string,
  project: string,
  file: File,
  choice?: MatchingChoice,
  options?: SendOptions,
) {
  const path = officePath(office, 'projects', project, 'submissions');
  return postForm<SubmissionView>(path, uploadForm(file, choice), options);
}
