import { useState } from 'react';
import { ProblemNote } from '@/app/_ui/problem-note';
import type { Member } from '@/modules/access';
import { MemberActions } from './member-actions';
import { MemberCells } from './member-cells';
import type { RoleGroup } from './role-choices';
import type { MemberChangeOf } from './use-member-changes';

interface Props {
  readonly member: Member;
  readonly groups: readonly RoleGroup[];
  readonly isOwn: boolean;
  readonly onChange: (change: MemberChangeOf) => Promise<unknown>;
}

/** One account, with what can be changed of it; a refusal stands below its row. */
export function MemberRow(props: Props) {
  const [refusal, setRefusal] = useState<unknown>(null);
  const { userId, name, isDisabled } = props.member;
  const switchAccess = async () => {
    setRefusal(null);
    const done = `${name} ${isDisabled ? 'enabled' : 'disabled'}.`;
    const change = { isDisabled: !isDisabled };
    await props.onChange({ userId, change, done }).catch(setRefusal);
  };
  return (
    <>
      <tr>
        <MemberCells {...props} />
        <MemberActions {...props} onSwitch={switchAccess} />
      </tr>
      {refusal ? (
        <tr>
          <td colSpan={5}>
            <div className="sticky left-0 max-w-[calc(100vw-3*var(--page))]">
              <ProblemNote problem={refusal} kept={`${name} is unchanged.`} />
            </div>
          </td>
        </tr>
      ) : null}
    </>
  );
}
