import type { RunEvent } from '@/modules/roster';

/** Where the plot's ink goes; all numbers are drawing units. */
export interface PlotGeometry {
  /** Falling step-line of the best cost. */
  readonly best: string;
  /** Rising step-line of the proven bound. */
  readonly bound: string;
  /** Between the two lines: what waiting can still save. */
  readonly between: string;
  readonly costTicks: readonly { readonly y: number; readonly cents: number }[];
  readonly timeTicks: readonly { readonly x: number; readonly seconds: number }[];
}

interface Frame {
  readonly width: number;
  readonly height: number;
  /** Room at the left for the figures of the cost axis, and below for the seconds. */
  readonly left: number;
  readonly bottom: number;
}

interface Point {
  readonly ms: number;
  readonly cents: number;
}

/**
 * Lays out best cost and bound over time as step-lines. The cost axis is cut: it shows the stretch from
 * the first bound to the first roster, since a line from zero would hide the gap. Null before stage two
 * has both figures.
 */
export function plotGeometry(events: readonly RunEvent[], frame: Frame): PlotGeometry | null {
  const best = pointsOf(events, (event) => event.bestCostCents);
  const bound = pointsOf(events, (event) => event.boundCents);
  if (best.length === 0 || bound.length === 0) return null;
  const until = Math.max(1000, events.at(-1)?.elapsedMs ?? 0);
  const costs = [...best, ...bound].map(({ cents }) => cents);
  const ticks = niceTicks(Math.min(...costs), Math.max(...costs));
  const low = ticks[0] ?? 0;
  const high = ticks.at(-1) ?? 1;
  const x = (ms: number) => frame.left + (ms / until) * (frame.width - frame.left);
  const y = (cents: number) =>
    (1 - (cents - low) / Math.max(1, high - low)) * (frame.height - frame.bottom - 8) + 8;
  const bestSteps = steps(best, until, x, y);
  const boundSteps = steps(bound, until, x, y);
  return {
    best: lineOf(bestSteps),
    bound: lineOf(boundSteps),
    between: `${lineOf(bestSteps)} L${[...boundSteps].reverse().join(' L')} Z`,
    costTicks: ticks.map((cents) => ({ cents, y: y(cents) })),
    timeTicks: niceTicks(0, until / 1000)
      .filter((seconds) => seconds * 1000 <= until)
      .map((seconds) => ({ seconds, x: x(seconds * 1000) })),
  };
}

/** The moments at which a figure changed. */
function pointsOf(events: readonly RunEvent[], read: (event: RunEvent) => number | null): Point[] {
  const points: Point[] = [];
  for (const event of events) {
    const cents = read(event);
    if (cents !== null && cents !== points.at(-1)?.cents)
      points.push({ ms: event.elapsedMs, cents });
  }
  return points;
}

/** Corners of a step-line that holds each value until the next and runs on to the end. */
function steps(
  points: readonly Point[],
  until: number,
  x: (ms: number) => number,
  y: (cents: number) => number,
): string[] {
  return points.flatMap(({ ms, cents }, index) => {
    const end = points[index + 1]?.ms ?? until;
    return [
      `${x(ms).toFixed(1)},${y(cents).toFixed(1)}`,
      `${x(end).toFixed(1)},${y(cents).toFixed(1)}`,
    ];
  });
}

const lineOf = (corners: readonly string[]): string => `M${corners.join(' L')}`;

/** Two to six round numbers around a range: steps of 1, 2 or 5 times a power of ten, never below 1. */
export function niceTicks(from: number, to: number): number[] {
  const span = Math.max(to - from, 1);
  const power = 10 ** Math.max(0, Math.floor(Math.log10(span / 3)));
  const sizes = [1, 2, 5, 10].map((factor) => factor * power);
  const step = sizes.find((size) => span / size <= 4) ?? 10 * power;
  const first = Math.floor(from / step) * step;
  const count = Math.max(1, Math.ceil((to - first) / step)) + 1;
  return Array.from({ length: count }, (_, index) => first + index * step);
}
