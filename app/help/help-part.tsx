import type { ReactNode } from 'react';
import { SectionHead } from '../_ui/section-head';
import type { Topic } from './help-topics';

interface Props {
  readonly part: HelpPartName;
  readonly children: ReactNode;
}

/** The parts of the page, in order; the list at its top leads to each. */
const helpParts = [
  { id: 'floor', title: 'What a floor is' },
  { id: 'drawings', title: 'Reading the drawings' },
  { id: 'words', title: 'Our words' },
  { id: 'roles', title: 'Who does what' },
  { id: 'keys', title: 'Keys' },
  { id: 'cautions', title: 'Cautions' },
] as const;
type HelpPartName = (typeof helpParts)[number]['id'];

/** The list of the parts; each leads to its own. */
export function HelpContents() {
  return (
    <nav aria-label="On this page">
      <ul className="flex flex-wrap gap-x-5">
        {helpParts.map(({ id, title }) => (
          <li key={id}>
            <a
              href={`#${id}`}
              className="inline-flex min-h-6 items-center text-act underline underline-offset-3 phone:min-h-11"
            >
              {title}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}

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
