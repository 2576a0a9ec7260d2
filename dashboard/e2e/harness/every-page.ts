import type { Page } from 'playwright-core';
import { navigation } from '../../src/config/navigation';
import { paths } from '../../src/config/paths';
import type { BreachPage, IntakePage, UnitPage } from '../../src/types/api';
import { ask } from './api';

/**
 * The address of every place of the navigation and of the pages below them. Where a page shows one thing, the
 * demonstration's; a unit must have failed lately, so that a breach is open.
 */
export async function everyPage(page: Page): Promise<string[]> {
  const unit = await oneUnit(page, '/units?verdict=pass&limit=1');
  const failed = await oneUnit(page, '/units?verdict=fail&limit=1');
  const open = (await ask<BreachPage>(page, '/breaches?state=open')).items[0];
  const closed = (await ask<BreachPage>(page, '/breaches?state=closed')).items[0];
  const refused = (await ask<IntakePage>(page, '/intake?kind=refused')).items[0];
  if (!open || !closed || !refused) throw new Error('The demonstration lacks a breach or a refused post');
  return [
    ...navigation.flatMap(({ entries }) => entries.map(({ to }) => to)),
    paths.units({ search: 'nothing has this serial' }),
    unit,
    failed,
    paths.station('north-1'),
    paths.breach(open.breachId),
    paths.breach(closed.breachId),
    paths.refusedPost(refused.intakeId),
    paths.accounts(),
    paths.rights(),
    paths.audit(),
    '/no-such-page',
  ];
}

async function oneUnit(page: Page, query: string): Promise<string> {
  const unit = (await ask<UnitPage>(page, query)).items[0];
  if (!unit) throw new Error(`The demonstration has no unit for ${query}`);
  return paths.unit(unit.partNumber, unit.serialNumber);
}
