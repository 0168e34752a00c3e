import type { Outcome } from '@/modules/units';

/** A comment goes out this often, so that nothing in between closes a silent connection. */
const heartbeatMilliseconds = 15_000;

/** Where events are written to; nothing happens once it is closed. */
export interface EventSink {
  readonly send: (event: SentEvent) => void;
  readonly close: () => void;
}

interface SentEvent {
  readonly id?: number;
  readonly event?: string;
  readonly data: unknown;
}

/**
 * Answers with server-sent events (HTML Standard, 9.2). `follow` starts the telling and returns what
 * ends it, which is called when the stream is closed or cancelled or its request is given up.
 */
export function eventStream(
  signal: AbortSignal,
  follow: (sink: EventSink) => Outcome<() => void>,
): Response | Outcome<never> {
  const { body, sink, whenClosed } = openStream(signal);
  const followed = follow(sink);
  if (!followed.ok) {
    sink.close();
    return followed;
  }
  whenClosed(followed.value);
  return new Response(body, {
    headers: {
      'content-type': 'text/event-stream; charset=utf-8',
      'cache-control': 'no-cache, no-transform',
    },
  });
}

/** A stream that stays open until it is closed from here, cancelled by its reader, or given up. */
function openStream(signal: AbortSignal) {
  const encoder = new TextEncoder();
  const closing = new AbortController();
  const closed = AbortSignal.any([signal, closing.signal]);
  let isCancelled = false;
  let stream: ReadableStreamDefaultController<Uint8Array> | undefined;
  const body = new ReadableStream<Uint8Array>({
    start: (controller) => {
      stream = controller;
    },
    cancel: () => {
      isCancelled = true;
      closing.abort();
    },
  });
  const write = (text: string) => {
    if (!closed.aborted) stream?.enqueue(encoder.encode(text));
  };
  const heartbeat = setInterval(() => write(': still here\n\n'), heartbeatMilliseconds);
  const whenClosed = (work: () => void) => {
    if (closed.aborted) work();
    else closed.addEventListener('abort', work, { once: true });
  };
  whenClosed(() => {
    clearInterval(heartbeat);
    if (!isCancelled) stream?.close();
  });
  const sink: EventSink = {
    send: (event) => write(formatEvent(event)),
    close: () => closing.abort(),
  };
  return { body, sink, whenClosed };
}

/** One event; JSON has no bare line breaks, so that `data` is one line. */
function formatEvent({ id, event, data }: SentEvent): string {
  const lines = [
    ...(id === undefined ? [] : [`id: ${id}`]),
    ...(event === undefined ? [] : [`event: ${event}`]),
    `data: ${JSON.stringify(data)}`,
  ];
  return `${lines.join('\n')}\n\n`;
}
