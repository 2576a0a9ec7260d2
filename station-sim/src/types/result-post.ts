/** The post of the station contract, version 1, as far as a station of this line fills it in. */
export interface ResultPost {
  resultId: string;
  runKind: 'production' | 'golden' | 'practice';
  outcome: 'completed' | 'stoppedOnFail' | 'aborted';
  abortReason?: string;
  partNumber: string;
  serialNumber: string;
  lot?: string;
  stage: string;
  channel?: string;
  startedAt: string;
  finishedAt?: string;
  sentAt?: string;
  testPlanVersion?: number;
  program?: { name: string; version: string };
  operator?: string;
  fixture?: string;
  ambientCelsius?: number;
  supplyVolts?: number;
  dwellMs?: number;
  ammeter?: {
    serialNumber: string;
    rangeAmps: number;
    resolutionAmps: number;
    readingAccuracyPercent: number;
    rangeAccuracyPercent: number;
    burdenOhms: number;
  };
  voltmeter?: {
    serialNumber: string;
    rangeVolts: number;
    resolutionVolts: number;
    readingAccuracyPercent: number;
    rangeAccuracyPercent: number;
    inputOhms: number;
    spansAmmeter: boolean;
  };
  points: PostedPoint[];
  stationVerdict?: 'pass' | 'fail';
  routedOn?: 'hub' | 'station';
}

export interface PostedPoint {
  loadVolts: number;
  outputAmps: number;
  elapsedMs?: number;
  direction?: 'up' | 'down' | 'repeat';
  overload?: boolean;
}
