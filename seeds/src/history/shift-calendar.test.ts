import { describe, expect, it } from 'vitest';
import { createShiftCalendar } from './shift-calendar.js';

const at = (text: string) => new Date(text);

describe('the shift calendar', () => {
  const calendar = createShiftCalendar(at('2026-10-19T00:00:00Z'), at('2026-10-27T00:00:00Z'));

  it('goes by the site’s clock, across the end of summer time', () => {
    // Summer time ended in London on 25 October 2026 at 01:00 UTC.
    expect(calendar.shiftAt(at('2026-10-23T04:59:59Z'))).toBe('off');
    expect(calendar.shiftAt(at('2026-10-23T05:00:00Z'))).toBe('early');
    expect(calendar.shiftAt(at('2026-10-26T05:59:59Z'))).toBe('off');
    expect(calendar.shiftAt(at('2026-10-26T06:00:00Z'))).toBe('early');
    expect(calendar.shiftAt(at('2026-10-26T21:59:59Z'))).toBe('late');
  });

  it('runs at half speed or less on Saturday morning and is off on Sunday', () => {
    expect(calendar.speedAt(at('2026-10-24T08:00:00Z'))).toBeLessThan(0.5);
    expect(calendar.shiftAt(at('2026-10-24T15:00:00Z'))).toBe('off');
    expect(calendar.shiftAt(at('2026-10-25T09:00:00Z'))).toBe('off');
  });

  it('names the start of each shift', () => {
    const starts = calendar.shiftStarts.map((start) => start.toISOString());
    expect(starts).toHaveLength(5 * 2 + 1 + 2);
    expect(starts.slice(0, 2)).toEqual(['2026-10-19T05:00:00.000Z', '2026-10-19T13:00:00.000Z']);
    expect(starts.slice(-2)).toEqual(['2026-10-26T06:00:00.000Z', '2026-10-26T14:00:00.000Z']);
  });
});
