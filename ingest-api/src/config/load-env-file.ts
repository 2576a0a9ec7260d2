import { existsSync } from 'node:fs';
import { loadEnvFile as load } from 'node:process';

/** Adds the settings of a `.env` file in the working folder to the environment, whose own settings win. */
export function loadEnvFile(file = '.env'): void {
  if (existsSync(file)) load(file);
}
