import type { EventStream } from '@/lib/contract/transfer';
import { log } from './log';

const HEARTBEAT_MS = 15_000;
/** Then the browser comes back by itself, and whether it still may is looked at anew. */
const LONGEST_MS = 10 * 60_000;

/** Open streams of this process: they would hold up a server that is told to stop. */
const open = new Set<() => void>();
let listening = false;

/** Ends every open stream; done on SIGTERM and SIGINT. */
export function closeStreams(): void {
  for (const close of [...open]) close();
}

export function eventStreamResponse(stream: EventStream, signal: AbortSignal): Response {
  listenForTheEnd();
  let end: (by: 'us' | 'reader') => void = () => undefined;
  const body = new ReadableStream<Uint8Array>({
    start(controller) {
      const encoder = new TextEncoder();
      let closed = false;
      let unsubscribe: (() => void) | null = null;
      const write = (text: string): void => {
        if (!closed) controller.enqueue(encoder.encode(text));
      };
      const close = (): void => end('us');
      end = (by) => {
        if (closed) return;
        closed = true;
        clearInterval(heartbeat);
        clearTimeout(longest);
        open.delete(close);
        signal.removeEventListener('abort', close);
        unsubscribe?.();
        if (by === 'us') controller.close();
      };
      const heartbeat = setInterval(() => write(': still here\n\n'), HEARTBEAT_MS);
      const longest = setTimeout(close, LONGEST_MS);
      open.add(close);
      signal.addEventListener('abort', close);
      write('retry: 2000\n\n');
      stream
        .open({ send: (kind, data) => write(`event: ${kind}\ndata: ${JSON.stringify(data)}\n\n`), close })
        .then(
          (stop) => {
            // It may have ended while the subscription was being made.
            if (closed) return stop();
            unsubscribe = stop;
            write(': listening\n\n');
          },
          (error: unknown) => {
            log.error({ err: error }, 'the event stream could not be opened');
            close();
          },
        );
    },
    cancel: () => end('reader'),
  });
  return new Response(body, {
    headers: {
      'content-type': 'text/event-stream; charset=utf-8',
      'cache-control': 'no-cache, no-transform',
      'x-accel-buffering': 'no',
    },
  });
}

function listenForTheEnd(): void {
  if (listening) return;
  listening = true;
  process.once('SIGTERM', closeStreams);
  process.once('SIGINT', closeStreams);
}
