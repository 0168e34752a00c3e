import { describe, expect, it } from 'vitest';
import { emptyLine, sizingFormSchema, toForm } from '@/app/(supervisor)/sizing/sizing-form';
import { sampleInput, sampleLine } from '../modules/sizing/coverage-samples';

const input = sampleInput({
  span: 2,
  mostPeople: 22,
  lines: [
    sampleLine({ weekdayCents: 18_405, extraDayCents: null, mostPercent: 25 }),
    sampleLine({ id: 'line-7', skillId: 'ski_nurse', extraDayCents: 6_200, mostPeople: 0 }),
  ],
});

/** Paths of the fields that a change of the first line makes wrong. */
function wrongFields(changes: Partial<ReturnType<typeof emptyLine>>): string[] {
  const form = toForm(input);
  const [first, ...rest] = form.lines;
  const lines = first ? [{ ...first, ...changes }, ...rest] : rest;
  const outcome = sizingFormSchema.safeParse({ ...form, lines });
  return outcome.success ? [] : outcome.error.issues.map(({ path }) => path.join('.'));
}

describe('the sizing form', () => {
  it('reads back what it shows', () => {
    expect(sizingFormSchema.parse(toForm(input))).toEqual(input);
  });

  it('takes amounts with a point, a comma or no minor units', () => {
    const form = toForm(input);
    for (const text of ['184', '184.00', '184,0']) {
      const lines = form.lines.map((line) => ({ ...line, sundayCents: text }));
      expect(sizingFormSchema.parse({ ...form, lines }).lines[0]?.sundayCents).toBe(18_400);
    }
  });

  it.each([
    ['an empty name', { name: ' ' }, 'lines.0.name'],
    ['pay that is no amount', { weekdayCents: 'lots' }, 'lines.0.weekdayCents'],
    ['pay below nothing', { saturdayCents: '-0.50' }, 'lines.0.saturdayCents'],
    ['half a day', { daysOn: '2.5' }, 'lines.0.daysOn'],
    ['no days', { daysOn: '' }, 'lines.0.daysOn'],
    ['no first day', { startWeekdays: [] }, 'lines.0.startWeekdays'],
    ['a limit in words', { mostPeople: 'few' }, 'lines.0.mostPeople'],
    ['a share above everybody', { mostPercent: '101' }, 'lines.0.mostPercent'],
  ])('names the field of %s', (_, changes, path) => {
    expect(wrongFields(changes)).toEqual([path]);
  });

  it('gives a new line an id that is free in the table', () => {
    expect(emptyLine(toForm(input).lines, []).id).toBe('line-8');
  });
});
