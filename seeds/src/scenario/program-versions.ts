import type { StageName } from '@ampkeep/station-sim/dist/circuit/product-facts.js';

interface ProgramVersion {
  version: string;
  /** Installed on all stations so many hours before the end of the history. */
  fromHoursAgo: number;
}

/** Newest first; the last of each stage was there from the beginning. */
const programVersions: Readonly<Record<StageName, readonly [ProgramVersion, ...ProgramVersion[]]>> = {
  board: [
    { version: '3.4.1', fromHoursAgo: 5 * 24 },
    { version: '3.4.0', fromHoursAgo: 33 * 24 },
    { version: '3.3.2', fromHoursAgo: Infinity },
  ],
  final: [
    { version: '3.4.1', fromHoursAgo: 30 * 24 },
    { version: '3.3.2', fromHoursAgo: Infinity },
  ],
};

/** Version of a stage's test program so many hours before the end of the history. */
export function programVersionAt(stage: StageName, hoursAgo: number): string {
  const versions = programVersions[stage];
  return (versions.find(({ fromHoursAgo }) => hoursAgo <= fromHoursAgo) ?? versions[0]).version;
}
