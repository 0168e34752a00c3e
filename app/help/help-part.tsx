import type { ReactNode } from 'react';
import { SectionHead } from '../_ui/section-head';
import type { Topic } from './help-topics';

interface Props {
  readonly part: HelpPartName;
  readonly children: ReactNode;
}

/** The parts of the page, in order; the list at its top leads to each. */
export const helpParts = [
  { id: 'floor', title: 'What a floor is' },
  { id: 'drawings', title: 'Reading the drawings' },
  { id: 'words', title: 'Our words' },
  { id: 'roles', title: 'Who does what' },
  { id: 'keys', title: 'Keys' },
  { id: 'cautions', title: 'Cautions' },
] as const;
type HelpPartName = (typeof helpParts)[number]['id'];

/** One part under its head. */
export function HelpPart({ part, children }: Props) {
  const title = helpParts.find(({ id }) => id === part)?.title;
  return (
    <section aria-labelledby={part} className="pt-4">
      <SectionHead id={part}>{title}</SectionHead>
      {children}
    </section>
  );
}

/** Words with their meanings. */
export function TopicList({ topics }: { readonly topics: readonly Topic[] }) {
  return (
    <dl>
      {topics.map(({ word, meaning }) => (
        <div key={word} className="line-row py-2">
          <dt className="font-[660]">{word}</dt>
          <dd className="text-ink2">{meaning}</dd>
        </div>
      ))}
    </dl>
  );
}
