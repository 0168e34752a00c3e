import { expect, it } from 'vitest';
import { dateFormSchema } from '@/app/(supervisor)/floors/date-form';

const typed = { floorId: 'flr_1', date: '2027-02-17', people: '2', reason: ' Kennels full ' };
const problemsOf = (changes: Partial<typeof typed>) => {
  const outcome = dateFormSchema.safeParse({ ...typed, ...changes });
  return outcome.success ? [] : outcome.error.issues.map(({ path }) => path.join('.'));
};

it('reads a date that differs', () => {
  expect(dateFormSchema.parse(typed)).toEqual({ ...typed, people: 2, reason: 'Kennels full' });
});

it.each([
  [{ floorId: '' }, 'floorId'],
  [{ date: '' }, 'date'],
  [{ date: '2027-02-30' }, 'date'],
  [{ people: '' }, 'people'],
  [{ people: '1000' }, 'people'],
  [{ reason: 'x'.repeat(201) }, 'reason'],
])('names the field of %j', (changes, path) => {
  expect(problemsOf(changes)).toEqual([path]);
});
