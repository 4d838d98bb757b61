import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { isNews, readEvent, subscribe, type SubmissionEvent } from '@/lib/client/events';

describe('an event', () => {
  it('is read from its data, and anything else is passed over', () => {
    expect(readEvent('{"kind":"correction","version":7,"by":"x"}')).toEqual({
      kind: 'correction',
      version: 7,
    });
    expect(readEvent('{"kind":"weather"}')).toBeNull();
    expect(readEvent('[]')).toBeNull();
    expect(readEvent('still here')).toBeNull();
  });

  it('is news unless this page has that version already', () => {
    expect(isNews({ kind: 'correction', version: 8 }, 7)).toBe(true);
    expect(isNews({ kind: 'correction', version: 7 }, 7)).toBe(false);
    expect(isNews({ kind: 'status' }, 7)).toBe(true);
    expect(isNews({ kind: 'comment', version: 7 }, 7)).toBe(true);
  });
});

/** Stands in for the browser's EventSource; the test opens, feeds and breaks it. */
class Stream extends EventTarget {
  static readonly CLOSED = 2;
  static made: Stream[] = [];
  readyState = 0;
  onopen: (() => void) | null = null;
  onerror: (() => void) | null = null;
  onmessage: ((message: MessageEvent<string>) => void) | null = null;

  constructor(readonly url: string) {
    super();
    Stream.made.push(this);
  }
  opens(): void {
    this.readyState = 1;
    this.onopen?.();
  }
  breaks(readyState: number): void {
    this.readyState = readyState;
    this.onerror?.();
  }
  says(event: SubmissionEvent): void {
    this.dispatchEvent(new MessageEvent(event.kind, { data: JSON.stringify(event) }));
  }
  close(): void {
    this.readyState = Stream.CLOSED;
  }
}

describe('the subscription', () => {
  const heard: SubmissionEvent[] = [];
  let gaps = 0;
  const start = () =>
    subscribe(
      '/events',
      (event) => heard.push(event),
      () => (gaps += 1),
    );

  beforeEach(() => {
    vi.useFakeTimers();
    vi.stubGlobal('EventSource', Stream);
    Stream.made = [];
    heard.length = 0;
    gaps = 0;
  });
  afterEach(() => {
    vi.useRealTimers();
    vi.unstubAllGlobals();
  });

  it('hears named events, once each', () => {
    start();
    Stream.made[0]?.opens();
    Stream.made[0]?.says({ kind: 'comment' });
    expect(heard).toEqual([{ kind: 'comment' }]);
    expect(gaps).toBe(0);
  });

  it('looks for itself while the stream is away, and once more when it is back', () => {
    start();
    const [stream] = Stream.made;
    stream?.opens();
    stream?.breaks(0);
    vi.advanceTimersByTime(20_000);
    expect(gaps).toBe(2);
    stream?.opens();
    expect(gaps).toBe(3);
    vi.advanceTimersByTime(60_000);
    expect(gaps).toBe(3);
  });

  it('opens a new stream where the server has ended it for good', () => {
    start();
    Stream.made[0]?.opens();
    Stream.made[0]?.breaks(2);
    vi.advanceTimersByTime(5_000);
    expect(Stream.made).toHaveLength(2);
    Stream.made[1]?.opens();
    Stream.made[1]?.says({ kind: 'fix', version: 3 });
    expect(heard).toEqual([{ kind: 'fix', version: 3 }]);
  });

  it('is silent once closed', () => {
    const subscription = start();
    Stream.made[0]?.opens();
    Stream.made[0]?.breaks(2);
    subscription.close();
    vi.advanceTimersByTime(60_000);
    expect(Stream.made).toHaveLength(1);
    expect(gaps).toBe(0);
  });
});
