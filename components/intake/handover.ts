/** What a file is handed over for: to be taken in, or to be read anew after it has gone straight through. */
export type Purpose = 'take' | 'again';

/** A file that was dropped on one page and is needed on the next; it lives no longer than the document. */
let waiting: { project: string; file: File; purpose: Purpose } | null = null;

export function handOver(project: string, file: File, purpose: Purpose): void {
  waiting = { project, file, purpose };
}

/** The file for this project and purpose. It stays until `forget`, for a page that is mounted twice. */
export function handedOver(project: string, purpose: Purpose): File | null {
  return waiting?.project === project && waiting.purpose === purpose ? waiting.file : null;
}

export function forget(): void {
  waiting = null;
}
