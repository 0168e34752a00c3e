import { describe, expect, it } from 'vitest';
import { expandLines, type SizingInput } from '@/modules/sizing';
import {
  desk,
  nurse,
  sampleFloor,
  sampleInput,
  sampleKind,
  sampleLine,
  skills,
} from './coverage-samples';

const early = sampleKind('early');
const night = sampleKind('night', { startMinute: 1320, endMinute: 1800 });
const source = { kinds: [early, night], skills, floors: [sampleFloor('day')] };

function expand(input: SizingInput, from = source) {
  const outcome = expandLines(input, from);
  if (!outcome.ok) throw new Error(outcome.error.detail);
  return outcome.value;
}

function fieldsOf(input: SizingInput, from = source) {
  const outcome = expandLines(input, from);
  return outcome.ok ? [] : (outcome.error.fields ?? []);
}

describe('the patterns of a line', () => {
  it('are one for each first weekday, each with its days in a row and its pay by weekday', () => {
    const { patterns, cycleMinutes } = expand(sampleInput());
    expect(cycleMinutes).toBe(10080);
    expect(patterns.map(({ costCents }) => costCents)).toEqual([
      50_000, 52_000, 57_000, 57_000, 57_000, 57_000, 55_000,
    ]);
    expect(patterns[5]).toMatchObject({ id: 'full-time/5', lineId: 'full-time' });
    expect(patterns[5]?.label).toBe('Full time, from Sat');
    expect(patterns[5]?.duties.map(({ startMinute }) => startMinute)).toEqual([
      5 * 1440 + 420,
      6 * 1440 + 420,
      420,
      1440 + 420,
      2 * 1440 + 420,
    ]);
  });

  it('begin only on the first weekdays that are allowed', () => {
    const { patterns } = expand(sampleInput({ lines: [sampleLine({ startWeekdays: [4, 0] })] }));
    expect(patterns.map(({ id }) => id)).toEqual(['full-time/0', 'full-time/4']);
  });

  it('pay the days beyond the fifth in a row as extra days, whatever weekday they are', () => {
    const line = sampleLine({ daysOn: 6, extraDayCents: 6_200 });
    const { patterns } = expand(sampleInput({ lines: [line] }));
    expect(patterns[0]?.costCents).toBe(5 * 10_000 + 6_200);
    expect(patterns[1]?.costCents).toBe(4 * 10_000 + 12_000 + 6_200);
  });

  it('pay days beyond the fifth like any other without a pay of their own', () => {
    const { patterns } = expand(sampleInput({ lines: [sampleLine({ daysOn: 6 })] }));
    expect(patterns[0]?.costCents).toBe(5 * 10_000 + 12_000);
  });

  it('are a single one for seven days on, at the least pay that any first day gives', () => {
    const line = sampleLine({ daysOn: 7, extraDayCents: 0 });
    const { patterns } = expand(sampleInput({ lines: [line] }));
    expect(patterns).toHaveLength(1);
    expect(patterns[0]).toMatchObject({ costCents: 50_000, label: 'Full time, every day' });
    expect(patterns[0]?.duties).toHaveLength(7);
  });

  it('wrap past Sunday midnight into Monday', () => {
    const line = sampleLine({ shiftKindId: night.id, daysOn: 1, startWeekdays: [6] });
    const { patterns } = expand(sampleInput({ lines: [line] }));
    expect(patterns[0]?.duties).toEqual([{ startMinute: 9960, endMinute: 10440 }]);
  });
});

describe('one weekday that repeats', () => {
  const day = sampleLine({ shiftKindId: night.id, daysOn: 1 });

  it('is a circle of a day: a duty past midnight comes round to its start', () => {
    const problem = expand(sampleInput({ span: 6, lines: [day] }));
    expect(problem).toMatchObject({
      cycleMinutes: 1440,
      floors: [{ weekday: 6, startMinute: 420, endMinute: 900 }],
      patterns: [
        { label: 'Full time', costCents: 15_000, duties: [{ startMinute: 1320, endMinute: 1800 }] },
      ],
    });
    expect(problem.patterns).toHaveLength(1);
  });

  it('refuses a line of several days and one that never begins on it, field by field', () => {
    const lines = [
      sampleLine({ id: 'a' }),
      sampleLine({ id: 'b', name: 'Help', daysOn: 1, startWeekdays: [1] }),
    ];
    const fields = fieldsOf(sampleInput({ span: 0, lines }));
    expect(fields.map(({ path }) => path)).toEqual(['lines.0.daysOn', 'lines.1.startWeekdays']);
    expect(fields[1]?.message).toBe(
      '"Help" never begins on Mon. Allow that day, or remove the line.',
    );
  });
});

describe('limits', () => {
  it('become caps on everybody, on a line, and on the share of a line', () => {
    const lines = [
      sampleLine({ mostPeople: 4 }),
      sampleLine({ id: 'help', name: 'Help', mostPercent: 25 }),
    ];
    const { caps } = expand(sampleInput({ lines, mostPeople: 22 }));
    expect(caps.map(({ lineIds, limit }) => ({ lineIds, limit }))).toEqual([
      { lineIds: ['full-time', 'help'], limit: { people: 22 } },
      { lineIds: ['full-time'], limit: { people: 4 } },
      { lineIds: ['help'], limit: { percentOfAll: 25 } },
    ]);
  });
});

describe('what does not fit', () => {
  const nurses = sampleKind('nurses', { skillIds: [nurse.id] });
  const from = { ...source, kinds: [early, nurses] };

  it.each([
    ['a shift kind that is not in use', { shiftKindId: 'knd_old' }, 'shiftKindId'],
    ['a skill of another team', { skillId: 'ski_other' }, 'skillId'],
    [
      'a skill nobody is posted in on the kind',
      { shiftKindId: nurses.id, skillId: desk.id },
      'skillId',
    ],
  ])('names line and field for %s', (_, changes, field) => {
    const fields = fieldsOf(sampleInput({ lines: [sampleLine(changes)] }), from);
    expect(fields.map(({ path }) => path)).toEqual([`lines.0.${field}`]);
    expect(fields[0]?.message).toContain('"Full time"');
  });

  it('refuses two lines of one id', () => {
    const fields = fieldsOf(sampleInput({ lines: [sampleLine(), sampleLine()] }));
    expect(fields.map(({ path }) => path)).toEqual(['lines.1.id']);
  });

  it('refuses a week in which no floor asks for anybody', () => {
    const fields = fieldsOf(sampleInput({ weekOf: '2026-12-21' }));
    expect(fields).toEqual([
      {
        path: 'weekOf',
        message:
          'No floor asks for anybody in the week of Mon 21 Dec. Choose another week, or add floors.',
      },
    ]);
  });

  it('refuses a weekday without floors', () => {
    const floors = [sampleFloor('day', { needs: [0, 1, 1, 1, 1, 1, 1, 9] })];
    const input = sampleInput({ span: 0, lines: [sampleLine({ daysOn: 1 })] });
    expect(fieldsOf(input, { ...source, floors })[0]?.path).toBe('weekOf');
  });
});
