import { hours } from '@/app/_ui/clock';
import type { Bracket, KnotsView, KnotView, WayOutView } from '@/modules/roster';
import { formatMoney } from '@/modules/units';

/** The line above the knots of a run. */
export function knotsVerdict({ knots, isComplete }: KnotsView): string {
  if (knots.length === 0) return 'Nothing was found in the time that a search is given.';
  const found =
    knots.length === 1 ? 'This cannot all be met together.' : 'Each of these cannot be met.';
  return isComplete
    ? `${found} With it undone, everything else can be.`
    : `${found} There may be more.`;
}

/** The head of a knot: what counting says, or how many needs clash. */
export const knotTitle = ({ sentence, members }: KnotView, place: number): string =>
  sentence ??
  `Knot ${place + 1}: ${members.length === 1 ? 'this cannot be met' : `these ${members.length} cannot all be met`}`;

/** `8 h less missing`, `4 h to 8 h less missing`, `as much missing`. */
export function shortageChangeWords({ least, most }: Bracket): string {
  if (least === 0 && most === 0) return 'as much missing';
  if (least < 0 && most > 0) return `${hours(-least)} less to ${hours(most)} more missing`;
  const [from, to] = [least, most].map(Math.abs).sort((one, other) => one - other);
  const amount = from === to ? hours(to ?? 0) : `${hours(from ?? 0)} to ${hours(to ?? 0)}`;
  return `${amount} ${most > 0 ? 'more' : 'less'} missing`;
}

/** `+€120`, `−€40 to +€20`: against the cost of the roster today. */
export function costChangeWords({ least, most }: Bracket, currency: string): string {
  const signed = (cents: number): string => {
    const sign = cents > 0 ? '+' : cents < 0 ? '\u2212' : '';
    return `${sign}${formatMoney(Math.abs(cents), currency)}`;
  };
  const [from, to] = [signed(least), signed(most)];
  return from === to ? from : `${from} to ${to}`;
}

/** Whether a way out unties its knot. */
export function undoesWords({ undoesKnot }: WayOutView): string {
  if (undoesKnot === null) return 'not tested';
  return undoesKnot ? 'yes' : 'not alone';
}
