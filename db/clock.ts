import { env } from './env';

/** The instant of now in milliseconds. Tests and demonstrations start it at CLOCK_STARTS_AT. */
export function now(): number {
  const startsAt = env().CLOCK_STARTS_AT;
  if (!startsAt) return Date.now();
  return Date.parse(startsAt) + Math.round(process.uptime() * 1000);
}
