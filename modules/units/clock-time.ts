/** `HH:MM` of a minute of the day; later days wrap, so 1860 reads `07:00`. */
export function formatClock(minute: number): string {
  const wrapped = ((minute % 1440) + 1440) % 1440;
  const two = (value: number) => String(value).padStart(2, '0');
  return `${two(Math.floor(wrapped / 60))}:${two(wrapped % 60)}`;
}

/** Reads `7`, `07:30`, `0730` or `24:00`; null for anything else. */
export function parseClock(text: string): number | null {
  const match = /^\s*(\d{1,2})(?::?(\d{2}))?\s*$/.exec(text);
  if (!match) return null;
  const minute = Number(match[1]) * 60 + Number(match[2] ?? 0);
  return minute <= 1440 && Number(match[2] ?? 0) < 60 ? minute : null;
}

/** Hours for people: `7.5` of 450 minutes, `8` of 480. */
export function formatHours(minutes: number): string {
  return (Math.round((minutes / 60) * 100) / 100).toLocaleString('en-GB');
}
