import { AskDialog } from '@/app/_ui/dialog';
import type { Member } from '@/modules/access';

interface Props {
  readonly member: Member;
  readonly isOwn: boolean;
  readonly isOpen: boolean;
  readonly onOpenChange: (isOpen: boolean) => void;
  readonly onConfirm: () => void;
}

/** Asks once before an account is disabled or enabled, with what follows from it. */
export function AskAccess({ member, isOwn, ...dialog }: Props) {
  const { name, isDisabled } = member;
  return (
    <AskDialog
      title={`${isDisabled ? 'Enable' : 'Disable'} ${name}?`}
      confirmLabel={isDisabled ? 'Enable' : 'Disable'}
      {...dialog}
    >
      {isDisabled ? (
        <p>{name} can sign in again at once, with the same password and the roles shown.</p>
      ) : (
        <>
          <p>
            It counts from the next request on: {name} is signed out everywhere and cannot sign in.
            Shifts, hours and roles stay as they are, and you can enable the account again.
          </p>
          {isOwn ? (
            <p className="mt-2 font-[640]">This is your own account: you would be signed out.</p>
          ) : null}
        </>
      )}
    </AskDialog>
  );
}
