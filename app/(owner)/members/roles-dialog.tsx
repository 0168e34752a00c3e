import { FormDialog } from '@/app/_ui/form-dialog';
import type { Member } from '@/modules/access';
import type { RoleGroup } from './role-choices';
import { RolesForm } from './roles-form';
import type { MemberChangeOf } from './use-member-changes';

interface Props {
  readonly member: Member;
  readonly groups: readonly RoleGroup[];
  readonly isOwn: boolean;
  readonly isOpen: boolean;
  readonly onOpenChange: (isOpen: boolean) => void;
  readonly onChange: (change: MemberChangeOf) => Promise<unknown>;
}

/** The roles of a member as boxes to tick. Stays open with what was ticked when it is refused. */
export function RolesDialog({ member, isOpen, onOpenChange, ...form }: Props) {
  return (
    <FormDialog title={`Roles of ${member.name}`} isOpen={isOpen} onOpenChange={onOpenChange}>
      <RolesForm member={member} onClose={() => onOpenChange(false)} {...form} />
    </FormDialog>
  );
}
