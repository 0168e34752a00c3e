import { type DateRange, dateRangeSchema, isLocalDate } from '@/modules/units';

/** Which hours are shown. */
export interface HoursChoice {
  readonly teamId: string;
  readonly range: DateRange;
}

/**
 * What an address says of it. `range` is null where its dates make none; `typed` is what stands there
 * for the fields, empty for a date that does not exist: a date field could not show it.
 */
export interface HoursAddress {
  readonly teamId: string | null;
  readonly range: DateRange | null;
  readonly typed: { readonly from: string; readonly to: string } | null;
}

/** Reads the query of the page's address; nothing in it is trusted. */
export function readAddress(query: URLSearchParams): HoursAddress {
  const from = query.get('from');
  const to = query.get('to');
  const range = dateRangeSchema.safeParse({ from, to });
  return {
    teamId: query.get('team'),
    range: range.success ? range.data : null,
    typed: from === null && to === null ? null : { from: fieldText(from), to: fieldText(to) },
  };
}

const fieldText = (date: string | null): string => (date && isLocalDate(date) ? date : '');

/** The address that shows a choice again. */
export const addressOf = ({ teamId, range }: HoursChoice): string =>
  `/hours?${new URLSearchParams({ team: teamId, ...range })}`;

/** Where the API has the hours of a choice; `.csv` gives the file. */
export const hoursPath = ({ teamId, range }: HoursChoice, ending: '' | '.csv' = ''): string =>
  `teams/${teamId}/hours${ending}?${new URLSearchParams(range)}`;

/** The query of an address as a page gets it; a name that stands there twice is left out. */
export const queryOf = (
  params: Readonly<Record<string, string | string[] | undefined>>,
): URLSearchParams =>
  new URLSearchParams(
    Object.entries(params).flatMap(([name, value]) =>
      typeof value === 'string' ? [[name, value]] : [],
    ),
  );
