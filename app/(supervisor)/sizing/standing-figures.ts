import { formatInstant } from '@/app/_ui/clock';
import type { StandingFigure } from '@/app/_ui/title-block';
import type { Sizing } from '@/modules/sizing';
import { formatDay, mondayOf } from '@/modules/units';

/** The foot of the sheet: what was asked last and when, by the team's clock. */
export function standingFigures(sizing: Sizing | null, zone: string): StandingFigure[] {
  if (!sizing) return [{ label: 'Sized', value: 'not yet' }];
  const { problem, answer, input, askedAtUtc } = sizing;
  return [
    { label: 'Week of', value: formatDay(mondayOf(input.weekOf)) },
    { label: 'Patterns tried', value: problem.patterns.length },
    { label: 'Floor windows', value: problem.floors.length },
    answer.floorsHold
      ? { label: 'Floors', value: 'hold', tone: 'holds' }
      : { label: 'Floors', value: 'cannot be held', tone: 'short' },
    {
      label: 'Asked',
      value: formatInstant(askedAtUtc, zone),
      isLast: true,
    },
  ];
}
