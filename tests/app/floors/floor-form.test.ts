import { describe, expect, it } from 'vitest';
import { emptyForm, floorFormSchema, toForm } from '@/app/(supervisor)/floors/floor-form';
import { floorInputSchema } from '@/modules/coverage';
import { period, sampleFloor } from './sample-floors';

const typed = { ...emptyForm(period), startMinute: '07:00', endMinute: '15:00' };
const problemsOf = (changes: Partial<typeof typed>) => {
  const outcome = floorFormSchema.safeParse({ ...typed, ...changes });
  return outcome.success ? [] : outcome.error.issues.map(({ path }) => path.join('.'));
};

describe('the form of a floor', () => {
  it('comes back as it was written', () => {
    const {
      id: _,
      teamId: __,
      dates: ___,
      ...input
    } = sampleFloor({
      startMinute: 1380,
      endMinute: 1860,
      priceCentsPerHour: 4050,
      counting: 'shared',
      effectiveTo: null,
      skillId: null,
    });
    expect(floorInputSchema.parse(input)).toEqual(input);
    expect(floorFormSchema.parse(toForm(input))).toEqual(input);
  });

  it('begins with one person through the period', () => {
    expect(floorFormSchema.parse(typed)).toEqual({
      skillId: null,
      startMinute: 420,
      endMinute: 900,
      needs: [1, 1, 1, 1, 1, 1, 1, 1],
      counting: 'seated',
      priceCentsPerHour: null,
      effectiveFrom: '2027-02-01',
      effectiveTo: '2027-02-28',
    });
  });

  it('forgets the price of a floor that is firm', () => {
    const form = { ...typed, force: 'firm', priceCentsPerHour: 'whatever' };
    expect(floorFormSchema.parse(form).priceCentsPerHour).toBeNull();
  });

  it.each([
    ['a start that is no time', { startMinute: 'morning' }, 'startMinute'],
    ['an end that is missing', { endMinute: '' }, 'endMinute'],
    ['a number that is no number', { needs: ['1', '', ...typed.needs.slice(2)] }, 'needs.1'],
    ['a wish without a price', { force: 'wished' as const }, 'priceCentsPerHour'],
    ['a first day that is missing', { effectiveFrom: '' }, 'effectiveFrom'],
    ['a last day before the first', { effectiveTo: '2027-01-31' }, 'effectiveTo'],
  ])('names the field of %s', (_, changes, path) => {
    expect(problemsOf(changes)).toContain(path);
  });
});
