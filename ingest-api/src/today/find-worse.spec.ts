import { yieldShare } from '../analysis/yield/yield-share.js';
import type { StationActivity } from '../stations/station-activity.service.js';
import type { TodayProductDto, TodayStageDto } from './dto/today.dto.js';
import { findWorse } from './find-worse.js';

const minute = 60_000;
const dayStart = Date.parse('2026-11-30T00:00:00Z');
const now = dayStart + 12 * 60 * minute;

function aStage(overrides: Partial<TodayStageDto> = {}): TodayStageDto {
  return {
    stage: 'final',
    target: 0.95,
    firstPass: yieldShare(95, 100),
    final: yieldShare(98, 100),
    failed: 5,
    notProven: 0,
    openUnits: 0,
    previous: yieldShare(950, 1000),
    ...overrides,
  };
}
const aProduct = (...stages: TodayStageDto[]): TodayProductDto => ({
  partNumber: 'FH-R500-W',
  description: '500 µA source',
  stages,
  rolledThroughput: null,
});
const aStation = (lastPostAt: number | null): StationActivity =>
  ({ station: 'north-1', lastPostAt }) as StationActivity;
const worse = (stage: Partial<TodayStageDto>, ...stations: StationActivity[]) =>
  findWorse([aProduct(aStage(stage))], stations, dayStart, now);

describe('what is getting worse', () => {
  it('is nothing on an ordinary day', () => {
    expect(worse({}, aStation(now - minute))).toEqual([]);
  });

  it('is a first-pass yield whose whole interval lies below that of the week before', () => {
    expect(worse({ firstPass: yieldShare(80, 100) })).toEqual([
      {
        kind: 'firstPass',
        text: 'First-pass yield 80.0 %, was 95.0 % over the seven days before',
        partNumber: 'FH-R500-W',
        stage: 'final',
        station: null,
      },
    ]);
  });

  it('is not a bad first unit of the day, nor a small dip that chance explains', () => {
    expect(worse({ firstPass: yieldShare(0, 1) })).toEqual([]);
    expect(worse({ firstPass: yieldShare(0, 4) })).toEqual([]);
    expect(worse({ firstPass: yieldShare(2, 5) })).toHaveLength(1);
    expect(worse({ firstPass: yieldShare(9, 10), previous: yieldShare(990, 1000) })).toEqual([]);
    expect(worse({ firstPass: yieldShare(92, 100) })).toEqual([]);
  });

  it('needs something to compare with', () => {
    expect(worse({ firstPass: yieldShare(10, 100), previous: yieldShare(0, 0) })).toEqual([]);
    expect(worse({ firstPass: yieldShare(0, 0) })).toEqual([]);
  });

  it('is what could not be proven, when it is surely more than one in twenty', () => {
    expect(worse({ notProven: 5 })).toEqual([]);
    expect(worse({ notProven: 4, firstPass: yieldShare(0, 4), previous: yieldShare(0, 0) })).toEqual([]);
    expect(worse({ notProven: 15 })).toMatchObject([
      { kind: 'notProven', text: expect.stringContaining('15 of 100 first attempts'), stage: 'final' },
    ]);
  });

  it('is a station that posted today and has been silent for half an hour', () => {
    expect(worse({}, aStation(now - 30 * minute + 1))).toEqual([]);
    expect(worse({}, aStation(now - 45 * minute))).toEqual([
      {
        kind: 'silent',
        text: 'north-1 posted nothing for 45 minutes',
        partNumber: null,
        stage: null,
        station: 'north-1',
      },
    ]);
  });

  it('is no station that did not work today', () => {
    expect(worse({}, aStation(null), aStation(dayStart - 1))).toEqual([]);
  });
});
