import { describe, expect, it } from 'vitest';
import { kindsOf, postLines, toBlocks } from '@/app/_ui/calendar/blocks';
import { choicesIn, chooseEntries, everything } from '@/app/_ui/calendar/choose-entries';
import { entry } from './calendar-entries';

const zone = 'Europe/Dublin';
const thursday = '2027-02-11';

describe('blocks of a calendar', () => {
  const entries = [
    entry(thursday, 'Late', { personName: 'Hana Quill' }),
    entry(thursday, 'Early', { personName: 'Noor Haldane', skillName: 'Vet' }),
    entry(thursday, 'Early', { personName: 'Ione Baptisto' }),
    entry(thursday, 'Early', { personName: 'Desmond Ferlow' }),
    entry('2027-02-10', 'Night', { personName: 'Petra Vanholt' }),
  ];

  it('hold everybody of one kind and day, in the order of day and start', () => {
    const blocks = toBlocks(entries, zone);
    expect(blocks.map(({ date, kindName, entries: who }) => [date, kindName, who.length])).toEqual([
      ['2027-02-10', 'Night', 1],
      [thursday, 'Early', 3],
      [thursday, 'Late', 1],
    ]);
  });

  it('name people by post, then by name', () => {
    const early = toBlocks(entries, zone).filter(({ kindName }) => kindName === 'Early');
    expect(early.map(postLines)).toEqual([
      [
        { post: 'Nurse', names: ['Desmond Ferlow', 'Ione Baptisto'] },
        { post: 'Vet', names: ['Noor Haldane'] },
      ],
    ]);
  });

  it('keep a night on the day on which it starts', () => {
    const [night] = toBlocks([entry(thursday, 'Night')], zone);
    expect(night).toMatchObject({ date: thursday, startMinute: 1380, endMinute: 1860 });
  });

  it.each(['America/Los_Angeles', 'Asia/Kolkata', 'Pacific/Auckland'])(
    'read the hours by the clock of the team in %s',
    (teamZone) => {
      const [late] = toBlocks([entry(thursday, 'Late', { zone: teamZone })], teamZone);
      expect(late).toMatchObject({ date: thursday, startMinute: 900, endMinute: 1380 });
    },
  );

  it('show what the clock shows on the nights of a clock change', () => {
    for (const date of ['2027-03-27', '2027-10-30']) {
      const [night] = toBlocks([entry(date, 'Night')], zone);
      expect(night).toMatchObject({ date, startMinute: 1380, endMinute: 1860 });
    }
  });

  it('keep shifts of a kind apart whose times were changed', () => {
    const long = entry(thursday, 'Early', { personName: 'Bram Okell' });
    const blocks = toBlocks(
      [entry(thursday, 'Early'), { ...long, endsAtUtc: long.endsAtUtc + 3_600_000 }],
      zone,
    );
    expect(blocks.map(({ endMinute }) => endMinute)).toEqual([900, 960]);
    expect(kindsOf(blocks)).toHaveLength(1);
  });
});

describe('the choice of a calendar', () => {
  const entries = [
    entry(thursday, 'Early', { personName: 'Jun Marisco', skillName: 'Ward' }),
    entry('2027-02-12', 'Early', { personName: 'Jun Marisco', skillName: 'Nurse' }),
    entry(thursday, 'Late', { personName: 'Bram Okell', skillName: 'Ward' }),
  ];

  it('offers the people and posts that occur, by name', () => {
    expect(choicesIn(entries)).toEqual({
      people: [
        { id: 'per_Bram Okell', name: 'Bram Okell' },
        { id: 'per_Jun Marisco', name: 'Jun Marisco' },
      ],
      posts: ['Nurse', 'Ward'],
    });
  });

  it('narrows to a person, a post, or both', () => {
    const count = (choice: Partial<typeof everything>) =>
      chooseEntries(entries, { ...everything, ...choice }).length;
    expect(count({})).toBe(3);
    expect(count({ personId: 'per_Jun Marisco' })).toBe(2);
    expect(count({ skillName: 'Ward' })).toBe(2);
    expect(count({ personId: 'per_Jun Marisco', skillName: 'Ward' })).toBe(1);
  });
});
