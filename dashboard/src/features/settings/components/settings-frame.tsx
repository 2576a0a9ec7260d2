import type { ReactNode } from 'react';
import { useLocation } from 'react-router-dom';
import { LinkTabs } from '@/components/ui/link-tabs';
import { PageHeader } from '@/components/ui/page-header';
import { RoleNote } from '@/components/ui/role-note';
import { useUser } from '@/lib/session';
import type { Role } from '@/types/api';
import { settingsTabs } from '../settings-tabs';

export interface SettingsFrameProps {
  title: string;
  lead?: ReactNode;
  actions?: ReactNode;
  /** Who may open it; left out for everybody. Others read why they may not. */
  roles?: readonly Role[];
  /** What those may, for the others: "see the accounts". */
  act?: string;
  children: ReactNode;
}

/** One side of Settings with the way to the others. */
export function SettingsFrame({ title, lead, actions, roles, act, children }: SettingsFrameProps) {
  const { role } = useUser();
  const { pathname } = useLocation();
  const isAllowed = roles?.includes(role) ?? true;
  const tabs = settingsTabs.filter((tab) => tab.roles?.includes(role) ?? true);
  return (
    <>
      <LinkTabs
        label="Settings"
        tabs={tabs.map(({ label, to }) => ({ label, to, isCurrent: pathname === to }))}
      />
      <PageHeader title={title} lead={lead} actions={isAllowed && actions} />
      {isAllowed ? children : <RoleNote roles={roles ?? []} act={act ?? 'see this'} />}
    </>
  );
}
