import { useRef } from 'react';
import { Button } from '@/app/_ui/button';
import { dateRange } from '@/app/_ui/clock';
import { ProblemNote } from '@/app/_ui/problem-note';
import { SectionHead } from '@/app/_ui/section-head';
import { type Floor, isInForce } from '@/modules/coverage';
import type { Period } from './period';

interface Props {
  readonly floors: readonly Floor[];
  readonly period: Period;
  readonly next: Omit<Period, 'isOpen'>;
  readonly onContinue: () => void;
  readonly isSaving: boolean;
  readonly problem: unknown;
}

/** Lets the floors of the last day of this period hold through the next one too. */
export function ContinueFloors({ floors, period, next, onContinue, isSaving, problem }: Props) {
  const section = useRef<HTMLElement>(null);
  const range = dateRange(next.startsOn, next.endsOn);
  const ending = floors.filter(
    (floor) => isInForce(floor, period.endsOn) && !isInForce(floor, next.endsOn),
  );
  return (
    <section ref={section} tabIndex={-1} aria-labelledby="next-head" className="outline-none">
      <SectionHead id="next-head">The next period, {range}</SectionHead>
      {ending.length === 0 ? (
        <p className="text-ink2">Every floor of the last day of this period holds there too.</p>
      ) : (
        <>
          <Button
            disabled={isSaving}
            onClick={() => {
              // The button goes away once it is done: the keyboard needs another place.
              section.current?.focus();
              onContinue();
            }}
          >
            Use these floors for the next period too
          </Button>
          <p className="mt-2 max-w-[46rem] text-second text-ink2">
            {ending.length === 1 ? 'One floor then holds' : `${ending.length} floors then hold`}{' '}
            through {range}. Dates that differ are not copied: each belongs to its own date.
          </p>
        </>
      )}
      <ProblemNote problem={problem} kept="The floors are as they were." />
    </section>
  );
}
