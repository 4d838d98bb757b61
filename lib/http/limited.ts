import { TooLarge } from '@/lib/contract/errors';

export const MEGABYTE = 1024 * 1024;

/** The body as a stream that breaks off with `TooLarge` once it is longer than it may be. */
export function limitedBody(
  request: Request,
  limit: number,
  sentence: string,
): ReadableStream<Uint8Array> | null {
  const announced = Number(request.headers.get('content-length') ?? 0);
  if (announced > limit) throw new TooLarge(sentence);
  if (!request.body) return null;
  let seen = 0;
  return request.body.pipeThrough(
    new TransformStream<Uint8Array, Uint8Array>({
      transform(chunk, controller) {
        seen += chunk.byteLength;
        if (seen > limit) controller.error(new TooLarge(sentence));
        else controller.enqueue(chunk);
      },
    }),
  );
}
