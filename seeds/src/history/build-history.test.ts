import { describe, expect, it } from 'vitest';
import { buildHistory, demoHistory, type HistoryPost } from './build-history.js';
import { judgePost } from './judge-post.js';
import { productByPartNumber, stageOf } from '@ampkeep/station-sim/dist/circuit/products.js';
import { stories } from '../scenario/stories.js';

const now = new Date('2026-12-01T14:30:00Z');
const history = buildHistory({ ...demoHistory, now }, judgePost);
const production = history.filter(({ post }) => post.runKind === 'production');

const verdictOf = ({ post }: HistoryPost) => {
  const product = productByPartNumber(post.partNumber);
  return judgePost(post, product, stageOf(product, post.stage as 'board' | 'final'));
};

const hoursAgo = ({ post }: HistoryPost) => (now.getTime() - Date.parse(post.startedAt)) / 3_600_000;

const shareOf = (posts: readonly HistoryPost[], verdict: string) =>
  posts.filter((entry) => verdictOf(entry) === verdict).length / posts.length;

describe('the demonstration’s history', () => {
  it('holds about 1,500 results of a week that ends now', () => {
    expect(history.length).toBeGreaterThan(1300);
    expect(history.length).toBeLessThan(1800);
    for (const { receivedAt, post } of history) {
      expect(receivedAt.getTime()).toBeLessThanOrEqual(now.getTime());
      expect(Date.parse(post.startedAt)).toBeGreaterThan(now.getTime() - 7.1 * 86_400_000);
      expect(Date.parse(post.startedAt)).toBeLessThan(receivedAt.getTime());
    }
  });

  it('is the same for the same seed', () => {
    const small = { ...demoHistory, now, days: 1 };
    expect(buildHistory(small, judgePost)).toEqual(buildHistory(small, judgePost));
    expect(buildHistory({ ...small, seed: 'other' }, judgePost)).not.toEqual(buildHistory(small, judgePost));
  });

  it('names every result once', () => {
    expect(new Set(history.map(({ post }) => post.resultId)).size).toBe(history.length);
  });

  it('gives no unit more attempts than its stage allows', () => {
    const counts = new Map<string, number>();
    for (const { post } of production.filter(({ post }) => post.outcome !== 'aborted')) {
      const key = `${post.serialNumber} ${post.stage}`;
      counts.set(key, (counts.get(key) ?? 0) + 1);
    }
    expect(Math.max(...counts.values())).toBeLessThanOrEqual(3);
  });

  it('lets most ordinary units pass at once', () => {
    const ordinary = production.filter((entry) => hoursAgo(entry) > 115);
    expect(shareOf(ordinary, 'pass')).toBeGreaterThan(0.93);
  });

  it('holds aborted runs and golden checks of every station', () => {
    expect(production.some(({ post }) => post.outcome === 'aborted')).toBe(true);
    const golden = history.filter(({ post }) => post.runKind === 'golden');
    expect(new Set(golden.map(({ station }) => station)).size).toBe(6);
  });
});

describe('the stories in it', () => {
  it('tells of a station whose gain drifts until units fail there and not beside it', () => {
    const lately = production.filter(
      (entry) =>
        hoursAgo(entry) < 30 && entry.post.partNumber === 'FH-R500-W' && entry.post.stage === 'final',
    );
    const at = (station: string) => lately.filter((entry) => entry.station === station);
    expect(shareOf(at(stories.gainDrift.station), 'fail')).toBeGreaterThan(0.25);
    expect(shareOf(at('north-4'), 'fail')).toBeLessThan(0.2);
  });

  it('tells of one lot with low output impedance', () => {
    const fails = production.filter(
      (entry) =>
        entry.post.partNumber === 'FH-R500-W' && entry.post.stage === 'board' && verdictOf(entry) === 'fail',
    );
    const byLot = new Map<string, number>();
    for (const { post } of fails) byLot.set(post.lot ?? '', (byLot.get(post.lot ?? '') ?? 0) + 1);
    const [worst = 0, second = 0] = [...byLot.values()].sort((a, b) => b - a);
    expect(worst).toBeGreaterThan(10);
    expect(worst).toBeGreaterThan(2 * second);
  });

  it('tells of a meter left on a coarse range: not proven, then proven elsewhere', () => {
    const notProven = production.filter((entry) => verdictOf(entry) === 'notProven');
    expect(notProven.length).toBeGreaterThan(4);
    expect(new Set(notProven.map(({ station }) => station))).toEqual(new Set([stories.coarseRange.station]));
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

  it('tells of an outage after which posts came late and out of order', () => {
    const late = history.filter(
      ({ receivedAt, post }) => receivedAt.getTime() - Date.parse(post.startedAt) > 3_600_000,
    );
    expect(late.length).toBeGreaterThan(5);
    const starts = late.map(({ post }) => Date.parse(post.startedAt));
    expect(starts).not.toEqual([...starts].sort((a, b) => a - b));
  });
});
