import type { Member } from '@/modules/access';

/** Members whose name or e-mail holds every word of a search, whatever its case or accents. */
export function findMembers(members: readonly Member[], search: string): Member[] {
  const words = plain(search).split(/\s+/).filter(Boolean);
  return members.filter(({ name, email }) => {
    const text = plain(`${name} ${email}`);
    return words.every((word) => text.includes(word));
  });
}

const plain = (text: string): string =>
  text.normalize('NFKD').replace(/\p{M}/gu, '').toLocaleLowerCase('en-GB');
