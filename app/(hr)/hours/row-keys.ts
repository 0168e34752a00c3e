/** The row that a key leads to from row `index` of `count`; null where the key means nothing here. */
export function rowAfterKey(key: string, index: number, count: number): number | null {
  switch (key) {
    case 'ArrowDown':
      return Math.min(count - 1, index + 1);
    case 'ArrowUp':
      return Math.max(0, index - 1);
    case 'Home':
      return 0;
    case 'End':
      return count - 1;
    default:
      return null;
  }
}
