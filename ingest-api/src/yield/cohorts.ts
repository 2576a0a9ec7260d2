import { addCounts } from '../analysis/yield/count-yields.js';
import { rolledThroughput } from '../analysis/yield/rolled-throughput.js';
import { yieldShare } from '../analysis/yield/yield-share.js';
import { NO_UNITS, type YieldCounts } from '../analysis/yield/yield.types.js';
import type { YieldDto } from '../today/dto/today.dto.js';
import type { CohortDto, YieldGroupDto } from './dto/yield-report.dto.js';
import type { CohortRow } from './yield-report.queries.js';

const totalOf = (rows: readonly YieldCounts[]): YieldCounts =>
  rows.reduce<YieldCounts>((all, row) => addCounts(all, row), { ...NO_UNITS });

/** Adds rows up to one cohort. */
export function toCohort(rows: readonly YieldCounts[]): CohortDto {
  const all = totalOf(rows);
  return {
    firstPass: yieldShare(all.firstPassed, all.total),
    final: yieldShare(all.latestPassed, all.total),
    failed: all.firstFailed,
    notProven: all.firstNotProven,
    openUnits: all.open,
  };
}

/** Rolled throughput over these stages; null when there are fewer than two, or one has counted nothing yet. */
export function toRolled(rows: readonly CohortRow[], stageIds: readonly number[]): YieldDto | null {
  if (stageIds.length < 2) return null;
  const counts = stageIds.map((stageId) => totalOf(rows.filter((row) => row.stageId === stageId)));
  const rolled = rolledThroughput(counts.map(({ firstPassed, total }) => ({ passed: firstPassed, total })));
  const last = counts.at(-1)!;
  return rolled === null ? null : { passed: last.firstPassed, total: last.total, ...rolled };
}

/** The cohort by group, the largest first, each with its own trend. */
export function toGroups(rows: readonly CohortRow[], bucketCount: number): YieldGroupDto[] {
  const names = [...new Set(rows.map((row) => row.groupName))];
  const groups = names.map((name) => {
    const own = rows.filter((row) => row.groupName === name);
    const trend = Array.from({ length: bucketCount }, (_, bucket) => {
      const { firstPassed, total } = totalOf(own.filter((row) => row.bucket === bucket));
      return yieldShare(firstPassed, total);
    });
    return { name, ...toCohort(own), buckets: trend };
  });
  return groups.sort((a, b) => b.firstPass.total - a.firstPass.total);
}
