import type { CoverStep } from './cover-steps';

/** From minutes or people to drawing units. */
export type Scale = (value: number) => number;

/** One closed box for each unbroken stretch with the same lower and upper edge. */
export function rectangles(
  steps: readonly CoverStep[],
  from: (step: CoverStep) => number,
  to: (step: CoverStep) => number,
  x: Scale,
  y: Scale,
): string {
  const boxes: { start: number; end: number; low: number; high: number }[] = [];
  for (const step of steps) {
    const box = { start: step.startMinute, end: step.endMinute, low: from(step), high: to(step) };
    if (box.high <= box.low || x(box.start) === x(box.end)) continue;
    const last = boxes.at(-1);
    if (last && last.end === box.start && last.low === box.low && last.high === box.high) {
      last.end = box.end;
    } else {
      boxes.push(box);
    }
  }
  return boxes
    .map(({ start, end, low, high }) => `M${x(start)} ${y(low)}V${y(high)}H${x(end)}V${y(low)}Z`)
    .join('');
}

/** A hairline at every whole person inside the covered part, broken where cover is lower. */
export function courseLines(steps: readonly CoverStep[], x: Scale, y: Scale): string {
  const most = steps.reduce((highest, { hold }) => Math.max(highest, hold), 0);
  const lines: string[] = [];
  for (let people = 1; people < most; people += 1) {
    let start: number | null = null;
    for (const step of [...steps, null]) {
      const isInside = step !== null && step.hold > people;
      if (isInside && start === null) start = step.startMinute;
      if (!isInside && start !== null) {
        const end = step?.startMinute ?? steps.at(-1)?.endMinute ?? start;
        lines.push(`M${x(start)} ${y(people)}H${x(end)}`);
        start = null;
      }
    }
  }
  return lines.join('');
}

/** The floor line as one step-line; it breaks nowhere and skips what has no width. */
export function stepLine(steps: readonly CoverStep[], x: Scale, y: Scale): string {
  let path = '';
  let level: number | null = null;
  for (const { startMinute, endMinute, need } of steps) {
    if (x(startMinute) === x(endMinute)) continue;
    if (level === null) path = `M${x(startMinute)} ${y(need)}`;
    else if (level !== need) path += `V${y(need)}`;
    path += `H${x(endMinute)}`;
    level = need;
  }
  return path;
}
