import { useState } from 'react';
import { Button } from '@/app/_ui/button';
import type { Member } from '@/modules/access';
import { AskAccess } from './ask-access';
import type { RoleGroup } from './role-choices';
import { RolesDialog } from './roles-dialog';
import type { MemberChangeOf } from './use-member-changes';

interface Props {
  readonly member: Member;
  readonly groups: readonly RoleGroup[];
  readonly isOwn: boolean;
  readonly onChange: (change: MemberChangeOf) => Promise<unknown>;
  /** Disables or enables, after asking. */
  readonly onSwitch: () => void;
}

/** What can be done with an account; each opens a question first. */
export function MemberActions({ member, onSwitch, ...props }: Props) {
  const [asked, setAsked] = useState<'roles' | 'access' | null>(null);
  const { name, isDisabled } = member;
  const close = (isOpen: boolean) => isOpen || setAsked(null);
  return (
    <td>
      <span className="flex gap-x-4 whitespace-nowrap phone:flex-col phone:items-start">
        <Button
          look="quiet"
          aria-label={`Change roles of ${name}`}
          onClick={() => setAsked('roles')}
        >
          Change roles…
        </Button>
        <Button
          look="quiet"
          aria-label={`${isDisabled ? 'Enable' : 'Disable'} ${name}`}
          onClick={() => setAsked('access')}
        >
          {isDisabled ? 'Enable…' : 'Disable…'}
        </Button>
      </span>
      <RolesDialog member={member} isOpen={asked === 'roles'} onOpenChange={close} {...props} />
      <AskAccess
        member={member}
        isOwn={props.isOwn}
        isOpen={asked === 'access'}
        onOpenChange={close}
        onConfirm={onSwitch}
      />
    </td>
  );
}
