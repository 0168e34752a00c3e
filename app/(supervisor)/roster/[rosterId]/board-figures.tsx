import { hours } from '@/app/_ui/clock';
import { Money } from '@/app/_ui/money';
import type { StandingFigure } from '@/app/_ui/title-block';
import type { Board } from '@/modules/roster';

/** The standing figures of a roster: shortage, rule problems, cost with its bound, overtime, nights. */
export function boardFigures(board: Board): StandingFigure[] {
  const { proof } = board;
  if (!proof) return [{ label: 'Team', value: board.teamName }];
  const isShort = proof.shortageMinutes > 0;
  return [
    {
      label: 'Shortage',
      value: isShort ? hours(proof.shortageMinutes) : 'floor holds',
      tone: isShort ? 'short' : 'holds',
    },
    {
      label: 'Rule problems',
      value: proof.breaches.length,
      tone: proof.breaches.length > 0 ? 'short' : 'ink',
    },
    ...payFigures(board),
    { label: 'Nights each', value: nightsSpread(board) },
    { label: 'Times in', value: board.zone, isLast: true },
  ];
}

function payFigures({ proof, maySeePay, currency, run, isRunCurrent }: Board): StandingFigure[] {
  if (!proof || !maySeePay) return [];
  const overtime = (
    <>
      {hours(proof.overtimeMinutes)}, <Money cents={proof.overtimePayCents} currency={currency} />
    </>
  );
  const figures: StandingFigure[] = [
    {
      label: 'Cost',
      value: <Money cents={proof.costCents} currency={currency} />,
      isScreenOnly: true,
    },
  ];
  if (isRunCurrent && run?.boundCents != null && run.bestCostCents === proof.costCents) {
    figures.push({
      label: 'Proven: not below',
      value: <Money cents={run.boundCents} currency={currency} />,
      isScreenOnly: true,
    });
  }
  return [...figures, { label: 'Overtime', value: overtime, isScreenOnly: true }];
}

/** "1 to 8 among 16": people who work no nights are left out of the spread. */
function nightsSpread({ people }: Board): string {
  const counts = people.map(({ nights }) => nights).filter((nights) => nights > 0);
  if (counts.length === 0) return 'none';
  return `${Math.min(...counts)} to ${Math.max(...counts)} among ${counts.length}`;
}
