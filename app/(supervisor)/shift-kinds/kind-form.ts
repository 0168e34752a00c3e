import { z } from 'zod';
import { type ShiftKindInput, shiftKindInputSchema } from '@/modules/coverage';
import { readWindow, writeWindow } from '../_window';

/** A shift kind as it is typed. Fields are named as in `ShiftKindInput`, so that its errors find them. */
export interface KindForm {
  name: string;
  letter: string;
  startMinute: string;
  endMinute: string;
  unpaidBreakMinutes: string;
  isNight: boolean;
  posts: 'all' | 'some';
  skillIds: string[];
}

/** Reads what was typed and checks it with the schema that the route and the use-case share. */
export const kindFormSchema = z
  .custom<KindForm>()
  .transform(
    (form): ShiftKindInput => ({
      name: form.name,
      letter: form.letter,
      ...readWindow(form.startMinute, form.endMinute),
      unpaidBreakMinutes: form.unpaidBreakMinutes.trim()
        ? Number(form.unpaidBreakMinutes)
        : Number.NaN,
      isNight: form.isNight,
      skillIds: form.posts === 'all' ? null : form.skillIds,
    }),
  )
  .pipe(shiftKindInputSchema);

/** What stands in the fields for a shift kind. */
export function toForm(kind: ShiftKindInput): KindForm {
  return {
    name: kind.name,
    letter: kind.letter,
    ...writeWindow(kind),
    unpaidBreakMinutes: String(kind.unpaidBreakMinutes),
    isNight: kind.isNight,
    posts: kind.skillIds ? 'some' : 'all',
    skillIds: [...(kind.skillIds ?? [])],
  };
}

/** A new shift kind: no break, open to every skill; name and hours are still open. */
export const emptyForm = (): KindForm => ({
  name: '',
  letter: '',
  startMinute: '',
  endMinute: '',
  unpaidBreakMinutes: '0',
  isNight: false,
  posts: 'all',
  skillIds: [],
});
