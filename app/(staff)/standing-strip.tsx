import { hours } from '@/app/_ui/clock';
import { Figure } from '@/app/_ui/figure';
import type { OwnPeriod } from '@/modules/roster';

/** A person's standing figures of one period: hours against the contract, Nights, weekends. */
export function StandingStrip({ period }: { readonly period: OwnPeriod }) {
  const { plannedMinutes, contractMinutes, nights, weekends } = period;
  return (
    <div className="grid grid-cols-3 divide-x divide-rule border-t border-ink [&>*]:px-3 [&>*]:py-2 [&>*:first-child]:pl-0">
      <Figure label="Hours planned">
        <span className="text-verdict">{hours(plannedMinutes)}</span>
        <span className="block text-note font-normal text-ink2">
          contract {hours(contractMinutes)}
        </span>
      </Figure>
      <Figure label="Nights">
        <span className="text-verdict">{nights}</span>
      </Figure>
      <Figure label="Weekends">
        <span className="text-verdict">{weekends}</span>
      </Figure>
    </div>
  );
}
