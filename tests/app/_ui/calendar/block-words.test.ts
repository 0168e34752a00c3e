import { describe, expect, it } from 'vitest';
import {
  blockTimes,
  type DayNotes,
  endsNote,
  inSentence,
  ownDaySentence,
  teamDaySentence,
} from '@/app/_ui/calendar/block-words';
import { toBlocks } from '@/app/_ui/calendar/blocks';
import { entry, hoursOf } from './calendar-entries';

const thursday = '2027-02-18';
const plain: DayNotes = { holidayName: null, isLeave: false, hasRoster: true };

describe('the words of a shift', () => {
  it('say where it ends when that is another day', () => {
    const night = { date: '2027-02-13', ...hoursOf('Night') };
    expect(blockTimes(night)).toBe('23:00–07:00');
    expect(endsNote(night)).toBe('ends Sun 07:00');
    expect(endsNote({ date: thursday, ...hoursOf('Late') })).toBeNull();
    expect(endsNote({ date: thursday, endMinute: 1440 })).toBeNull();
  });

  it('write a post small in a sentence but leave abbreviations', () => {
    expect(['Nurse', 'ICU nurse', 'Éducateur'].map(inSentence)).toEqual([
      'nurse',
      'ICU nurse',
      'éducateur',
    ]);
  });
});

describe('a day in a sentence', () => {
  const own = (entries: Parameters<typeof toBlocks>[0], notes = plain) =>
    ownDaySentence(thursday, toBlocks(entries, 'Europe/Dublin'), notes);

  it('names the shift, its times and post, the holiday and a draft', () => {
    expect(own([entry(thursday, 'Late')], { ...plain, holidayName: 'Lantern Day' })).toBe(
      'Thursday 18 February, Lantern Day, Late 15:00–23:00, nurse',
    );
    expect(own([entry(thursday, 'Late', { isPublished: false })])).toBe(
      'Thursday 18 February, Late 15:00–23:00, nurse, draft',
    );
  });

  it('tells a free day from leave and from a day without a roster', () => {
    expect(own([])).toBe('Thursday 18 February, no shift');
    expect(own([], { ...plain, isLeave: true })).toBe('Thursday 18 February, leave');
    expect(own([], { ...plain, hasRoster: false })).toBe('Thursday 18 February, no roster');
  });

  it('counts the people of a team by kind', () => {
    const entries = ['Anouk Tessaly', 'Hana Quill'].map((personName) =>
      entry(thursday, 'Early', { personName, isPublished: false }),
    );
    const blocks = toBlocks([...entries, entry(thursday, 'Late')], 'Europe/Dublin');
    expect(teamDaySentence(thursday, blocks, { holidayName: 'Lantern Day' })).toBe(
      'Thursday 18 February, Lantern Day, Early 2, Late 1, draft',
    );
    expect(teamDaySentence(thursday, [], { holidayName: null })).toBe(
      'Thursday 18 February, nobody planned',
    );
  });
});
