import { ButtonLink } from './_ui/button';
import { NoticePage } from './_ui/notice-page';

/** Shown for unknown addresses, and for rows of other teams and organisations alike. */
export default function NotFound() {
  return (
    <NoticePage title="There is nothing here">
      <p>
        The address may be mistyped, or what stood here belongs to another team or was removed.
        Nothing was changed.
      </p>
      <ButtonLink href="/" look="primary">
        Go to your first sheet
      </ButtonLink>
    </NoticePage>
  );
}
