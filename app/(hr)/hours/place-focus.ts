import type { PersonId } from '@/modules/units';

/** Id of the button that opens a person's days. */
export const rowId = (personId: PersonId): string => `hours-of-${personId}`;

/** Puts the focus on a person's row. */
export const focusRow = (personId: PersonId): void =>
  document.getElementById(rowId(personId))?.focus();

/**
 * Leads to the days of the person just chosen where they lie out of view, below the table. Beside the
 * table they take no focus, so that arrow keys go on from row to row.
 */
export function revealPerson(panelId: string): void {
  const head = document.getElementById(panelId);
  if (!head) return;
  const { top, bottom } = head.getBoundingClientRect();
  if (top < 0 || bottom > window.innerHeight) head.focus();
}
