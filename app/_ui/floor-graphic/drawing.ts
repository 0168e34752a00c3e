import type { CoverLane } from '@/modules/roster';
import type { CoverStep, Stretch } from './cover-steps';
import { toColumn } from './day-axis';
import { courseLines, rectangles, type Scale, stepLine } from './paths';

/** What a floor graphic shows: cover, floors without a roster, or neither yet. */
export type GraphicState = 'cover' | 'no-roster' | 'no-floors';

/** What there is to draw: floors must be set somewhere, and something planned, before cover shows. */
export function graphicStateOf(lanes: readonly CoverLane[], isPlanned: boolean): GraphicState {
  const hasFloors = lanes.some(({ slots }) => slots.some(({ need }) => need > 0));
  if (!hasFloors) return 'no-floors';
  return isPlanned ? 'cover' : 'no-roster';
}

export interface DrawingInput {
  readonly steps: readonly CoverStep[];
  /** Shortages to label, each once. */
  readonly shortages: readonly Stretch[];
  /** Edges of the day columns, see `columnEdges`. */
  readonly edges: readonly number[];
  readonly width: number;
  readonly height: number;
  readonly state: GraphicState;
  /** Highest stack to scale by, when several graphics share one scale; otherwise the graphic's own. */
  readonly highest?: number | undefined;
}

export interface DrawnLabel {
  readonly x: number;
  readonly y: number;
  readonly text: string;
}

/** Paths and places of a floor graphic in drawing units; empty paths are not drawn. */
export interface Drawing {
  readonly spare: string;
  readonly hold: string;
  readonly courses: string;
  readonly short: string;
  readonly floorLine: string;
  readonly baselineY: number;
  readonly lineWidth: number;
  readonly hatchPitch: number;
  readonly labels: readonly DrawnLabel[];
  /** Highest floor and where it stands, for the numeral at the side. */
  readonly top: { readonly people: number; readonly y: number };
}

const headroom = 1.08;
const smallestCourse = 6;
const labelGap = 7;
const labelWidth = 20;
const labelRow = 12;

/** Lays out a floor graphic: linear from zero, equal height per person, the base never cut off. */
export function layOut(input: DrawingInput): Drawing {
  const { steps, edges, width, height, state } = input;
  const columns = Math.max(1, edges.length - 1);
  const baselineY = height - 0.75;
  const highest = input.highest ?? highestStack(steps);
  const unit = highest > 0 ? baselineY / (highest * headroom) : 0;
  const x = (minute: number) =>
    round((Math.min(columns, Math.max(0, toColumn(edges, minute))) * width) / columns);
  const y = (people: number) => round(baselineY - people * unit);
  const isDrawn = state === 'cover';
  const parts = (from: (step: CoverStep) => number, to: (step: CoverStep) => number) =>
    isDrawn ? rectangles(steps, from, to, x, y) : '';
  return {
    spare: parts(
      (step) => step.need,
      (step) => step.need + step.spare,
    ),
    hold: parts(
      () => 0,
      (step) => step.hold,
    ),
    courses: isDrawn && unit >= smallestCourse ? courseLines(steps, x, y) : '',
    short: parts(
      (step) => step.hold,
      (step) => step.need,
    ),
    floorLine: state === 'no-floors' ? '' : stepLine(steps, x, y),
    baselineY,
    lineWidth: lineWidthFor(height),
    hatchPitch: height < 30 ? 4 : height > 90 ? 6 : 5,
    labels: isDrawn && height >= 60 ? placeLabels(input.shortages, steps, x, y) : [],
    top: topFloor(steps, y),
  };
}

/** The highest stack of people anywhere: what is needed and what is spare on top of it. */
export const highestStack = (steps: readonly CoverStep[]): number =>
  steps.reduce((most, { need, spare }) => Math.max(most, need + spare), 0);

const round = (value: number): number => Math.round(value * 100) / 100;

function lineWidthFor(height: number): number {
  if (height < 30) return 2;
  return height > 90 ? 3 : 2.5;
}

/**
 * Labels stand above everything within their width, so that the line of a neighbour never crosses them;
 * one that would touch the label before it moves up a row.
 */
function placeLabels(
  shortages: readonly Stretch[],
  steps: readonly CoverStep[],
  x: Scale,
  y: Scale,
): DrawnLabel[] {
  const labels: DrawnLabel[] = [];
  for (const { startMinute, endMinute, people } of [...shortages].sort(
    (one, other) => one.startMinute - other.startMinute,
  )) {
    if (x(startMinute) === x(endMinute)) continue;
    const place = round((x(startMinute) + x(endMinute)) / 2);
    const [left, right] = [place - labelWidth / 2, place + labelWidth / 2];
    const ceiling = highestStack(
      steps.filter((step) => x(step.startMinute) < right && x(step.endMinute) > left),
    );
    let top = y(ceiling) - labelGap;
    const last = labels.at(-1);
    if (last && place - last.x < labelWidth && Math.abs(top - last.y) < labelRow) {
      top = last.y - labelRow;
    }
    labels.push({ x: place, y: round(top), text: `−${formatPeople(people)}` });
  }
  return labels;
}

const formatPeople = (people: number): string => people.toLocaleString('en-GB');

function topFloor(steps: readonly CoverStep[], y: Scale): Drawing['top'] {
  const people = steps.reduce((most, { need }) => Math.max(most, need), 0);
  return { people, y: y(people) };
}
