/**
 * A number of people with a skill, in running text: `1 nurse`, `2 vets`, `2 ICU nurses`. Names that begin
 * with a capital and a small letter lose the capital; plurals follow the common English rules.
 */
export function countSkill(people: number, skillName: string | null): string {
  if (skillName === null) return people === 1 ? '1 person' : `${people} people`;
  const name = /^\p{Lu}\p{Ll}/u.test(skillName)
    ? skillName.charAt(0).toLowerCase() + skillName.slice(1)
    : skillName;
  return `${people} ${people === 1 ? name : plural(name)}`;
}

function plural(name: string): string {
  if (/[^aeiou]y$/.test(name)) return `${name.slice(0, -1)}ies`;
  return /(s|x|ch|sh)$/.test(name) ? `${name}es` : `${name}s`;
}
