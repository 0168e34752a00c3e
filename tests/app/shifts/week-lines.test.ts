import { describe, expect, it } from 'vitest';
import { periodsAhead, splitWeeks } from '@/app/(staff)/shifts/order-periods';
import { confirmSentence, freeWords, weekTotal } from '@/app/(staff)/shifts/period-words';
import { weeksOf } from '@/app/(staff)/shifts/week-lines';
import type { OwnPeriod } from '@/modules/roster';
import { ownShift } from '../_ui/calendar/calendar-entries';

function period(changes: Partial<OwnPeriod> = {}): OwnPeriod {
  return {
    rosterId: 'ros_1',
    versionId: 'ver_1',
    versionNumber: 1,
    startsOn: '2027-02-01',
    endsOn: '2027-02-28',
    confirmBy: '2027-01-18',
    confirmedAtUtc: null,
    contractMinutes: 9600,
    plannedMinutes: 9600,
    nights: 0,
    weekends: 0,
    shifts: [],
    leave: [],
    ...changes,
  };
}

const lates = ['2027-02-02', '2027-02-03', '2027-02-04', '2027-02-05'].map((date) =>
  ownShift(date, 'Late'),
);

/** Shifts on the first days of February, one a day. */
const daysInARow = (count: number) =>
  Array.from({ length: count }, (_, index) => ownShift(`2027-02-0${index + 1}`, 'Early'));

describe('the weeks of a period', () => {
  it('run from Monday, with every day in one line and free days in a row in one', () => {
    const [first] = weeksOf(period({ shifts: lates }));
    expect(
      first?.lines.map((line) => (line.is === 'shift' ? line.shift.date : freeWords(line))),
    ).toEqual([
      'off Mon 1',
      '2027-02-02',
      '2027-02-03',
      '2027-02-04',
      '2027-02-05',
      'off Sat 6 to Sun 7',
    ]);
  });

  it('are cut where the period begins or ends inside a week', () => {
    const weeks = weeksOf(period({ startsOn: '2027-02-03', endsOn: '2027-03-02' }));
    expect(weeks.map(({ from, to }) => `${from} ${to}`)).toEqual([
      '2027-02-03 2027-02-07',
      '2027-02-08 2027-02-14',
      '2027-02-15 2027-02-21',
      '2027-02-22 2027-02-28',
      '2027-03-01 2027-03-02',
    ]);
  });

  it('tell leave from days off', () => {
    const leave = [{ startsOn: '2027-02-03', endsOn: '2027-02-12' }];
    const [first] = weeksOf(period({ leave }));
    expect(first?.lines.map((line) => (line.is === 'shift' ? '' : freeWords(line)))).toEqual([
      'off Mon 1 to Tue 2',
      'leave Wed 3 to Sun 7',
    ]);
    expect(first?.leaveDays).toBe(5);
  });
});

describe('the total of a week', () => {
  const total = (changes: Partial<OwnPeriod>, weeklyMinutes = 2400) => {
    const [first] = weeksOf(period(changes));
    return first && weekTotal(first, weeklyMinutes);
  };

  it.each([
    ['as usual', { shifts: daysInARow(5) }, '5 shifts, 40 h'],
    ['more than usual', { shifts: daysInARow(6) }, '6 shifts, 48 h (usual 40)'],
    ['less than usual', { shifts: daysInARow(1) }, '1 shift, 8 h (usual 40)'],
    [
      'with leave, which explains itself',
      { shifts: daysInARow(2), leave: [{ startsOn: '2027-02-03', endsOn: '2027-02-05' }] },
      '2 shifts, 16 h, leave 3 days',
    ],
    ['of a cut week', { shifts: daysInARow(2), endsOn: '2027-02-02' }, '2 shifts, 16 h'],
  ])('%s', (_, changes, words) => {
    expect(total(changes)).toBe(words);
  });

  it('says nothing of what is usual without a contract', () => {
    expect(total({ shifts: daysInARow(1) }, 0)).toBe('1 shift, 8 h');
  });
});

describe('the periods of a person', () => {
  const january = period({ startsOn: '2027-01-04', endsOn: '2027-01-31' });

  it('stand with the running one first and without those that are over', () => {
    const december = period({ startsOn: '2026-12-07', endsOn: '2027-01-03' });
    const ahead = periodsAhead([period(), december, january], '2027-01-14');
    expect(ahead.map(({ startsOn }) => startsOn)).toEqual(['2027-01-04', '2027-02-01']);
  });

  it('show the week of today whole and put earlier weeks aside', () => {
    const { past, ahead } = splitWeeks(january, '2027-01-14');
    expect(past.map(({ from }) => from)).toEqual(['2027-01-04']);
    expect(ahead.map(({ from }) => from)).toEqual(['2027-01-11', '2027-01-18', '2027-01-25']);
  });
});

describe('the question to confirm', () => {
  it('says by when and what follows', () => {
    expect(confirmSentence(period(), '2027-01-15')).toBe(
      'Please confirm by Mon 18 Jan. After that your supervisor sees who has not confirmed.',
    );
  });

  it('stays open when the day is over', () => {
    expect(confirmSentence(period(), '2027-01-19')).toBe(
      'The day to confirm was Mon 18 Jan; you still can. Until then your supervisor sees who has not confirmed.',
    );
  });

  it('does without a day', () => {
    expect(confirmSentence(period({ confirmBy: null }), '2027-01-19')).toBe(
      'Please confirm soon: your supervisor sees who has not confirmed.',
    );
  });
});
