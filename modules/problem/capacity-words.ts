/** `Vet`, `Vet and Nurse`, `Vet, Nurse and Ward`. */
export const listed = (names: readonly string[], word: string): string =>
  names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} ${word} ${names.at(-1)}`;

/** Beyond this many items only single ones and all together are looked at. */
const mostItemsInSets = 8;

/** Every set that is not empty, smaller ones first; only single ones and all when there would be too many. */
export function setsOf<T>(items: readonly T[]): T[][] {
  if (items.length > mostItemsInSets) return [...items.map((item) => [item]), [...items]];
  const sets: T[][] = [];
  for (const item of items) sets.push([item], ...sets.map((set) => [...set, item]));
  return sets.sort((one, other) => one.length - other.length);
}
