import { Figure } from '@/app/_ui/figure';
import { SectionHead } from '@/app/_ui/section-head';
import type { Skill } from '@/modules/people';
import { explainBound, type Sizing } from '@/modules/sizing';
import { FloorPrices } from './floor-prices';
import { formatPay, formatPeople, formatValue } from './format-value';
import { PeoplePerPattern } from './people-per-pattern';
import { Shortages } from './shortages';

interface Props {
  readonly sizing: Sizing;
  readonly skills: readonly Skill[];
  readonly currency: string;
}

/** The answer: how many people or how much pay, how good that is, and what each floor's next person costs. */
export function Answer({ sizing, skills, currency }: Props) {
  const { answer, problem, input } = sizing;
  const format = formatValue(problem.objective, currency);
  const counts = answer.people.reduce((sum, { count }) => sum + count, 0);
  const pay = answer.people.reduce((sum, { patternId, count }) => {
    const pattern = problem.patterns.find(({ id }) => id === patternId);
    return sum + count * (pattern?.costCents ?? 0);
  }, 0);
  const cycle = input.span === 'week' ? 'week' : 'day';
  const isPeople = problem.objective === 'people';
  return (
    <section aria-labelledby="answer-head" className="mt-6">
      <SectionHead id="answer-head">
        {answer.floorsHold ? 'Every floor holds' : 'The floors cannot be held'}
      </SectionHead>
      {answer.floorsHold ? null : <Shortages sizing={sizing} />}
      <div className="flex flex-wrap items-end gap-x-12 gap-y-4 py-2">
        <Figure label={isPeople ? 'People, least' : `Pay a ${cycle}, least`} size="big" tone="act">
          {isPeople ? counts : formatPay(pay, currency)}
        </Figure>
        <Figure label="Linear bound: cannot be less than">{format(answer.linearBound)}</Figure>
        <Figure label={isPeople ? `Pay of these people a ${cycle}` : 'People on these patterns'}>
          {isPeople ? formatPay(pay, currency) : formatPeople(counts)}
        </Figure>
      </div>
      <p className="max-w-[60rem] text-body">{explainBound(answer, problem.objective, format)}</p>
      <div className="mt-6 grid items-start gap-x-9 gap-y-6 desk:grid-cols-2">
        <PeoplePerPattern sizing={sizing} skills={skills} currency={currency} />
        <FloorPrices sizing={sizing} skills={skills} format={format} />
      </div>
    </section>
  );
}
