/** A file as an answer. */
export class Download {
  constructor(
    readonly name: string,
    readonly mediaType: string,
    readonly bytes: Uint8Array,
    /** Further headers of the answer. */
    readonly headers: Readonly<Record<string, string>> = {},
  ) {}
}

export interface StreamSink {
  /** Sends one event; `data` is written as JSON. */
  send(kind: string, data: unknown): void;
  close(): void;
}

/** Server-sent events as an answer. `open` is called once and gives back what ends the subscription. */
export class EventStream {
  constructor(readonly open: (sink: StreamSink) => Promise<() => void>) {}
}

/** A file that came with a form. */
export interface UploadedFile {
  readonly name: string;
  readonly bytes: Uint8Array;
}

/** A multipart form with at most one file that counts. */
export interface Form {
  readonly file: UploadedFile | null;
  readonly fields: Readonly<Record<string, readonly string[]>>;
}
