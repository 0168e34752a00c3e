import { problemVersion } from './problem';

/**
 * Brings a document of version 1 up to today's: it had one overtime percentage, no priorities, ceilings,
 * team rules, wishes or fairness, and looked only backwards. Anything else comes back as it is, for the
 * schema to judge.
 */
export function upgradeProblem(document: unknown): unknown {
  if (!isRecord(document) || document.version !== 1) return document;
  return {
    ...document,
    version: problemVersion,
    floors: eachRecord(document.floors, { priority: 1 }),
    ceilings: [],
    people: eachRecord(document.people, {
      following: [],
      rules: null,
      kindLimits: [],
      wishes: [],
      isOutside: false,
    }),
    rules: isRecord(document.rules)
      ? {
          ...document.rules,
          shortestRunDays: null,
          shortestRunFreeDays: null,
          kindsThatMayNotFollow: [],
        }
      : document.rules,
    teamRules: [],
    pay: upgradePay(document.pay),
    fairness: [],
  };
}

function upgradePay(pay: unknown): unknown {
  if (!isRecord(pay)) return pay;
  const { overtimePercent, ...premiums } = pay;
  return { ...premiums, overtimeSteps: [{ overMinutes: 0, percent: overtimePercent }] };
}

const eachRecord = (list: unknown, added: Record<string, unknown>): unknown =>
  Array.isArray(list)
    ? list.map((item: unknown) => (isRecord(item) ? { ...item, ...added } : item))
    : list;

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);
