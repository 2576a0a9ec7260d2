import { describe, expect, it } from 'vitest';
import { bucketDays } from './bucket-names';
import { lastDays, siteDay } from './site-days';

describe('siteDay', () => {
  it("is the day on the site's calendar, whatever the day in UTC", () => {
    expect(siteDay(Date.parse('2026-11-30T23:30:00Z'), 'Europe/Berlin')).toBe('2026-12-01');
    expect(siteDay(Date.parse('2026-11-30T03:00:00Z'), 'America/New_York')).toBe('2026-11-29');
  });
});

describe('lastDays', () => {
  it('counts its last day and crosses months', () => {
    expect(lastDays(14, '2026-12-01')).toEqual({ from: '2026-11-18', to: '2026-12-01' });
  });
});

describe('bucketDays', () => {
  it('ends with the day before the next step, also where a clock change made it long', () => {
    const week = { startAt: '2026-10-18T22:00:00.000Z', endAt: '2026-10-25T23:00:00.000Z' };
    expect(bucketDays(week, 'Europe/Berlin')).toEqual({ from: '2026-10-19', to: '2026-10-25' });
  });
});
