import type { Block } from './blocks';

/** Where a block stands in its day column, in percent of the column. */
export interface Place {
  readonly top: number;
  readonly height: number;
  readonly left: number;
  readonly width: number;
}

const dayMinutes = 1440;

/**
 * Minute at which the day columns begin: the team's own start of the day, or the start of an earlier shift
 * so that nothing lies above its column.
 */
export const columnStart = (
  blocks: readonly Pick<Block, 'startMinute'>[],
  dayStartsAtMinute: number,
): number => Math.min(dayStartsAtMinute, ...blocks.map(({ startMinute }) => startMinute));

/**
 * Places the blocks of one day, given by start, side by side without overlap: those that touch the same
 * hours share the width equally. A column is 24 h long; what lasts longer is cut there.
 */
export function layOutDay<B extends Pick<Block, 'startMinute' | 'endMinute'>>(
  blocks: readonly B[],
  start: number,
): ReadonlyMap<B, Place> {
  const places = new Map<B, Place>();
  for (const cluster of clustersOf(blocks)) {
    const laneEnds: number[] = [];
    const lanes = cluster.map((block) => {
      const free = laneEnds.findIndex((end) => end <= block.startMinute);
      const lane = free === -1 ? laneEnds.length : free;
      laneEnds[lane] = block.endMinute;
      return lane;
    });
    cluster.forEach((block, index) => {
      const width = 100 / laneEnds.length;
      places.set(block, { ...hours(block, start), left: (lanes[index] ?? 0) * width, width });
    });
  }
  return places;
}

function hours(
  { startMinute, endMinute }: Pick<Block, 'startMinute' | 'endMinute'>,
  start: number,
) {
  const from = clamp(startMinute - start);
  return {
    top: (100 * from) / dayMinutes,
    height: (100 * (clamp(endMinute - start) - from)) / dayMinutes,
  };
}

const clamp = (minute: number): number => Math.min(dayMinutes, Math.max(0, minute));

/** Runs of blocks in which each overlaps one before it. */
function clustersOf<B extends Pick<Block, 'startMinute' | 'endMinute'>>(
  blocks: readonly B[],
): B[][] {
  const clusters: B[][] = [];
  let end = Number.NEGATIVE_INFINITY;
  for (const block of blocks) {
    const last = clusters.at(-1);
    if (last && block.startMinute < end) last.push(block);
    else clusters.push([block]);
    end = Math.max(end, block.endMinute);
  }
  return clusters;
}
