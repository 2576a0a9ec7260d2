import type { Site } from '@/types/api';
import { paths } from './paths';

export interface NavigationEntry {
  label: string;
  to: string;
  /** Left out: shown on every site. */
  shownWhen?: (site: Site) => boolean;
}

export interface NavigationGroup {
  label: string;
  entries: NavigationEntry[];
}

/** The left navigation. A place appears here once its page exists; a group without entries is not shown. */
export const navigation: NavigationGroup[] = [
  {
    label: 'Line',
    entries: [
      { label: 'Today', to: paths.today() },
      { label: 'Units', to: paths.units() },
    ],
  },
  { label: 'Learn', entries: [{ label: 'Yield', to: paths.yields() }] },
  {
    label: 'Decide',
    entries: [
      { label: 'Limits', to: paths.limits() },
      { label: 'Breaches', to: paths.breaches() },
    ],
  },
  {
    label: 'Connect',
    entries: [
      { label: 'Stations', to: paths.stations() },
      { label: 'Intake', to: paths.intake() },
      { label: 'Docs', to: paths.connect() },
      { label: 'Settings', to: paths.settings() },
      { label: 'Mailbox', to: paths.mailbox(), shownWhen: ({ localMailbox }) => localMailbox },
    ],
  },
];
