import type { Verdict } from '@ampkeep/ingest-api/dist/analysis/analysis.types.js';
import { createRandom } from '@ampkeep/station-sim/dist/circuit/random.js';
import { DateTime } from 'luxon';
import { describe, expect, it } from 'vitest';
import { outageBefore, SITE_ZONE, stories } from '../scenario/stories.js';
import { buildHistory, demoHistory, type HistoryPost } from './build-history.js';
import { type Judge, judgePost } from './judge-post.js';
import { planUnits } from './plan-units.js';
import { createShiftCalendar } from './shift-calendar.js';

const now = new Date('2026-12-01T14:30:00Z');
const days = 26;
const verdicts = new Map<string, Verdict>();
const remembering: Judge = (post, product, stage) => {
  const verdict = judgePost(post, product, stage);
  verdicts.set(post.resultId, verdict);
  return verdict;
};
const history = [...buildHistory({ ...demoHistory, days, now }, remembering)];
const production = history.filter(({ post }) => post.runKind === 'production');

const hoursAgo = ({ post }: HistoryPost) => (now.getTime() - Date.parse(post.startedAt)) / 3_600_000;

const shareOf = (posts: readonly HistoryPost[], verdict: Verdict) =>
  posts.filter(({ post }) => verdicts.get(post.resultId) === verdict).length / posts.length;

const count = <Key>(keys: readonly Key[]): Map<Key, number> =>
  keys.reduce((counts, key) => counts.set(key, (counts.get(key) ?? 0) + 1), new Map<Key, number>());

describe('the demonstration’s history', () => {
  it('takes some 9,000 units to the line in two months', () => {
    const options = { ...demoHistory, now };
    const calendar = createShiftCalendar(new Date(now.getTime() - options.days * 86_400_000), now);
    const units = [...planUnits(options, calendar, createRandom(options.seed))];
    expect(units.length).toBeGreaterThan(8500);
    expect(units.length).toBeLessThan(9800);
    expect(new Set(units.map(({ unit }) => unit.serialNumber)).size).toBe(units.length);
  });

  it('ends now and holds two results for most units, in order of arrival', () => {
    expect(history.length).toBeGreaterThan(days * 280);
    let latest = 0;
    for (const { receivedAt, post } of history) {
      expect(receivedAt.getTime()).toBeGreaterThanOrEqual(latest);
      latest = receivedAt.getTime();
      expect(Date.parse(post.startedAt)).toBeGreaterThanOrEqual(now.getTime() - days * 86_400_000);
      expect(Date.parse(post.startedAt)).toBeLessThan(latest);
    }
    expect(latest).toBeLessThanOrEqual(now.getTime());
    expect(now.getTime() - latest).toBeLessThan(3_600_000);
  });

  it('is the same for the same seed', () => {
    const small = { ...demoHistory, now, days: 1 };
    const posts = (seed: string) => [...buildHistory({ ...small, seed }, judgePost)];
    expect(posts('one')).toEqual(posts('one'));
    expect(posts('other')).not.toEqual(posts('one'));
  });

  it('names every result once', () => {
    expect(new Set(history.map(({ post }) => post.resultId)).size).toBe(history.length);
  });

  it('gives no unit more attempts than its stage allows', () => {
    const attempts = production.filter(({ post }) => post.outcome !== 'aborted');
    const counts = count(attempts.map(({ post }) => `${post.serialNumber} ${post.stage}`));
    expect(Math.max(...counts.values())).toBeLessThanOrEqual(3);
  });

  it('lets most ordinary units pass at once', () => {
    const ordinary = production.filter((entry) => hoursAgo(entry) > 18 * 24);
    expect(shareOf(ordinary, 'pass')).toBeGreaterThan(0.93);
  });

  it('works in two shifts and hardly at night and on Sundays', () => {
    const starts = production.map(({ post }) => DateTime.fromISO(post.startedAt, { zone: SITE_ZONE }));
    const onShift = starts.filter(({ weekday, hour }) => weekday <= 5 && hour >= 6 && hour < 22);
    const onSundays = starts.filter(({ weekday }) => weekday === 7);
    expect(onShift.length / starts.length).toBeGreaterThan(0.9);
    expect(onSundays.length).toBeGreaterThan(0);
    expect(onSundays.length / starts.length).toBeLessThan(0.02);
  });

  it('holds aborted runs, retests and golden checks of every station', () => {
    expect(production.some(({ post }) => post.outcome === 'aborted')).toBe(true);
    const tests = count(production.map(({ post }) => `${post.serialNumber} ${post.stage}`));
    expect([...tests.values()].filter((number) => number > 1).length).toBeGreaterThan(100);
    const golden = history.filter(({ post }) => post.runKind === 'golden');
    expect(new Set(golden.map(({ station }) => station)).size).toBe(6);
  });

  it('changes the boards’ test program within the last week', () => {
    const boards = production.filter(({ post }) => post.stage === 'board');
    const versions = (posts: readonly HistoryPost[]) =>
      new Set(posts.map(({ post }) => post.program?.version));
    expect(versions(boards.filter((entry) => hoursAgo(entry) < 100))).toEqual(new Set(['3.4.1']));
    expect(versions(boards.filter((entry) => hoursAgo(entry) < 168))).toEqual(new Set(['3.4.0', '3.4.1']));
  });
});

describe('the stories in it', () => {
  it('tells of a station whose gain drifts over weeks until units fail there and not beside it', () => {
    const share = (station: string, fromHours: number, untilHours: number) =>
      shareOf(
        production.filter(
          (entry) =>
            entry.station === station &&
            entry.post.partNumber === 'FH-R500-W' &&
            hoursAgo(entry) < fromHours &&
            hoursAgo(entry) >= untilHours,
        ),
        'fail',
      );
    const { station } = stories.gainDrift;
    expect(share(station, 26 * 24, 15 * 24)).toBeLessThan(0.1);
    expect(share(station, 48, 0)).toBeGreaterThan(0.25);
    expect(share('north-4', 48, 0)).toBeLessThan(0.1);
  });

  it('tells of one lot with low output impedance', () => {
    const fails = production.filter(
      ({ post }) =>
        post.partNumber === stories.lowEarlyLot.partNumber &&
        post.stage === 'board' &&
        verdicts.get(post.resultId) === 'fail',
    );
    const [worst = 0, second = 0] = [...count(fails.map(({ post }) => post.lot)).values()].sort(
      (a, b) => b - a,
    );
    expect(worst).toBeGreaterThan(20);
    expect(worst).toBeGreaterThan(2 * second);
  });

  it('tells of a meter left on a coarse range for days: not proven, then proven elsewhere', () => {
    const notProven = production.filter(({ post }) => verdicts.get(post.resultId) === 'notProven');
    expect(notProven.length).toBeGreaterThan(50);
    expect(new Set(notProven.map(({ station }) => station))).toEqual(new Set([stories.coarseRange.station]));
    const serials = new Set(notProven.map(({ post }) => post.serialNumber));
    const elsewhere = production.filter(
      ({ station, post }) =>
        post.stage === 'board' && serials.has(post.serialNumber) && station !== stories.coarseRange.station,
    );
    expect(shareOf(elsewhere, 'pass')).toBeGreaterThan(0.9);
  });

  it('tells of a fixture that costs compliance now and then', () => {
    const { station, fixture, fromHoursAgo } = stories.poorContact;
    const there = production.filter((entry) => entry.station === station && hoursAgo(entry) < fromHoursAgo);
    const fails = (wanted: boolean) =>
      shareOf(
        there.filter(({ post }) => (post.fixture === fixture) === wanted),
        'fail',
      );
    expect(fails(true)).toBeGreaterThan(0.2);
    expect(fails(false)).toBeLessThan(0.15);
  });

  it('tells of a night of outage after which posts came late and out of order', () => {
    const { from, until } = outageBefore(now);
    const late = history.filter(({ receivedAt, post }) => isLate(receivedAt, post));
    expect(late.length).toBeGreaterThan(50);
    for (const { receivedAt, post } of late) {
      expect(Date.parse(post.startedAt)).toBeGreaterThan(from.getTime() - 60_000);
      expect(receivedAt.getTime()).toBeGreaterThan(until.getTime());
      expect(post.routedOn).toBe('station');
    }
    const starts = late.map(({ post }) => Date.parse(post.startedAt));
    expect(starts).not.toEqual([...starts].sort((a, b) => a - b));
  });
});

const isLate = (receivedAt: Date, post: HistoryPost['post']) =>
  receivedAt.getTime() - Date.parse(post.startedAt) > 3_600_000;
