import { useState } from 'react';
import { Button } from '@/app/_ui/button';
import { ProblemNote } from '@/app/_ui/problem-note';
import type { Member } from '@/modules/access';
import { AskAccess } from './ask-access';
import { type RoleGroup, roleLines } from './role-choices';
import { RolesDialog } from './roles-dialog';
import type { MemberChangeOf } from './use-member-changes';

interface Props {
  readonly member: Member;
  readonly groups: readonly RoleGroup[];
  readonly isOwn: boolean;
  readonly onChange: (change: MemberChangeOf) => Promise<unknown>;
}

/** One account, with what can be changed of it; a refusal stands below its row. */
export function MemberRow({ member, groups, isOwn, onChange }: Props) {
  const [asked, setAsked] = useState<'roles' | 'access' | null>(null);
  const [refusal, setRefusal] = useState<unknown>(null);
  const { userId, name, email, isDisabled } = member;
  const close = (isOpen: boolean) => isOpen || setAsked(null);
  const setDisabled = async () => {
    setRefusal(null);
    const done = `${name} ${isDisabled ? 'enabled' : 'disabled'}.`;
    await onChange({ userId, change: { isDisabled: !isDisabled }, done }).catch(setRefusal);
  };
  return (
    <>
      <tr>
        <th scope="row" className="phone:min-w-32">
          {name}
          {isOwn ? <span className="font-normal text-ink2">, you</span> : null}
        </th>
        <td>{email}</td>
        <td>
          {roleLines(member.memberships, groups).map((line) => (
            <span key={line} className="block whitespace-nowrap">
              {line}
            </span>
          ))}
        </td>
        <td className={isDisabled ? 'font-[640] text-note' : 'text-ink2'}>
          {isDisabled ? 'Disabled' : 'Active'}
        </td>
        <td>
          <span className="flex gap-4 whitespace-nowrap">
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
          <RolesDialog
            member={member}
            groups={groups}
            isOwn={isOwn}
            isOpen={asked === 'roles'}
            onOpenChange={close}
            onChange={onChange}
          />
          <AskAccess
            member={member}
            isOwn={isOwn}
            isOpen={asked === 'access'}
            onOpenChange={close}
            onConfirm={setDisabled}
          />
        </td>
      </tr>
      {refusal ? (
        <tr>
          <td colSpan={5}>
            <ProblemNote problem={refusal} kept={`${name} is unchanged.`} />
          </td>
        </tr>
      ) : null}
    </>
  );
}
