import { z } from 'zod';
import { readAmount, writeAmount } from '@/app/_ui/amount';
import { type FloorInput, floorInputSchema } from '@/modules/coverage';
import { readWindow, writeWindow } from '../_window';
import type { Period } from './period';

/** A floor as it is typed. Fields are named as in `FloorInput`, so that its errors find them. */
export interface FloorForm {
  /** Empty: anybody. */
  skillId: string;
  startMinute: string;
  endMinute: string;
  needs: string[];
  counting: 'seated' | 'shared';
  force: 'firm' | 'wished';
  priceCentsPerHour: string;
  effectiveFrom: string;
  /** Empty: no last day. */
  effectiveTo: string;
}

/** Reads what was typed and checks it with the schema that the route and the use-case share. */
export const floorFormSchema = z
  .custom<FloorForm>()
  .transform(
    (form): FloorInput => ({
      skillId: form.skillId || null,
      ...readWindow(form.startMinute, form.endMinute),
      needs: form.needs.map((text) => (text.trim() ? Number(text) : Number.NaN)),
      counting: form.counting,
      priceCentsPerHour: form.force === 'wished' ? readAmount(form.priceCentsPerHour) : null,
      effectiveFrom: form.effectiveFrom,
      effectiveTo: form.effectiveTo || null,
    }),
  )
  .pipe(floorInputSchema);

/** What stands in the fields for a floor. */
export function toForm(floor: FloorInput): FloorForm {
  return {
    skillId: floor.skillId ?? '',
    ...writeWindow(floor),
    needs: floor.needs.map(String),
    counting: floor.counting,
    force: floor.priceCentsPerHour === null ? 'firm' : 'wished',
    priceCentsPerHour: writeAmount(floor.priceCentsPerHour),
    effectiveFrom: floor.effectiveFrom,
    effectiveTo: floor.effectiveTo ?? '',
  };
}

/** A new floor: one person, firm, through the period shown; the hours are still open. */
export function emptyForm(period: Omit<Period, 'isOpen'>): FloorForm {
  return {
    skillId: '',
    startMinute: '',
    endMinute: '',
    needs: Array.from({ length: 8 }, () => '1'),
    counting: 'seated',
    force: 'firm',
    priceCentsPerHour: '',
    effectiveFrom: period.startsOn,
    effectiveTo: period.endsOn,
  };
}
