import { log } from '../../db/log';
import { deliverWaiting } from './deliver-waiting';

/** Pause between two looks into the outbox, in milliseconds. */
const pauseMs = 5_000;

const shared = globalThis as typeof globalThis & {
  floorwrightSender?: ReturnType<typeof setInterval>;
};

/** Looks into the outbox every few seconds, once per process; does not keep the process alive. */
export function startSender(): void {
  shared.floorwrightSender ??= setInterval(nudgeSender, pauseMs).unref();
}

/** Has the outbox looked into right away; to be called after the transaction that filled it. */
export function nudgeSender(): void {
  deliverWaiting().catch((cause) => log().error({ err: cause }, 'mail round broke off'));
}
