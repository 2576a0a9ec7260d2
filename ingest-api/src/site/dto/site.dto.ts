import type { Role } from '../../auth/roles.js';

export class DemoAccountDto {
  email!: string;
  password!: string;
  displayName!: string;
  role!: Role;
}

export class SiteDto {
  /** @example "Fernhollow Controls" */
  name!: string;
  /** @example "Europe/London" */
  timeZone!: string;
  /** Invented data, public accounts. */
  demo!: boolean;
  /** Mails go to a mailbox inside this program, readable in the dashboard. */
  localMailbox!: boolean;
  /** @example "0.1.0" */
  version!: string;
  /** Empty outside the demo. */
  demoAccounts!: DemoAccountDto[];
}

export class HealthDto {
  status!: 'ok';
  version!: string;
}
