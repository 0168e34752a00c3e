import { describe, expect, it } from 'vitest';
import { explainBound, explainShortage } from '@/modules/sizing';

const people = (value: number) => `${Math.round(value * 100) / 100} people`;
const money = (value: number) => `€${(value / 100).toFixed(2)}`;

describe('the sentence on bound and answer', () => {
  it('says that nothing smaller exists when they agree up to rounding', () => {
    const answer = { objective: 22, linearBound: 21.99999999, provenBound: 22, isProven: true };
    expect(explainBound(answer, 'people', people)).toContain('nothing smaller exists');
  });

  it('names the next whole number when people are counted', () => {
    const answer = { objective: 23, linearBound: 67 / 3, provenBound: 23, isProven: true };
    const sentence = explainBound(answer, 'people', people);
    expect(sentence).toContain('22.33 people would do; 23 people is the next whole number');
  });

  it('says how much more whole people take when rounding up the bound is not enough', () => {
    const answer = {
      objective: 1_285_000,
      linearBound: 1_251_666.6667,
      provenBound: 1_285_000,
      isProven: true,
    };
    const sentence = explainBound(answer, 'pay', money);
    expect(sentence).toContain('€12516.67 would do');
    expect(sentence).toContain('€333.33 more');
  });

  it('says plainly when the search ended early', () => {
    const answer = { objective: 30, linearBound: 27, provenBound: 28, isProven: false };
    expect(explainBound(answer, 'people', people)).toBe(
      'The search ended before it was done: 30 people is the best found, and less than 28 people is impossible.',
    );
  });
});

describe('the sentence on a shortage', () => {
  it('names window, people and hours', () => {
    const shortage = { label: 'Mon, Nurse 07:00–15:00', people: 2, minutes: 960 };
    expect(explainShortage(shortage)).toBe('Mon, Nurse 07:00–15:00: short 2, 16 h missing');
  });
});
