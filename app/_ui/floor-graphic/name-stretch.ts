import type { BoardKind, CoverLane } from '@/modules/roster';
import { formatClock } from '@/modules/units';
import { stretchesOf } from './cover-steps';
import { atLocalMinute, type CoverDay, columnEdges } from './day-axis';

type Kind = Pick<BoardKind, 'name' | 'startMinute' | 'endMinute'>;

/** The days and shift kinds by which people call a stretch of time. */
export interface TimeWords {
  readonly days: readonly CoverDay[];
  readonly dayStartsAtMinute: number;
  readonly kinds: readonly Kind[];
}

/** People missing or spare over a stretch of time, as people call it: by day and shift, or by the clock. */
export interface NamedStretch {
  readonly dayIndex: number;
  /** Name of a shift kind, or `07:00 to 09:00` where none fits. */
  readonly name: string;
  readonly startMinute: number;
  readonly endMinute: number;
  readonly people: number;
}

interface Piece {
  readonly startMinute: number;
  readonly endMinute: number;
  readonly people: number;
}

/**
 * Takes what a lane is short of (or has to spare) apart into whole shifts, earliest first and longest
 * first: one missing from 15:00 to 07:00 is a Late and a Night. What no shift fits is named by the clock.
 */
export function nameStretches(
  words: TimeWords,
  lane: CoverLane,
  kind: 'short' | 'spare',
): NamedStretch[] {
  const edges = columnEdges(words.days, words.dayStartsAtMinute);
  const names: NamedStretch[] = [];
  let rest = clip(stretchesOf(lane, kind), edges[0] ?? 0, edges.at(-1) ?? 0);
  for (let piece = rest[0]; piece; piece = rest[0]) {
    const columnIndex = edges.findLastIndex((edge) => edge <= (piece?.startMinute ?? 0));
    const named = longestFit(words, columnIndex, rest) ?? byClock(words, columnIndex, edges, piece);
    names.push(named);
    rest = subtract(rest, named);
  }
  return names;
}

/** The longest shift that starts where the rest starts and is missing from its start to its end. */
function longestFit(
  words: TimeWords,
  columnIndex: number,
  rest: readonly Piece[],
): NamedStretch | null {
  let best: NamedStretch | null = null;
  for (const dayIndex of [columnIndex, columnIndex + 1]) {
    for (const kind of words.kinds) {
      const startMinute = atLocalMinute(words.days, dayIndex, kind.startMinute);
      const endMinute = atLocalMinute(words.days, dayIndex, kind.endMinute);
      const people = leastOver(rest, startMinute, endMinute);
      const isFit = startMinute === rest[0]?.startMinute && people > 0;
      if (isFit && (best === null || endMinute > best.endMinute)) {
        best = { dayIndex, name: kind.name, startMinute, endMinute, people };
      }
    }
  }
  return best;
}

function byClock(
  words: TimeWords,
  dayIndex: number,
  edges: readonly number[],
  { startMinute, endMinute, people }: Piece,
): NamedStretch {
  const columnStart = edges[dayIndex] ?? 0;
  const end = Math.min(endMinute, edges[dayIndex + 1] ?? endMinute);
  const clock = (minute: number) => formatClock(words.dayStartsAtMinute + minute - columnStart);
  const name = `${clock(startMinute)} to ${clock(end)}`;
  return { dayIndex, name, startMinute, endMinute: end, people };
}

/** Least people over a window; 0 when the pieces leave a gap in it. */
function leastOver(pieces: readonly Piece[], startMinute: number, endMinute: number): number {
  let reached = startMinute;
  let least = Number.POSITIVE_INFINITY;
  for (const piece of pieces) {
    if (piece.endMinute <= reached || piece.startMinute > reached) continue;
    least = Math.min(least, piece.people);
    reached = piece.endMinute;
    if (reached >= endMinute) return least;
  }
  return 0;
}

/** What is left after taking people away over a window; equal neighbours become one piece. */
function subtract(pieces: readonly Piece[], taken: Piece): Piece[] {
  const left: Piece[] = [];
  const add = (startMinute: number, endMinute: number, people: number) => {
    if (endMinute <= startMinute || people <= 0) return;
    const last = left.at(-1);
    if (last && last.endMinute === startMinute && last.people === people) {
      left[left.length - 1] = { ...last, endMinute };
    } else {
      left.push({ startMinute, endMinute, people });
    }
  };
  for (const { startMinute, endMinute, people } of pieces) {
    const from = Math.min(endMinute, Math.max(startMinute, taken.startMinute));
    const to = Math.max(from, Math.min(endMinute, taken.endMinute));
    add(startMinute, from, people);
    add(from, to, people - taken.people);
    add(to, endMinute, people);
  }
  return left;
}

const clip = (pieces: readonly Piece[], from: number, to: number): Piece[] =>
  pieces
    .map(({ startMinute, endMinute, people }) => ({
      startMinute: Math.max(from, startMinute),
      endMinute: Math.min(to, endMinute),
      people,
    }))
    .filter(({ startMinute, endMinute }) => startMinute < endMinute);
