import { clockRange } from '@/app/_ui/clock';
import { SectionHead } from '@/app/_ui/section-head';
import type { HoursView } from '@/modules/hours';

/** Where the figures come from and how they are counted. */
export function HoursNotes({ payRules }: Pick<HoursView, 'payRules'>) {
  const night = clockRange(payRules.nightStartMinute, payRules.nightEndMinute);
  return (
    <section aria-labelledby="hours-notes" className="mt-6">
      <SectionHead id="hours-notes">How these hours are counted</SectionHead>
      <ul className="list-disc space-y-1.5 pl-5 text-second text-ink2">
        <li>
          Planned hours are of published rosters only, of the newest version of each. Worked hours
          are what was recorded. Unpaid breaks are in neither.
        </li>
        <li>
          The difference counts days with recorded work only. Bars, night, weekend and holiday take
          worked time where it is recorded, and the plan elsewhere.
        </li>
        <li>
          One hour can stand in several columns: night, weekend and holiday overlap, so they do not
          add up to the hours.
        </li>
        <li>
          Night is {night}, weekend Saturday 00:00 to Sunday 24:00, holiday the whole date, all by
          the team’s clock; a shift across midnight is split. They add {payRules.nightPercent} %,{' '}
          {payRules.weekendPercent} % and {payRules.holidayPercent} % of the ordinary rate, each on
          top of the others.
        </li>
        <li>
          All hours of a shift stand on the date on which it starts, also those after midnight of
          the last day.
        </li>
        <li>
          Contract hours are the part of the contract that falls into these dates, a seventh of the
          week for each. Overtime is settled over whole periods.
        </li>
      </ul>
    </section>
  );
}
