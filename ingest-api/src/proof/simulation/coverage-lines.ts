import { percent } from './coverage-shortfalls.js';
import type { BenchReport, CoverageReport } from './run-coverage.js';

/** The report of the coverage simulation as lines of text: a table of benches, one of knees, the shortfalls. */
export function coverageLines({
  benches,
  knees,
  trueBounds,
  allowance,
  shortfalls,
}: CoverageReport): string[] {
  return [
    'Coverage of the 95 % interval of the slope (covered, mean width over the 95 % quantile of the error)',
    '',
    'points  σ/δ   log-uniform      uniform          worst slope       2×ceiling bounded  ceiling/10 measured',
    ...benches.map(benchLine),
    '',
    'Compliance voltage at 0.2 % noise, knee at 30 to 98 % of the range',
    '',
    'points  loss over  law       within a step  false knees',
    ...knees.map((knee) =>
      [
        String(knee.pointCount).padEnd(8),
        String(knee.lossVolts).padEnd(11),
        knee.law.padEnd(10),
        percent(knee.withinStep).padEnd(15),
        percent(knee.falseKnees),
      ].join(''),
    ),
    '',
    `"At least" claims that are true: ${percent(trueBounds)}`,
    '',
    ...(allowance > 0
      ? [`A short run: figures may miss their aims by ${allowance} standard errors.`, '']
      : []),
    ...(shortfalls.length === 0
      ? ['No figure falls short.']
      : shortfalls.map(
          ({ what, aim, measured }) => `FALLS SHORT  ${what}: aim ${aim}, measured ${measured}`,
        )),
  ];
}

function benchLine({ pointCount, noise, cells, worst, ceiling }: BenchReport): string {
  return [
    String(pointCount).padEnd(8),
    String(noise).padEnd(6),
    ...cells.map((cell) => `${percent(cell.covered)} ${cell.relativeWidth.toFixed(2)}`.padEnd(17)),
    `${percent(worst.covered)} at ${worst.slope}`.padEnd(18),
    percent(ceiling.twiceBounded).padEnd(19),
    percent(ceiling.tenthMeasured),
  ].join('');
}
