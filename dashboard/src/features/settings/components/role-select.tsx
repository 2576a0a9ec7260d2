import { SelectField } from '@/components/ui/select-field';
import { roleNames } from '@/lib/session';
import type { Role } from '@/types/api';

const roleOptions = (Object.keys(roleNames) as Role[]).map((value) => ({ value, label: roleNames[value] }));

export function RoleSelect({ role, onChange }: { role: Role; onChange: (role: Role) => void }) {
  return (
    <SelectField
      label="Role"
      value={role}
      options={roleOptions}
      onChange={onChange}
      hint="What each may do stands under Rights."
    />
  );
}
