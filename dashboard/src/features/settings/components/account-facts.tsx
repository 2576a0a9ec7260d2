import { Facts } from '@/components/ui/facts';
import { TimeText } from '@/components/ui/time-text';
import { roleNames, useUser } from '@/lib/session';

export function AccountFacts() {
  const user = useUser();
  return (
    <Facts
      facts={[
        ['Name', user.displayName],
        ['Email', user.email],
        ['Role', roleNames[user.role]],
        ['Signed in', <TimeText at={user.lastSignInAt} show="both" />],
      ]}
    />
  );
}
