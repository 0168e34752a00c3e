import { z } from 'zod';
import { type FloorDate, floorDateSchema } from '@/modules/coverage';
import { localDateSchema } from '@/modules/units';

/** A date that differs as it is typed. Fields are named as in the API, so that its errors find them. */
export interface DateForm {
  floorId: string;
  date: string;
  people: string;
  reason: string;
}

/** A date that differs and the floor that it is of. */
export interface DateChange extends FloorDate {
  readonly floorId: string;
}

/** Reads what was typed and checks it with the schemas that the route and the use-case share. */
export const dateFormSchema = z
  .custom<DateForm>()
  .transform(
    (form): DateChange => ({
      ...form,
      people: form.people.trim() ? Number(form.people) : Number.NaN,
    }),
  )
  .pipe(
    z.strictObject({
      ...floorDateSchema.shape,
      date: localDateSchema,
      floorId: z.string().min(1, 'Choose a floor.'),
    }),
  );
