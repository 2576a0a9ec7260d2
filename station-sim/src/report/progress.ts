import type { Tally } from './tally.js';

/** One line that fits 80 columns: how many, how they were judged, what is wrong. */
export function progressLine(tally: Tally, count: number): string {
  const { pass, fail, notProven, aborted, unjudged } = tally.verdicts;
  const parts = [
    count === 0 ? `tested ${tally.tested}` : `tested ${tally.tested}/${count}`,
    `pass ${pass}`,
    `fail ${fail}`,
    `not proven ${notProven}`,
  ];
  if (aborted > 0) parts.push(`aborted ${aborted}`);
  if (unjudged > 0) parts.push(`unjudged ${unjudged}`);
  if (tally.refused > 0) parts.push(`refused ${tally.refused}`);
  if (tally.waiting > 0) parts.push(`waiting ${tally.waiting}`);
  return parts.join(' · ');
}

/** What is said at the end, line by line. */
export function summaryLines(tally: Tally, seconds: number, spoolFile: string): string[] {
  const lines = [
    `${tally.tested} tests in ${seconds.toFixed(1)} s; ${tally.accepted} results taken by the hub: ${progressLine(
      tally,
      0,
    )
      .split(' · ')
      .slice(1)
      .join(', ')}`,
  ];
  if (tally.replayed > 0)
    lines.push(`${tally.replayed} results of an earlier run were in the spool and sent first`);
  if (tally.retries > 0)
    lines.push(`${tally.retries} tries were repeated; the last trouble: ${tally.lastTrouble}`);
  if (tally.refused > 0) lines.push(`${tally.refused} results were refused for good: ${tally.lastTrouble}`);
  if (tally.blocked) lines.push(`The hub does not let this station in: ${tally.blocked}`);
  if (tally.waiting > 0)
    lines.push(`${tally.waiting} results wait in ${spoolFile} and go out with the next run`);
  return lines;
}
