import { Section } from '@/components/ui/section';
import { AccountFacts } from '@/features/settings/components/account-facts';
import { PasswordForm } from '@/features/settings/components/password-form';
import { SettingsFrame } from '@/features/settings/components/settings-frame';
import { useSite } from '@/lib/site';

export function SettingsRoute() {
  const site = useSite();
  return (
    <SettingsFrame
      title="Your account"
      lead={`${site.name}, Ampkeep ${site.version}, times in ${site.timeZone}`}
    >
      <Section title="Who you are here" note="an administrator changes name and role">
        <AccountFacts />
      </Section>
      <Section title="Change your password">
        <PasswordForm />
      </Section>
    </SettingsFrame>
  );
}
