import type { HoursPerson } from '@/modules/hours';
import { contractBar } from './against-contract';

interface Props {
  readonly person: Pick<
    HoursPerson,
    'contractMinutes' | 'leaveMinutes' | 'plannedMinutes' | 'differenceMinutes'
  >;
  readonly longest: number;
}

const width = 84;
const height = 18;
const top = 4;
const thickness = 10;

/**
 * Filled up to the contract, outlined beyond it, leave as a line between slanted ticks, the contract as
 * a thick tick. The words beside it say the same.
 */
export function ContractBarDrawing({ person, longest }: Props) {
  const { within, beyond, leave, contractAt } = contractBar(person, longest, width);
  const middle = top + thickness / 2;
  return (
    <svg
      viewBox={`-2 0 ${width + 4} ${height}`}
      className="h-4.5 w-22 shrink-0 self-center"
      aria-hidden="true"
    >
      <rect x={0} y={top} width={within.length} height={thickness} className="fill-stone" />
      {beyond ? (
        <rect
          x={beyond.start}
          y={top + 0.5}
          width={beyond.length}
          height={thickness - 1}
          className="fill-spare stroke-edge"
        />
      ) : null}
      {leave ? (
        <path
          d={`M${leave.start} ${middle}h${leave.length}${slantedTick(leave.start, middle)}${slantedTick(leave.start + leave.length, middle)}`}
          className="fill-none stroke-ink"
          strokeWidth="1.25"
        />
      ) : null}
      {contractAt === null ? null : (
        <path
          d={`M${contractAt} ${top - 3}V${top + thickness + 3}`}
          className="stroke-ink"
          strokeWidth="2.5"
        />
      )}
    </svg>
  );
}

const slantedTick = (x: number, y: number): string => `M${x - 2} ${y + 4}l4 -8`;
