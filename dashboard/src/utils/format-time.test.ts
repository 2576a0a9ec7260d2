import { describe, expect, it } from 'vitest';
import { formatDay, formatTime, relativeTime } from './format-time';

describe('formatTime', () => {
  it("reads a UTC instant on the site's clock, summer and winter", () => {
    expect(formatTime('2026-07-01T23:30:00Z', 'Europe/Berlin')).toBe('2 Jul 2026, 01:30:00');
    expect(formatTime('2026-12-01T23:30:00Z', 'Europe/Berlin', 'short')).toBe('2 Dec, 00:30');
  });
});

describe('formatDay', () => {
  it('keeps a calendar day whatever the time zone of the reader', () => {
    expect(formatDay('2026-11-30')).toBe('Monday, 30 November 2026');
  });
});

describe('relativeTime', () => {
  const now = Date.parse('2026-11-30T12:00:00Z');

  it('calls the last ten seconds now', () => {
    expect(relativeTime('2026-11-30T11:59:55Z', now)).toBe('now');
  });

  it('counts whole units that have passed', () => {
    expect(relativeTime('2026-11-30T11:58:10Z', now)).toMatch(/^1 min/);
    expect(relativeTime('2026-11-30T09:00:00Z', now)).toMatch(/^3 h/);
    expect(relativeTime('2026-11-29T11:00:00Z', now)).toBe('yesterday');
  });
});
