/** A file that was dropped on one page and is taken in on the next; it lives no longer than the document. */
let waiting: { project: string; file: File } | null = null;

export function handOver(project: string, file: File): void {
  waiting = { project, file };
}

/** The file for this project. It stays for a second mount of the page, until `forget`. */
export function handedOver(project: string): File | null {
  return waiting?.project === project ? waiting.file : null;
}

export function forget(): void {
  waiting = null;
}
