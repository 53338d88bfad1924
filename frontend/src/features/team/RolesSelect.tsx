import type { Role } from '@roothertz/common/access';
import { Select } from 'antd';
import { useState } from 'react';
import { detailOf } from '../../api/problem';
import type { TeamMember } from '../../api/team';
import { FieldMessage } from '../../components/FieldMessage';
import { ROLE_OPTIONS } from './teamWords';
import { useRoleChange } from './useRoleChange';

/** The roles of a member: each choice is in force at once. */
export function RolesSelect({ member }: { member: TeamMember }) {
  const { name, roles } = member;
  const change = useRoleChange(member);
  const [isEmpty, setIsEmpty] = useState(false);
  const choose = (chosen: Role[]) => {
    setIsEmpty(chosen.length === 0);
    if (chosen.length > 0) change.mutate(chosen);
  };
  return (
    <>
      <Select<Role[]>
        mode="multiple"
        showSearch={false}
        aria-label={`Roles of ${name}`}
        style={{ width: '100%' }}
        options={ROLE_OPTIONS}
        value={change.isPending ? change.variables : roles}
        onChange={choose}
      />
      {isEmpty && <FieldMessage>A member has at least one role.</FieldMessage>}
      {change.error && <FieldMessage>{detailOf(change.error)}</FieldMessage>}
    </>
  );
}
