import { type FormEvent, useState } from 'react';
import { Button } from '@/app/_ui/button';
import { ProblemNote } from '@/app/_ui/problem-note';
import type { Member } from '@/modules/access';
import { readRoles } from './read-roles';
import { RoleBoxes } from './role-boxes';
import { keysOf, type RoleGroup } from './role-choices';
import type { MemberChangeOf } from './use-member-changes';

interface Props {
  readonly member: Member;
  readonly groups: readonly RoleGroup[];
  readonly isOwn: boolean;
  readonly onChange: (change: MemberChangeOf) => Promise<unknown>;
  readonly onClose: () => void;
}

/** The roles of a member to tick. What was ticked stays when it is refused. */
export function RolesForm({ member, groups, isOwn, onChange, onClose }: Props) {
  const [keys, setKeys] = useState<readonly string[]>(() => keysOf(member.memberships));
  const [error, setError] = useState<string | null>(null);
  const [refusal, setRefusal] = useState<unknown>(null);
  const tick = (key: string, isTicked: boolean) =>
    setKeys((known) => (isTicked ? [...known, key] : known.filter((other) => other !== key)));
  const save = async (event: FormEvent) => {
    event.preventDefault();
    const read = readRoles(keys, groups);
    setRefusal(null);
    setError('error' in read ? read.error : null);
    if ('error' in read) return;
    const { userId, name } = member;
    const done = `Roles of ${name} saved.`;
    await onChange({ userId, change: read.change, done }).then(onClose, setRefusal);
  };
  return (
    <form noValidate onSubmit={save}>
      <p className="mt-2 text-body text-ink2">
        Owner and HR count in every team, supervisor and staff in theirs.
        {isOwn ? ' This is your own account: without Owner this sheet closes for you.' : ''}
      </p>
      <RoleBoxes groups={groups} keys={keys} onTick={tick} />
      {error ? (
        <p role="alert" className="mt-2 text-second font-[640] text-short">
          <span aria-hidden="true">! </span>
          {error}
        </p>
      ) : null}
      <div className="mt-4 empty:hidden">
        <ProblemNote problem={refusal} kept="What you ticked is kept here." />
      </div>
      <div className="mt-6 flex flex-wrap justify-end gap-2">
        <Button onClick={onClose}>Cancel</Button>
        <Button type="submit" look="primary">
          Save roles
        </Button>
      </div>
    </form>
  );
}
