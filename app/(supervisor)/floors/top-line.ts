import type { FloorRow } from './floor-rows';

/**
 * The line above a cell: mid where a skill begins, else a hairline. Lines stand above cells only: where
 * two meet, a collapsed border would keep the thinner one on some screens.
 */
export const topLine = ({ isFirstOfSkill }: FloorRow): string =>
  isFirstOfSkill ? 'border-t-[1.5px] border-t-ink' : 'border-t border-t-rule';
