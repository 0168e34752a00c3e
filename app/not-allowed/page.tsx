import type { Metadata } from 'next';
import { ButtonLink } from '../_ui/button';
import { NoticePage } from '../_ui/notice-page';

export const metadata: Metadata = { title: 'Not for your role' };

/** Where people of another role are sent instead of the sheet they asked for. */
export default function NotAllowedPage() {
  return (
    <NoticePage title="This sheet is not for your role">
      <p>
        You are signed in, and nothing is wrong with your account. If your work needs this sheet,
        ask an owner of your organisation to give you the role.
      </p>
      <ButtonLink href="/" look="primary">
        Go to your first sheet
      </ButtonLink>
    </NoticePage>
  );
}
