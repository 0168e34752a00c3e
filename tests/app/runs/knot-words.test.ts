import { expect, test } from 'vitest';
import {
  costChangeWords,
  knotsVerdict,
  knotTitle,
  shortageChangeWords,
  undoesWords,
} from '@/app/(supervisor)/runs/[runId]/knot-words';

const member = { words: 'Vet Night on Thu 11 Feb needs 1', asksPerson: false };

test('a knot is headed by what counting says, or by how many clash', () => {
  const knot = { sentence: null, isMinimal: true, members: [member, member] };
  expect(knotTitle(knot, 1)).toBe('Knot 2: these 2 cannot all be met');
  expect(knotTitle({ ...knot, members: [member] }, 0)).toBe('Knot 1: this cannot be met');
  expect(knotTitle({ ...knot, sentence: 'Too few hours.' }, 0)).toBe('Too few hours.');
  expect(knotsVerdict({ knots: [], isComplete: false })).toMatch(/^Nothing was found in the time/);
  expect(knotsVerdict({ knots: [knot], isComplete: true })).toMatch(/everything else can be\.$/);
  expect(knotsVerdict({ knots: [knot, knot], isComplete: false })).toMatch(/may be more\.$/);
});

test.each([
  [-480, -480, '8 h less missing'],
  [-480, -240, '4 h to 8 h less missing'],
  [-480, 0, '0 h to 8 h less missing'],
  [0, 0, 'as much missing'],
  [0, 480, '0 h to 8 h more missing'],
  [-60, 60, '1 h less to 1 h more missing'],
])('a change of the shortage of %i to %i minutes reads "%s"', (least, most, words) => {
  expect(shortageChangeWords({ least, most })).toBe(words);
});

test.each([
  [12_000, 12_000, '+€120'],
  [-4000, 2000, '−€40 to +€20'],
  [0, 0, '€0'],
])('a change of the cost of %i to %i cents reads "%s"', (least, most, words) => {
  expect(costChangeWords({ least, most }, 'EUR')).toBe(words);
});

test('whether a way unties its knot is told, and when it was not tested', () => {
  const way = { changes: [], effect: null };
  expect([true, false, null].map((undoesKnot) => undoesWords({ ...way, undoesKnot }))).toEqual([
    'yes',
    'not alone',
    'not tested',
  ]);
});
