import { type Actor, can, type Need } from '@/modules/access';

/** One sheet of the index. */
export interface SheetTab {
  readonly href: string;
  readonly label: string;
}

interface Sheet extends SheetTab {
  readonly need: Need;
  /** Order of places on the phone's bar; the rest stands behind "More". */
  readonly barRank: number;
  readonly isDemoOnly?: true;
}

const sheets: readonly Sheet[] = [
  { href: '/shifts', label: 'Shifts', need: 'own-shifts.read', barRank: 1 },
  { href: '/month', label: 'Month', need: 'own-shifts.read', barRank: 2 },
  { href: '/floors', label: 'Floors', need: 'floors.read', barRank: 4 },
  { href: '/shift-kinds', label: 'Shift kinds', need: 'floors.read', barRank: 9 },
  { href: '/roster', label: 'Roster', need: 'rosters.read', barRank: 3 },
  { href: '/runs', label: 'Runs', need: 'rosters.write', barRank: 5 },
  { href: '/sizing', label: 'Sizing', need: 'sizing.run', barRank: 8 },
  { href: '/calendar', label: 'Calendar', need: 'rosters.read', barRank: 6 },
  { href: '/hours', label: 'Hours', need: 'hours.read', barRank: 7 },
  { href: '/members', label: 'Members', need: 'members.write', barRank: 10 },
  { href: '/mail', label: 'Mail', need: 'mail.read', barRank: 11, isDemoOnly: true },
];

/** The sheets that an actor may open, in the order of the index. */
export function tabsFor(actor: Actor, isDemo: boolean): SheetTab[] {
  return sheetsFor(actor, isDemo).map(({ href, label }) => ({ href, label }));
}

/** The phone's bar has five places: up to four sheets, and "More" for the rest, theme and sign-out. */
export function barTabsFor(
  actor: Actor,
  isDemo: boolean,
): { readonly bar: SheetTab[]; readonly more: SheetTab[] } {
  const ranked = sheetsFor(actor, isDemo).sort((a, b) => a.barRank - b.barRank);
  const tabs = ranked.map(({ href, label }) => ({ href, label }));
  return { bar: tabs.slice(0, 4), more: tabs.slice(4) };
}

/** Whether a sheet is the open one: its own address or one below it. */
export const isOpenTab = (pathname: string, { href }: SheetTab): boolean =>
  pathname === href || pathname.startsWith(`${href}/`);

function sheetsFor(actor: Actor, isDemo: boolean): Sheet[] {
  return sheets.filter(({ need, isDemoOnly }) => can(actor, need) && (isDemo || !isDemoOnly));
}
