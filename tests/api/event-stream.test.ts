import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { type EventSink, eventStream } from '@/app/_event-stream';
import { ok, refuse } from '@/modules/units';

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

/** Opens a stream and gives what is needed to play both ends. */
function open(before: (sink: EventSink) => void = () => {}) {
  const request = new AbortController();
  const unfollow = vi.fn();
  let sink: EventSink | undefined;
  const response = eventStream(request.signal, (opened) => {
    sink = opened;
    before(opened);
    return ok(unfollow);
  });
  if (!(response instanceof Response) || !response.body || !sink) throw new Error('no stream');
  return { request, unfollow, sink, response, reader: response.body.getReader() };
}

const textOf = ({ value }: { value?: Uint8Array | undefined }) => new TextDecoder().decode(value);

test('events carry id, name and one line of JSON, those sent at once included', async () => {
  const { sink, reader, response } = open(({ send }) => send({ id: 1, data: { text: 'a\nb' } }));
  expect(response.headers.get('content-type')).toBe('text/event-stream; charset=utf-8');
  expect(response.headers.get('cache-control')).toBe('no-cache, no-transform');
  expect(textOf(await reader.read())).toBe('id: 1\ndata: {"text":"a\\nb"}\n\n');
  sink.send({ event: 'end', data: {} });
  expect(textOf(await reader.read())).toBe('event: end\ndata: {}\n\n');
});

test('a silent stream says every 15 seconds that it is still there', async () => {
  const { reader } = open();
  vi.advanceTimersByTime(15_000);
  expect(textOf(await reader.read())).toBe(': still here\n\n');
});

test.each([
  ['closed from here', ({ sink }: ReturnType<typeof open>) => sink.close()],
  ['given up by its request', ({ request }: ReturnType<typeof open>) => request.abort()],
  ['cancelled by its reader', ({ reader }: ReturnType<typeof open>) => void reader.cancel()],
])('a stream that is %s ends the telling once and leaves no timer', async (_, end) => {
  const stream = open();
  end(stream);
  stream.sink.send({ data: 'too late' });
  stream.sink.close();
  stream.request.abort();
  expect(stream.unfollow).toHaveBeenCalledTimes(1);
  expect(vi.getTimerCount()).toBe(0);
  expect(await stream.reader.read()).toEqual({ done: true, value: undefined });
});

test('a stream that is closed while it is opened ends too', async () => {
  const { reader, unfollow } = open((sink) => {
    sink.send({ event: 'end', data: 1 });
    sink.close();
  });
  expect(textOf(await reader.read())).toBe('event: end\ndata: 1\n\n');
  expect((await reader.read()).done).toBe(true);
  expect(unfollow).toHaveBeenCalledTimes(1);
});

test('a refusal opens nothing', () => {
  const refused = refuse('not-found', 'There is no such run among yours.');
  expect(eventStream(new AbortController().signal, () => refused)).toEqual(refused);
  expect(vi.getTimerCount()).toBe(0);
});
