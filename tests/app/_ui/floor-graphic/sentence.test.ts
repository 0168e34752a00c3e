import { describe, expect, it } from 'vitest';
import { coverSentence, laneVerdict } from '@/app/_ui/floor-graphic';
import { countSkill } from '@/app/_ui/floor-graphic/count-skill';
import { labelledShortages } from '@/app/_ui/floor-graphic/sentence';
import { at, lane, nurse, vet, week } from './cover-fixture';

/** The days and cover of the reviewed example: two vet Nights empty, one nurse moved from Late to Early. */
const example = week(
  lane(
    vet,
    [0, at(3, 23), 1, 1],
    [at(3, 23), at(4, 7), 1, 0],
    [at(4, 7), at(4, 23), 1, 1],
    [at(4, 23), at(5, 7), 1, 0],
    [at(5, 7), at(7, 7), 1, 1],
  ),
  lane(
    nurse,
    [0, at(4, 7), 1, 1],
    [at(4, 7), at(4, 15), 1, 2],
    [at(4, 15), at(4, 23), 1, 0],
    [at(4, 23), at(7, 7), 1, 1],
  ),
);

describe('the sentence of a floor graphic', () => {
  it('names period and scope, then every exception by day, shift and skill', () => {
    expect(coverSentence(example, 'all skills', 'cover')).toBe(
      'Cover 1 to 7 February, all skills: the floor holds except: Thursday 4 February Night short 1 vet; Friday 5 February Late short 1 nurse while Early has 1 spare; Friday 5 February Night short 1 vet.',
    );
  });

  it('says that the floor holds when it does', () => {
    const words = week(lane(vet, [0, at(7, 7), 1, 1]));
    expect(coverSentence(words, 'Vet', 'cover')).toBe(
      'Cover 1 to 7 February, Vet: the floor holds.',
    );
  });

  it('joins what is short on the same shift', () => {
    const words = week(
      lane(vet, [at(0, 23), at(1, 7), 1, 0]),
      lane(nurse, [at(0, 23), at(1, 7), 3, 1]),
    );
    expect(coverSentence(words, 'all skills', 'cover')).toContain(
      'Monday 1 February Night short 1 vet and 2 nurses.',
    );
  });

  it('takes overlapping shortages apart into the shifts that are missing', () => {
    const words = week(
      lane(
        nurse,
        [at(0, 9), at(0, 15), 1, 0],
        [at(0, 15), at(0, 17), 2, 0],
        [at(0, 17), at(0, 23), 1, 0],
      ),
    );
    expect(coverSentence(words, 'Nurse', 'cover')).toContain(
      'Monday 1 February Day short 1 nurse; Monday 1 February Late short 1 nurse.',
    );
  });

  it('uses the clock where no shift fits', () => {
    const words = week(lane(vet, [at(0, 15), at(0, 16), 1, 0]));
    expect(coverSentence(words, 'Vet', 'cover')).toContain(
      'Monday 1 February 15:00 to 16:00 short 1 vet.',
    );
  });

  it('counts on after eight exceptions', () => {
    const nights = [0, 1, 2, 3, 4, 5, 6].flatMap((day) => [
      [at(day, 7), at(day, 15), 1, 0] as const,
      [at(day, 23), at(day, 31), 1, 0] as const,
    ]);
    expect(coverSentence(week(lane(vet, ...nights)), 'Vet', 'cover')).toMatch(/; and 6 more\.$/);
  });

  it('says what is missing before there is a roster, or floors', () => {
    const words = week(lane(vet, [0, at(7, 7), 2, 0]));
    expect(coverSentence(words, 'Vet', 'no-roster')).toBe(
      'Floors 1 to 7 February, Vet: no roster yet; at most 2 people needed at once.',
    );
    expect(coverSentence(words, 'Vet', 'no-floors')).toBe('1 to 7 February, Vet: no floors yet.');
  });
});

describe('the verdict of a lane', () => {
  it('counts shifts that are short', () => {
    expect(laneVerdict(example, 'cover')).toBe('short 3 shifts');
    expect(laneVerdict(week(lane(vet, [at(0, 23), at(1, 7), 1, 0])), 'cover')).toBe(
      'short 1 shift',
    );
    expect(laneVerdict(week(), 'cover')).toBe('floor holds');
    expect(laneVerdict(week(), 'no-roster')).toBe('no roster yet');
  });
});

describe('labels on the drawing', () => {
  it('tell a Late and the Night after it apart', () => {
    const words = week(lane(vet, [at(0, 15), at(1, 7), 1, 0]));
    expect(
      labelledShortages(words).map(({ startMinute, endMinute }) => [startMinute, endMinute]),
    ).toEqual([
      [at(0, 15), at(0, 23)],
      [at(0, 23), at(1, 7)],
    ]);
  });
});

describe('numbers of people with a skill', () => {
  it.each([
    [1, 'Vet', '1 vet'],
    [2, 'Nurse', '2 nurses'],
    [2, 'ICU nurse', '2 ICU nurses'],
    [2, 'Night watch', '2 night watches'],
    [3, 'Trainee', '3 trainees'],
    [2, 'Secretary', '2 secretaries'],
    [1, null, '1 person'],
    [2, null, '2 people'],
  ])('%d of %s read "%s"', (people, name, text) => {
    expect(countSkill(people, name)).toBe(text);
  });
});
