import type { CatalogueProduct } from '../products/catalogue.js';
import type { YieldMarkerDto } from './dto/yield-report.dto.js';
import type { ProgramRow } from './yield-report.queries.js';

interface MarkerQuestion {
  startAt: number;
  endAt: number;
  partNumber?: string;
  stage?: string;
}

/** What changed within the period: limits and plans that took effect, programs that ran for the first time. */
export function findMarkers(
  products: readonly CatalogueProduct[],
  programs: readonly ProgramRow[],
  question: MarkerQuestion,
): YieldMarkerDto[] {
  const concerns = (partNumber: string, stage: string): boolean =>
    (question.partNumber ?? partNumber) === partNumber && (question.stage ?? stage) === stage;
  const within = (time: number): boolean => time >= question.startAt && time < question.endAt;
  const found: { at: number; kind: YieldMarkerDto['kind']; text: string }[] = [];
  for (const { partNumber, stages } of products) {
    for (const { name, limitSets, plans } of stages.filter((stage) => concerns(partNumber, stage.name))) {
      for (const { version, effectiveAt } of limitSets)
        found.push({ at: effectiveAt, kind: 'limitSet', text: `${partNumber} ${name}: limits ${version}` });
      for (const { version, effectiveAt } of plans)
        found.push({
          at: effectiveAt,
          kind: 'testPlan',
          text: `${partNumber} ${name}: test plan ${version}`,
        });
    }
  }
  for (const { partNumber, stage, programName, programVersion, firstAt } of programs) {
    if (concerns(partNumber, stage))
      found.push({
        at: firstAt,
        kind: 'program',
        text: `${partNumber} ${stage}: ${programName} ${programVersion}`,
      });
  }
  return found
    .filter(({ at }) => within(at))
    .sort((a, b) => a.at - b.at)
    .map(({ at, kind, text }) => ({ at: new Date(at).toISOString(), kind, text }));
}
