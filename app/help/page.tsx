import type { Metadata } from 'next';
import { ButtonLink } from '../_ui/button';
import { Caution } from '../_ui/caution';
import { NoticePage } from '../_ui/notice-page';
import { FloorExample } from './floor-example';
import { HelpContents, HelpPart, TopicList } from './help-part';
import { cautions, drawings, roles, words } from './help-topics';
import { KeyList } from './key-list';

export const metadata: Metadata = { title: 'Help' };

/** What the words and drawings mean, the keys and the cautions. The same page for everybody. */
export default function HelpPage() {
  return (
    <NoticePage title="Help">
      <HelpContents />
      <HelpPart part="floor">
        <p>
          A floor is the least people on duty: how many, of which skill, over which hours. You set
          the floors; Floorwright looks for the roster that keeps to them at the least cost, and
          says where it cannot.
        </p>
        <FloorExample />
      </HelpPart>
      <HelpPart part="drawings">
        <TopicList topics={drawings} />
      </HelpPart>
      <HelpPart part="words">
        <TopicList topics={words} />
      </HelpPart>
      <HelpPart part="roles">
        <TopicList topics={roles} />
      </HelpPart>
      <HelpPart part="keys">
        <KeyList />
      </HelpPart>
      <HelpPart part="cautions">
        <div className="space-y-3 pb-6">
          {cautions.map((caution) => (
            <Caution key={caution}>{caution}</Caution>
          ))}
        </div>
        <ButtonLink href="/" className="mb-9">
          Go to your first sheet, or sign in
        </ButtonLink>
      </HelpPart>
    </NoticePage>
  );
}
