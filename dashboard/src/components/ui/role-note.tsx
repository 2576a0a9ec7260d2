import { useUser } from '@/lib/session';
import type { Role } from '@/types/api';
import { rolesInWords } from '@/utils/roles-in-words';
import styles from './role-note.module.css';

export interface RoleNoteProps {
  /** Who may. */
  roles: readonly Role[];
  /** What they may, after "may": "add stations and keys". */
  act: string;
}

/** Says in place of a control why it isn't there: whose role may do it. */
export function RoleNote({ roles, act }: RoleNoteProps) {
  if (roles.includes(useUser().role)) return null;
  return (
    <p className={`${styles.note} no-print`}>
      {rolesInWords(roles)} may {act}.
    </p>
  );
}
