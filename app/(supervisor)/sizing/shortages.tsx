import { explainShortage, type Sizing } from '@/modules/sizing';
import { formatHours } from '@/modules/units';

/** What is missing at least, window by window, when the floors cannot be held. */
export function Shortages({ sizing }: { readonly sizing: Sizing }) {
  const { answer, problem, input } = sizing;
  const cycle = input.span === 'week' ? 'week' : 'day';
  const within = problem.caps.length > 0 ? ' within the limits on people' : '';
  return (
    <div className="flex gap-3 py-2">
      <span aria-hidden="true" className="hatch mt-1 size-5 shrink-0" />
      <div>
        <p className="text-body font-[660] text-short">
          {answer.isProven ? 'At least ' : 'In the best answer found, '}
          {formatHours(answer.shortageMinutes)} hours of cover are missing each {cycle}
          {answer.isProven ? `: no number of people on these patterns${within} does better.` : '.'}
        </p>
        <ul className="mt-1 list-disc pl-5 text-body">
          {answer.shortages.map((shortage) => (
            <li key={shortage.label}>{explainShortage(shortage)}</li>
          ))}
        </ul>
        <p className="mt-1 text-second text-ink2">
          The same shortage can often stand elsewhere: this is one of the ways. The figures below
          are for this much shortage.
        </p>
      </div>
    </div>
  );
}
