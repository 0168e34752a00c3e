import { describe, expect, it } from 'vitest';
import { emptyForm, kindFormSchema, toForm } from '@/app/(supervisor)/shift-kinds/kind-form';

const night = {
  name: 'Night',
  letter: 'N',
  startMinute: 1380,
  endMinute: 1860,
  unpaidBreakMinutes: 30,
  isNight: true,
  skillIds: ['ski_vet'],
};
const problemsOf = (changes: Partial<ReturnType<typeof toForm>>) => {
  const outcome = kindFormSchema.safeParse({ ...toForm(night), ...changes });
  return outcome.success ? [] : outcome.error.issues.map(({ path }) => path.join('.'));
};

describe('the form of a shift kind', () => {
  it('comes back as it was written', () => {
    expect(kindFormSchema.parse(toForm(night))).toEqual(night);
    const open = { ...night, skillIds: null };
    expect(kindFormSchema.parse(toForm(open))).toEqual(open);
  });

  it('forgets ticked skills once all may work it', () => {
    const form = { ...toForm(night), posts: 'all' as const };
    expect(kindFormSchema.parse(form).skillIds).toBeNull();
  });

  it.each([
    ['no name', { name: ' ' }, 'name'],
    ['too many letters', { letter: 'NGHT' }, 'letter'],
    ['a start that is no time', { startMinute: '' }, 'startMinute'],
    ['a break that is no number', { unpaidBreakMinutes: '' }, 'unpaidBreakMinutes'],
    ['no skill ticked', { skillIds: [] }, 'skillIds'],
  ])('names the field of %s', (_, changes, path) => {
    expect(problemsOf(changes)).toContain(path);
  });

  it('refuses a break as long as the shift', () => {
    const form = { startMinute: '07:00', endMinute: '08:00', unpaidBreakMinutes: '60' };
    expect(problemsOf(form)).toEqual(['unpaidBreakMinutes']);
  });

  it('asks for name and hours of a new one', () => {
    const outcome = kindFormSchema.safeParse(emptyForm());
    expect(outcome.success).toBe(false);
  });
});
