import { toClientError, unreachable } from './error';
import { trusted } from './http';

export interface SendOptions {
  /** Share of the bytes that have left, 0 … 1. */
  readonly onProgress?: (share: number) => void;
  readonly signal?: AbortSignal;
}

/** Posts a form with a file. XMLHttpRequest, because fetch does not say how much has been sent. */
export function postForm<T>(path: string, form: FormData, options: SendOptions = {}): Promise<T> {
  return new Promise<T>((resolve, reject) => {
    const request = new XMLHttpRequest();
    const abort = () => request.abort();
    request.open('POST', path);
    request.setRequestHeader('accept', 'application/json, application/problem+json');
    request.upload.onprogress = (event) => {
      if (event.lengthComputable && event.total > 0) options.onProgress?.(event.loaded / event.total);
    };
    request.onload = () => {
      if (request.status < 200 || request.status >= 300) {
        reject(toClientError(request.status, request.responseText));
        return;
      }
      try {
        resolve(trusted<T>(JSON.parse(request.responseText)));
      } catch {
        reject(toClientError(request.status, ''));
      }
    };
    request.onerror = () => reject(unreachable());
    request.onabort = () => reject(new DOMException('Cancelled', 'AbortError'));
    request.onloadend = () => options.signal?.removeEventListener('abort', abort);
    if (options.signal?.aborted) {
      reject(new DOMException('Cancelled', 'AbortError'));
      return;
    }
    options.signal?.addEventListener('abort', abort);
    request.send(form);
  });
}
